import type { Vec3 } from './light-documents';
import { add, scale, subtract } from './vector';

/**
 * A solid box, of any orientation, that stops light: a tier, a pipe, a lamp's body. A box without thickness is a sheet.
 */
export interface Occluder {
  centre: Vec3;
  /** Three unit directions of its edges. */
  axes: readonly [Vec3, Vec3, Vec3];
  /** Half its extent along each. */
  half: Vec3;
  /** The share that it stops: 1 for a solid, less for a mesh. */
  stops: number;
  /** Its extent along x, y and z, to dismiss it quickly. */
  low: Vec3;
  high: Vec3;
}

export function createOccluder({
  centre,
  axes,
  half,
  stops,
}: Pick<Occluder, 'centre' | 'axes' | 'half' | 'stops'>): Occluder {
  const reach = [0, 1, 2].map((k) =>
    axes.reduce((sum, axis, i) => sum + Math.abs(axis[k]!) * half[i]!, 0),
  ) as unknown as Vec3;
  return { centre, axes, half, stops, low: subtract(centre, reach), high: add(centre, reach) };
}

export const uprightBox = ({ low, high, stops = 1 }: { low: Vec3; high: Vec3; stops?: number }): Occluder =>
  createOccluder({
    centre: scale(add(low, high), 0.5),
    axes: [
      [1, 0, 0],
      [0, 1, 0],
      [0, 0, 1],
    ],
    half: scale(subtract(high, low), 0.5),
    stops,
  });

/** Faces closer than this to the eye or to the lamp do not hide it: they are the same surface. */
export const TOUCH_M = 1e-11;
/** At most 3 near faces and 6 silhouette edges. */
export const MOST_SHADOW_PLANES = 9;
const local = new Float64Array(3);

/**
 * The shadow of a box as seen from a point, as half-spaces a·r + d ≥ 0 with r measured from the point.
 *
 * A point q lies in shadow exactly when it is inside the cone of the box's silhouette and beyond every face that looks at
 * the eye: the ray enters a box where it has passed the last of those faces. All conditions are half-spaces, so the shadow
 * is convex and a polygon can be cut by it without approximation.
 *
 * @param planes receives four numbers for each half-space
 * @returns how many half-spaces; 0 when the point lies on the box, which then hides nothing; −1 when it lies inside
 */
export function shadowPlanes(box: Occluder, px: number, py: number, pz: number, planes: Float64Array): number {
  const { centre, axes, half } = box;
  const dx = px - centre[0];
  const dy = py - centre[1];
  const dz = pz - centre[2];
  for (let i = 0; i < 3; i += 1) {
    const e = axes[i]!;
    local[i] = e[0] * dx + e[1] * dy + e[2] * dz;
  }
  let at = 0;
  let inside = 0;
  for (let i = 0; i < 3; i += 1) {
    const e = axes[i]!;
    const li = local[i]!;
    const hi = half[i]!;
    const side = li > hi + TOUCH_M ? 1 : li < -hi - TOUCH_M ? -1 : 0;
    if (side === 0) {
      if (Math.abs(li) < hi - TOUCH_M) inside += 1;
      continue;
    }
    planes[at] = -side * e[0];
    planes[at + 1] = -side * e[1];
    planes[at + 2] = -side * e[2];
    planes[at + 3] = hi - side * li;
    at += 4;
    for (let step = 1; step <= 2; step += 1) {
      const j = (i + step) % 3;
      const f = axes[j]!;
      const lj = local[j]!;
      const hj = half[j]!;
      const nearJ = lj > hj + TOUCH_M ? 1 : lj < -hj - TOUCH_M ? -1 : 0;
      for (let t = -1; t <= 1; t += 2) {
        if (t === nearJ) continue;
        // The edge between this near face and a face that is turned away, seen along its own direction.
        const wi = side * hi - li;
        const wj = t * hj - lj;
        const turn = wj * li - wi * lj < 0 ? -1 : 1;
        const ni = -wj * turn;
        const nj = wi * turn;
        planes[at] = ni * e[0] + nj * f[0];
        planes[at + 1] = ni * e[1] + nj * f[1];
        planes[at + 2] = ni * e[2] + nj * f[2];
        planes[at + 3] = 0;
        at += 4;
      }
    }
  }
  return at === 0 ? (inside === 3 ? -1 : 0) : at / 4;
}

/** Where a ray from a point enters and leaves a box, in units of the way; enters after it leaves when it misses. */
export interface Passage {
  enter: number;
  leave: number;
}

/** Fills `into` and returns true when the straight line a + t·way meets the box for some t in 0…1. */
export function passage(box: Occluder, a: Vec3, way: Vec3, into: Passage): boolean {
  const { centre, axes, half } = box;
  const fx = a[0] - centre[0];
  const fy = a[1] - centre[1];
  const fz = a[2] - centre[2];
  let enter = 0;
  let leave = 1;
  for (let i = 0; i < 3; i += 1) {
    const e = axes[i]!;
    const origin = fx * e[0] + fy * e[1] + fz * e[2];
    const speed = way[0] * e[0] + way[1] * e[1] + way[2] * e[2];
    const h = half[i]!;
    if (Math.abs(speed) < 1e-15) {
      if (Math.abs(origin) > h) return false;
      continue;
    }
    const t0 = (-h - origin) / speed;
    const t1 = (h - origin) / speed;
    const first = t0 < t1 ? t0 : t1;
    const last = t0 < t1 ? t1 : t0;
    if (first > enter) enter = first;
    if (last < leave) leave = last;
    if (enter > leave) return false;
  }
  into.enter = enter;
  into.leave = leave;
  return true;
}

const met: Passage = { enter: 0, leave: 0 };

/** True when the straight line from a to b passes through the box; the two ends may touch it. */
export function crosses(box: Occluder, a: Vec3, b: Vec3): boolean {
  const way: Vec3 = [b[0] - a[0], b[1] - a[1], b[2] - a[2]];
  if (!passage(box, a, way, met)) return false;
  const reach = Math.hypot(way[0], way[1], way[2]);
  return met.enter * reach < reach - TOUCH_M && met.leave * reach > TOUCH_M;
}
