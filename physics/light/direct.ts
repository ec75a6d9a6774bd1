import type { Emitter } from './emitter';
import type { Vec3 } from './light-documents';
import { apart, crosses, type Occluder } from './occluder';
import { add, scale } from './vector';
import { viewFactor } from './view-factor';

/** Parts of a face that is not Lambertian are at most this share of their distance wide: 0.3 keeps the middle within 0.1 %. */
const PART_OF_DISTANCE = 0.03;
const MOST_PARTS = 200;

function pointLight(point: Vec3, normal: Vec3, lamp: Emitter, occluders: readonly Occluder[]): number {
  const x = point[0] - lamp.position[0];
  const y = point[1] - lamp.position[1];
  const z = point[2] - lamp.position[2];
  const r2 = x * x + y * y + z * z;
  if (r2 < 1e-12) return 0;
  const r = Math.sqrt(r2);
  const cosReceiver = -(x * normal[0] + y * normal[1] + z * normal[2]) / r;
  if (cosReceiver <= 0) return 0;
  const gamma = Math.acos(Math.max(-1, Math.min(1, (x * lamp.aim[0] + y * lamp.aim[1] + z * lamp.aim[2]) / r)));
  const c = Math.atan2(
    x * lamp.side[0] + y * lamp.side[1] + z * lamp.side[2],
    x * lamp.axis[0] + y * lamp.axis[1] + z * lamp.axis[2],
  );
  const intensity = lamp.intensity(gamma, c);
  if (intensity === 0) return 0;
  return ((lamp.ppf * intensity * cosReceiver) / r2) * seen(point, lamp.position, occluders);
}

/** The share of a straight ray that passes all boxes between two points. */
function seen(a: Vec3, b: Vec3, occluders: readonly Occluder[]): number {
  const low: Vec3 = [Math.min(a[0], b[0]), Math.min(a[1], b[1]), Math.min(a[2], b[2])];
  const high: Vec3 = [Math.max(a[0], b[0]), Math.max(a[1], b[1]), Math.max(a[2], b[2])];
  let share = 1;
  for (const box of occluders) {
    if (!apart(box, low, high) && crosses(box, a, b)) share *= 1 - box.stops;
    if (share === 0) return 0;
  }
  return share;
}

/** Nearest distance from a point to the rectangle of a lamp's face. */
function distanceToFace(point: Vec3, lamp: Emitter, face: NonNullable<Emitter['face']>): number {
  const x = point[0] - lamp.position[0];
  const y = point[1] - lamp.position[1];
  const z = point[2] - lamp.position[2];
  const along = Math.max(0, Math.abs(x * lamp.axis[0] + y * lamp.axis[1] + z * lamp.axis[2]) - face.lengthM / 2);
  const across = Math.max(0, Math.abs(x * lamp.side[0] + y * lamp.side[1] + z * lamp.side[2]) - face.widthM / 2);
  const ahead = x * lamp.aim[0] + y * lamp.aim[1] + z * lamp.aim[2];
  return Math.sqrt(along * along + across * across + ahead * ahead);
}

/** A face with a pattern of its own, cut into parts: each part's exact view factor, weighted by its radiance towards the point. */
function patternedFace(
  point: Vec3,
  normal: Vec3,
  lamp: Emitter,
  face: NonNullable<Emitter['face']>,
  occluders: readonly Occluder[],
): number {
  const step = Math.max(1e-3, PART_OF_DISTANCE * distanceToFace(point, lamp, face));
  const nu = Math.min(MOST_PARTS, Math.max(1, Math.ceil(face.lengthM / step)));
  const nv = Math.min(MOST_PARTS, Math.max(1, Math.ceil(face.widthM / step)));
  const du = scale(lamp.axis, face.lengthM / nu);
  const dv = scale(lamp.side, face.widthM / nv);
  const first = face.corners[0]!;
  let sum = 0;
  for (let i = 0; i < nu; i += 1) {
    for (let j = 0; j < nv; j += 1) {
      const a = add(first, add(scale(du, i), scale(dv, j)));
      const middle = add(a, add(scale(du, 0.5), scale(dv, 0.5)));
      const x = point[0] - middle[0];
      const y = point[1] - middle[1];
      const z = point[2] - middle[2];
      const r = Math.sqrt(x * x + y * y + z * z);
      const cos = (x * lamp.aim[0] + y * lamp.aim[1] + z * lamp.aim[2]) / r;
      // Intensity is finite at grazing angles, radiance need not be; the view factor there is 0.
      if (cos <= 1e-9) continue;
      const c = Math.atan2(
        x * lamp.side[0] + y * lamp.side[1] + z * lamp.side[2],
        x * lamp.axis[0] + y * lamp.axis[1] + z * lamp.axis[2],
      );
      const intensity = lamp.intensity(Math.acos(Math.min(1, cos)), c);
      if (intensity === 0) continue;
      const part = [a, add(a, du), add(a, add(du, dv)), add(a, dv)];
      sum += (intensity / cos) * viewFactor(point, normal, part, occluders, lamp.body ?? undefined);
    }
  }
  return (Math.PI * lamp.ppf * sum) / face.areaM2;
}

/**
 * PPFD that one lamp gives a point directly, past tiers, pipes and other lamps.
 *
 * Point: E = Φ·i(γ, C)·cos θ/r². Lambertian face: E = Φ/A·F. Any other face: E = Φ/A·π·Σ i(γ, C)/cos γ·F over its parts.
 *
 * @param point metres; @param normal unit vector of the leaf
 * @returns µmol/m²/s
 * @source [S640] PPFD; [Lambert1760]; [CIE-inverse-square] for points
 * @accuracy exact for points and Lambertian faces; other faces within 0.1 % at any distance over 5 mm
 */
export function directPpfd(point: Vec3, normal: Vec3, lamp: Emitter, occluders: readonly Occluder[]): number {
  if (lamp.ppf === 0) return 0;
  if (!lamp.face) return pointLight(point, normal, lamp, occluders);
  const ahead =
    (point[0] - lamp.position[0]) * lamp.aim[0] +
    (point[1] - lamp.position[1]) * lamp.aim[1] +
    (point[2] - lamp.position[2]) * lamp.aim[2];
  if (ahead <= 1e-9) return 0;
  if (lamp.lambertian)
    return (
      (lamp.ppf / lamp.face.areaM2) * viewFactor(point, normal, lamp.face.corners, occluders, lamp.body ?? undefined)
    );
  return patternedFace(point, normal, lamp, lamp.face, occluders);
}
