import { describe, expect, it, vi } from 'vitest';
import { createLightCache, evaluateScenario } from '@/lib/evaluation/evaluate-scenario';
import { toldMonth } from '@/lib/scenarios/coldest-month';
import { setLampOutput } from '@/lib/scenarios/edit-plan';
import { lampAcrossRange, lampRange, placeForLamp } from '@/lib/scenarios/lamp-range';
import { applyWayOut, heightsInside, waysOut, type Evaluate } from '@/lib/scenarios/ways-out';
import { twoTierTent as doc } from '../../app/section/two-tier-tent';

// Each way is priced by whole years: seconds, not milliseconds, on a busy machine.
vi.setConfig({ testTimeout: 60_000 });

const lightCache = createLightCache();
const evaluate: Evaluate = (document, { year }) => evaluateScenario(document, { year, lightCache });
const pause = () => Promise.resolve();
const dli = (evaluation: ReturnType<Evaluate>, id: string) =>
  evaluation.tiers.find((tier) => tier.id === id)!.dliMolM2D.mean;

describe('ways out', () => {
  const whole = evaluate(doc, { year: true });

  it('each land inside the band when they are applied and evaluated anew', async () => {
    expect(whole.tiers.find((tier) => tier.id === 'low')!.verdict).toBe('below');
    const ways = await waysOut(doc, whole, 'low', { evaluate, pause });
    expect(ways.length).toBeGreaterThan(0);
    expect(ways.length).toBeLessThanOrEqual(2);
    for (const way of ways) {
      const after = evaluate(applyWayOut(doc, way), { year: false });
      expect(dli(after, 'low')).toBeGreaterThanOrEqual(12);
      expect(dli(after, 'low')).toBeLessThanOrEqual(17);
    }
  });

  it("are priced by the told month's energy of a whole evaluation, cheapest first", async () => {
    const ways = await waysOut(doc, whole, 'low', { evaluate, pause });
    const { month } = toldMonth(doc.room.airTempC, whole);
    const kwh = (document: typeof doc) => evaluate(document, { year: true }).year.months[month - 1]!.energyKwh.total;
    ways.forEach((way) => expect(way.monthKwh).toBeCloseTo(kwh(applyWayOut(doc, way)) - kwh(doc), 9));
    expect([...ways].sort((a, b) => a.monthKwh! - b.monthKwh!)).toEqual(ways);
  });

  it("never pass the crop's longest day", async () => {
    const short = structuredClone(doc);
    short.tiers[0]!.target = { ...short.tiers[0]!.target!, photoperiodMaxH: 15 };
    const ways = await waysOut(short, whole, 'low', { evaluate, pause });
    ways.forEach((way) => expect(way.hours?.to ?? 0).toBeLessThanOrEqual(15));
  });

  it('turn a tier that gets too much down, and save energy', async () => {
    const bright = setLampOutput(
      {
        ...doc,
        tiers: doc.tiers.map((tier) => ({
          ...tier,
          target: { ...tier.target!, dliLowMolM2D: 3, dliTargetMolM2D: 4, dliHighMolM2D: 5 },
        })),
      },
      ['lamp-2', 'lamp-3'],
      1,
    );
    const ways = await waysOut(bright, evaluate(bright, { year: true }), 'low', { evaluate, pause });
    expect(ways.length).toBeGreaterThan(0);
    ways.forEach((way) => expect(way.dliMolM2D).toBeLessThanOrEqual(5));
  });

  it('are none for a tier inside its band, and none after an abort', async () => {
    expect(await waysOut(doc, whole, 'high', { evaluate, pause })).toEqual([]);
    const stop = new AbortController();
    stop.abort();
    expect(await waysOut(doc, whole, 'low', { evaluate, pause, signal: stop.signal })).toEqual([]);
  });
});

describe('the rail of a held lamp', () => {
  it('brackets the heights at which the tier truly is inside its band', () => {
    const full = setLampOutput(doc, ['lamp-2', 'lamp-3'], 0.95);
    const range = lampRange(full, ['lamp-2', 'lamp-3']);
    const inside = heightsInside(full, { lamps: ['lamp-2', 'lamp-3'], tierId: 'low', ...range, evaluate });
    expect(inside).not.toBeNull();
    expect(inside!.fromM).toBeGreaterThanOrEqual(range.lowM - 1e-9);
    expect(inside!.toM).toBeLessThanOrEqual(range.highM + 1e-9);
  });

  it('ends clear of the leaves and of the shelf above', () => {
    const range = lampRange(doc, ['lamp-1']);
    // Roof at 1.80, 4 cm of housing, leaves at 1.28.
    expect(range.highM).toBeCloseTo(1.8 - 0.04 - 0.005 - 1.28, 6);
    expect(range.lowM).toBeCloseTo(0.05, 6);
    expect(lampRange(doc, ['lamp-2']).highM).toBeLessThan(1.09 - 0.57);
  });

  it('keeps a lamp between the walls and hangs a new one inside the tent', () => {
    expect(lampAcrossRange(doc, 'lamp-1', 'front')).toEqual({
      lowM: expect.closeTo(0.3, 9),
      highM: expect.closeTo(0.9, 9),
    });
    const [x, y, z] = placeForLamp(doc, 'low');
    expect([x, y]).toEqual([expect.closeTo(0.6, 9), expect.closeTo(0.6, 9)]);
    expect(z).toBeGreaterThan(0.57);
    expect(z).toBeLessThan(1.09);
  });
});
