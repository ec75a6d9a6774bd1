import { gammaQuantiles } from './distribution';
import type { Emitter } from './emitter';
import type { LightScene, Vec3 } from './light-documents';
import { passage, type Passage } from './occluder';
import type { Solid } from './scene-geometry';
import { lowerReflectance, zoneAt, type ZoneModel } from './zones';

/** Rays of one quarter about the axis; each is sent four times, mirrored, so that what is symmetric stays so. */
const RAYS = 192;
/** Steps of an additive sequence that fills a cube evenly: powers of the real root of x⁴ = x + 1, recalled. */
const ROOT = 1.2207440846057596;
const spread = (i: number, power: number) => (0.5 + i / ROOT ** power) % 1;
const MIRRORS = [
  [1, 1],
  [-1, 1],
  [-1, -1],
  [1, -1],
] as const;
const TOUCH_M = 1e-7;

/** Of one photon flux of 1: what each zone's surfaces throw back at the first meeting, and what they take in. */
export interface FirstBounce {
  reflected: Float64Array;
  absorbed: number;
}

interface Target {
  scene: LightScene;
  model: ZoneModel;
  solids: readonly Solid[];
}

const met: Passage = { enter: 0, leave: 0 };

/** The wall, floor or ceiling that a ray meets, and how far on. */
function wallAhead({ tent }: LightScene, from: Vec3, way: Vec3): { reach: number; reflectance: number } {
  const { reflectance } = tent;
  const faces = [
    way[0] > 0 ? reflectance.xMax : reflectance.xMin,
    way[1] > 0 ? reflectance.yMax : reflectance.yMin,
    way[2] > 0 ? reflectance.ceiling : reflectance.floor,
  ];
  const ends = [tent.width, tent.depth, tent.height];
  let reach = Infinity;
  let found = 0;
  for (let i = 0; i < 3; i += 1) {
    const speed = way[i]!;
    if (speed === 0) continue;
    const distance = Math.max(0, ((speed > 0 ? ends[i]! : 0) - from[i]!) / speed);
    if (distance < reach) {
      reach = distance;
      found = faces[i]!;
    }
  }
  return { reach, reflectance: found };
}

function landOn(solid: Solid, z: number, rising: boolean, model: ZoneModel): { zone: number; reflectance: number } {
  if (solid.kind === 'box') return { zone: zoneAt(model.levels, z), reflectance: solid.box.reflectance };
  const { slab, occluder } = solid;
  const level = model.levelOf.get(slab)!;
  if (slab.openFraction > 0)
    return rising
      ? { zone: level - 1, reflectance: lowerReflectance(slab) }
      : { zone: level, reflectance: slab.reflectanceTop };
  if (z > occluder.high[2] - TOUCH_M && !rising) return { zone: level, reflectance: slab.reflectanceTop };
  if (z < occluder.low[2] + TOUCH_M && rising) return { zone: level - 1, reflectance: slab.reflectanceBottom };
  return { zone: level - 1, reflectance: slab.reflectanceEdge };
}

function land(into: FirstBounce, zone: number, reflectance: number, share: number): void {
  into.reflected[zone]! += share * reflectance;
  into.absorbed += share * (1 - reflectance);
}

/** Follows one ray to where it ends, leaving at each mesh the share that the mesh stops. */
function follow(target: Target, from: Vec3, way: Vec3, weight: number, into: FirstBounce): void {
  const { scene, model, solids } = target;
  const wall = wallAhead(scene, from, way);
  const whole: Vec3 = [way[0] * wall.reach, way[1] * wall.reach, way[2] * wall.reach];
  const least = wall.reach > 0 ? TOUCH_M / wall.reach : 1;
  let passed = least;
  let left = weight;
  for (;;) {
    let nearest = Infinity;
    let hit: Solid | null = null;
    for (const solid of solids) {
      if (!passage(solid.occluder, from, whole, met)) continue;
      const mesh = solid.occluder.stops < 1;
      // A solid in which the lamp sits, or that it touches, lets its light out.
      if (met.leave < least || (mesh && met.enter <= passed) || met.enter < least) continue;
      if (met.enter < nearest) {
        nearest = met.enter;
        hit = solid;
      }
    }
    if (!hit) return land(into, zoneAt(model.levels, from[2] + whole[2]), wall.reflectance, left);
    const place = landOn(hit, from[2] + nearest * whole[2], way[2] > 0, model);
    const stopped = left * hit.occluder.stops;
    land(into, place.zone, place.reflectance, stopped);
    left -= stopped;
    if (left <= 0) return;
    passed = nearest;
  }
}

