import type { Emitter } from './emitter';
import type { Vec3 } from './light-documents';
import { crosses, type Occluder } from './occluder';
import { patternedFace } from './patterned-face';
import { viewFactor } from './view-factor';

/** The share of a straight ray that passes all boxes between two points. */
function passes(a: Vec3, b: Vec3, occluders: readonly Occluder[]): number {
  let share = 1;
  for (const box of occluders) {
    const { low, high } = box;
    if (
      (a[2] < low[2] && b[2] < low[2]) ||
      (a[2] > high[2] && b[2] > high[2]) ||
      (a[0] < low[0] && b[0] < low[0]) ||
      (a[0] > high[0] && b[0] > high[0]) ||
      (a[1] < low[1] && b[1] < low[1]) ||
      (a[1] > high[1] && b[1] > high[1])
    )
      continue;
    if (crosses(box, a, b)) share *= 1 - box.stops;
    if (share === 0) return 0;
  }
  return share;
}

function pointLight(point: Vec3, normal: Vec3, lamp: Emitter, occluders: readonly Occluder[]): number {
  const x = point[0] - lamp.position[0];
  const y = point[1] - lamp.position[1];
  const z = point[2] - lamp.position[2];
  const r2 = x * x + y * y + z * z;
  if (r2 < 1e-12) return 0;
  const r = Math.sqrt(r2);
  const cosReceiver = -(x * normal[0] + y * normal[1] + z * normal[2]) / r;
  if (cosReceiver <= 0) return 0;
  const { aim, axis, side } = lamp;
  const intensity = lamp.intensity(
    (x * aim[0] + y * aim[1] + z * aim[2]) / r,
    x * axis[0] + y * axis[1] + z * axis[2],
    x * side[0] + y * side[1] + z * side[2],
  );
  if (intensity === 0) return 0;
  return ((intensity * cosReceiver) / r2) * passes(point, lamp.position, occluders);
}

function isBehind(point: Vec3, { position, aim }: Emitter): boolean {
  const ahead =
    (point[0] - position[0]) * aim[0] + (point[1] - position[1]) * aim[1] + (point[2] - position[2]) * aim[2];
  return ahead <= 1e-9;
}

/**
 * The share of a point's sky that a lamp's face takes up: no reflected light comes from there.
 *
 * @param unit what `unitPpfd` gives for the same point
 */
export function faceShare(
  point: Vec3,
  normal: Vec3,
  lamp: Emitter,
  occluders: readonly Occluder[],
  unit: number,
): number {
  if (!lamp.face || isBehind(point, lamp)) return 0;
  return lamp.lambertian ? unit * lamp.face.areaM2 : viewFactor(point, normal, lamp.face.polygon, occluders, lamp.body);
}

/**
 * PPFD that a lamp gives a point directly, past tiers, pipes and other lamps, for a photon flux of 1 µmol/s.
 *
 * Point: E = i(γ, C)·cos θ/r². Lambertian face: E = F/A. Any other face: E = 1/A ∫ i(γ, C) cos θ/r² dA.
 *
 * @param point metres
 * @param normal unit vector of the leaf
 * @param lamp whose own body hides nothing of it
 * @param occluders solid and meshed boxes
 * @returns µmol/m²/s for each µmol/s
 * @source [S640] PPFD; [Lambert1760]; inverse square and cosine for points
 * @accuracy exact for points and Lambertian faces; other faces as patterned-face.ts says
 */
export function unitPpfd(point: Vec3, normal: Vec3, lamp: Emitter, occluders: readonly Occluder[]): number {
  if (!lamp.face) return pointLight(point, normal, lamp, occluders);
  if (isBehind(point, lamp)) return 0;
  return lamp.lambertian
    ? viewFactor(point, normal, lamp.face.polygon, occluders, lamp.body) / lamp.face.areaM2
    : patternedFace(point, normal, lamp, lamp.face, occluders);
}

/** PPFD that one lamp gives a point directly at full output, µmol/m²/s. */
export const directPpfd = (point: Vec3, normal: Vec3, lamp: Emitter, occluders: readonly Occluder[]): number =>
  lamp.ppf === 0 ? 0 : lamp.ppf * unitPpfd(point, normal, lamp, occluders);
