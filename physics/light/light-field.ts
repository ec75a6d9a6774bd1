import type { ResolvedScenario } from '../plan/resolved-scenario';
import { faceShare, unitPpfd } from './direct';
import type { Emitter } from './emitter';
import { firstBounce } from './first-bounce';
import { kept, type LightCache } from './light-cache';
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

const poseKey = ({ position, aim, axis, face, bodyThicknessM }: Emitter): string =>
  `${position.join()};${aim.join()};${axis.join()};${face ? `${face.lengthM},${face.widthM},${bodyThicknessM}` : ''}`;

export function createLightField(scenario: ResolvedScenario, cache?: LightCache): LightField {
  const scene = sceneFromScenario(scenario);
  const { emitters, solids } = prepareScene(scene);
  const model = createZoneModel(scene, emitters);
  const rackKey = JSON.stringify([scene.tent, scene.slabs, scene.boxes]);
  const rack = solids.map(({ occluder }) => occluder);
  const poses = emitters.map(poseKey);
  const patterns = new Map<string, string>();
  const fixtureKeys = emitters.map((lamp, i) => {
    const { fixture } = scenario.placements[i]!;
    if (!patterns.has(fixture)) patterns.set(fixture, JSON.stringify(lamp.distribution));
    return `${rackKey}#${poses[i]}#${patterns.get(fixture)}`;
  });
  const faces = emitters.map((lamp) => extentOf(lamp.face?.polygon ?? [lamp.position]));

  /** Which other bodies may hide this lamp from the points: only they are part of its key, and of its sum. */
  const hiding = (index: number, { extent }: PointSet): number[] => {
    const { aim, face } = emitters[index]!;
    const near = faces[index]!;
    return emitters.flatMap((other, i) => {
      if (i === index || !other.body) return [];
      // A point shines to all sides, so nothing is behind it.
      return mayHide(other.body, near, extent, face ? aim : null) ? [i] : [];
    });
  };

  const zoneLevels = emitters.map((lamp, i) => {
    const bounce = kept(cache, `${fixtureKeys[i]}#bounce`, () => firstBounce({ scene, model, solids }, lamp).reflected);
    return solveZones(model, bounce);
  });

  const mapsOf = (index: number, set: PointSet): { unit: Float64Array; faces: Float64Array } => {
    const lamp = emitters[index]!;
    const bodies = hiding(index, set);
    const key = `${fixtureKeys[index]}#${set.name}#${bodies.map((i) => poses[i]).join('|')}`;
    const boxes = () => [...rack, ...bodies.map((i) => emitters[i]!.body!)];
    const unit = kept(cache, key, () => {
      const past = boxes();
      return Float64Array.from(set.points, (point) => unitPpfd(point, UP, lamp, past));
    });
    const faces = kept(cache, `${key}#face`, () => {
      const past = boxes();
      return Float64Array.from(set.points, (point, at) => faceShare(point, UP, lamp, past, unit[at]!));
    });
    return { unit, faces };
  };

  return {
    lamps: emitters,
    lampsAt(set) {
      const maps = emitters.map((_, index) => mapsOf(index, set));
      const zone = Int32Array.from(set.points, (point) => zoneAt(model.levels, point[2]));
      const seen = Float64Array.from(zone, (at, i) =>
        seenOfLevel(
          model.zones[at]!,
          maps.reduce((sum, { faces }) => sum + faces[i]!, 0),
        ),
      );
      return maps.map(({ unit }, index) => {
        const { ppf } = emitters[index]!;
        const level = zoneLevels[index]!;
        return unit.map((value, i) => ppf * (value + level[zone[i]!]! * seen[i]!));
      });
    },
  };
}
