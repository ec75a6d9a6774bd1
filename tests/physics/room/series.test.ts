import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { resolveScenario } from '@/physics/plan/resolve-scenario';
import { roomYear } from '@/physics/room/room-year';
import { drawIn, hourlyValues } from '@/physics/room/series';
import { daysInMonth } from '@/physics/schedule/local-year';
import { rackScenario } from '../../support/rack-scenario';

const MONTHS = Array.from({ length: 12 }, (_, month) => month);
function monthMeans(hours: Float64Array, year: number): number[] {
  let start = 0;
  return MONTHS.map((month) => {
    const length = daysInMonth(year, month + 1) * 24;
    const part = hours.subarray(start, (start += length));
    return part.reduce((sum, value) => sum + value, 0) / length;
  });
}
const months = (min: number, max: number) =>
  fc.array(fc.double({ min, max, noNaN: true }), { minLength: 12, maxLength: 12 });
const year = fc.constantFrom(2026, 2028);

describe('monthly series', () => {
  it('keep each month’s mean exactly, with a daily swing and without', () => {
    fc.assert(
      fc.property(months(-20, 35), fc.double({ min: 0, max: 15, noNaN: true }), year, (values, dailySwingK, of) => {
        const hours = hourlyValues({ kind: 'monthly', values, dailySwingK }, of);
        monthMeans(hours, of).forEach((mean, month) => expect(Math.abs(mean - values[month]!)).toBeLessThan(1e-8));
      }),
      { numRuns: 60 },
    );
  });

  it('join without a step: an hour differs from the last by no more than the steepest pair of knots asks', () => {
    const hours = hourlyValues({ kind: 'monthly', values: [4, 5, 8, 11, 14, 17, 19, 18, 15, 11, 8, 5] }, 2026);
    for (let hour = 1; hour < hours.length; hour += 1)
      expect(Math.abs(hours[hour]! - hours[hour - 1]!)).toBeLessThan(0.02);
    expect(Math.abs(hours[0]! - hours.at(-1)!)).toBeLessThan(0.02);
  });

  it('swing from peak to peak by the given kelvins, warmest at 15:00 and coldest at 03:00', () => {
    const hours = hourlyValues({ kind: 'monthly', values: MONTHS.map(() => 10), dailySwingK: 6 }, 2026);
    const day = Array.from(hours.subarray(24 * 100, 24 * 101));
    // Means of whole hours: half an hour beside the peak the cosine has lost 0.9 %.
    expect(Math.max(...day)).toBeCloseTo(10 + 3 * Math.cos(Math.PI / 24), 9);
    expect([14, 15]).toContain(day.indexOf(Math.max(...day)));
    expect([2, 3]).toContain(day.indexOf(Math.min(...day)));
    expect(day[14]).toBeCloseTo(day[15]!, 9);
  });

  it('that stand still stand still', () => {
    const hours = hourlyValues({ kind: 'monthly', values: MONTHS.map(() => 13.5) }, 2026);
    for (const value of hours) expect(value).toBeCloseTo(13.5, 9);
  });
});

describe('hourly series', () => {
  it('are taken as they are, one value an hour from midnight of 1 January', () => {
    const values = Array.from({ length: 8760 }, (_, hour) => hour % 37);
    expect(Array.from(hourlyValues({ kind: 'hourly', values }, 2026))).toEqual(values);
  });
});

describe('drawing in', () => {
  it('keeps to the bounds and to every month’s mean, and leaves alone what already does', () => {
    fc.assert(
      fc.property(months(40, 100), (values) => {
        const hours = hourlyValues({ kind: 'monthly', values }, 2026);
        const before = hours.slice();
        const drawn = drawIn(hours, 2026, { least: 0, most: 100 });
        expect(Math.max(...hours)).toBeLessThanOrEqual(100);
        monthMeans(hours, 2026).forEach((mean, month) => expect(Math.abs(mean - values[month]!)).toBeLessThan(1e-8));
        expect(drawn).toBe(Math.max(...before) > 100);
        if (!drawn) expect(hours).toEqual(before);
      }),
      { numRuns: 60 },
    );
  });
});

describe('the room of a scenario', () => {
  const scenarioOf = (value: number, pct: number) => {
    const doc = rackScenario({ lamps: 1, tiers: 1 });
    doc.room.airTempC = { kind: 'monthly', values: MONTHS.map((month) => value + month) };
    doc.room.relHumidityPct = { kind: 'constant', value: pct };
    return { doc, room: () => roomYear(resolveScenario(doc).scenario) };
  };

  it('is kept by its contents: a change in place is seen', () => {
    const { doc, room } = scenarioOf(5, 60);
    const first = room();
    expect(room()).toBe(first);
    (doc.room.airTempC as { values: number[] }).values[6] = 30;
    expect(room()).not.toBe(first);
    expect(room().hotTempC).toBeGreaterThan(first.hotTempC);
    expect(scenarioOf(5, 61).room().roomRelHumidityPct[0]).toBe(61);
  });

  it('is cold and hot at the 1st and 99th percentile of its hours', () => {
    const { coldTempC, hotTempC, roomTempC } = scenarioOf(5, 60).room();
    const below = roomTempC.filter((value) => value < coldTempC).length;
    const above = roomTempC.filter((value) => value > hotTempC).length;
    expect(below / 8760).toBeCloseTo(0.01, 3);
    expect(above / 8760).toBeCloseTo(0.01, 3);
  });
});
