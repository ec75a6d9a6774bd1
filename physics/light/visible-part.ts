import { clip, cornerBuffer } from './polygon-clip';
import { MOST_SHADOW_PLANES, shadowPlanes, TOUCH_M, type Occluder } from './occluder';

/** What is summed over the convex pieces of a polygon that the eye sees; corners are measured from the eye. */
export type Measure = (corners: Float64Array, count: number) => number;

/** The shadows that cut a polygon as seen from one eye. */
interface Shadow {
  planes: Float64Array;
  count: number;
  stops: number;
}

const NUMBERS = 4;
// Scratch that every call reuses: a view factor is taken a hundred thousand times in a second.
const shadows: Shadow[] = [];
let shadowCount = 0;
const buffers: [Float64Array, Float64Array, Float64Array][] = [];

const shadowAt = (index: number): Shadow =>
  (shadows[index] ??= { planes: new Float64Array(MOST_SHADOW_PLANES * NUMBERS), count: 0, stops: 1 });

const OUT = -1;
const CUT = 0;
const IN = 1;

/** Where a polygon lies of a half-space. One that lies in its edge is out: a box does not hide its own face. */
function sideOf(corners: Float64Array, count: number, planes: Float64Array, at: number): number {
  const a = planes[at]!;
  const b = planes[at + 1]!;
  const c = planes[at + 2]!;
  const d = planes[at + 3]!;
  let within = false;
  let without = false;
  for (let i = 0; i < count * 3; i += 3) {
    const reach = a * corners[i]! + b * corners[i + 1]! + c * corners[i + 2]! + d;
    if (reach > TOUCH_M) within = true;
    else if (reach < -TOUCH_M) without = true;
    if (within && without) return CUT;
  }
  return within ? IN : OUT;
}

/**
 * Finds the boxes that hide part of a polygon from the eye, and keeps their shadows for `overVisible`.
 *
 * @param corners of the polygon, measured from the eye
 * @returns false when one solid box hides all of it
 */
export function castShadows(
  px: number,
  py: number,
  pz: number,
  corners: Float64Array,
  count: number,
  occluders: readonly Occluder[],
  except: Occluder | null,
): boolean {
  let lowX = px;
  let lowY = py;
  let lowZ = pz;
  let highX = px;
  let highY = py;
  let highZ = pz;
  for (let i = 0; i < count * 3; i += 3) {
    const x = px + corners[i]!;
    const y = py + corners[i + 1]!;
    const z = pz + corners[i + 2]!;
    if (x < lowX) lowX = x;
    else if (x > highX) highX = x;
    if (y < lowY) lowY = y;
    else if (y > highY) highY = y;
    if (z < lowZ) lowZ = z;
    else if (z > highZ) highZ = z;
  }
  shadowCount = 0;
  for (let k = 0; k < occluders.length; k += 1) {
    const box = occluders[k]!;
    const { low, high } = box;
    if (low[2] > highZ || high[2] < lowZ || low[0] > highX || high[0] < lowX || low[1] > highY || high[1] < lowY)
      continue;
    if (box === except) continue;
    const shadow = shadowAt(shadowCount);
    shadow.count = shadowPlanes(box, px, py, pz, shadow.planes);
    if (shadow.count === 0) continue;
    if (shadow.count < 0) return false;
    shadow.stops = box.stops;
    let whole = true;
    let missed = false;
    for (let w = 0; w < shadow.count && !missed; w += 1) {
      const side = sideOf(corners, count, shadow.planes, w * NUMBERS);
      if (side === OUT) missed = true;
      else if (side === CUT) whole = false;
    }
    if (missed) continue;
    if (whole && box.stops === 1) return false;
    shadowCount += 1;
  }
  return true;
}

export const nothingHides = (): boolean => shadowCount === 0;

/**
 * Sums a measure over what the eye sees of a polygon past the shadows cast before. Exact: at each shadow the polygon is cut
 * into convex pieces outside it, which go on whole, and the piece inside, of which a mesh lets its open share go on. The
 * pieces never overlap, so boxes that stand one behind the other cost no more than boxes side by side.
 */
export function overVisible(corners: Float64Array, count: number, measure: Measure, from = 0): number {
  let k = from;
  for (; k < shadowCount; k += 1) {
    const { planes, count: walls } = shadows[k]!;
    let missed = false;
    for (let w = 0; w < walls && !missed; w += 1) missed = sideOf(corners, count, planes, w * NUMBERS) === OUT;
    if (!missed) break;
  }
  if (k === shadowCount) return measure(corners, count);
  const { planes, count: walls, stops } = shadows[k]!;
  const [left, right, outside] = (buffers[k] ??= [cornerBuffer(), cornerBuffer(), cornerBuffer()]);
  let inside = corners;
  let size = count;
  let sum = 0;
  for (let w = 0; w < walls && size > 0; w += 1) {
    const side = sideOf(inside, size, planes, w * NUMBERS);
    if (side === IN) continue;
    if (side === OUT) {
      sum += overVisible(inside, size, measure, k + 1);
      return sum;
    }
    const out = clip(inside, size, outside, planes, w * NUMBERS, -1);
    if (out > 0) sum += overVisible(outside, out, measure, k + 1);
    const next = inside === left ? right : left;
    size = clip(inside, size, next, planes, w * NUMBERS, 1);
    inside = next;
  }
  return stops < 1 && size > 0 ? sum + (1 - stops) * overVisible(inside, size, measure, k + 1) : sum;
}
