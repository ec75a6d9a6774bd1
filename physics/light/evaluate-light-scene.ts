import { directPpfd } from './direct';
import type { LightResult, LightScene, PlaneResult, ScenePlane, Vec3 } from './light-documents';
import { prepareScene } from './scene-geometry';
import { absorbedInZones, createZoneModel, firstBounce, solveZones, zoneAt } from './zones';

const UP: Vec3 = [0, 0, 1];

export const REFLECTED_IS_AN_ESTIMATE =
  'Reflected light is an estimate: each space between tiers is taken as evenly lit by its walls. Direct light is exact. Against converged simulations the mean of a tier with its own lamps came within 20 %, that of a tier lit by spill alone within 30 %.';

/** Centres of a plane's cells, x inner and y outer. */
export function cellCentres(plane: Pick<ScenePlane, 'x0' | 'x1' | 'y0' | 'y1' | 'nx' | 'ny' | 'z'>): Vec3[] {
  const dx = (plane.x1 - plane.x0) / plane.nx;
  const dy = (plane.y1 - plane.y0) / plane.ny;
  return Array.from({ length: plane.nx * plane.ny }, (_, at) => [
    plane.x0 + ((at % plane.nx) + 0.5) * dx,
    plane.y0 + (Math.floor(at / plane.nx) + 0.5) * dy,
    plane.z,
  ]);
}

export function statistics(grid: ArrayLike<number>): { mean: number; min: number; max: number; minOverMean: number } {
  let sum = 0;
  let min = Infinity;
  let max = -Infinity;
  for (let i = 0; i < grid.length; i += 1) {
    const value = grid[i]!;
    sum += value;
    if (value < min) min = value;
    if (value > max) max = value;
  }
  const mean = sum / grid.length;
  return { mean, min, max, minOverMean: mean > 0 ? min / mean : 0 };
}

/**
 * PPFD on every sensor plane of a scene: direct light exactly, reflected light as an estimate.
 *
 * @param scene light-scene/1, checked; metres, µmol/s, degrees
 * @returns light-result/1; `elapsedMs` is 0, the caller has the clock
 * @throws DomainError for a lamp without a direction or a size
 * @source [Lambert1760], [Howell] C-13; reflected: physics/light/zones.ts
 * @accuracy direct 1e-4 of closed forms; reflected as the warning says
 */
export function evaluateLightScene(scene: LightScene): LightResult {
  const { emitters, occluders } = prepareScene(scene);
  const model = createZoneModel(scene, emitters);
  const emittedUmolS = emitters.reduce((sum, lamp) => sum + lamp.ppf, 0);
  const reflected = new Float64Array(model.zones.length);
  let absorbedUmolS = 0;
  for (const lamp of emitters) {
    const bounce = firstBounce(model, lamp, occluders);
    bounce.reflected.forEach((flux, zone) => (reflected[zone]! += flux * lamp.ppf));
    absorbedUmolS += bounce.absorbed * lamp.ppf;
  }
  const level = solveZones(model, reflected);
  absorbedUmolS += absorbedInZones(model, level);
  const planes = scene.planes.map((plane): PlaneResult => {
    const haze = level[zoneAt(model.levels, plane.z)]!;
    const grid = cellCentres(plane).map((point) =>
      emitters.reduce((sum, lamp) => sum + directPpfd(point, UP, lamp, occluders), haze),
    );
    const cellM2 = ((plane.x1 - plane.x0) * (plane.y1 - plane.y0)) / grid.length;
    const ppfdUmolM2S = statistics(grid);
    const incidentFrac = emittedUmolS > 0 ? (ppfdUmolM2S.mean * grid.length * cellM2) / emittedUmolS : 0;
    return { id: plane.id, ppfdUmolM2S, incidentFrac, nx: plane.nx, ny: plane.ny, grid };
  });
  const hazy = level.some((value) => value > 0);
  return {
    schema: 'light-result/1',
    planes,
    energyBalance: { emittedUmolS, absorbedUmolS },
    warnings: hazy ? [REFLECTED_IS_AN_ESTIMATE] : [],
    elapsedMs: 0,
  };
}
