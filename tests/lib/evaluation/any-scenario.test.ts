import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evaluateScenario, explainFigure } from '@/lib/evaluation/evaluate-scenario';
import { parseScenarioDocument } from '@/lib/evaluation/problems';
import { anyScenario } from '../../support/any-scenario';

/** Dotted paths of every number that is none. */
function notNumbers(value: unknown, path = ''): string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [`${path} is ${value}`];
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, child]) => notNumbers(child, `${path}.${key}`));
}

const PATHS = [
  'tiers.t0.dli',
  'tiers.t0.stray',
  'heat.coldDark.heater',
  'heat.recommendedHeater',
  'heat.hotLight.exhaust',
  'heat.moistureAirflow.light',
  'heat.wallDewMargin',
  'heat.freeFloat.light',
  'circuits.c1.continuous',
  'upFront.cost',
];

describe('any scenario that the schema takes', () => {
  it('is taken by the schema, so that what follows is about valid documents', () => {
    fc.assert(
      fc.property(anyScenario, (doc) => {
        const parsed = parseScenarioDocument(JSON.parse(JSON.stringify(doc)));
        expect(parsed.ok ? [] : parsed.problems.map(({ path, message }) => `${path}: ${message}`)).toEqual([]);
      }),
      { numRuns: 500 },
    );
  });

  it('is evaluated without an error, and every figure is a number', () => {
    fc.assert(
      fc.property(anyScenario, (doc) => {
        expect(notNumbers(evaluateScenario(doc))).toEqual([]);
      }),
      { numRuns: 80 },
    );
  }, 240_000);

  it('keeps what must hold: sums, bounds, balances of the cold states', () => {
    fc.assert(
      fc.property(anyScenario, (doc) => {
        const { heat, tiers, circuits } = evaluateScenario(doc, { year: false });
        for (const state of [heat.coldDark, heat.coldDawn, heat.coldLight]) {
          const scale = 1e-9 * Math.max(1, Math.abs(state.fabricW), Math.abs(state.latentW), Math.abs(state.airW));
          expect(Math.abs(state.lossW - state.fabricW - state.floorW - state.airW - state.latentW)).toBeLessThan(scale);
          expect(state.heaterW).toBe(Math.max(0, state.lossW - state.gainW));
          expect(state.tentRelHumidityPct).toBeLessThanOrEqual(100 + 1e-9);
        }
        for (const tier of tiers) {
          expect(tier.photoperiodH).toBeLessThanOrEqual(24);
          expect(tier.dliMolM2D.min).toBeLessThanOrEqual(tier.dliMolM2D.mean + 1e-9);
          if (tier.photoperiodH === 24) expect(tier.strayPpfdUmolM2S).toBeNull();
        }
        for (const circuit of circuits) expect(circuit.continuousA).toBeLessThanOrEqual(circuit.peakA + 1e-9);
      }),
      { numRuns: 400 },
    );
  }, 120_000);

  it('lets every figure be opened without an error', () => {
    fc.assert(
      fc.property(anyScenario, (doc) => {
        const evaluation = evaluateScenario(doc, { year: false });
        for (const path of PATHS) expect(notNumbers(explainFigure(doc, evaluation, path))).toEqual([]);
      }),
      { numRuns: 25 },
    );
  }, 240_000);
});
