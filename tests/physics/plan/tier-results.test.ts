import { describe, expect, it } from 'vitest';
import { evaluateScenario } from '@/physics/plan/evaluate-scenario';
import type { ScenarioDocument } from '@/physics/plan/scenario-document';
import { verdictOf } from '@/physics/plan/tier-results';
import { rackScenario } from '../../support/rack-scenario';

const tiersOf = (doc: ScenarioDocument) => evaluateScenario(doc, { year: false }).tiers;

/** Two tiers, a lamp over each; the upper one's burns from `onAt` for `hours`. */
function two(onAt: string, hours: number): ScenarioDocument {
  const doc = rackScenario({ lamps: 2, tiers: 2 });
  doc.schedules.push({ id: 'other', onAt, hours });
  doc.placements[1]!.schedule = 'other';
  return doc;
}

describe('a tier’s day', () => {
  it('DLI is each placement’s PPFD over its own hours × 0.0036 (ANSI/ASABE S640)', () => {
    for (const tier of tiersOf(two('20:00', 5))) {
      const [first, second] = tier.byPlacement;
      expect(tier.dliMolM2D.mean).toBeCloseTo(0.0036 * (16 * first!.meanPpfdUmolM2S + 5 * second!.meanPpfdUmolM2S), 9);
    }
  });

  it('is the union of the schedules that name it, through midnight too', () => {
    const doc = two('20:00', 5);
    doc.placements[1]!.tier = 't0';
    // 06:00 to 22:00 and 20:00 to 01:00: 19 h.
    expect(tiersOf(doc)[0]!.photoperiodH).toBeCloseTo(19, 12);
    doc.schedules[1]!.hours = 24;
    expect(tiersOf(doc)[0]!.photoperiodH).toBe(24);
    expect(tiersOf(doc)[0]!.strayPpfdUmolM2S).toBeNull();
  });

  it('of a tier that nobody names counts lamps from 5 % of its light upwards', () => {
    const doc = two('23:00', 2);
    doc.placements[0]!.tier = 't1';
    const [lower] = tiersOf(doc);
    // The upper tier's lamp gives this tier far less than a twentieth: the day is the first lamp's alone, its light at night is stray.
    const [own, above] = lower!.byPlacement;
    expect(above!.meanPpfdUmolM2S * 2).toBeLessThan(0.05 * (own!.meanPpfdUmolM2S * 16 + above!.meanPpfdUmolM2S * 2));
    expect(lower!.photoperiodH).toBe(16);
    expect(lower!.strayPpfdUmolM2S).toBeCloseTo(above!.meanPpfdUmolM2S, 12);
    // Dim the first to nothing, and the other is all the light there is.
    doc.placements[0]!.dimFrac = 0;
    expect(tiersOf(doc)[0]!.photoperiodH).toBe(2);
    expect(tiersOf(doc)[0]!.strayPpfdUmolM2S).toBe(0);
  });

  it('stray light is the brightest dark minute, not their mean', () => {
    const doc = two('21:00', 4);
    const [lower] = tiersOf(doc);
    expect(lower!.strayPpfdUmolM2S).toBeCloseTo(lower!.byPlacement[1]!.meanPpfdUmolM2S, 12);
    doc.schedules[1]!.hours = 0.02;
    doc.schedules[1]!.onAt = '03:00';
    expect(tiersOf(doc)[0]!.strayPpfdUmolM2S).toBeCloseTo(lower!.byPlacement[1]!.meanPpfdUmolM2S, 12);
  });

  it('is short of what a lamp’s table sends behind its face, and the evaluation says so once for the lamp', () => {
    const doc = rackScenario({ lamps: 2, tiers: 2 });
    const beyond = () => evaluateScenario(doc, { year: false }).warnings.filter((text) => text.includes('beyond 90°'));
    expect(beyond()).toEqual([]);
    for (const fixture of doc.fixtures) fixture.distribution = { type: 'table', gammaDeg: [0, 120], intensity: [1, 1] };
    expect(beyond()).toHaveLength(new Set(doc.placements.map((placement) => placement.fixture)).size);
  });

  it('without a lamp has no light, no day, and darkness that is dark', () => {
    const doc = rackScenario({ lamps: 2, tiers: 2 });
    doc.placements = [];
    for (const tier of tiersOf(doc)) {
      expect(tier.dliMolM2D.mean).toBe(0);
      expect(tier.photoperiodH).toBe(0);
      expect(tier.strayPpfdUmolM2S).toBe(0);
      expect(tier.verdict).toBe('none');
    }
  });
});

describe('verdict', () => {
  const target = { dliLowMolM2D: 12, dliHighMolM2D: 17 };
  it.each([
    [11.999, 'below'],
    [12, 'inside'],
    [17, 'inside'],
    [17.001, 'above'],
  ])('%s mol of 12 to 17 is %s', (dli, verdict) => expect(verdictOf(dli, target)).toBe(verdict));
  it('is none without a target', () => expect(verdictOf(12, null)).toBe('none'));
  it('takes 0.8 and 1.2 of the target for edges that are missing, and lists them', () => {
    const doc = rackScenario({ lamps: 2, tiers: 2 });
    doc.tiers[0]!.target = { crop: 'Leaf', stage: 'any', dliTargetMolM2D: 10 };
    const { assumptions } = evaluateScenario(doc, { year: false });
    expect(assumptions.find((each) => each.path === 'tiers[0].target.dliLowMolM2D')?.value).toBe(8);
    expect(assumptions.find((each) => each.path === 'tiers[0].target.dliHighMolM2D')?.value).toBe(12);
  });
});
