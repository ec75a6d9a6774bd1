import type { ResolvedScenario, ResolvedTier } from '../plan/resolved-scenario';
import { cellCentres, statistics } from './evaluate-light-scene';
import { createLightField, pointSet, type LightCache, type LightField } from './light-field';

/** Sensor cells are at most this wide, m. */
export const CELL_M = 0.1;

export interface TierLight {
  id: string;
  nx: number;
  ny: number;
  /** PPFD at cell centres with every placement on at its dimming, x inner and y outer, µmol/m²/s. */
  grid: Float64Array;
  byPlacement: { id: string; grid: Float64Array; meanPpfdUmolM2S: number }[];
  ppfdUmolM2S: { mean: number; min: number; max: number; p10: number; minOverMean: number };
  /** Photons that land on the tier for each that is emitted; light thrown back and forth counts each time it lands. */
  incidentFrac: number;
}

/** The value below which a share of the cells lies, linear between neighbours. */
export function percentile(values: ArrayLike<number>, share: number): number {
  const sorted = Float64Array.from(values).sort();
  const at = share * (sorted.length - 1);
  const low = Math.floor(at);
  const high = Math.min(sorted.length - 1, low + 1);
  return sorted[low]! + (at - low) * (sorted[high]! - sorted[low]!);
}

export const canopyHeightM = (tier: Pick<ResolvedTier, 'topHeightM' | 'canopyHeightM'>): number =>
  tier.topHeightM + tier.canopyHeightM;

/** Cells across, so that none is wider than `CELL_M`; a hair's breadth over a whole number does not add one. */
const cells = (extentM: number) => Math.max(1, Math.ceil(extentM / CELL_M - 1e-9));

function lightTier(tier: ResolvedTier, scenario: ResolvedScenario, field: LightField): TierLight {
  const nx = cells(tier.x1M - tier.x0M);
  const ny = cells(tier.y1M - tier.y0M);
  const points = cellCentres({
    x0: tier.x0M,
    x1: tier.x1M,
    y0: tier.y0M,
    y1: tier.y1M,
    nx,
    ny,
    z: canopyHeightM(tier),
  });
  const set = pointSet(`tier ${tier.x0M},${tier.x1M},${tier.y0M},${tier.y1M},${canopyHeightM(tier)}`, points);
  const grid = new Float64Array(points.length);
  let emitted = 0;
  const maps = field.lampsAt(set);
  const byPlacement = scenario.placements.map((placement, index) => {
    const own = maps[index]!;
    for (let cell = 0; cell < own.length; cell += 1) {
      own[cell]! *= placement.dimFrac;
      grid[cell]! += own[cell]!;
    }
    emitted += field.lamps[index]!.ppf * placement.dimFrac;
    return { id: placement.id, grid: own, meanPpfdUmolM2S: statistics(own).mean };
  });
  const stats = statistics(grid);
  const areaM2 = (tier.x1M - tier.x0M) * (tier.y1M - tier.y0M);
  return {
    id: tier.id,
    nx,
    ny,
    grid,
    byPlacement,
    ppfdUmolM2S: {
      mean: stats.mean,
      min: stats.min,
      max: stats.max,
      p10: percentile(grid, 0.1),
      minOverMean: stats.minOverMean,
    },
    incidentFrac: emitted > 0 ? (stats.mean * areaM2) / emitted : 0,
  };
}

/**
 * PPFD on every tier at canopy height, by placement.
 *
 * @param scenario resolved
 * @param cache keeps each lamp's map of 1 µmol/s by its pose; dimming is a weighted sum
 * @accuracy direct light 1e-4 of closed forms, reflected light as evaluate-light-scene.ts says
 */
export function solveTierLight(scenario: ResolvedScenario, cache?: LightCache): TierLight[] {
  const field = createLightField(scenario, cache);
  return scenario.tiers.map((tier) => lightTier(tier, scenario, field));
}
