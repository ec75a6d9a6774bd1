import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evaluateDocument } from '@/lib/evaluation/evaluate-document';
import { fuzzedDocument } from '@/tests/support/fuzzed-document';

const scenario = (
  JSON.parse(readFileSync('tests/truth/climate/cases.json', 'utf8')) as { cases: { scenario: object }[] }
).cases[3]!.scenario;
const scene = JSON.parse(readFileSync('tests/truth/light/p02_black_panel.json', 'utf8')) as { scene: object };

const isFiniteThroughout = (value: unknown): boolean => {
  if (typeof value === 'number') return Number.isFinite(value);
  if (Array.isArray(value)) return value.every(isFiniteThroughout);
  if (typeof value === 'object' && value !== null) return Object.values(value).every(isFiniteThroughout);
  return true;
};

describe('20,000 broken documents', () => {
  it.each([
    ['scenario/1', scenario, 10_000],
    ['light-scene/1', scene.scene, 10_000],
  ] as const)(
    '%s never crashes: it is evaluated, or each problem names path, value and range',
    (_name, document, numRuns) => {
      let refused = 0;
      fc.assert(
        fc.property(fuzzedDocument(document), (broken) => {
          const evaluated = evaluateDocument(broken);
          if (evaluated.ok) {
            expect(isFiniteThroughout(evaluated.result)).toBe(true);
            return;
          }
          refused += 1;
          expect(evaluated.problems.length).toBeGreaterThan(0);
          for (const problem of evaluated.problems) {
            expect(typeof problem.path).toBe('string');
            expect(['', 'see message']).not.toContain(problem.range);
            expect(problem.message.length).toBeGreaterThan(5);
            expect(problem).toHaveProperty('value');
            expect(problem).toHaveProperty('unit');
          }
        }),
        { numRuns },
      );
      // Most of what is broken is refused; a document in which nothing is would mean that nothing is checked.
      expect(refused).toBeGreaterThan(numRuns / 2);
    },
    240_000,
  );
});
