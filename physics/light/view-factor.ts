import type { Vec3 } from './light-documents';
import type { Occluder } from './occluder';
import { clip, cornerBuffer } from './polygon-clip';
import { castShadows, overVisible } from './visible-part';

const start = cornerBuffer();
const front = cornerBuffer();
const horizon = new Float64Array(4);
let nx = 0;
let ny = 0;
let nz = 1;

/** Lambert's sum over the edges of a polygon that lies in front of the receiver. */
function lambertSum(polygon: Float64Array, count: number): number {
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

/** Puts the polygon as the eye sees it, above the eye's horizon, into a buffer. Returns the number of corners. */
export function inFront(
  px: number,
  py: number,
  pz: number,
  normal: Vec3,
  polygon: Float64Array,
  to: Float64Array,
): number {
  const length = polygon.length;
  for (let i = 0; i < length; i += 3) {
    start[i] = polygon[i]! - px;
    start[i + 1] = polygon[i + 1]! - py;
    start[i + 2] = polygon[i + 2]! - pz;
  }
  horizon[0] = normal[0];
  horizon[1] = normal[1];
  horizon[2] = normal[2];
  return clip(start, length / 3, to, horizon, 0, 1);
}

/**
 * View factor from a point with a normal to a plane convex polygon, seen past solid and meshed boxes. Exact.
 *
 * F = 1/(2π) · Σ |Σ θᵢ n·(rᵢ × rᵢ₊₁)/|rᵢ × rᵢ₊₁||, the outer sum over the convex pieces that are seen, each with n·r ≥ 0;
 * θᵢ by the arc tangent of two arguments. A Lambertian face of photon flux Φ and area A gives the point Φ/A·F.
 *
 * @param point metres
 * @param normal unit vector of the receiver
 * @param polygon corners in order, three numbers each, metres
 * @param except a box that hides nothing here: the lamp's own body
 * @returns 0…1
 * @source [Lambert1760] polygon formula; [Howell] C-13 gives the same for a rectangle parallel to the receiver
 * @accuracy rounding only, about 1e-14
 */
export function viewFactor(
  point: Vec3,
  normal: Vec3,
  polygon: Float64Array,
  occluders: readonly Occluder[],
  except: Occluder | null = null,
): number {
  const [px, py, pz] = point;
  const count = inFront(px, py, pz, normal, polygon, front);
  if (count === 0 || !castShadows(px, py, pz, front, count, occluders, except)) return 0;
  nx = normal[0];
  ny = normal[1];
  nz = normal[2];
  return overVisible(front, count, lambertSum);
}
