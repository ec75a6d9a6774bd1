import { describe, expect, it } from 'vitest';
import { payback, type ComparisonColumn } from '@/lib/comparison/comparison';
import { comparisonCsv, comparisonFileName, csvText } from '@/lib/comparison/comparison-csv';
import { comparisonRows } from '@/lib/comparison/differences';

const month = (light: number, heater: number) => ({
  cost: light + heater,
  costByDevice: { light, heater, exhaust: 0, circulation: 0, pump: 0 },
});
const tier = (name: string, mean: number, verdict: ComparisonColumn['tiers'][number]['verdict']) => ({
  name,
  dliMolM2D: { mean, min: mean - 2, max: mean + 3 },
  lowMolM2D: 12,
  highMolM2D: 17,
  verdict,
});

/** Invented: one lamp on top. */
const onTop: ComparisonColumn = {
  scenarioId: 'a',
  tentId: 't',
  tentName: 'Tent',
  name: 'One on top',
  tiers: [tier('Lower', 4.5, 'below'), tier('Upper', 15, 'inside')],
  evenness: 0.5,
  heaterNeedW: 420,
  heaterRatedW: 500,
  designTempC: 8,
  upFrontMinor: 32_000,
  costPerMonth: 40,
  costPerYear: 480,
  energyKwhPerYear: 1600,
  months: Array.from({ length: 12 }, (_, index) => month(30, index === 0 ? 20 : 9)),
  currency: 'EUR',
  dangers: 0,
  warnings: 0,
};

/** Invented: a lamp per tier, 60 dearer and 5 a month cheaper. */
const perTier: ComparisonColumn = {
  ...onTop,
  scenarioId: 'b',
  name: 'A lamp per tier',
  tiers: [tier('Lower', 13, 'inside'), tier('Upper', 13.5, 'inside')],
  evenness: 0.7,
  heaterNeedW: 380.5,
  upFrontMinor: 38_000,
  costPerMonth: 35,
  costPerYear: 420,
  energyKwhPerYear: 1400,
  months: Array.from({ length: 12 }, () => month(26, 9)),
};

const row = (columns: ComparisonColumn[], base: string, figure: string) =>
  comparisonRows(columns, base).find((each) => each.figure === figure);

describe('differences from the baseline', () => {
  it.each([
    ['Light, Lower, mean', 'mol/m²/d', 8.5],
    ['Light, Upper, mean', 'mol/m²/d', -1.5],
    ['Evenness of the least even tier', 'lowest/mean', 0.2],
    ['Heat needed in the coldest state', 'W', -39.5],
    ['Heater as rated', 'W', 0],
    ['Energy a year', 'kWh', -200],
    ['Money up front', 'EUR', 60],
    ['Money a month, mean of the year', 'EUR', -5],
    ['Money in January, light', 'EUR', -4],
    ['Money in January, heater', 'EUR', -11],
    ['Money in January, all', 'EUR', -15],
    ['Money in December, all', 'EUR', -4],
  ])('of %s are told in %s and signed: %d, by hand', (figure, unit, by) => {
    const found = row([onTop, perTier], 'a', figure)!;
    expect(found.unit).toBe(unit);
    expect(found.differences[0]).toBeNull();
    expect(found.differences[1]).toBeCloseTo(by, 9);
  });

  it('turn their sign when the baseline is the other one', () => {
    const figures = comparisonRows([onTop, perTier], 'a');
    const turned = comparisonRows([onTop, perTier], 'b');
    figures.forEach((each, index) => {
      const [, forth] = each.differences;
      const [back] = turned[index]!.differences;
      if (each.figure !== 'Payback' && forth !== null) expect(back).toBeCloseTo(-forth!, 9);
    });
  });

  it('are none where a scenario lacks the tier, or reckons its money in another currency', () => {
    const bare = { ...perTier, scenarioId: 'c', tiers: [perTier.tiers[0]!] };
    expect(row([onTop, bare], 'a', 'Light, Upper, mean')).toMatchObject({
      values: [15, null],
      differences: [null, null],
    });
    const dollars = { ...perTier, scenarioId: 'd', currency: 'USD' };
    expect(row([onTop, dollars], 'a', 'Money a year')).toMatchObject({
      values: [480, null],
      differences: [null, null],
    });
    expect(row([onTop, dollars], 'a', 'Energy a year')).toMatchObject({ differences: [null, -200] });
    expect(payback(dollars, onTop)).toEqual({ kind: 'none' });
  });
});

