import { latentHeat, saturationPressure } from '../air/psychrometrics';

/** Speed of air over trays, m/s; judged. */
const AIR_SPEED_M_S = 0.1;
/** Measured against the formula on undisturbed water. @source [POOL1998] */
const QUIET = 0.74;

/**
 * Evaporation from still water as a straight line in the vapour pressure of the air: E = still − slope·p_w, kg/(m²·s).
 *
 *   E = (p_ws(T_w) − p_w)·(0.0885 + 0.0779·V)/Y·0.74, pressures in kPa, Y in kJ/kg
 *
 * @param waterTempC 0…60; the water is taken at the temperature of the air
 * @source [POOL1998], converted from inch-pound units
 * @accuracy a quarter
 */
export function waterEvaporationLine({
  waterTempC,
  airSpeedMS = AIR_SPEED_M_S,
}: {
  waterTempC: number;
  airSpeedMS?: number;
}): { still: number; slope: number } {
  const slope = ((0.0885 + 0.0779 * airSpeedMS) / (latentHeat(waterTempC) / 1000) / 1000) * QUIET;
  return { still: slope * saturationPressure(waterTempC), slope };
}
