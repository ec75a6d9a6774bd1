import { requireWithin } from '../domain-error';

/** Loads that run three hours or more in a row should stay within this share of the rating. @source [NEC210] */
export const CONTINUOUS_SHARE = 0.8;
export const CONTINUOUS_H = 3;

export interface Load {
  powerW: number;
  /** 0.1…1. */
  powerFactor: number;
  /** Runs three hours or more in a row. */
  continuous: boolean;
}

/**
 * Current on a circuit, I = Σ P/(U·λ), against its rating and its limit for long loads.
 *
 * @param supplyV 90…420; @param ratingA of the breaker
 * @returns amperes; `within` when the long loads keep to 80 % and all together to the rating
 * @source [NEC210]; on 230 V supplies the 80 % is planning advice, local code decides
 */
export function circuitLoad({
  loads,
  supplyV,
  ratingA,
}: {
  loads: readonly Load[];
  supplyV: number;
  ratingA: number;
}): {
  peakA: number;
  continuousA: number;
  limitA: number;
  within: boolean;
} {
  requireWithin({ quantity: 'supply voltage', value: supplyV, min: 1, max: 1000, unit: 'V' });
  requireWithin({ quantity: 'rating', value: ratingA, min: 0.1, max: 1000, unit: 'A' });
  const current = (each: Load) => each.powerW / (supplyV * each.powerFactor);
  const peakA = loads.reduce((sum, each) => sum + current(each), 0);
  const continuousA = loads.filter((each) => each.continuous).reduce((sum, each) => sum + current(each), 0);
  const limitA = CONTINUOUS_SHARE * ratingA;
  // A hair for rounding: 16 A of 16 A is within.
  const within = continuousA <= limitA * (1 + 1e-12) && peakA <= ratingA * (1 + 1e-12);
  return { peakA, continuousA, limitA, within };
}
