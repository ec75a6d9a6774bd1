/** More corners than a clipped rectangle ever has among real racks; one more would be dropped, not written elsewhere. */
export const MOST_CORNERS = 64;

export const cornerBuffer = (): Float64Array => new Float64Array(MOST_CORNERS * 3);

/**
 * Keeps the part of a plane convex polygon where s·(a·x + b·y + c·z + d) ≥ 0.
 *
 * @param plane four numbers a, b, c, d from `at` on; @param s 1, or −1 for the other side
 * @returns how many corners `to` now holds; 0 when nothing of the polygon is left
 * @source Sutherland & Hodgman 1974, recalled
 */
export function clip(
  from: Float64Array,
  count: number,
  to: Float64Array,
  plane: Float64Array,
  at: number,
  s: number,
): number {
  if (count < 3) return 0;
  const a = s * plane[at]!;
  const b = s * plane[at + 1]!;
  const c = s * plane[at + 2]!;
  const d = s * plane[at + 3]!;
  let kept = 0;
  let k = (count - 1) * 3;
  let px = from[k]!;
  let py = from[k + 1]!;
  let pz = from[k + 2]!;
  let pd = a * px + b * py + c * pz + d;
  for (let i = 0; i < count && kept < MOST_CORNERS - 1; i += 1) {
    k = i * 3;
    const qx = from[k]!;
    const qy = from[k + 1]!;
    const qz = from[k + 2]!;
    const qd = a * qx + b * qy + c * qz + d;
    if ((pd < 0 && qd > 0) || (pd > 0 && qd < 0)) {
      const t = pd / (pd - qd);
      to[kept * 3] = px + t * (qx - px);
      to[kept * 3 + 1] = py + t * (qy - py);
      to[kept * 3 + 2] = pz + t * (qz - pz);
      kept += 1;
    }
    if (qd >= 0) {
      to[kept * 3] = qx;
      to[kept * 3 + 1] = qy;
      to[kept * 3 + 2] = qz;
      kept += 1;
    }
    px = qx;
    py = qy;
    pz = qz;
    pd = qd;
  }
  return kept < 3 ? 0 : kept;
}
