import { minorPerMajor } from '../format/money';
import { payback, type ComparisonColumn } from './comparison';

/** A text cell that a spreadsheet would take for a formula is led by an apostrophe; quotes are doubled (RFC 4180). */
export function csvText(text: string): string {
  const harmless = /^[=+\-@\t\r\n]/.test(text) ? `'${text}` : text;
  return /[",\n\r]/.test(harmless) || harmless !== text ? `"${harmless.replaceAll('"', '""')}"` : harmless;
}

const number = (value: number | null, digits = 6): string =>
  value === null ? '' : String(Number(value.toFixed(digits)));

/** The comparison as a table: a row for each figure, a column for each scenario and for its difference from the baseline. */
export function comparisonCsv(columns: readonly ComparisonColumn[], baseId: string): string {
  const base = columns.find((column) => column.scenarioId === baseId) ?? columns[0]!;
  const head = [
    'Figure',
    'Unit',
    ...columns.flatMap((column) => [column.name, ...(column === base ? [] : [`${column.name}, minus ${base.name}`])]),
  ];
  const lines = [head.map(csvText).join(',')];
  const row = (figure: string, unit: string, read: (column: ComparisonColumn) => number | null) => {
    const at = read(base);
    const cells = columns.flatMap((column) => {
      const value = read(column);
      return [number(value), ...(column === base ? [] : [value === null || at === null ? '' : number(value - at)])];
    });
    lines.push([csvText(figure), csvText(unit), ...cells].join(','));
  };
  const mostTiers = Math.max(0, ...columns.map((column) => column.tiers.length));
  for (let tier = 0; tier < mostTiers; tier += 1) {
    const name = base.tiers[tier]?.name ?? `Tier ${tier + 1}`;
    row(`Light, ${name}, mean`, 'mol/m²/d', (column) => column.tiers[tier]?.dliMolM2D.mean ?? null);
    row(`Light, ${name}, lowest`, 'mol/m²/d', (column) => column.tiers[tier]?.dliMolM2D.min ?? null);
    row(`Light, ${name}, highest`, 'mol/m²/d', (column) => column.tiers[tier]?.dliMolM2D.max ?? null);
  }
  row('Evenness of the least even tier', 'lowest/mean', (column) => column.evenness);
  row('Heat on the coldest night', 'W', (column) => column.heaterNeedW);
  row('Heater planned', 'W', (column) => column.heaterRatedW);
  row('Money up front', base.currency, (column) => column.upFrontMinor / minorPerMajor(column.currency));
  row('Money a month, mean', base.currency, (column) => column.costPerMonth);
  row('Energy a year', 'kWh', (column) => column.energyKwhPerYear);
  row('Payback', 'months', (column) => {
    const back = payback(column, base, minorPerMajor(column.currency));
    return back.kind === 'months' ? back.months : back.kind === 'atOnce' ? 0 : null;
  });
  base.months.forEach((_, month) =>
    row(`Money, month ${month + 1}`, base.currency, (column) => column.months[month]!.cost),
  );
  return `${lines.join('\r\n')}\r\n`;
}
