import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evaluateScenario } from '@/physics/plan/evaluate-scenario';
import { PEAK_H, PeakMean } from '@/physics/plan/peak-mean';
import { workedTent } from '../../support/worked-tent';

const peakOf = (stretches: readonly (readonly [minutes: number, powerW: number])[]) => {
  const peak = new PeakMean();
  for (const [minutes, powerW] of stretches) peak.add(minutes / 60, powerW);
  return peak.result();
};

describe('the highest five-minute mean', () => {
  it.each([
    [
      'a long stretch',
      [
        [60, 100],
        [60, 400],
        [60, 50],
      ],
      400,
    ],
    [
      'a minute of 1,000 W beside 100 W',
      [
        [60, 100],
        [1, 1000],
        [60, 100],
      ],
      (1000 + 4 * 100) / 5,
    ],
    [
      'two short ones in a row',
      [
        [60, 0],
        [2, 500],
        [3, 1000],
        [60, 0],
      ],
      (2 * 500 + 3 * 1000) / 5,
    ],
    [
      'one between unequal neighbours takes the higher',
      [
        [60, 0],
        [1, 1000],
        [60, 300],
      ],
      (1000 + 4 * 300) / 5,
    ],
  ] as const)('%s', (_what, stretches, watts) => expect(peakOf(stretches)).toBeCloseTo(watts, 9));

  it('is what a window slid second by second finds, to a second', () => {
    const stretch = fc.tuple(fc.integer({ min: 1, max: 12 }), fc.integer({ min: 0, max: 1000 }));
    fc.assert(
      fc.property(fc.array(stretch, { minLength: 3, maxLength: 12 }), (stretches) => {
        const seconds = stretches.flatMap(([minutes, powerW]) => Array.from({ length: minutes * 60 }, () => powerW));
        if (seconds.length < 300) return;
        let highest = 0;
        for (let at = 0; at + 300 <= seconds.length; at += 1) {
          let sum = 0;
          for (let s = at; s < at + 300; s += 1) sum += seconds[s]!;
          highest = Math.max(highest, sum / 300);
        }
        expect(peakOf(stretches)).toBeCloseTo(highest, 6);
      }),
      { numRuns: 200 },
    );
  });

  it('of a tent whose lamp burns for one minute a day counts that minute for a fifth', () => {
    const doc = workedTent();
    doc.climate.heater = null;
    doc.schedules[0] = { id: 'day', onAt: '06:30', hours: 1 / 60 };
    expect(evaluateScenario(doc).year.peakPowerW).toBeCloseTo(80, 6);
    expect(PEAK_H).toBeCloseTo(1 / 12, 15);
  });
});
