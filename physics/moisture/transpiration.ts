import { latentHeat, saturationPressure, saturationSlope } from '../air/psychrometrics';
import { requireWithin } from '../domain-error';

/** Energy of photosynthetic photons of LED lamps, J/µmol; 0.18 to 0.22. @source [Graamans2017] its light levels are 0.200 */
export const JOULE_PER_MICROMOLE = 0.2;
/** Boundary-layer resistance of a dense canopy, s/m for each m² of leaf. @source [Graamans2017] */
export const BOUNDARY_RESISTANCE_S_M = 100;
/** Share of light that the canopy throws back. @source [Graamans2017] */
const CANOPY_REFLECTANCE = 0.05;
/** Heat capacity of air, J/(kg·K), as the model's authors take it. */
const HEAT_CAPACITY = 1013;

/**
 * Stomatal resistance of lettuce by light, r_s = 60·(1500 + PPFD)/(200 + PPFD).
 *
 * @param ppfdUmolM2S 0…2500
 * @returns s/m for each m² of leaf; 450 in the dark, 158 at 600
 * @source [Graamans2017] eq. 9
 */
export function stomatalResistance(ppfdUmolM2S: number): number {
  requireWithin({ quantity: 'PPFD', value: ppfdUmolM2S, min: 0, max: Infinity, unit: 'µmol/m²/s' });
  return (60 * (1500 + ppfdUmolM2S)) / (200 + ppfdUmolM2S);
}

export interface Canopy {
  ppfdUmolM2S: number;
  leafAreaIndex: number;
  coverFrac: number;
}

/**
 * Evaporation of a canopy as a straight line in the vapour pressure of the air: E = still − slope·p_w, kg/(m²·s).
 *
 *   λE = (Δ·R_n + LAI·ρ·c_p·VPD/r_a)/(Δ + γ·(1 + r_s/r_a)),  R_n = (1 − 0.05)·cover·PPFD·E_photon
 *
 * Linear in p_w at a given temperature, so that the humidity of a tent follows in closed form. Resistances are for each
 * m² of leaf: one LAI, not two.
 *
 * @param tempC air, −20…60; @param pressurePa total
 * @returns `still` kg/(m²·s) at dry air, `slope` kg/(m²·s·Pa)
 * @source [Graamans2017] eq. 5–9
 * @accuracy 3 % of the leaf solved without linearisation; accepted models differ by 40 %
 */
export function evaporationLine({ canopy, tempC, pressurePa }: { canopy: Canopy; tempC: number; pressurePa: number }): {
  still: number;
  slope: number;
} {
  const { ppfdUmolM2S, leafAreaIndex, coverFrac } = canopy;
  if (leafAreaIndex === 0) return { still: 0, slope: 0 };
  const lambda = latentHeat(tempC);
  const gamma = (HEAT_CAPACITY * pressurePa) / (0.622 * lambda);
  const delta = saturationSlope(tempC);
  const densityDry = pressurePa / (287.05 * (tempC + 273.15));
  const net = (1 - CANOPY_REFLECTANCE) * coverFrac * ppfdUmolM2S * JOULE_PER_MICROMOLE;
  const under = (delta + gamma * (1 + stomatalResistance(ppfdUmolM2S) / BOUNDARY_RESISTANCE_S_M)) * lambda;
  const slope = (leafAreaIndex * densityDry * HEAT_CAPACITY) / BOUNDARY_RESISTANCE_S_M / under;
  return { still: (delta * net) / under + slope * saturationPressure(tempC), slope };
}

/** Latent heat flux of a canopy, W/m² of ground; the form in which it is published. */
export function canopyLatentHeat({
  canopy,
  tempC,
  relHumidityPct,
  pressurePa,
}: {
  canopy: Canopy;
  tempC: number;
  relHumidityPct: number;
  pressurePa: number;
}): number {
  const { still, slope } = evaporationLine({ canopy, tempC, pressurePa });
  return (still - slope * (relHumidityPct / 100) * saturationPressure(tempC)) * latentHeat(tempC);
}