describe('payback', () => {
  const against = (upFrontMinor: number, costPerMonth: number, currency = 'EUR') =>
    payback({ upFrontMinor, costPerMonth, currency }, { upFrontMinor: 10_000, costPerMonth: 20, currency });

  it.each([
    ['60 dearer, 5 a month cheaper: 12 months', 16_000, 15, { kind: 'months', months: 12 }],
    ['cheaper both ways: at once', 9000, 15, { kind: 'atOnce' }],
    ['cheaper, as dear to run: at once', 9000, 20, { kind: 'atOnce' }],
    ['dearer, as dear to run: never', 16_000, 20, { kind: 'never' }],
    ['dearer both ways: never', 16_000, 25, { kind: 'never' }],
    ['cheaper, dearer to run: never', 9000, 25, { kind: 'never' }],
    ['alike: none', 10_000, 20, { kind: 'none' }],
  ])('%s', (_, upFront, month, expected) => {
    expect(against(upFront, month)).toEqual(expected);
  });

  it('counts yen, which have no minor unit, as whole: 6000 yen over 5 a month are 1200 months', () => {
    expect(against(16_000, 15, 'JPY')).toEqual({ kind: 'months', months: 1200 });
  });
});

/** A reader of RFC 4180 for the tests, apart from the product's own. */
function cellsOf(csv: string): string[][] {
  return csv
    .split('\r\n')
    .filter((line) => line !== '')
    .map((line) =>
      [...line.matchAll(/(?:^|,)(?:"((?:[^"]|"")*)"|([^",]*))/g)].map(([, quoted, plain]) =>
        quoted === undefined ? plain! : quoted.replaceAll('""', '"'),
      ),
    );
}

describe('the comparison as CSV', () => {
  it('is RFC 4180: CRLF, as many cells in every row, units beside their figures, numbers as numbers', () => {
    const csv = comparisonCsv([onTop, perTier], 'a');
    expect(csv.endsWith('\r\n')).toBe(true);
    expect(csv.replaceAll('\r\n', '')).not.toMatch(/[\r\n]/);
    const cells = cellsOf(csv);
    expect(cells[0]).toEqual(['Figure', 'Unit', 'One on top', 'A lamp per tier', 'A lamp per tier, minus One on top']);
    for (const line of cells) expect(line).toHaveLength(5);
    const at = (figure: string) => cells.find(([name]) => name === figure)!.slice(1);
    expect(at('Light, Lower, mean')).toEqual(['mol/m²/d', '4.5', '13', '8.5']);
    expect(at('Light, Lower, verdict')).toEqual(['in words', 'below', 'inside', '']);
    expect(at('Heat needed in the coldest state')).toEqual(['W', '420', '380.5', '-39.5']);
    expect(at('Money up front')).toEqual(['EUR', '320', '380', '60']);
    expect(at('Payback')).toEqual(['months', '', '12', '']);
  });

  // OWASP, CSV Injection: cells beginning with these are taken for formulas.
  it.each(['=1+1', '+1', '-1', '@SUM(A1)', '\t=1', '\r=1', '\n=1'])('disarms the text %j', (text) => {
    expect(csvText(text)).toBe(`"'${text}"`);
    const armed = { ...perTier, name: text, tiers: [{ ...perTier.tiers[0]!, name: text }] };
    for (const cell of comparisonCsv([armed, onTop], 'b').split(/,|\r\n/))
      expect(cell).not.toMatch(/^"?[=+@\t\r\n]|^"-/);
  });

  it('leaves other text as it is and doubles its quotes', () => {
    expect(csvText('Lower')).toBe('Lower');
    expect(csvText('The "best", so far')).toBe('"The ""best"", so far"');
    expect(csvText('a=b')).toBe('a=b');
  });

  it('leaves negative numbers numbers', () => {
    expect(comparisonCsv([onTop, perTier], 'a')).toContain(',-39.5\r\n');
  });

  it('is saved under the name of its garden, in letters that every system holds', () => {
    expect(comparisonFileName('Skerry Point School')).toBe('comparison-skerry-point-school.csv');
    expect(comparisonFileName('Gärtchen "x"; rm\r\n/../')).toBe('comparison-gartchen-x-rm.csv');
    expect(comparisonFileName('庭')).toBe('comparison.csv');
  });
});
