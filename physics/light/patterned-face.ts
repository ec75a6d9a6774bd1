import type { Emitter, LampFace } from './emitter';
import type { Vec3 } from './light-documents';
import type { Occluder } from './occluder';
import { cornerBuffer } from './polygon-clip';
import { castShadows, nothingHides, overVisible } from './visible-part';
import { inFront } from './view-factor';

/** A part of the face is at most this share of its distance wide, or of the angle over which the beam changes. */
const PART_OF_DISTANCE = 0.7;
/** Patterns with a cliff would ask for parts without end. */
const LEAST_SCALE_RAD = 0.06;
const MOST_HALVINGS = 14;

interface Points {
  at: readonly number[];
  weight: readonly number[];
}

/** Gauss and Legendre's points on −1…1, exact to the first, third and fifth degree. */
const ONE: Points = { at: [0], weight: [1] };
const TWO: Points = { at: [-Math.sqrt(1 / 3), Math.sqrt(1 / 3)], weight: [0.5, 0.5] };
const THREE: Points = { at: [-Math.sqrt(0.6), 0, Math.sqrt(0.6)], weight: [5 / 18, 8 / 18, 5 / 18] };
/** Up to this share of the widest a part may be, one or two points across it do as well as three on the widest. */
const ONE_DOES = 0.04;
const TWO_DO = 0.4;

const pointsAcross = (share: number): Points => (share < ONE_DOES ? ONE : share < TWO_DO ? TWO : THREE);

/** Radon's seven points on a triangle, exact to the fifth degree: weight and the three shares of the corners. */
const RADON: readonly (readonly [number, number, number, number])[] = [
  [0.225, 1 / 3, 1 / 3, 1 / 3],
  ...around((155 + Math.sqrt(15)) / 1200, (6 + Math.sqrt(15)) / 21),
  ...around((155 - Math.sqrt(15)) / 1200, (6 - Math.sqrt(15)) / 21),
];

function around(weight: number, b: number): [number, number, number, number][] {
  const a = 1 - 2 * b;
  return [
    [weight, a, b, b],
    [weight, b, a, b],
    [weight, b, b, a],
  ];
}

// One point and one lamp at a time; a closure for each would cost more than the sum itself.
let lamp!: Emitter;
let face!: LampFace;
let nx = 0;
let ny = 0;
let nz = 1;
/** The eye in the lamp's own frame: along its axis, along its third direction, ahead of its face. */
let eyeU = 0;
let eyeV = 0;
let eyeH = 0;
let wide = PART_OF_DISTANCE;
let clear = true;
const part = new Float64Array(12);
const seenPart = cornerBuffer();

/** What one bit of the face at r from the eye gives it, for a unit of its area and of photon flux. */
function arrives(x: number, y: number, z: number): number {
  const facing = x * nx + y * ny + z * nz;
  if (facing <= 0) return 0;
  const r2 = x * x + y * y + z * z;
  const r = Math.sqrt(r2);
  const { aim, axis, side } = lamp;
  const cosGamma = -(x * aim[0] + y * aim[1] + z * aim[2]) / r;
  const along = -(x * axis[0] + y * axis[1] + z * axis[2]);
  const across = -(x * side[0] + y * side[1] + z * side[2]);
  return (lamp.intensity(cosGamma, along, across) * facing) / (r2 * r);
}

function overPolygon(corners: Float64Array, count: number): number {
  const ax = corners[0]!;
  const ay = corners[1]!;
  const az = corners[2]!;
  let sum = 0;
  for (let i = 1; i + 1 < count; i += 1) {
    const bx = corners[i * 3]!;
    const by = corners[i * 3 + 1]!;
    const bz = corners[i * 3 + 2]!;
    const cx = corners[i * 3 + 3]!;
    const cy = corners[i * 3 + 4]!;
    const cz = corners[i * 3 + 5]!;
    const tx = (by - ay) * (cz - az) - (bz - az) * (cy - ay);
    const ty = (bz - az) * (cx - ax) - (bx - ax) * (cz - az);
    const tz = (bx - ax) * (cy - ay) - (by - ay) * (cx - ax);
    const area = Math.sqrt(tx * tx + ty * ty + tz * tz) / 2;
    if (area < 1e-16) continue;
    let mean = 0;
    for (const [weight, a, b, c] of RADON)
      mean += weight * arrives(a * ax + b * bx + c * cx, a * ay + b * by + c * cy, a * az + b * bz + c * cz);
    sum += area * mean;
  }
  return sum;
}

