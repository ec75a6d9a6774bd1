import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import * as comparisonRoute from '@/app/api/v1/gardens/[gardenId]/comparison/route';
import * as csvRoute from '@/app/api/v1/gardens/[gardenId]/comparison/csv/route';
import type { ComparisonColumn } from '@/lib/comparison/comparison';
import { compareScenarios } from '@/lib/comparison/comparison.service';
import { comparisonRows } from '@/lib/comparison/differences';
import { closePools } from '@/lib/db/client';
import { createFixture } from '@/lib/fixtures/fixture.service';
import { getEvaluatedScenario } from '@/lib/scenarios/evaluation.service';
import type { Plan } from '@/lib/scenarios/plan.schema';
import { createScenario } from '@/lib/scenarios/scenario.service';
import { callRoute } from '../../support/call-route';
import { fixtureInput, newPlannedGarden, type PlannedGarden } from '../../support/planned-garden';

let garden: PlannedGarden;
let other: PlannedGarden;
let one: string;
let two: string;

/** Lamps of 40 W and 25.00, of which one is had already, over a tent that nothing else runs in. */
const lit = (fixtureId: string, lamps: number, hours: number): Plan => ({
  tiers: [{ id: 'only', name: 'Only', topHeightM: 0.4, x0M: 0.1, x1M: 1.1, y0M: 0.1, y1M: 0.5 }],
  placements: Array.from({ length: lamps }, (_, index) => ({
    id: `lamp-${index}`,
    fixture: fixtureId,
    positionM: [0.6, 0.3, 1.2],
    aim: [0, 0, -1],
    axis: [1, 0, 0],
    schedule: 'day',
  })),
  schedules: [{ id: 'day', onAt: '06:00', hours }],
  climate: { dayTempC: 10, nightTempC: 10, maxTempC: 40, heater: null, exhaust: null, circulation: null },
  water: { pump: null },
});

beforeAll(async () => {
  garden = await newPlannedGarden('=Compared "gardens"');
  other = await newPlannedGarden('Elsewhere');
  // Points, since the bodies of two lamps in one place would shade each other's reflected light.
  const { lengthM: _length, widthM: _width, ...bar } = fixtureInput.spec;
  const spec = { ...bar, shape: 'point' as const, priceMinor: 2500, owned: 1 };
  const { fixtureId } = await createFixture(garden.owner, { name: 'Bar', spec });
  const make = async (name: string, lamps: number, hours: number) =>
    (await createScenario(garden.owner, garden.tentId, { name, note: '', plan: lit(fixtureId, lamps, hours) }))
      .scenarioId;
  one = await make('=One lamp', 1, 12);
  two = await make('Two lamps, half the hours', 2, 6);
}, 60_000);
afterAll(closePools);

const rowOf = (columns: ComparisonColumn[], figure: string) =>
  comparisonRows(columns, one).find((row) => row.figure === figure)!;

