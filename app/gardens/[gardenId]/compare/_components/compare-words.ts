import { payback, type ComparisonColumn, type Payback } from '@/lib/comparison/comparison';
import { differenceText, figureText } from '@/lib/format/figure';
import { formatMoney } from '@/lib/format/money';

export const missing = (column: ComparisonColumn) => column.tiers.filter((tier) => tier.verdict === 'below');

/** By how much the worst tier misses the lower edge of its band; null where none misses. */
export function worstMiss(column: ComparisonColumn): { name: string; mol: number } | null {
  const misses = missing(column).map((tier) => ({ name: tier.name, mol: (tier.lowMolM2D ?? 0) - tier.dliMolM2D.mean }));
  return misses.sort((a, b) => b.mol - a.mol)[0] ?? null;
}

export function lightWords(column: ComparisonColumn): { text: string; good: boolean } {
  const wanted = column.tiers.filter((tier) => tier.verdict !== 'none');
  if (wanted.length === 0) return { text: 'no crop chosen yet', good: false };
  const miss = worstMiss(column);
  if (miss) return { text: `${miss.name} misses by ${figureText(miss.mol, 1)} mol`, good: false };
  const above = column.tiers.find((tier) => tier.verdict === 'above');
  return above
    ? { text: `${above.name} gets more than it needs`, good: false }
    : { text: 'every tier inside its band', good: true };
}

/** The answer over the columns: what the cheapest sufficient one is, or which comes nearest. */
export function headline(columns: readonly ComparisonColumn[], base: ComparisonColumn): string {
  const enough = columns.filter(
    (column) => column.tiers.some((tier) => tier.verdict !== 'none') && missing(column).length === 0,
  );
  if (columns.length === 1) return `${base.name} stands alone. Add another to compare it with.`;
  if (enough.length === 0) {
    const nearest = [...columns].sort((a, b) => (worstMiss(a)?.mol ?? 0) - (worstMiss(b)?.mol ?? 0))[0]!;
    const miss = worstMiss(nearest);
    return miss
      ? `None lights every tier. ${nearest.name} comes nearest, ${figureText(miss.mol, 1)} mol short.`
      : 'Choose crops for the tiers, and their light can be judged.';
  }
  const cheapest = [...enough].sort((a, b) => a.costPerMonth - b.costPerMonth)[0]!;
  const words = `${cheapest.name} lights every tier for ${formatMoney(cheapest.costPerMonth, cheapest.currency)} a month`;
  if (cheapest === base) return `${words}, the least of those that do.`;
  const difference = cheapest.costPerMonth - base.costPerMonth;
  return `${words}, ${formatMoney(Math.abs(difference), cheapest.currency)} ${difference < 0 ? 'less' : 'more'} than ${base.name}.`;
}

/** `1 danger, 5 warnings`; never "none" while one stands. */
export function cautionWords({ dangers, warnings }: Pick<ComparisonColumn, 'dangers' | 'warnings'>): string {
  const some = (count: number, word: string) => (count === 0 ? [] : [`${count} ${word}${count === 1 ? '' : 's'}`]);
  return [...some(dangers, 'danger'), ...some(warnings, 'warning')].join(', ') || 'none';
}

export function paybackWords(column: ComparisonColumn, base: ComparisonColumn): { text: string; note?: string } {
  if (column === base) return { text: '–' };
  const back: Payback = payback(column, base);
  switch (back.kind) {
    case 'none':
      return { text: '–' };
    case 'atOnce':
      return { text: 'at once' };
    case 'never':
      return {
        text: 'never',
        note: missing(column).length < missing(base).length ? 'it buys light, not savings' : 'it saves nothing',
      };
    case 'months':
      return back.months > 600
        ? { text: 'never', note: 'longer than any lamp lasts' }
        : { text: `${Math.ceil(back.months)} months` };
  }
}

/** A difference from the baseline, signed and with its unit; nothing for the baseline itself. */
export function difference(value: number, base: number, digits: number, unit: string): string {
  const text = differenceText(value - base, digits);
  return text === 'same' || unit === '' ? text : `${text} ${unit}`;
}

export function moneyDifference(value: number, base: number, currency: string): string {
  const by = value - base;
  if (Math.abs(by) < 0.005) return 'same';
  return `${by > 0 ? '+' : '−'}${formatMoney(Math.abs(by), currency)}`;
}