function overRectangle(u: number, v: number, halfU: number, halfV: number, distance: number): number {
  const { axis, side, aim } = lamp;
  const most = wide * distance;
  const across = pointsAcross((2 * halfU) / most);
  const down = pointsAcross((2 * halfV) / most);
  let sum = 0;
  for (let i = 0; i < across.at.length; i += 1) {
    const du = u + across.at[i]! * halfU - eyeU;
    for (let j = 0; j < down.at.length; j += 1) {
      const dv = v + down.at[j]! * halfV - eyeV;
      sum +=
        across.weight[i]! *
        down.weight[j]! *
        arrives(
          du * axis[0] + dv * side[0] - eyeH * aim[0],
          du * axis[1] + dv * side[1] - eyeH * aim[1],
          du * axis[2] + dv * side[2] - eyeH * aim[2],
        );
    }
  }
  return 4 * halfU * halfV * sum;
}

function overPart(point: Vec3, normal: Vec3, u: number, v: number, halfU: number, halfV: number, d: number): number {
  if (clear) return overRectangle(u, v, halfU, halfV, d);
  const { position, axis, side } = lamp;
  for (let corner = 0; corner < 4; corner += 1) {
    const at = u + (corner === 0 || corner === 3 ? -halfU : halfU);
    const bt = v + (corner < 2 ? -halfV : halfV);
    for (let k = 0; k < 3; k += 1) part[corner * 3 + k] = position[k]! + at * axis[k]! + bt * side[k]!;
  }
  const count = inFront(point[0], point[1], point[2], normal, part, seenPart);
  return count === 0 ? 0 : overVisible(seenPart, count, overPolygon);
}

/** True when no direction from this part to the eye lies within the beam. */
function outsideBeam(u: number, v: number, halfU: number, halfV: number, distance: number): boolean {
  const { reachRad } = lamp.beam;
  if (reachRad > 1.5) return false;
  const gamma = Math.atan2(Math.hypot(eyeU - u, eyeV - v), eyeH);
  return gamma - Math.atan2(Math.hypot(halfU, halfV), distance) * 1.5 > reachRad;
}

function overFace(
  point: Vec3,
  normal: Vec3,
  u: number,
  v: number,
  halfU: number,
  halfV: number,
  halvings: number,
): number {
  const offU = Math.max(0, Math.abs(eyeU - u) - halfU);
  const offV = Math.max(0, Math.abs(eyeV - v) - halfV);
  const distance = Math.sqrt(offU * offU + offV * offV + eyeH * eyeH);
  if (outsideBeam(u, v, halfU, halfV, distance)) return 0;
  if (halvings === 0 || 2 * Math.max(halfU, halfV) <= wide * distance)
    return overPart(point, normal, u, v, halfU, halfV, distance);
  const left = halvings - 1;
  if (halfU >= halfV) {
    const half = halfU / 2;
    return (
      overFace(point, normal, u - half, v, half, halfV, left) + overFace(point, normal, u + half, v, half, halfV, left)
    );
  }
  const half = halfV / 2;
  return (
    overFace(point, normal, u, v - half, halfU, half, left) + overFace(point, normal, u, v + half, halfU, half, left)
  );
}

/**
 * PPFD for a photon flux of 1 from a face that has a pattern of its own: E = 1/A ∫ i(γ, C) cos θ/r² dA over what is seen.
 *
 * The face is halved until each part is small against its distance and against the beam; a part that is seen whole takes up to
 * nine points, one that is cut is cut exactly and takes seven a triangle.
 *
 * @accuracy 2e-4 of the plane's mean; 2e-3 where a table has a cliff
 */
export function patternedFace(
  point: Vec3,
  normal: Vec3,
  source: Emitter,
  sourceFace: LampFace,
  occluders: readonly Occluder[],
): number {
  const [px, py, pz] = point;
  const count = inFront(px, py, pz, normal, sourceFace.polygon, seenPart);
  if (count === 0 || !castShadows(px, py, pz, seenPart, count, occluders, source.body)) return 0;
  lamp = source;
  face = sourceFace;
  [nx, ny, nz] = normal;
  // What crosses the horizon is cut like what is hidden.
  clear = nothingHides() && count === 4;
  const x = px - lamp.position[0];
  const y = py - lamp.position[1];
  const z = pz - lamp.position[2];
  eyeU = x * lamp.axis[0] + y * lamp.axis[1] + z * lamp.axis[2];
  eyeV = x * lamp.side[0] + y * lamp.side[1] + z * lamp.side[2];
  eyeH = x * lamp.aim[0] + y * lamp.aim[1] + z * lamp.aim[2];
  wide = PART_OF_DISTANCE * Math.min(1, Math.max(LEAST_SCALE_RAD, lamp.beam.scaleRad));
  return overFace(point, normal, 0, 0, face.lengthM / 2, face.widthM / 2, MOST_HALVINGS) / face.areaM2;
}
