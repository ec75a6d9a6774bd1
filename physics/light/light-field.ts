import type { ResolvedScenario } from '../plan/resolved-scenario';
import { directPpfd } from './direct';
import type { Emitter } from './emitter';
import type { Vec3 } from './light-documents';
import { prepareScene, type SceneGeometry } from './scene-geometry';
import { sceneFromScenario } from './scene-from-scenario';
import { createZoneModel, firstBounce, solveZones, zoneAt, type ZoneModel } from './zones';

/**
 * What may be kept between two evaluations, so that moving one lamp reckons that lamp alone.
 *
 * Keys are the geometry and the poses themselves, so a stale entry is never met; old entries fall out when there are many.
 */
export interface LightCache {
  entries: Map<string, Float64Array>;
}

const MOST_ENTRIES = 600;

export const createLightCache = (): LightCache => ({ entries: new Map() });

function kept(cache: LightCache | undefined, key: string, make: () => Float64Array): Float64Array {
  if (!cache) return make();
  const found = cache.entries.get(key);
  if (found) {
    // Seen again: to the young end.
    cache.entries.delete(key);
    cache.entries.set(key, found);
    return found;
  }
  const made = make();
  cache.entries.set(key, made);
  if (cache.entries.size > MOST_ENTRIES) cache.entries.delete(cache.entries.keys().next().value!);
  return made;
}

/** A rack with its light, asked for point sets: each lamp's own share at full output, direct and reflected. */
export interface LightField {
  lamps: Emitter[];
  /** PPFD of one lamp on level leaves at the points; `name` tells point sets apart. */
  lampAt(lamp: number, name: string, points: readonly Vec3[]): Float64Array;
  hasReflections: boolean;
}

const UP: Vec3 = [0, 0, 1];

/** What other lamps' bodies hide is part of a lamp's own light; its key therefore holds every body near it. */
function poseKey(lamp: Emitter): string {
  return `${lamp.position.join()};${lamp.aim.join()};${lamp.axis.join()};${lamp.face ? `${lamp.face.lengthM},${lamp.face.widthM},${lamp.bodyThicknessM}` : ''}`;
}

export function createLightField(scenario: ResolvedScenario, cache?: LightCache): LightField {
  const scene = sceneFromScenario(scenario);
  const geometry: SceneGeometry = prepareScene(scene);
  const { emitters, occluders } = geometry;
  const rackKey = JSON.stringify([scene.tent, scene.slabs, scene.boxes]);
  const bodies = emitters.filter((lamp) => lamp.body).map(poseKey);
  let model: ZoneModel | undefined;
  const zones = () => (model ??= createZoneModel(scene, emitters));

  const lampKey = (lamp: Emitter, index: number) => {
    const own = poseKey(lamp);
    // A body only matters to another lamp; leaving its own out keeps a dragged lamp from spoiling the rest when nothing is near.
    const others = bodies.filter((pose) => pose !== own).join('|');
    return `${rackKey}#${own}#${JSON.stringify(scene.fixtures[index]!.distribution)}#${others}`;
  };

  return {
    lamps: emitters,
    hasReflections:
      Object.values(scene.tent.reflectance).some((value) => value > 0) ||
      scene.slabs.some((slab) => slab.reflectanceTop > 0 || slab.reflectanceBottom > 0),
    lampAt(index, name, points) {
      const lamp = emitters[index]!;
      const key = lampKey(lamp, index);
      const one: Emitter = { ...lamp, ppf: 1 };
      const level = kept(cache, `${key}#haze`, () =>
        solveZones(zones(), firstBounce(zones(), lamp, occluders).reflected),
      );
      const unitMap = kept(cache, `${key}#${name}`, () =>
        Float64Array.from(
          points,
          (point) => directPpfd(point, UP, one, occluders) + level[zoneAt(zones().levels, point[2])]!,
        ),
      );
      return unitMap.map((value) => value * lamp.ppf);
    },
  };
}
