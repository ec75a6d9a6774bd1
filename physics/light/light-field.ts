import type { ResolvedScenario } from '../plan/resolved-scenario';
import { faceShare, unitPpfd } from './direct';
import type { Emitter } from './emitter';
import { firstBounce } from './first-bounce';
import { kept, shortName, type LightCache } from './light-cache';
import type { Vec3 } from './light-documents';
import { extentOf, mayHide, type Extent } from './reach';
import { prepareScene } from './scene-geometry';
import { sceneFromScenario } from './scene-from-scenario';
import { createZoneModel, seenOfLevel, solveZones, zoneAt } from './zones';

export { createLightCache, type LightCache } from './light-cache';

/** Where light is wanted; `name` tells point sets of one rack apart. */
export interface PointSet {
  name: string;
  points: readonly Vec3[];
  extent: Extent;
}

export const pointSet = (name: string, points: readonly Vec3[]): PointSet => ({
  name,
  points,
  extent: extentOf(points),
});

/** A rack with its light: each lamp's own share at full output, direct and reflected. */
export interface LightField {
  lamps: Emitter[];
  /** PPFD of each lamp on level leaves at the points. */
  lampsAt(set: PointSet): Float64Array[];
}

const UP: Vec3 = [0, 0, 1];

function overPoints({ points }: PointSet, value: (point: Vec3, at: number) => number): Float64Array {
  const map = new Float64Array(points.length);
  for (let i = 0; i < map.length; i += 1) map[i] = value(points[i]!, i);
  return map;
}

const poseKey = ({ position, aim, axis, face, bodyThicknessM }: Emitter): string =>
  `${position.join()};${aim.join()};${axis.join()};${face ? `${face.lengthM},${face.widthM},${bodyThicknessM}` : ''}`;

export function createLightField(scenario: ResolvedScenario, cache?: LightCache): LightField {
  const scene = sceneFromScenario(scenario);
  const { emitters, solids } = prepareScene(scene);
  const model = createZoneModel(scene, emitters);
  const rackKey = shortName(cache, JSON.stringify([scene.tent, scene.slabs, scene.boxes]));
  const rack = solids.map(({ occluder }) => occluder);
  const poseOf = new Map(emitters.map((lamp) => [lamp.id, shortName(cache, poseKey(lamp))]));
  const patterns = new Map<string, string>();
  const fixtureKeys = emitters.map((lamp, i) => {
    const { fixture } = scenario.placements[i]!;
    if (!patterns.has(fixture)) patterns.set(fixture, shortName(cache, JSON.stringify(lamp.distribution)));
    return `${rackKey}#${poseOf.get(lamp.id)}#${patterns.get(fixture)}`;
  });
  const faces = emitters.map((lamp) => extentOf(lamp.face?.polygon ?? [lamp.position]));

  /** Which other bodies may hide this lamp from the points: only they are part of its key, and of its sum. */
  const hiding = (index: number, { extent }: PointSet): Emitter[] => {
    const { aim, face } = emitters[index]!;
    return emitters.filter(
      ({ body }, i) => i !== index && body && mayHide(body, faces[index]!, extent, face ? aim : null),
    );
  };

  const zoneLevels = emitters.map((lamp, i) => {
    const bounce = kept(cache, `${fixtureKeys[i]}#bounce`, () => firstBounce({ scene, model, solids }, lamp).reflected);
    return solveZones(model, bounce);
  });

  const mapsOf = (index: number, set: PointSet): { unit: Float64Array; faces: Float64Array } => {
    const lamp = emitters[index]!;
    const bodies = hiding(index, set);
    const key = `${fixtureKeys[index]}#${set.name}#${bodies.map(({ id }) => poseOf.get(id)).join('|')}`;
    const past = [...rack, ...bodies.map(({ body }) => body!)];
    const unit = kept(cache, key, () => overPoints(set, (point) => unitPpfd(point, UP, lamp, past)));
    const faces = kept(cache, `${key}#face`, () =>
      overPoints(set, (point, at) => faceShare(point, UP, lamp, past, unit[at]!)),
    );
    return { unit, faces };
  };

  return {
    lamps: emitters,
    lampsAt(set) {
      const maps = emitters.map((_, index) => mapsOf(index, set));
      const zone = Int32Array.from(set.points, (point) => zoneAt(model.levels, point[2]));
      const seen = new Float64Array(zone.length);
      for (const { faces } of maps) for (let i = 0; i < seen.length; i += 1) seen[i]! += faces[i]!;
      for (let i = 0; i < seen.length; i += 1) seen[i] = seenOfLevel(model.zones[zone[i]!]!, seen[i]!);
      return maps.map(({ unit }, index) => {
        const { ppf } = emitters[index]!;
        const level = zoneLevels[index]!;
        const own = new Float64Array(unit.length);
        for (let i = 0; i < own.length; i += 1) own[i] = ppf * (unit[i]! + level[zone[i]!]! * seen[i]!);
        return own;
      });
    },
  };
}
