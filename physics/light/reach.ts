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
function reachAlong({ low, high }: Extent, x: number, y: number, z: number): number {
  return x * (x > 0 ? high[0] : low[0]) + y * (y > 0 ? high[1] : low[1]) + z * (z > 0 ? high[2] : low[2]);
}

/** True when a plane square to the direction has the body on one side and both extents on the other. */
function parted(x: number, y: number, z: number, body: Extent, a: Extent, b: Extent): boolean {
  const high = Math.max(reachAlong(a, x, y, z), reachAlong(b, x, y, z));
  if (-reachAlong(body, -x, -y, -z) >= high - 1e-9) return true;
  const low = -Math.max(reachAlong(a, -x, -y, -z), reachAlong(b, -x, -y, -z));
  return reachAlong(body, x, y, z) <= low + 1e-9;
}

/**
 * False when a body cannot stand between a lamp and any of the points: some plane parts it from both. True when it may; it is
 * careful, not exact.
 *
 * @param aim of a face; null for a point, which may shine to all sides
 */
export function mayHide(body: Occluder, lamp: Extent, points: Extent, aim: Vec3 | null): boolean {
  if (parted(0, 0, 1, body, lamp, points) || parted(1, 0, 0, body, lamp, points)) return false;
  if (parted(0, 1, 0, body, lamp, points)) return false;
  // Nothing behind the face's own plane hides its light.
  if (aim && reachAlong(body, aim[0], aim[1], aim[2]) <= -reachAlong(lamp, -aim[0], -aim[1], -aim[2]) + 1e-9)
    return false;
  // Along the edges of the hull of the two extents, as seen along x, y and z.
  for (let corner = 0; corner < 8; corner += 1) {
    const dx = (corner & 1 ? points.high : points.low)[0] - (corner & 1 ? lamp.high : lamp.low)[0];
    const dy = (corner & 2 ? points.high : points.low)[1] - (corner & 2 ? lamp.high : lamp.low)[1];
    const dz = (corner & 4 ? points.high : points.low)[2] - (corner & 4 ? lamp.high : lamp.low)[2];
    if (parted(-dy, dx, 0, body, lamp, points)) return false;
    if (parted(0, -dz, dy, body, lamp, points)) return false;
    if (parted(dz, 0, -dx, body, lamp, points)) return false;
  }
  return true;
}
