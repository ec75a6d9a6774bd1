import type { Vec3 } from './light-documents';
import type { Occluder } from './occluder';

/** An upright box of space. */
export interface Extent {
  low: Vec3;
  high: Vec3;
}

export function extentOf(points: readonly Vec3[] | Float64Array): Extent {
  const low: [number, number, number] = [Infinity, Infinity, Infinity];
  const high: [number, number, number] = [-Infinity, -Infinity, -Infinity];
  const take = (k: number, value: number) => {
    if (value < low[k]!) low[k] = value;
    if (value > high[k]!) high[k] = value;
  };
  if (points instanceof Float64Array) points.forEach((value, i) => take(i % 3, value));
  else for (const point of points) point.forEach((value, k) => take(k, value));
  return { low, high };
}

/** How far an extent reaches along a direction. */
function reachAlong({ low, high }: Extent, [x, y, z]: Vec3): number {
  return (x > 0 ? high[0] : low[0]) * x + (y > 0 ? high[1] : low[1]) * y + (z > 0 ? high[2] : low[2]) * z;
}

/** True when a plane square to the direction has the box on one side and both extents on the other. */
function parts(direction: Vec3, box: Extent, a: Extent, b: Extent): boolean {
  const back: Vec3 = [-direction[0], -direction[1], -direction[2]];
  const near = (way: Vec3, away: Vec3) =>
    -reachAlong(box, away) >= Math.max(reachAlong(a, way), reachAlong(b, way)) - 1e-9;
  return near(direction, back) || near(back, direction);
}

const FACES: readonly Vec3[] = [
  [1, 0, 0],
  [0, 1, 0],
  [0, 0, 1],
];

/**
 * False when a body cannot stand between a lamp and any of the points: some plane parts it from both. True when it may; it is
 * careful, not exact.
 *
 * @param aim of a face; null for a point, which may shine to all sides
 */
export function mayHide(body: Occluder, lamp: Extent, points: Extent, aim: Vec3 | null): boolean {
  for (const face of FACES) if (parts(face, body, lamp, points)) return false;
  // Nothing behind the face's own plane hides its light.
  if (aim && reachAlong(body, aim) <= -reachAlong(lamp, [-aim[0], -aim[1], -aim[2]]) + 1e-9) return false;
  for (let i = 0; i < 3; i += 1) {
    const j = (i + 1) % 3;
    for (let corner = 0; corner < 4; corner += 1) {
      const pick = (extent: Extent, k: number, upper: boolean) => (upper ? extent.high[k]! : extent.low[k]!);
      const di = pick(points, i, (corner & 1) > 0) - pick(lamp, i, (corner & 1) > 0);
      const dj = pick(points, j, (corner & 2) > 0) - pick(lamp, j, (corner & 2) > 0);
      const normal: [number, number, number] = [0, 0, 0];
      normal[i] = -dj;
      normal[j] = di;
      if ((di !== 0 || dj !== 0) && parts(normal, body, lamp, points)) return false;
    }
  }
  return true;
}
