import type { Tariff } from '../plan/scenario-document';
import { DAY_MIN, minuteOfDay } from '../schedule/clock';

/** Minutes of the day at which a tariff's price may change. */
export function priceCuts(tariff: Tariff): number[] {
  if (tariff.kind !== 'timeOfUse') return [];
  return tariff.periods.flatMap((period) => [minuteOfDay(period.from), minuteOfDay(period.to)]);
}

const isWeekend = (weekday: number) => weekday === 0 || weekday === 6;

/**
 * Price of a kWh at a minute of the wall clock, before tax: the first period that matches counts, and may wrap midnight.
 * A period that begins where it ends lasts the whole day. For a tiered tariff the price follows the month's sum, not the clock.
 */
export function priceAt(
  tariff: Tariff,
  { month, weekday, minute }: { month: number; weekday: number; minute: number },
): number {
  if (tariff.kind === 'flat') return tariff.pricePerKwh;
  if (tariff.kind === 'tiered') return 0;
  const matching = tariff.periods.find((period) => {
    if (period.months && !period.months.includes(month)) return false;
    const days = period.weekdays ?? 'all';
    if (days !== 'all' && isWeekend(weekday) !== (days === 'weekend')) return false;
    const from = minuteOfDay(period.from) % DAY_MIN;
    const to = minuteOfDay(period.to);
    if (from === to % DAY_MIN) return true;
    return from < to ? minute >= from && minute < to : minute >= from || minute < to;
  });
  return matching?.price ?? tariff.otherwise;
}

/** Energy charge of a month on steps: each kWh at the price of the step in which it falls. */
export function tieredCharge({
  energyKwh,
  tariff,
  daysInMonth,
}: {
  energyKwh: number;
  tariff: Extract<Tariff, { kind: 'tiered' }>;
  daysInMonth: number;
}): number {
  const scale = tariff.prorateByDays ? daysInMonth / 30 : 1;
  let from = 0;
  let sum = 0;
  for (const tier of tariff.tiers) {
    const to = tier.upToKwh === undefined ? Infinity : tier.upToKwh * scale;
    sum += Math.max(0, Math.min(energyKwh, to) - from) * tier.price;
    from = to;
  }
  return sum;
}

interface MonthBill {
  tariff: Tariff;
  energyKwh: number;
  /** Σ price × energy over the month, for tariffs by the clock or flat. */
  clockCharge: number;
  daysInMonth: number;
}

/**
 * What a tent adds to a month's bill: bill(household + tent) − bill(household), with tax.
 *
 * Tax applies to energy and fixed charge. The fixed charge counts to the tent only where no household is given.
 *
 * @returns major units of the currency, unrounded
 */
export function tentCost({ tariff, energyKwh, clockCharge, daysInMonth }: MonthBill): number {
  const base = tariff.householdBaseKwhPerMonth ?? 0;
  const energy =
    tariff.kind === 'tiered'
      ? tieredCharge({ energyKwh: base + energyKwh, tariff, daysInMonth }) -
        tieredCharge({ energyKwh: base, tariff, daysInMonth })
      : clockCharge;
  const fixed = base === 0 ? (tariff.fixedPerMonth ?? 0) : 0;
  return (energy + fixed) * (1 + (tariff.taxPct ?? 0) / 100);
}
