import { requireWithin } from '../domain-error';

/** Stefan and Boltzmann's constant, W/m²K⁴ (exact since the 2019 SI). */
const STEFAN_BOLTZMANN = 5.670374419e-8;

/** Where heat goes: through a wall, up through a roof, down through a floor. */
export type HeatDirection = 'horizontal' | 'up' | 'down';

/** Convection in still air, W/m²K. @source [ISO6946] annex C, consistent with its table of surface resistances */
export const STILL_CONVECTION: Record<HeatDirection, number> = { horizontal: 2.5, up: 5.0, down: 0.7 };
/** Convection where a circulation fan stirs the air, W/m²K; judged. */
export const STIRRED_CONVECTION = 4;

/**
 * Radiative coefficient of a black surface, h_r = 4σT³.
 *
 * @param meanTempC −100…200
 * @returns W/m²K; 5.71 at 20 °C
 * @source [ISO6946] annex C
 */
export function radiativeCoefficient(meanTempC: number): number {
  requireWithin({ quantity: 'mean temperature', value: meanTempC, min: -100, max: 200, unit: '°C' });
  return 4 * STEFAN_BOLTZMANN * (meanTempC + 273.15) ** 3;
}

/**
 * Film coefficient of a surface, h = h_c + ε·h_r.
 *
 * @param convection h_c, W/m²K; @param emittanceFrac ε, 0…1; @param meanTempC of the film
 * @source [ISO6946]
 */
export function filmCoefficient({
  convection,
  emittanceFrac,
  meanTempC = 20,
}: {
  convection: number;
  emittanceFrac: number;
  meanTempC?: number;
}): number {
  requireWithin({ quantity: 'convection', value: convection, min: 0, max: 100, unit: 'W/m²K' });
  requireWithin({ quantity: 'emittance', value: emittanceFrac, min: 0, max: 1, unit: 'of 1' });
  return convection + emittanceFrac * radiativeCoefficient(meanTempC);
}

/**
 * U-value of a thin sheet between two films, U = 1/(1/h_i + R + 1/h_o).
 *
 * @param resistance of the sheet itself, m²K/W; a fabric's is some thousandths and is left out
 * @source [ISO6946]
 */
export function uValue({
  inner,
  outer,
  resistance = 0,
}: {
  inner: number;
  outer: number;
  resistance?: number;
}): number {
  requireWithin({ quantity: 'inner film', value: inner, min: 1e-6, max: 1000, unit: 'W/m²K' });
  requireWithin({ quantity: 'outer film', value: outer, min: 1e-6, max: 1000, unit: 'W/m²K' });
  return 1 / (1 / inner + resistance + 1 / outer);
}

/** Emittance of a room's walls and of the fabric's outer face. @source [ISO6946] */
export const ROOM_EMITTANCE = 0.9;

/** U of a tent's walls and ceiling from its films, and the inner film that decides whether they sweat. */
export function fabricFromFilms({ liningEmittanceFrac, stirred }: { liningEmittanceFrac: number; stirred: boolean }): {
  wallUWM2K: number;
  roofUWM2K: number;
  innerFilmWM2K: number;
} {
  const inner = (direction: 'horizontal' | 'up') =>
    filmCoefficient({
      convection: stirred ? Math.max(STIRRED_CONVECTION, STILL_CONVECTION[direction]) : STILL_CONVECTION[direction],
      emittanceFrac: liningEmittanceFrac,
    });
  const outer = (direction: 'horizontal' | 'up') =>
    filmCoefficient({ convection: STILL_CONVECTION[direction], emittanceFrac: ROOM_EMITTANCE });
  return {
    wallUWM2K: uValue({ inner: inner('horizontal'), outer: outer('horizontal') }),
    roofUWM2K: uValue({ inner: inner('up'), outer: outer('up') }),
    innerFilmWM2K: inner('horizontal'),
  };
}
