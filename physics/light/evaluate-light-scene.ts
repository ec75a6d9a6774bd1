import { requireWithin } from '../domain-error';
import { faceShare, unitPpfd } from './direct';
import type { LightResult, LightScene, PlaneResult, SceneFixture, ScenePlane, Vec3 } from './light-documents';
import { prepareScene } from './scene-geometry';
import { firstBounce } from './first-bounce';
import { absorbedInZones, createZoneModel, seenOfLevel, solveZones, zoneAt } from './zones';

const UP: Vec3 = [0, 0, 1];

/** Says of a lit face whose table reaches behind it that those photons are lost. */
export function behindFace({ id, shape, distribution }: Pick<SceneFixture, 'id' | 'shape' | 'distribution'>): string[] {
  const beyond = shape === 'rect' && distribution.type === 'table' && distribution.gammaDeg.some((gamma) => gamma > 90);
  return beyond
    ? [
        `The table of lamp ${id} reaches beyond 90°; a face shines to one side only, so those photons are lost in its body.`,
      ]
    : [];
}

export const REFLECTED_IS_AN_ESTIMATE =
  'Reflected light is a whole-box estimate: each space between tiers is taken as evenly lit. Direct light is exact. In the eight tents compared with converged simulations the mean of a lit tier came within 7 %, that of a tier lit by spill alone within 11 %; its darkest spot came out up to 40 % too bright.';

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

function requirePlane({ id, nx, ny }: ScenePlane): void {
  requireWithin({ quantity: `cells across of plane ${id}`, value: nx, min: 1, max: 20_000, unit: '' });
  requireWithin({ quantity: `cells in depth of plane ${id}`, value: ny, min: 1, max: 20_000, unit: '' });
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
  const { emitters, occluders, solids } = prepareScene(scene);
  const model = createZoneModel(scene, emitters);
  const emittedUmolS = emitters.reduce((sum, lamp) => sum + lamp.ppf, 0);
  const reflected = new Float64Array(model.zones.length);
  let absorbedUmolS = 0;
  for (const lamp of emitters) {
    const bounce = firstBounce({ scene, model, solids }, lamp);
    bounce.reflected.forEach((flux, zone) => (reflected[zone]! += flux * lamp.ppf));
    absorbedUmolS += bounce.absorbed * lamp.ppf;
  }
  const level = solveZones(model, reflected);
  absorbedUmolS += absorbedInZones(model, level);
  const hazy = level.some((value) => value > 0);
  const planes = scene.planes.map((plane): PlaneResult => {
    requirePlane(plane);
    const zone = zoneAt(model.levels, plane.z);
    const grid = cellCentres(plane).map((point) => {
      let direct = 0;
      let faces = 0;
      for (const lamp of emitters) {
        const unit = unitPpfd(point, UP, lamp, occluders);
        direct += lamp.ppf * unit;
        if (hazy) faces += faceShare(point, UP, lamp, occluders, unit);
      }
      return direct + level[zone]! * seenOfLevel(model.zones[zone]!, faces);
    });
    const cellM2 = ((plane.x1 - plane.x0) * (plane.y1 - plane.y0)) / grid.length;
    const ppfdUmolM2S = statistics(grid);
    const incidentFrac = emittedUmolS > 0 ? (ppfdUmolM2S.mean * grid.length * cellM2) / emittedUmolS : 0;
    return { id: plane.id, ppfdUmolM2S, incidentFrac, nx: plane.nx, ny: plane.ny, grid };
  });
  return {
    schema: 'light-result/1',
    planes,
    energyBalance: { emittedUmolS, absorbedUmolS },
    warnings: [...(hazy ? [REFLECTED_IS_AN_ESTIMATE] : []), ...scene.fixtures.flatMap(behindFace)],
    elapsedMs: 0,
  };
}
