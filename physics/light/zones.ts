import type { Emitter } from './emitter';
import { directPpfd } from './direct';
import type { LightScene, SceneSlab, Vec3 } from './light-documents';
import type { Occluder } from './occluder';

/**
 * Reflected light, as an estimate: the tent is a stack of zones between its tiers, each lit evenly by what its surfaces
 * throw back, and open to its neighbours through the gaps beside and in the tiers.
 *
 *   A E = Φ₁ + Σ ρ A E (own surfaces) + Σ Aₒ E' (openings), for each zone; E' is the neighbour's level.
 *
 * Φ₁ is the photon flux that the zone's surfaces reflect of the lamps' direct light. With one zone this is the integrating
 * sphere, E = Φ₁/(A(1 − ρ)). Photons are conserved: what is emitted is absorbed, to rounding.
 *
 * @source [Walsh-sphere] the integrating enclosure; the stack of zones is ours, and stands in until surfaces exchange light one by one
 * @accuracy against converged simulations of tests/truth/light: see physics/light/README.md
 */
export interface ZoneModel {
  /** Heights between which zone i lies: levels[i]…levels[i + 1]. */
  levels: number[];
  zones: Zone[];
  surfaces: Surface[];
}

interface Zone {
  /** All that bounds it, openings and lamps' bodies included, m². */
  areaM2: number;
  /** Σ ρ A of what bounds it, m². */
  reflectingM2: number;
  /** Openings to the zone above and below, m². */
  upM2: number;
  downM2: number;
}

interface Surface {
  zone: number;
  reflectance: number;
  normal: Vec3;
  patches: { at: Vec3; areaM2: number }[];
}

/** Patches are about this wide: fine enough for a share of flux, coarse enough to be cheap. */
const PATCH_M = 0.3;
const MOST_PATCHES = 8;
/** Tiers whose tops are closer than this are one level. */
const LEVEL_M = 0.05;
/** Just off the surface, so that a patch does not lie in the plane of the slab that it belongs to. */
const OFF_M = 1e-6;

interface Sheet {
  zone: number;
  reflectance: number;
  normal: Vec3;
  corner: Vec3;
  u: Vec3;
  v: Vec3;
}

function sheetSurface({ zone, reflectance, normal, corner, u, v }: Sheet, share = 1): Surface {
  const lu = Math.hypot(...u);
  const lv = Math.hypot(...v);
  const nu = Math.min(MOST_PATCHES, Math.max(2, Math.ceil(lu / PATCH_M)));
  const nv = Math.min(MOST_PATCHES, Math.max(2, Math.ceil(lv / PATCH_M)));
  const patches = [];
  for (let i = 0; i < nu; i += 1) {
    for (let j = 0; j < nv; j += 1) {
      const a = (i + 0.5) / nu;
      const b = (j + 0.5) / nv;
      const at = [0, 1, 2].map((k) => corner[k]! + a * u[k]! + b * v[k]! + OFF_M * normal[k]!) as unknown as Vec3;
      patches.push({ at, areaM2: ((lu * lv) / (nu * nv)) * share });
    }
  }
  return { zone, reflectance, normal, patches };
}

const solidShare = (slab: SceneSlab) => 1 - slab.openFraction;
const slabArea = (slab: SceneSlab) => (slab.x1 - slab.x0) * (slab.y1 - slab.y0) * solidShare(slab);
const undersideOf = (slab: SceneSlab) => slab.zTop - (slab.openFraction > 0 ? 0 : slab.thickness);
const lowerReflectance = (slab: SceneSlab) => (slab.openFraction > 0 ? slab.reflectanceTop : slab.reflectanceBottom);

/** Groups the tiers into levels, from the floor up. */
function groupLevels(slabs: readonly SceneSlab[]): SceneSlab[][] {
  const groups: SceneSlab[][] = [];
  for (const slab of [...slabs].sort((a, b) => a.zTop - b.zTop)) {
    const last = groups.at(-1);
    if (last && slab.zTop - last[0]!.zTop < LEVEL_M) last.push(slab);
    else groups.push([slab]);
  }
  return groups;
}

function wallSurfaces({ tent }: LightScene, zone: number, z0: number, z1: number): Surface[] {
  const { width, depth, reflectance } = tent;
  const h = z1 - z0;
  const walls: Omit<Sheet, 'zone'>[] = [
    { reflectance: reflectance.xMin, normal: [1, 0, 0], corner: [0, 0, z0], u: [0, depth, 0], v: [0, 0, h] },
    { reflectance: reflectance.xMax, normal: [-1, 0, 0], corner: [width, 0, z0], u: [0, depth, 0], v: [0, 0, h] },
    { reflectance: reflectance.yMin, normal: [0, 1, 0], corner: [0, 0, z0], u: [width, 0, 0], v: [0, 0, h] },
    { reflectance: reflectance.yMax, normal: [0, -1, 0], corner: [0, depth, z0], u: [width, 0, 0], v: [0, 0, h] },
  ];
  return walls.map((wall) => sheetSurface({ ...wall, zone }));
}

function slabSurface(slab: SceneSlab, zone: number, face: 'top' | 'bottom'): Surface {
  const top = face === 'top';
  const z = top ? slab.zTop : undersideOf(slab);
  return sheetSurface(
    {
      zone,
      reflectance: top ? slab.reflectanceTop : lowerReflectance(slab),
      normal: [0, 0, top ? 1 : -1],
      corner: [slab.x0, slab.y0, z],
      u: [slab.x1 - slab.x0, 0, 0],
      v: [0, slab.y1 - slab.y0, 0],
    },
    solidShare(slab),
  );
}

