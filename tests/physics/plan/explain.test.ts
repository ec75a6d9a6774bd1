import { describe, expect, it } from 'vitest';
import { evaluateScenario } from '@/physics/plan/evaluate-scenario';
import { explainFigure, type Explanation, type ExplanationTerm } from '@/physics/plan/explain';
import type { ScenarioDocument } from '@/physics/plan/scenario-document';
import { withValue } from '@/physics/plan/set-value';
import { rackScenario } from '../../support/rack-scenario';

function tent(): ScenarioDocument {
  const doc = rackScenario({ lamps: 4, tiers: 2 });
  doc.room.airTempC = { kind: 'monthly', values: [6, 6, 8, 11, 15, 18, 20, 19, 16, 12, 9, 7] };
  doc.climate.heater = { ratedPowerW: 1500, priceMinor: 4900 };
  doc.climate.exhaust = { maxAirflowM3H: 220, minAirflowM3H: 6, inputPowerW: 28, priceMinor: 8900, owned: true };
  doc.climate.circulation = { inputPowerW: 15 };
  doc.water = { pump: { inputPowerW: 25 } };
  doc.fixtures[0]!.priceMinor = 7900;
  doc.fixtures[0]!.owned = 1;
  doc.placements[1]!.tier = null;
  doc.power.circuits = [
    { id: 'c1', ratingA: 16, otherLoadsW: 200, carries: ['light', 'heater', 'exhaust', 'circulation', 'pump'] },
  ];
  return doc;
}

/** What the terms come to, one after the other as they stand on paper. */
function worked(terms: readonly ExplanationTerm[]): number {
  return terms.reduce((value, term) => {
    switch (term.operator) {
      case '−':
        return value - term.value;
      case '×':
        return value * term.value;
      case '÷':
        return value / term.value;
      default:
        return value + term.value;
    }
  }, 0);
}

const PATHS = [
  'tiers.t0.dli',
  'tiers.t1.ppfd',
  'tiers.t1.evenness',
  'tiers.t0.stray',
  'heat.coldDark.heater',
  'heat.coldDawn.heater',
  'heat.coldLight.heater',
  'heat.recommendedHeater',
  'heat.hotLight.exhaust',
  'heat.moistureAirflow.light',
  'heat.moistureAirflow.dark',
  'heat.wallDewMargin',
  'heat.freeFloat.light',
  'heat.freeFloat.dark',
  'year.months.1.energy',
  'year.months.12.cost',
  'year.energy',
  'year.cost',
  'circuits.c1.continuous',
  'upFront.cost',
  'fixtures.bar.ppf',
];

const doc = tent();
const evaluation = evaluateScenario(doc);
const open = (path: string): Explanation => explainFigure(doc, evaluation, path)!;

/** Terms that are too small to show are left out of sums over lamps. */
const LEFT_OUT: Record<string, number> = { 'tiers.t0.dli': 0.05, 'tiers.t1.ppfd': 2 };

describe('a figure that is opened', () => {
  it.each(PATHS)(
    '%s has a title, a formula, terms with their standing, sources, and what would make it surer',
    (path) => {
      const { title, formula, terms, sources, makesItSurer, result } = open(path);
      for (const text of [title, formula, makesItSurer, ...sources]) expect(text.length).toBeGreaterThan(3);
      expect(sources.length).toBeGreaterThan(0);
      expect(terms.length).toBeGreaterThan(0);
      for (const term of terms) expect(term.source.length).toBeGreaterThan(2);
      expect(Number.isFinite(result.value)).toBe(true);
    },
  );

  it.each(PATHS.filter((path) => path !== 'heat.recommendedHeater'))('%s is what its terms come to', (path) => {
    const { terms, result } = open(path);
    const room = LEFT_OUT[path] ?? 1e-6 * Math.max(1, Math.abs(result.value));
    expect(Math.abs(Math.max(path.endsWith('heater') ? 0 : -Infinity, worked(terms)) - result.value)).toBeLessThan(
      room,
    );
  });

  it('rounds the heater up to the next size that is sold, and no further', () => {
    const { terms, result } = open('heat.recommendedHeater');
    expect(worked(terms)).toBeLessThanOrEqual(result.value);
    expect(worked(terms)).toBeGreaterThan(result.value / 1.5);
  });

  it('says the figure of the evaluation', () => {
    const { heat, year, tiers, upFront } = evaluation;
    expect(open('heat.coldLight.heater').result.value).toBe(heat.coldLight.heaterW);
    expect(open('year.months.12.cost').result.value).toBe(year.months[11]!.cost);
    expect(open('tiers.t0.dli').result.value).toBe(tiers[0]!.dliMolM2D.mean);
    // Three bars to buy at 79.00, the heater at 49.00; the fan is owned.
    expect(upFront.costMinor).toBe(3 * 7900 + 4900);
    expect(open('upFront.cost').result.value).toBeCloseTo(286, 9);
  });

  it('is null where the path names no figure', () => {
    for (const path of [
      '',
      'x',
      'tiers.t9.dli',
      'tiers.t0.colour',
      'heat.nothing',
      'year.months.13.cost',
      'circuits.c9.continuous',
    ])
      expect(explainFigure(doc, evaluation, path), path).toBeNull();
  });
});