describe('a comparison of two scenarios', () => {
  it('has the energy, the money and the price up front that a pencil finds', async () => {
    const { columns } = await compareScenarios(garden.owner, { ids: [one, two], base: one });
    // 40 W × 12 h × 365 d = 175.2 kWh, and 80 W × 6 h × 365 d the same; at 0.30 a kWh 52.56 a year, 4.38 a month.
    for (const column of columns) {
      expect(column.energyKwhPerYear).toBeCloseTo(175.2, 6);
      expect(column.costPerYear).toBeCloseTo(52.56, 6);
      expect(column.costPerMonth).toBeCloseTo(4.38, 6);
      expect(column.heaterRatedW).toBe(0);
      // January: 0.48 kWh × 31 d × 0.30.
      expect(column.months[0]!.costByDevice.light).toBeCloseTo(4.464, 6);
    }
    expect(columns.map((column) => column.upFrontMinor)).toEqual([0, 2500]);
    expect(rowOf(columns, 'Money up front').differences).toEqual([null, 25]);
    expect(rowOf(columns, 'Payback').values).toEqual([null, 'never']);
    // Twice the lamps for half the hours: the same daily light.
    expect(rowOf(columns, 'Light, Only, mean').differences[1]).toBeCloseTo(0, 8);
  });

  it('has the figures of the evaluations themselves', async () => {
    const { columns } = await compareScenarios(garden.owner, { ids: [one], base: one });
    const { evaluation } = await getEvaluatedScenario(garden.owner, one);
    const [column] = columns as [ComparisonColumn];
    expect(column.tiers[0]).toMatchObject({
      dliMolM2D: evaluation.tiers[0]!.dliMolM2D,
      verdict: 'none',
      lowMolM2D: null,
    });
    expect(column.evenness).toBe(evaluation.tiers[0]!.ppfdUmolM2S.minOverMean);
    expect(column.designTempC).toBe(evaluation.heat.coldDark.roomTempC);
    const { coldDark, coldDawn, coldLight } = evaluation.heat;
    expect(column.heaterNeedW).toBe(Math.max(coldDark.heaterW, coldDawn.heaterW, coldLight.heaterW));
  });

  it('measures against the first without a baseline, and takes in a baseline that was not named among the others', async () => {
    expect((await compareScenarios(garden.owner, { ids: [two, one, two] })).base).toBe(two);
    const { base, columns } = await compareScenarios(garden.owner, { ids: [two], base: one });
    expect(base).toBe(one);
    expect(columns.map((column) => column.scenarioId)).toEqual([one, two]);
  });
});

describe('the routes of comparisons', () => {
  const call = (query: string, as = garden.people.viewer) => ({ as, params: { gardenId: garden.gardenId }, query });

  it('answer a viewer, and find no scenario of another garden among the ids or as baseline', async () => {
    expect((await callRoute(comparisonRoute.GET, call(`?ids=${one},${two}&base=${two}`))).status).toBe(200);
    for (const query of [
      `?ids=${one},${other.scenarioId}`,
      `?ids=${one}&base=${other.scenarioId}`,
      `?ids=${randomUUID()}`,
    ]) {
      expect((await callRoute(comparisonRoute.GET, call(query))).status).toBe(404);
      expect((await callRoute(csvRoute.GET, call(query))).status).toBe(404);
    }
  });

  it.each([
    ['no ids', ''],
    ['empty ids', '?ids='],
    ['a word for an id', '?ids=one'],
    ['nine ids', `?ids=${Array.from({ length: 9 }, () => randomUUID()).join(',')}`],
    ['a word for a baseline', `?ids=${randomUUID()}&base=y`],
  ])('refuse %s in words', async (_, query) => {
    const response = await callRoute(comparisonRoute.GET, call(query));
    expect(response.status).toBe(422);
    expect(await response.json()).toMatchObject({ problems: [{ message: expect.stringMatching(/\w/) }] });
  });

  it('give CSV to save, marked as UTF-8, under a harmless name, with no cell that is a formula', async () => {
    const response = await callRoute(csvRoute.GET, call(`?ids=${one},${two}&base=${two}`));
    expect(response.headers.get('content-type')).toBe('text/csv; charset=utf-8');
    expect(response.headers.get('content-disposition')).toBe('attachment; filename="comparison-compared-gardens.csv"');
    const bytes = new Uint8Array(await response.arrayBuffer());
    expect([...bytes.slice(0, 3)]).toEqual([0xef, 0xbb, 0xbf]);
    const [head, ...lines] = new TextDecoder().decode(bytes).split('\r\n');
    expect(head).toBe(
      `Figure,Unit,"'=One lamp","'=One lamp, minus Two lamps, half the hours","Two lamps, half the hours"`,
    );
    expect(lines.find((line) => line.startsWith('Energy a year'))).toMatch(
      /^Energy a year,kWh,175\.2,-?0(\.0+1)?,175\.2$/,
    );
    expect(lines).toContain('Money up front,EUR,0,-25,25');
  });
});
