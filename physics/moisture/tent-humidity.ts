const MASS_RATIO = 0.621945;

interface Moisture {
  /** E = still − slope·p_w, kg/s for the whole tent. */
  still: number;
  slope: number;
  /** Dry air exchanged, kg/s. */
  dryAirKgS: number;
  /** Humidity ratio of the room's air. */
  roomRatio: number;
  pressurePa: number;
  /** Vapour pressure at saturation, Pa: what does not fit the air condenses. */
  saturationPa: number;
}

/**
 * Vapour pressure at which a tent's evaporation and its air exchange are in balance.
 *
 *   still − slope·p_w = ṁ·(W(p_w) − W_room), W = 0.621945·p_w/(p − p_w)
 *
 * Multiplied by p − p_w this is a quadratic in p_w; its one root below p is taken. No iteration.
 *
 * @returns Pa, at most saturation
 * @source mass balance; [ASHRAE2017] eq. 20
 */
export function balancedVapourPressure({
  still,
  slope,
  dryAirKgS,
  roomRatio,
  pressurePa,
  saturationPa,
}: Moisture): number {
  const a = slope;
  const b = -(still + slope * pressurePa + dryAirKgS * (MASS_RATIO + roomRatio));
  const c = (still + dryAirKgS * roomRatio) * pressurePa;
  let vapourPa: number;
  if (b === 0) return 0;
  if (a === 0) vapourPa = -c / b;
  else {
    // The smaller root, in the form that does not lose digits when the slope is small.
    const root = Math.sqrt(Math.max(0, b * b - 4 * a * c));
    vapourPa = (2 * c) / (-b + root);
  }
  return Math.min(saturationPa, Math.max(0, vapourPa));
}
