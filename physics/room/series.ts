import type { Series } from '../plan/scenario-document';
import { daysInMonth, hoursInYear } from '../schedule/local-year';

const HOURS = 24;
/** Hour of the day at which a swing is warmest. */
const WARMEST_H = 15;

/**
 * Joins twelve monthly means by straight lines through the middles of the months, lifted so that each month keeps its mean.
 *
 * The middles' values are corrected until the mean of each month's hours is the given one; the corrections form a
 * diagonally dominant system, so a few sweeps reach rounding.
 */
function joinMonths(values: readonly number[], year: number): Float64Array {
  const lengths = values.map((_, month) => daysInMonth(year, month + 1) * HOURS);
  const starts = lengths.map((_, month) => lengths.slice(0, month).reduce((sum, hours) => sum + hours, 0));
  const total = hoursInYear(year);
  const middles = starts.map((start, month) => start + lengths[month]! / 2);
  const knots = [...values];
  const series = new Float64Array(total);
  const draw = () => {
    for (let month = 0; month < 12; month += 1) {
      const next = (month + 1) % 12;
      const from = middles[month]!;
      const to = next === 0 ? middles[0]! + total : middles[next]!;
      for (let hour = Math.ceil(from - 0.5); hour + 0.5 < to; hour += 1) {
        const part = (hour + 0.5 - from) / (to - from);
        series[hour % total] = knots[month]! + part * (knots[next]! - knots[month]!);
      }
    }
  };
  for (let sweep = 0; sweep < 60; sweep += 1) {
    draw();
    let worst = 0;
    for (let month = 0; month < 12; month += 1) {
      let sum = 0;
      for (let hour = starts[month]!; hour < starts[month]! + lengths[month]!; hour += 1) sum += series[hour]!;
      const error = values[month]! - sum / lengths[month]!;
      knots[month]! += error;
      worst = Math.max(worst, Math.abs(error));
    }
    if (worst < 1e-10) break;
  }
  draw();
  return series;
}

interface Bounds {
  least: number;
  most: number;
}

/**
 * Keeps a year within bounds without touching any month's mean: where hours would pass a bound, that month's hours are drawn in
 * towards its mean. Steep months overshoot when they are joined by straight lines, and humidity near 100 % has little room.
 *
 * @returns whether any month was drawn in
 */
export function drawIn(values: Float64Array, year: number, { least, most }: Bounds): boolean {
  let drawn = false;
  let start = 0;
  for (let month = 1; month <= 12; month += 1) {
    const hours = values.subarray(start, start + daysInMonth(year, month) * HOURS);
    start += hours.length;
    let sum = 0;
    let low = Infinity;
    let high = -Infinity;
    for (const value of hours) {
      sum += value;
      low = Math.min(low, value);
      high = Math.max(high, value);
    }
    if (low >= least && high <= most) continue;
    drawn = true;
    const mean = Math.min(most, Math.max(least, sum / hours.length));
    const room = Math.min(
      high > most ? (most - mean) / (high - mean) : 1,
      low < least ? (mean - least) / (mean - low) : 1,
    );
    for (let hour = 0; hour < hours.length; hour += 1)
      hours[hour] = Math.min(most, Math.max(least, mean + room * (hours[hour]! - mean)));
  }
  return drawn;
}

/**
 * The hours of a year of a series, in local standard time.
 *
 * @returns one value for each hour; a monthly series keeps each month's mean, its daily swing is peak to peak and warmest at 15:00
 */
export function hourlyValues(series: Series, year: number): Float64Array {
  const total = hoursInYear(year);
  if (series.kind === 'constant') return new Float64Array(total).fill(series.value);
  if (series.kind === 'hourly')
    return Float64Array.from({ length: total }, (_, hour) => series.values[hour % series.values.length]!);
  const values = joinMonths(series.values, year);
  const half = (series.dailySwingK ?? 0) / 2;
  if (half > 0)
    for (let hour = 0; hour < total; hour += 1)
      values[hour]! += half * Math.cos((2 * Math.PI * ((hour % HOURS) + 0.5 - WARMEST_H)) / HOURS);
  return values;
}
