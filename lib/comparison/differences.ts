import { minorPerMajor } from '../format/money';
import { payback, type ComparisonColumn } from './comparison';

export type Cell = number | string | null;

/** One figure of every scenario, and by how much it differs from the baseline's. */
export interface ComparisonRow {
  figure: string;
  unit: string;
  /** A value for each scenario; null where it has none. */
  values: Cell[];
  /** Value minus the baseline's, in the row's unit; null for the baseline itself, for words, and where either has no value. */
  differences: (number | null)[];
}

const MONTHS = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
];
const DEVICES = ['light', 'heater', 'exhaust', 'circulation', 'pump'] as const;

interface Reading {
  figure: string;
  unit: string;
  read: (column: ComparisonColumn) => Cell;
}

function tierReadings(columns: readonly ComparisonColumn[], base: ComparisonColumn): Reading[] {
  const most = Math.max(0, ...columns.map((column) => column.tiers.length));
  return Array.from({ length: most }, (_, index): Reading[] => {
    const name = base.tiers[index]?.name ?? `Tier ${index + 1}`;
    const of = (what: string, read: (tier: ComparisonColumn['tiers'][number]) => Cell, unit = 'mol/m²/d'): Reading => ({
      figure: `Light, ${name}, ${what}`,
      unit,
      read: (column) => {
        const tier = column.tiers[index];
        return tier ? read(tier) : null;
      },
    });
    return [
      of('mean', (tier) => tier.dliMolM2D.mean),
      of('lowest', (tier) => tier.dliMolM2D.min),
      of('highest', (tier) => tier.dliMolM2D.max),
      of('wanted from', (tier) => tier.lowMolM2D),
      of('wanted to', (tier) => tier.highMolM2D),
      of('verdict', (tier) => tier.verdict, 'in words'),
    ];
  }).flat();
}

/** Money is compared within one currency; what is reckoned in another has a value of its own and no difference. */
function moneyReadings(base: ComparisonColumn): Reading[] {
  const money = (figure: string, read: (column: ComparisonColumn) => number | null): Reading => ({
    figure,
    unit: base.currency,
    read: (column) => (column.currency === base.currency ? read(column) : null),
  });
  return [
    money('Money up front', (column) => column.upFrontMinor / minorPerMajor(column.currency)),
    money('Money a month, mean of the year', (column) => column.costPerMonth),
    money('Money a year', (column) => column.costPerYear),
    { figure: 'Payback', unit: 'months', read: (column) => paybackCell(column, base) },
    ...MONTHS.flatMap((month, index) => [
      ...DEVICES.map((device) =>
        money(`Money in ${month}, ${device}`, (column) => column.months[index]?.costByDevice[device] ?? null),
      ),
      money(`Money in ${month}, all`, (column) => column.months[index]?.cost ?? null),
    ]),
  ];
}

function paybackCell(column: ComparisonColumn, base: ComparisonColumn): Cell {
  if (column === base) return null;
  const back = payback(column, base);
  if (back.kind === 'months') return back.months;
  return back.kind === 'none' ? null : back.kind === 'atOnce' ? 'at once' : 'never';
}

/** Every figure of a comparison, row by row, with its differences from the baseline. */
export function comparisonRows(columns: readonly ComparisonColumn[], baseId: string): ComparisonRow[] {
  const base = columns.find((column) => column.scenarioId === baseId) ?? columns[0];
  if (!base) return [];
  const readings: Reading[] = [
    ...tierReadings(columns, base),
    { figure: 'Evenness of the least even tier', unit: 'lowest/mean', read: (column) => column.evenness },
    { figure: 'Heat needed in the coldest state', unit: 'W', read: (column) => column.heaterNeedW },
    { figure: 'Heater as rated', unit: 'W', read: (column) => column.heaterRatedW },
    { figure: 'Energy a year', unit: 'kWh', read: (column) => column.energyKwhPerYear },
    ...moneyReadings(base),
  ];
  return readings.map(({ figure, unit, read }) => {
    const at = read(base);
    const values = columns.map(read);
    const differences = values.map((value, index) =>
      columns[index] !== base && typeof value === 'number' && typeof at === 'number' ? value - at : null,
    );
    return { figure, unit, values, differences };
  });
}
