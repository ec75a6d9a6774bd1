import type { Vec3 } from './light-documents';
import { apart, MOST_SHADOW_PLANES, shadowPlanes, type Occluder } from './occluder';

/** A clipped rectangle gains at most one corner a plane; deeper overlaps than this do not occur among real racks. */
const MOST_CORNERS = 64;
const MOST_DEPTH = 48;

// Scratch that every call reuses: a view factor is taken a hundred thousand times in a second.
const corners: Float64Array[] = Array.from({ length: MOST_DEPTH * 2 }, () => new Float64Array(MOST_CORNERS * 3));
const planes = Array.from({ length: MOST_DEPTH }, () => new Float64Array(MOST_SHADOW_PLANES * 4));
const near: Occluder[] = [];

/** Keeps the part of a convex polygon where a·r + d ≥ 0 (Sutherland and Hodgman 1974). Returns the number of corners. */
function clip(from: Float64Array, count: number, to: Float64Array, a: number, b: number, c: number, d: number): number {
  if (count < 3) return 0;
  let kept = 0;
  let at = (count - 1) * 3;
  let px = from[at]!;
  let py = from[at + 1]!;
  let pz = from[at + 2]!;
  let pd = a * px + b * py + c * pz + d;
  for (let i = 0; i < count; i += 1) {
    at = i * 3;
    const qx = from[at]!;
    const qy = from[at + 1]!;
    const qz = from[at + 2]!;
    const qd = a * qx + b * qy + c * qz + d;
    if ((pd < 0 && qd > 0) || (pd > 0 && qd < 0)) {
      const t = pd / (pd - qd);
      const into = kept * 3;
      to[into] = px + t * (qx - px);
      to[into + 1] = py + t * (qy - py);
      to[into + 2] = pz + t * (qz - pz);
      kept += 1;
    }
    if (qd >= 0) {
      const into = kept * 3;
      to[into] = qx;
      to[into + 1] = qy;
      to[into + 2] = qz;
      kept += 1;
    }
    px = qx;
    py = qy;
    pz = qz;
    pd = qd;
  }
  return kept < 3 ? 0 : kept;
}

/** Lambert's sum over the edges of a polygon that lies in front of the receiver. */
function lambertSum(polygon: Float64Array, count: number, nx: number, ny: number, nz: number): number {
  let sum = 0;
  let at = (count - 1) * 3;
  let px = polygon[at]!;
  let py = polygon[at + 1]!;
  let pz = polygon[at + 2]!;
  for (let i = 0; i < count; i += 1) {
    at = i * 3;
    const qx = polygon[at]!;
    const qy = polygon[at + 1]!;
    const qz = polygon[at + 2]!;
    const cx = py * qz - pz * qy;
    const cy = pz * qx - px * qz;
    const cz = px * qy - py * qx;
    const size = Math.sqrt(cx * cx + cy * cy + cz * cz);
    if (size > 1e-300) sum += (Math.atan2(size, px * qx + py * qy + pz * qz) * (nx * cx + ny * cy + nz * cz)) / size;
    px = qx;
    py = qy;
    pz = qz;
  }
  return Math.abs(sum) / (2 * Math.PI);
}

/** Clips the polygon in `slot` by the shadow of one occluder, between the two buffers of the next depth. */
function shade(slot: number, count: number, box: Occluder, p: Vec3, depth: number): { slot: number; count: number } {
  const half = planes[depth]!;
  const walls = shadowPlanes(box, p[0], p[1], p[2], half);
  if (walls === 0) return { slot, count: 0 };
  let from = slot;
  let left = count;
  for (let w = 0; w < walls && left > 0; w += 1) {
    const to = from === depth * 2 + 2 ? depth * 2 + 3 : depth * 2 + 2;
    left = clip(corners[from]!, left, corners[to]!, half[w * 4]!, half[w * 4 + 1]!, half[w * 4 + 2]!, half[w * 4 + 3]!);
    from = to;
  }
  return { slot: from, count: left };
}

function visible(slot: number, count: number, first: number, p: Vec3, n: Vec3, depth: number): number {
  let factor = lambertSum(corners[slot]!, count, n[0], n[1], n[2]);
  if (factor === 0 || depth + 2 >= MOST_DEPTH) return factor;
  for (let k = first; k < near.length; k += 1) {
    const box = near[k]!;
    const hidden = shade(slot, count, box, p, depth);
    if (hidden.count > 0) factor -= box.stops * visible(hidden.slot, hidden.count, k + 1, p, n, depth + 1);
  }
  return factor;
}

/**
 * View factor from a point with a normal to a plane convex polygon, seen past solid and meshed boxes. Exact.
 *
 * F = 1/(2π) · |Σ θᵢ n·(rᵢ × rᵢ₊₁)/|rᵢ × rᵢ₊₁||, with the polygon clipped to n·r ≥ 0. What is hidden is taken off by
 * inclusion and exclusion: V(P; k…) = V(P; k+1…) − aₖ·V(P ∩ Sₖ; k+1…), where Sₖ is the shadow of box k and aₖ the share it
 * stops. A lamp of photon flux Φ whose face of area A shines by Lambert's law gives the point Φ/A·F.
 *
 * @param point metres
 * @param normal unit vector of the receiver
 * @param polygon corners in order, metres
 * @returns 0…1
 * @source [Lambert1760] polygon formula; [Howell] C-13 gives the same for a rectangle parallel to the receiver
 * @accuracy rounding only, about 1e-13
 */
export function viewFactor(
  point: Vec3,
  normal: Vec3,
  polygon: readonly Vec3[],
  occluders: readonly Occluder[],
  except?: Occluder,
): number {
  const start = corners[0]!;
  let lowX = point[0];
  let lowY = point[1];
  let lowZ = point[2];
  let highX = lowX;
  let highY = lowY;
  let highZ = lowZ;
  polygon.forEach((corner, i) => {
    start[i * 3] = corner[0] - point[0];
    start[i * 3 + 1] = corner[1] - point[1];
    start[i * 3 + 2] = corner[2] - point[2];
    lowX = Math.min(lowX, corner[0]);
    lowY = Math.min(lowY, corner[1]);
    lowZ = Math.min(lowZ, corner[2]);
    highX = Math.max(highX, corner[0]);
    highY = Math.max(highY, corner[1]);
    highZ = Math.max(highZ, corner[2]);
  });
  const count = clip(start, polygon.length, corners[1]!, normal[0], normal[1], normal[2], 0);
  if (count === 0) return 0;
  const low: Vec3 = [lowX, lowY, lowZ];
  const high: Vec3 = [highX, highY, highZ];
  near.length = 0;
  for (const box of occluders) if (box !== except && !apart(box, low, high)) near.push(box);
  return visible(1, count, 0, point, normal, 0);
}
