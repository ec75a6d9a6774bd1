import { DomainError, requireWithin } from '../domain-error';

/** Moist air as an ideal gas, in SI units, to the equations of ASHRAE's handbook. */

/** Ratio of the molar masses of water and dry air. @source [ASHRAE2017] */
const MASS_RATIO = 0.621945;
/** Gas constant of dry air, J/(kg·K). @source [ASHRAE2017] */
const DRY_AIR_GAS_CONSTANT = 287.042;
const ZERO_C = 273.15;
/** Below the triple point water vapour is in balance with ice. */
const TRIPLE_POINT_C = 0.01;

/**
 * Pressure of the standard atmosphere, p = 101325·(1 − 2.25577e-5·z)^5.2559.
 *
 * @param altitudeM −5000…11000
 * @returns Pa
 * @source [ASHRAE2017] eq. 3
 * @accuracy 1 Pa of table 1
 */
export function pressureAtAltitude(altitudeM: number): number {
  requireWithin({ quantity: 'altitude', value: altitudeM, min: -5000, max: 11000, unit: 'm' });
  return 101325 * (1 - 2.25577e-5 * altitudeM) ** 5.2559;
}

/**
 * Pressure of saturated water vapour, over ice below the triple point and over water above it (Hyland and Wexler).
 *
 * @param tempC −100…200
 * @returns Pa
 * @source [ASHRAE2017] eq. 5 and 6
 * @accuracy 0.03 % of table 3
 */
export function saturationPressure(tempC: number): number {
  requireWithin({ quantity: 'temperature', value: tempC, min: -100, max: 200, unit: '°C' });
  const t = tempC + ZERO_C;
  if (tempC <= TRIPLE_POINT_C) {
    return Math.exp(
      -5.6745359e3 / t +
        6.3925247 +
        t * (-9.677843e-3 + t * (6.2215701e-7 + t * (2.0747825e-9 - t * 9.484024e-13))) +
        4.1635019 * Math.log(t),
    );
  }
  return Math.exp(
    -5.8002206e3 / t +
      1.3914993 +
      t * (-4.8640239e-2 + t * (4.1764768e-5 - t * 1.4452093e-8)) +
      6.5459673 * Math.log(t),
  );
}

/** Slope of the saturation pressure, dp_ws/dT, Pa/K; the derivative of the equations above. */
export function saturationSlope(tempC: number): number {
  const p = saturationPressure(tempC);
  const t = tempC + ZERO_C;
  if (tempC <= TRIPLE_POINT_C) {
    return (
      p *
      (5.6745359e3 / t ** 2 -
        9.677843e-3 +
        2 * 6.2215701e-7 * t +
        3 * 2.0747825e-9 * t ** 2 -
        4 * 9.484024e-13 * t ** 3 +
        4.1635019 / t)
    );
  }
  return p * (5.8002206e3 / t ** 2 - 4.8640239e-2 + 2 * 4.1764768e-5 * t - 3 * 1.4452093e-8 * t ** 2 + 6.5459673 / t);
}

/** Pressure of the vapour in air of a relative humidity, p_w = φ·p_ws. @param relHumidityPct 0…100 @returns Pa */
export function vapourPressure({ tempC, relHumidityPct }: { tempC: number; relHumidityPct: number }): number {
  requireWithin({ quantity: 'relative humidity', value: relHumidityPct, min: 0, max: 100, unit: '%' });
  return (relHumidityPct / 100) * saturationPressure(tempC);
}

/**
 * Humidity ratio, W = 0.621945·p_w/(p − p_w).
 *
 * @param vapourPa 0…below the total pressure
 * @returns kg of water for each kg of dry air
 * @source [ASHRAE2017] eq. 20
 */
export function humidityRatio({ vapourPa, pressurePa }: { vapourPa: number; pressurePa: number }): number {
  if (!(vapourPa >= 0 && vapourPa < pressurePa)) {
    throw new DomainError({ quantity: 'vapour pressure', value: vapourPa, min: 0, max: pressurePa, unit: 'Pa' });
  }
  return (MASS_RATIO * vapourPa) / (pressurePa - vapourPa);
}

/** The inverse: p_w = p·W/(0.621945 + W). @returns Pa */
export function vapourPressureOfRatio({ ratio, pressurePa }: { ratio: number; pressurePa: number }): number {
  requireWithin({ quantity: 'humidity ratio', value: ratio, min: 0, max: 10, unit: 'kg/kg' });
  return (pressurePa * ratio) / (MASS_RATIO + ratio);
}

