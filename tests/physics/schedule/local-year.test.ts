import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { daySegments, isOn, minuteOfDay, spansOf, unionHours } from '@/physics/schedule/clock';
import { localYear } from '@/physics/schedule/local-year';

const hoursOf = (zone: string, year: number, month: number) =>
  localYear(zone, year).filter((hour) => hour.month === month).length;

describe('the hours of a year', () => {
  it('are 8,760 or 8,784, 744, 672, 744, 720 … by month where clocks never change', () => {
    expect(localYear('Asia/Kathmandu', 2026)).toHaveLength(8760);
    expect(localYear('America/Phoenix', 2028)).toHaveLength(8784);
    const lengths = Array.from({ length: 12 }, (_, month) => hoursOf('America/Phoenix', 2026, month + 1));
    expect(lengths).toEqual([744, 672, 744, 720, 744, 720, 744, 744, 720, 744, 720, 744]);
  });

  // European Union, Directive 2000/84/EC: last Sundays of March and October; 29 March and 25 October 2026.
  it('skip 02:00 on 29 March 2026 in Oslo and have it twice on 25 October', () => {
    const year = localYear('Europe/Oslo', 2026);
    const march = year.slice((31 + 28 + 28) * 24, (31 + 28 + 29) * 24 - 1).map((hour) => hour.wallHour);
    expect(march.slice(0, 4)).toEqual([0, 1, 3, 4]);
    expect(hoursOf('Europe/Oslo', 2026, 3)).toBe(743);
    expect(hoursOf('Europe/Oslo', 2026, 10)).toBe(745);
    const october = year.filter((hour) => hour.month === 10 && hour.wallHour === 2).length;
    expect(october).toBe(32);
  });

  // US Energy Policy Act of 2005: second Sunday of March to first Sunday of November; 8 March and 1 November 2026.
  it('change in March and November in Denver, and the other way round in Hobart', () => {
    expect([hoursOf('America/Denver', 2026, 3), hoursOf('America/Denver', 2026, 11)]).toEqual([743, 721]);
    expect([hoursOf('Australia/Hobart', 2026, 4), hoursOf('Australia/Hobart', 2026, 10)]).toEqual([721, 743]);
  });

  it('begin on the right weekday: 1 January 2026 is a Thursday', () => {
    expect(localYear('Europe/Oslo', 2026)[0]).toEqual({ index: 0, month: 1, wallHour: 0, weekday: 4 });
    expect(localYear('Pacific/Apia', 2026)[12]!.weekday).toBe(4);
  });
});

const clock = fc
  .tuple(fc.integer({ min: 0, max: 23 }), fc.integer({ min: 0, max: 59 }))
  .map(([hour, minute]) => `${String(hour).padStart(2, '0')}:${String(minute).padStart(2, '0')}`);
const timer = fc.record({ onAt: clock, hours: fc.double({ min: 0, max: 24, noNaN: true }) });

describe('timers', () => {
  it('are on for exactly their hours, from their minute on, through midnight too', () => {
    fc.assert(
      fc.property(timer, ({ onAt, hours }) => {
        const spans = spansOf({ onAt, hours });
        expect(unionHours([spans])).toBeCloseTo(hours, 6);
        if (hours > 0.01) expect(isOn(spans, minuteOfDay(onAt))).toBe(true);
        if (hours < 23.9) expect(isOn(spans, (minuteOfDay(onAt) + hours * 60 + 0.01) % 1440)).toBe(false);
      }),
    );
  });

  it('together are on for no less than the longest and no more than all of them', () => {
    fc.assert(
      fc.property(fc.array(timer, { minLength: 1, maxLength: 5 }), (timers) => {
        const together = unionHours(timers.map(spansOf));
        expect(together).toBeGreaterThanOrEqual(Math.max(...timers.map((each) => each.hours)) - 1e-6);
        expect(together).toBeLessThanOrEqual(
          Math.min(
            24,
            timers.reduce((sum, each) => sum + each.hours, 0),
          ) + 1e-6,
        );
      }),
    );
  });

  it('cut the day into pieces that make a day', () => {
    fc.assert(
      fc.property(fc.array(timer, { maxLength: 5 }), (timers) => {
        const pieces = daySegments(timers.map(spansOf));
        expect(pieces.reduce((sum, { fromMin, toMin }) => sum + toMin - fromMin, 0)).toBeCloseTo(1440, 6);
        pieces.slice(1).forEach((piece, index) => expect(piece.fromMin).toBeCloseTo(pieces[index]!.toMin, 6));
      }),
    );
  });
});
