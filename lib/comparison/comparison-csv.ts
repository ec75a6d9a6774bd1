import type { ComparisonColumn } from './comparison';
import { comparisonRows, type Cell } from './differences';

/** A text cell that a spreadsheet would take for a formula is led by an apostrophe; quotes are doubled (RFC 4180). */
export function csvText(text: string): string {
  const harmless = /^[=+\-@\t\r\n]/.test(text) ? `'${text}` : text;
  return /[",\n\r]/.test(harmless) || harmless !== text ? `"${harmless.replaceAll('"', '""')}"` : harmless;
}

/** Numbers stay numbers: a point, no thousands, as many digits as anybody could want of a plan. */
const csvNumber = (value: number): string => (Number.isFinite(value) ? String(Number(value.toFixed(6)) + 0) : '');

const csvCell = (cell: Cell): string =>
  cell === null ? '' : typeof cell === 'number' ? csvNumber(cell) : csvText(cell);

/** The comparison as a table: a row for each figure, a column for each scenario and for its difference from the baseline. */
export function comparisonCsv(columns: readonly ComparisonColumn[], baseId: string): string {
  const base = columns.find((column) => column.scenarioId === baseId) ?? columns[0]!;
  const names = columns.flatMap((column) => [
    column.name,
    ...(column === base ? [] : [`${column.name}, minus ${base.name}`]),
  ]);
  const lines = comparisonRows(columns, base.scenarioId).map(({ figure, unit, values, differences }) => {
    const cells = columns.flatMap((column, index) => [
      csvCell(values[index] ?? null),
      ...(column === base ? [] : [csvCell(differences[index] ?? null)]),
    ]);
    return [csvText(figure), csvText(unit), ...cells].join(',');
  });
  return [['Figure', 'Unit', ...names].map(csvText).join(','), ...lines, ''].join('\r\n');
}

/** A name that every system can hold: letters and digits of the garden's own, nothing else. */
export function comparisonFileName(gardenName: string): string {
  const plain = gardenName
    .normalize('NFKD')
    .replaceAll(/\p{M}/gu, '')
    .replaceAll(/[^A-Za-z0-9]+/g, '-')
    .replaceAll(/^-+|-+$/g, '')
    .slice(0, 60)
    .toLowerCase();
  return plain ? `comparison-${plain}.csv` : 'comparison.csv';
}