/**
 * Dew point: the temperature at which this vapour would be saturated, by Newton's method on ln p.
 *
 * @param vapourPa above 0.0014, the vapour over ice at −100 °C
 * @returns °C
 * @source [ASHRAE2017] section 1.8
 * @accuracy 1e-9 K
 */
export function dewPoint(vapourPa: number): number {
  requireWithin({ quantity: 'vapour pressure', value: vapourPa, min: 0.00142, max: 1.5e6, unit: 'Pa' });
  const wanted = Math.log(vapourPa);
  let tempC = (240 * (wanted - Math.log(611.2))) / (17.4 - (wanted - Math.log(611.2)));
  for (let i = 0; i < 60; i += 1) {
    const bounded = Math.min(199.9, Math.max(-99.9, tempC));
    const p = saturationPressure(bounded);
    const step = ((Math.log(p) - wanted) * p) / saturationSlope(bounded);
    tempC = Math.min(200, Math.max(-100, bounded - step));
    if (Math.abs(step) < 1e-10) break;
  }
  return tempC;
}

/** Enthalpy of moist air, h = 1.006·t + W·(2501 + 1.86·t). @returns kJ for each kg of dry air @source [ASHRAE2017] eq. 30 */
export const enthalpy = ({ tempC, ratio }: { tempC: number; ratio: number }): number =>
  1.006 * tempC + ratio * (2501 + 1.86 * tempC);

/** Volume of moist air for each kg of dry air, v = 287.042·T·(1 + 1.607858·W)/p. @returns m³/kg @source [ASHRAE2017] eq. 26 */
export const specificVolume = ({
  tempC,
  ratio,
  pressurePa,
}: {
  tempC: number;
  ratio: number;
  pressurePa: number;
}): number => (DRY_AIR_GAS_CONSTANT * (tempC + ZERO_C) * (1 + 1.607858 * ratio)) / pressurePa;

/** Density of moist air, ρ = (1 + W)/v. @returns kg/m³ @source [ASHRAE2017] eq. 27 */
export const density = (state: { tempC: number; ratio: number; pressurePa: number }): number =>
  (1 + state.ratio) / specificVolume(state);

/** Heat capacity of moist air for each kg of dry air, 1006 + 1860·W J/(kg·K). @source [ASHRAE2017] eq. 30 */
export const heatCapacity = (ratio: number): number => 1006 + 1860 * ratio;

/** Latent heat of evaporation, λ = 2.501e6 − 2361·t. @returns J/kg @source [FAO56] annex 3 */
export const latentHeat = (tempC: number): number => 2.501e6 - 2361 * tempC;

/** Vapour pressure deficit of air, p_ws − p_w. @returns kPa */
export const airVpd = ({ tempC, relHumidityPct }: { tempC: number; relHumidityPct: number }): number =>
  (saturationPressure(tempC) - vapourPressure({ tempC, relHumidityPct })) / 1000;

/** Deficit between a leaf and the air about it; negative where dew falls on the leaf. @returns kPa */
export const leafVpd = ({
  leafTempC,
  tempC,
  relHumidityPct,
}: {
  leafTempC: number;
  tempC: number;
  relHumidityPct: number;
}): number => (saturationPressure(leafTempC) - vapourPressure({ tempC, relHumidityPct })) / 1000;

/**
 * Thermodynamic wet-bulb temperature, by bisection on the humidity ratio that it implies.
 *
 * @returns °C
 * @source [ASHRAE2017] eq. 33 and 35
 * @accuracy 1e-6 K
 */
export function wetBulb({
  tempC,
  relHumidityPct,
  pressurePa,
}: {
  tempC: number;
  relHumidityPct: number;
  pressurePa: number;
}): number {
  const vapourPa = vapourPressure({ tempC, relHumidityPct });
  const ratio = humidityRatio({ vapourPa, pressurePa });
  let low = Math.max(-100, vapourPa > 0.0015 ? dewPoint(vapourPa) : -100);
  let high = tempC;
  while (high - low > 1e-7) {
    const middle = (low + high) / 2;
    if (ratioAtWetBulb(tempC, middle, pressurePa) > ratio) high = middle;
    else low = middle;
  }
  return (low + high) / 2;
}

function ratioAtWetBulb(tempC: number, wetC: number, pressurePa: number): number {
  const saturated = humidityRatio({ vapourPa: saturationPressure(wetC), pressurePa });
  return wetC >= 0
    ? ((2501 - 2.326 * wetC) * saturated - 1.006 * (tempC - wetC)) / (2501 + 1.86 * tempC - 4.186 * wetC)
    : ((2830 - 0.24 * wetC) * saturated - 1.006 * (tempC - wetC)) / (2830 + 1.86 * tempC - 2.1 * wetC);
}
