/** Width of a plain thermostat's band, K. Recalled. */
export const THERMOSTAT_BAND_K = 1;
/** Heat capacity of fabric and frame, J/K; judged. */
export const FABRIC_CAPACITY_J_K = 20_000;

/**
 * How often a two-point thermostat turns a heater on, of a single air node with time constant τ = C/UA.
 *
 *   t_on = τ·ln((T_on − T_low)/(T_on − T_high)), t_off = τ·ln((T_high − T_free)/(T_low − T_free))
 *
 * @param conductanceWK UA of everything; @param freeTempC where the tent would settle unheated
 * @returns cycles an hour; 0 where the heater runs all the time or never
 * @source exact solution of the one-node balance
 */
export function heaterCycles({
  ratedPowerW,
  conductanceWK,
  capacityJK,
  setTempC,
  freeTempC,
}: {
  ratedPowerW: number;
  conductanceWK: number;
  capacityJK: number;
  setTempC: number;
  freeTempC: number;
}): number {
  if (!(conductanceWK > 0) || !(ratedPowerW > 0)) return 0;
  const low = setTempC - THERMOSTAT_BAND_K / 2;
  const high = setTempC + THERMOSTAT_BAND_K / 2;
  const onTempC = freeTempC + ratedPowerW / conductanceWK;
  if (onTempC <= high || freeTempC >= low) return 0;
  const tau = capacityJK / conductanceWK;
  const onS = tau * Math.log((onTempC - low) / (onTempC - high));
  const offS = tau * Math.log((high - freeTempC) / (low - freeTempC));
  return 3600 / (onS + offS);
}