/** Builds the zones of a scene. Independent of the lamps but for their bodies, which absorb. */
export function createZoneModel(scene: LightScene, emitters: readonly Emitter[]): ZoneModel {
  const { width, depth, height, reflectance } = scene.tent;
  const groups = groupLevels(scene.slabs);
  const levels = [0, ...groups.map((group) => group[0]!.zTop), height];
  const plan = width * depth;
  const surfaces: Surface[] = [];
  const zones: Zone[] = [];
  for (let i = 0; i + 1 < levels.length; i += 1) {
    const below = groups[i - 1] ?? [];
    const above = groups[i] ?? [];
    const top = i + 2 === levels.length;
    const z1 = top ? height : Math.max(levels[i]!, Math.min(...above.map(undersideOf)));
    const own = [
      ...wallSurfaces(scene, i, levels[i]!, z1),
      ...below.map((slab) => slabSurface(slab, i, 'top')),
      ...above.map((slab) => slabSurface(slab, i, 'bottom')),
    ];
    const flat = { zone: i, u: [width, 0, 0] as Vec3, v: [0, depth, 0] as Vec3 };
    if (i === 0)
      own.push(sheetSurface({ ...flat, reflectance: reflectance.floor, normal: [0, 0, 1], corner: [0, 0, 0] }));
    if (top)
      own.push(sheetSurface({ ...flat, reflectance: reflectance.ceiling, normal: [0, 0, -1], corner: [0, 0, height] }));
    const solid = (group: readonly SceneSlab[]) =>
      Math.min(
        plan,
        group.reduce((sum, slab) => sum + slabArea(slab), 0),
      );
    const zone: Zone = {
      areaM2: 0,
      reflectingM2: 0,
      upM2: top ? 0 : plan - solid(above),
      downM2: i === 0 ? 0 : plan - solid(below),
    };
    for (const surface of own) {
      const areaM2 = surface.patches.reduce((sum, patch) => sum + patch.areaM2, 0);
      zone.areaM2 += areaM2;
      zone.reflectingM2 += areaM2 * surface.reflectance;
    }
    zone.areaM2 += zone.upM2 + zone.downM2;
    zones.push(zone);
    surfaces.push(...own);
  }
  for (const lamp of emitters) if (lamp.face) addBody(zones[zoneAt(levels, lamp.position[2])]!, lamp, lamp.face);
  return { levels, zones, surfaces };
}

/** A lamp's face and bare back absorb; its body reflects a share. */
function addBody(zone: Zone, lamp: Emitter, face: NonNullable<Emitter['face']>): void {
  const bodyM2 = face.areaM2 + 2 * (face.lengthM + face.widthM) * lamp.bodyThicknessM;
  zone.areaM2 += face.areaM2 + bodyM2;
  zone.reflectingM2 += bodyM2 * lamp.bodyReflectance;
}

export function zoneAt(levels: readonly number[], z: number): number {
  let zone = 0;
  while (zone + 2 < levels.length && z >= levels[zone + 1]! - 1e-9) zone += 1;
  return zone;
}

export interface FirstBounce {
  /** Photon flux that the zone's surfaces throw back, for a lamp of 1 µmol/s. */
  reflected: Float64Array;
  /** … and that they take in. */
  absorbed: number;
}

/** Where one lamp's direct light lands. The flux is scaled so that none is lost to the coarseness of the patches. */
export function firstBounce(model: ZoneModel, lamp: Emitter, occluders: readonly Occluder[]): FirstBounce {
  const reflected = new Float64Array(model.zones.length);
  const one: Emitter = { ...lamp, ppf: 1 };
  let landed = 0;
  let absorbed = 0;
  for (const surface of model.surfaces) {
    let flux = 0;
    for (const patch of surface.patches) flux += directPpfd(patch.at, surface.normal, one, occluders) * patch.areaM2;
    landed += flux;
    reflected[surface.zone]! += flux * surface.reflectance;
    absorbed += flux * (1 - surface.reflectance);
  }
  if (landed === 0) return { reflected, absorbed: 1 };
  return { reflected: reflected.map((flux) => flux / landed), absorbed: absorbed / landed };
}

/**
 * The even level of reflected light in each zone, µmol/m²/s, for a flux first thrown back in each.
 * Solved as the three-diagonal system that it is.
 */
export function solveZones(model: ZoneModel, reflected: ArrayLike<number>): Float64Array {
  const n = model.zones.length;
  const level = new Float64Array(n);
  const upper = new Float64Array(n);
  let previous = 0;
  for (let i = 0; i < n; i += 1) {
    const zone = model.zones[i]!;
    const below = i === 0 ? 0 : zone.downM2;
    const pivot = zone.areaM2 - zone.reflectingM2 - below * previous;
    upper[i] = zone.upM2 / pivot;
    level[i] = (reflected[i]! + below * (i === 0 ? 0 : level[i - 1]!)) / pivot;
    previous = upper[i]!;
  }
  for (let i = n - 2; i >= 0; i -= 1) level[i]! += upper[i]! * level[i + 1]!;
  return level;
}

/** What the zones' surfaces absorb at these levels, µmol/s. */
export function absorbedInZones(model: ZoneModel, level: Float64Array): number {
  return model.zones.reduce(
    (sum, zone, i) => sum + (zone.areaM2 - zone.reflectingM2 - zone.upM2 - zone.downM2) * level[i]!,
    0,
  );
}
