import type { Vec3 } from './light-documents';
import { add, dot, scale, subtract } from './vector';

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
const TOUCH_M = 1e-7;
/** At most 3 near faces and 6 silhouette edges. */
export const MOST_SHADOW_PLANES = 9;

/**
 * The shadow of a box as seen from a point, as half-spaces a·r + d ≥ 0 with r measured from the point.
 *
 * A point q lies in shadow exactly when it is inside the cone of the box's silhouette and beyond every face that looks at
 * the eye: the ray enters a box where it has passed the last of those faces. All conditions are half-spaces, so the shadow
 * is convex and a polygon can be clipped by it without approximation.
 *
 * @param planes receives four numbers for each half-space
 * @returns how many half-spaces; 0 when the point lies in or on the box, which then hides nothing
 */
export function shadowPlanes(box: Occluder, px: number, py: number, pz: number, planes: Float64Array): number {
  const { centre, axes, half } = box;
  const dx = px - centre[0];
  const dy = py - centre[1];
  const dz = pz - centre[2];
  let count = 0;
  const put = (x: number, y: number, z: number, d: number) => {
    const at = count * 4;
    planes[at] = x;
    planes[at + 1] = y;
    planes[at + 2] = z;
    planes[at + 3] = d;
    count += 1;
  };
  for (let i = 0; i < 3; i += 1) {
    const e = axes[i]!;
    const li = e[0] * dx + e[1] * dy + e[2] * dz;
    const hi = half[i]!;
    const side = li > hi + TOUCH_M ? 1 : li < -hi - TOUCH_M ? -1 : 0;
    if (side === 0) continue;
    put(-side * e[0], -side * e[1], -side * e[2], hi - side * li - TOUCH_M);
    for (let step = 1; step <= 2; step += 1) {
      const j = (i + step) % 3;
      const f = axes[j]!;
      const lj = f[0] * dx + f[1] * dy + f[2] * dz;
      const hj = half[j]!;
      const nearJ = lj > hj + TOUCH_M ? 1 : lj < -hj - TOUCH_M ? -1 : 0;
      for (let t = -1; t <= 1; t += 2) {
        if (t === nearJ) continue;
        // The edge between this near face and a face that is turned away, seen along its own direction.
        const wi = side * hi - li;
        const wj = t * hj - lj;
        let ni = -wj;
        let nj = wi;
        if (ni * -li + nj * -lj < 0) {
          ni = -ni;
          nj = -nj;
        }
        put(ni * e[0] + nj * f[0], ni * e[1] + nj * f[1], ni * e[2] + nj * f[2], 0);
      }
    }
  }
  return count;
}

/** True when the straight line from a to b passes through the box; the two ends may touch it. */
export function crosses(box: Occluder, a: Vec3, b: Vec3): boolean {
  const from = subtract(a, box.centre);
  const way = subtract(b, a);
  let enter = 0;
  let leave = 1;
  for (let i = 0; i < 3; i += 1) {
    const origin = dot(from, box.axes[i]!);
    const speed = dot(way, box.axes[i]!);
    const h = box.half[i]!;
    if (Math.abs(speed) < 1e-15) {
      if (Math.abs(origin) > h) return false;
      continue;
    }
    const t0 = (-h - origin) / speed;
    const t1 = (h - origin) / speed;
    enter = Math.max(enter, Math.min(t0, t1));
    leave = Math.min(leave, Math.max(t0, t1));
    if (enter > leave) return false;
  }
  const reach = Math.hypot(way[0], way[1], way[2]);
  return enter * reach < reach - TOUCH_M && leave * reach > TOUCH_M;
}

/** True when box and region, each given by its extent, do not even come near each other. */
export function apart(box: Occluder, low: Vec3, high: Vec3): boolean {
  return (
    box.low[0] > high[0] ||
    box.high[0] < low[0] ||
    box.low[1] > high[1] ||
    box.high[1] < low[1] ||
    box.low[2] > high[2] ||
    box.high[2] < low[2]
  );
}