describe('its range', () => {
  it.each(PATHS)('%s lies within its own range', (path) => {
    const { range, result } = open(path);
    if (!range) return;
    const value = path === 'heat.recommendedHeater' ? worked(open(path).terms) : result.value;
    expect(range.low).toBeLessThanOrEqual(value);
    expect(range.high).toBeGreaterThanOrEqual(value);
    expect(range.widestBy.length).toBeGreaterThan(3);
  });

  it('adds independent doubts as the root of the sum of squares: two that are said, worked by hand', () => {
    const said = tent();
    // Everything else is given, so that nothing but these two is in doubt; dry, so that loss is linear in both.
    said.tent = { ...said.tent, fabricUWM2K: 4, floorUWM2K: 1.5, leakageAch: 0, floorReflectanceFrac: 0.3 };
    said.room.relHumidityPct = { kind: 'constant', value: 60 };
    said.room.slabTempC = { kind: 'constant', value: 10 };
    said.room.designTempC = 10;
    said.water = { transpiration: { kind: 'fixed', lightKgH: 0, darkKgH: 0 } };
    said.climate.exhaust = null;
    said.climate.circulation = null;
    said.fixtures[0]!.driverOutsideFrac = 0;
    for (const tier of said.tiers) Object.assign(tier, { leafAreaIndex: 1, canopyCoverFrac: 0.9 });
    said.range = { 'tent.fabricUWM2K': [3, 5], 'tent.floorUWM2K': [1, 3] };
    const { range, result } = explainFigure(said, evaluateScenario(said, { year: false }), 'heat.coldDark.heater')!;
    // 8 K × (15.84 + 2.88) m² × ± 1 W/m²K, and 8 K × 2.88 m² × −0.5 or + 1.5 W/m²K.
    const fabricW = 8 * (2 * (2.4 + 1.2) * 2.2 + 2.88);
    const floorW = 8 * 2.88;
    expect(range!.low).toBeCloseTo(result.value - Math.hypot(fabricW, 0.5 * floorW), 6);
    expect(range!.high).toBeCloseTo(result.value + Math.hypot(fabricW, 1.5 * floorW), 6);
    expect(range!.widestBy).toBe('tent.fabricUWM2K');
  });

  it('follows a doubt about the price into the cost and not into the energy', () => {
    const said = { ...tent(), range: { 'power.tariff.pricePerKwh': [0.2, 0.5] as const } };
    const first = evaluateScenario(said);
    expect(explainFigure(said, first, 'year.cost')!.range!.high).toBeGreaterThan(first.year.cost * 1.5);
    expect(explainFigure(said, first, 'year.energy')!.range).toEqual(explainFigure(doc, first, 'year.energy')!.range);
  });

  it('leaves out an end that is impossible and a path that leads nowhere', () => {
    const said = { ...tent(), range: { 'tent.widthM': [-1, 2.4] as const, 'no.such.figure': [0, 1] as const } };
    expect(() => explainFigure(said, evaluateScenario(said, { year: false }), 'heat.coldDark.heater')).not.toThrow();
  });
});

describe('a figure set by its path', () => {
  it('reaches parts, lists by number and by id, and what a series holds, and leaves the old document alone', () => {
    const before = structuredClone(doc);
    expect(withValue(doc, 'tent.fabricUWM2K', 2)!.tent.fabricUWM2K).toBe(2);
    expect(withValue(doc, 'tiers.1.leafAreaIndex', 2)!.tiers[1]!.leafAreaIndex).toBe(2);
    expect(withValue(doc, 'tiers[1].leafAreaIndex', 2)!.tiers[1]!.leafAreaIndex).toBe(2);
    expect(withValue(doc, 'tiers.t1.topHeightM', 0.7)!.tiers[1]!.topHeightM).toBe(0.7);
    expect(doc).toEqual(before);
  });

  it('is null where there is no figure', () => {
    for (const path of [
      'name',
      'tent',
      'app.x',
      'tiers.9.leafAreaIndex',
      'tiers.t9.leafAreaIndex',
      'power.tariff.kind',
      '__proto__.x',
    ])
      expect(withValue(doc, path, 1), path).toBeNull();
  });
});
