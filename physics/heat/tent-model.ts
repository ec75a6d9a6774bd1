import { pressureAtAltitude } from '../air/psychrometrics';
import type { TierLight } from '../light/tier-light';
import type { ResolvedScenario } from '../plan/resolved-scenario';
import type { TentModel, WaterSource } from './tent-state';

/** A reservoir is about this deep, m; judged. Only an uncovered one gives off water. */
const RESERVOIR_DEPTH_M = 0.25;

/** Walls, ceiling and floor of the box, m², and its volume, m³. */
export function boxOf({ widthM, depthM, heightM }: Pick<ResolvedScenario['tent'], 'widthM' | 'depthM' | 'heightM'>) {
  return { wallsM2: 2 * (widthM + depthM) * heightM, planM2: widthM * depthM, volumeM3: widthM * depthM * heightM };
}

export function tentModel({ tent, climate, place }: ResolvedScenario): TentModel {
  const { wallsM2, planM2, volumeM3 } = boxOf(tent);
  return {
    fabricWK: tent.wallUWM2K * wallsM2 + tent.roofUWM2K * planM2,
    floorWK: tent.floorUWM2K * planM2,
    volumeM3,
    leakageM3H: tent.leakageAch * volumeM3,
    exhaustMinM3H: climate.exhaust?.minAirflowM3H ?? 0,
    exhaustMaxM3H: climate.exhaust?.maxAirflowM3H ?? 0,
    maxRelHumidityPct: climate.maxRelHumidityPct,
    pressurePa: pressureAtAltitude(place.altitudeM),
  };
}

/** The share of time in which the pump runs. */
export const pumpShare = ({ flood }: ResolvedScenario['water']): number =>
  Math.min(1, flood.minutes / flood.everyMinutes);

/** What gives off water while some of the lamps burn. */
export function waterSource(
  scenario: ResolvedScenario,
  lights: readonly TierLight[],
  on: readonly number[],
): WaterSource {
  const { transpiration, reservoirL, coveredFrac, pumpW } = scenario.water;
  if (transpiration.kind === 'fixed')
    return { kind: 'fixed', kgH: on.length > 0 ? transpiration.lightKgH : transpiration.darkKgH };
  const wetShare = pumpW > 0 ? pumpShare(scenario.water) : 0;
  return {
    kind: 'model',
    openWaterM2: (1 - coveredFrac) * (reservoirL / 1000 / RESERVOIR_DEPTH_M),
    tiers: scenario.tiers.map((tier, at) => {
      const areaM2 = (tier.x1M - tier.x0M) * (tier.y1M - tier.y0M);
      const byPlacement = lights[at]!.byPlacement;
      return {
        areaM2,
        wetM2: areaM2 * wetShare * (1 - tier.canopyCoverFrac),
        canopy: {
          ppfdUmolM2S: on.reduce((sum, index) => sum + byPlacement[index]!.meanPpfdUmolM2S, 0),
          leafAreaIndex: tier.leafAreaIndex,
          coverFrac: tier.canopyCoverFrac,
        },
      };
    }),
  };
}
