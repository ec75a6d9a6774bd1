/** The month by which a plan's bill is told: the room's coldest, or the dearest where the room is always alike. */
import type { Evaluation } from '@/physics/plan/evaluation-document';
import type { Series } from '@/physics/plan/scenario-document';

export interface ToldMonth {
  /** 1 to 12. */
  month: number;
  because: 'coldest' | 'dearest';
}

const DAYS = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31];

function monthlyMeans(series: Series): number[] | null {
  if (series.kind === 'constant') return null;
  if (series.kind === 'monthly') return series.values.length === 12 ? series.values : null;
  let from = 0;
  return DAYS.map((days) => {
    const hours = series.values.slice(from, from + days * 24);
    from += days * 24;
    return hours.reduce((sum, value) => sum + value, 0) / Math.max(1, hours.length);
  });
}

export function toldMonth(airTempC: Series, evaluation: Pick<Evaluation, 'year'>): ToldMonth {
  const means = monthlyMeans(airTempC);
  if (means && Math.max(...means) - Math.min(...means) > 0.05)
    return { month: means.indexOf(Math.min(...means)) + 1, because: 'coldest' };
  const totals = evaluation.year.months.map((month) => month.energyKwh.total);
  return { month: Math.max(0, totals.indexOf(Math.max(...totals))) + 1, because: 'dearest' };
}

export const DAYS_IN_MONTH: readonly number[] = DAYS;

/** A series' mean in a month (1 to 12). */
export function monthMean(series: Series, month: number): number {
  if (series.kind === 'constant') return series.value;
  return monthlyMeans(series)?.[month - 1] ?? Number.NaN;
}