/** A ray of the fan in the lamp's own frame: cosine to the axis, parts along and across, where on the face it starts. */
interface Ray {
  cos: number;
  along: number;
  across: number;
  u: number;
  v: number;
  weight: number;
}

/** An even fan of a lamp's photons. Weights add up to 1; a table that differs about the axis is in the weights. */
function fanOf(lamp: Emitter): Ray[] {
  const gammas = gammaQuantiles(lamp.distribution, RAYS);
  const rays: Ray[] = [];
  let total = 0;
  for (let i = 0; i < RAYS; i += 1) {
    const c = (spread(i, 1) * Math.PI) / 2;
    const cos = Math.cos(gammas[i]!);
    const sin = Math.sin(gammas[i]!);
    const quarter = MIRRORS.map(([mu, mv]): Ray => {
      const along = mu * sin * Math.cos(c);
      const across = mv * sin * Math.sin(c);
      const weight = lamp.intensity(cos, along, across);
      const u = (mu * spread(i, 2) * (lamp.face?.lengthM ?? 0)) / 2;
      const v = (mv * spread(i, 3) * (lamp.face?.widthM ?? 0)) / 2;
      return { cos, along, across, u, v, weight };
    });
    // Each γ stands for an equal share of the photons; about the axis they are shared as the table says.
    const sum = quarter.reduce((all, ray) => all + ray.weight, 0);
    if (sum > 0) for (const ray of quarter) ray.weight /= sum * RAYS;
    total += sum > 0 ? 1 / RAYS : 0;
    rays.push(...quarter);
  }
  for (const ray of rays) ray.weight /= total;
  return rays;
}

/** Where on the face a ray starts; the edge of a face that pokes through the fabric shines from the fabric. */
function startOf({ u, v }: Ray, { position, axis, side }: Emitter, ends: Vec3): Vec3 {
  return [
    Math.min(ends[0], Math.max(0, position[0] + u * axis[0] + v * side[0])),
    Math.min(ends[1], Math.max(0, position[1] + u * axis[1] + v * side[1])),
    Math.min(ends[2], Math.max(0, position[2] + u * axis[2] + v * side[2])),
  ];
}

function wayOf({ along, across, cos }: Ray, { aim, axis, side }: Emitter): Vec3 {
  return [
    along * axis[0] + across * side[0] + cos * aim[0],
    along * axis[1] + across * side[1] + cos * aim[1],
    along * axis[2] + across * side[2] + cos * aim[2],
  ];
}

/**
 * Where one lamp's direct light lands, by an even fan of rays past tiers and boxes. No photon is lost. Other lamps' bodies
 * are left out: they hide little of it, and so a lamp that is moved leaves the others' fans as they are.
 *
 * @accuracy a zone's share within 1 % of the lamp's photons
 */
export function firstBounce(target: Target, lamp: Emitter): FirstBounce {
  const into: FirstBounce = { reflected: new Float64Array(target.model.zones.length), absorbed: 0 };
  const { tent } = target.scene;
  const ends: Vec3 = [tent.width, tent.depth, tent.height];
  for (const ray of fanOf(lamp)) {
    if (ray.weight === 0) continue;
    if (lamp.face && ray.cos <= 0) into.absorbed += ray.weight;
    else follow(target, startOf(ray, lamp, ends), wayOf(ray, lamp), ray.weight, into);
  }
  return into;
}
