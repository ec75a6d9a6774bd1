import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evaluateScenario } from '@/physics/plan/evaluate-scenario';
import type { ScenarioDocument } from '@/physics/plan/scenario-document';
import { DEVICES } from '@/physics/plan/year-totals';
import { pumpPeakW } from '@/physics/plan/year';
import { rackScenario } from '../../support/rack-scenario';
import { workedTent } from '../../support/worked-tent';

const near = (value: number, expected: number, rel: number) =>
  expect(Math.abs(value - expected), `${value} against ${expected}`).toBeLessThanOrEqual(
    rel * Math.max(1e-9, Math.abs(expected)),
  );
const sum = (values: readonly number[]) => values.reduce((a, b) => a + b, 0);

/** All day long, so that the closed forms hold hour by hour. */
function alwaysLit(lampsW: number): ScenarioDocument {
  const doc = workedTent({ lampsW });
  doc.schedules[0]!.onAt = '00:00';
  doc.schedules[0]!.hours = 24;
  return doc;
}

const hourly = (of: (hour: number) => number) => ({
  kind: 'hourly' as const,
  values: Array.from({ length: 8760 }, (_, hour) => of(hour)),
});

describe('the heat of a year against closed forms', () => {
  // Load a + b·cos over the year, a = UA(T_s − T_m) − G, b = UA·A, clipped at 0; UA 74.40576 W/K, 24 °C. Integral by hand.
  it.each([
    [16, 4, 0, 5214.356],
    [16, 4, 400, 1871.085],
    [18, 6, 400, 1454.959],
  ])('room of %s °C ± %s K, %s W always on: %s kWh', (meanC, swingK, lampsW, kwh) => {
    const doc = alwaysLit(lampsW);
    doc.room.airTempC = hourly((hour) => meanC - swingK * Math.cos((2 * Math.PI * (hour + 0.5)) / 8760));
    near(evaluateScenario(doc).year.energyKwh.heater, kwh, 1e-4);
  });

  it('constant room of 15.6 °C, no lamps: 8,760 h of 625 W, 5475.07 kWh', () => {
    const doc = workedTent();
    doc.placements = [];
    near(evaluateScenario(doc).year.energyKwh.heater, 5475.07344, 1e-8);
  });

  it('a room that steps from month to month, 400 W for 16 h a day: 2933.8 kWh, January 410.54, July 83.04 (worked by hand)', () => {
    const doc = workedTent();
    const steps = [13, 12.5, 13, 14.5, 16, 18, 19.5, 20, 19, 17.5, 15.5, 14];
    const days = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31];
    doc.room.airTempC = {
      kind: 'hourly',
      values: steps.flatMap((tempC, month) => Array.from({ length: days[month]! * 24 }, () => tempC)),
    };
    const { year } = evaluateScenario(doc);
    near(year.energyKwh.heater, 2933.8, 5e-4);
    near(year.months[0]!.energyKwh.heater, 410.54, 5e-4);
    near(year.months[6]!.energyKwh.heater, 83.04, 5e-4);
  });

  it('lamps in a tent below its set-point displace the heater one for one, so their net energy is nothing', () => {
    const { year } = evaluateScenario(workedTent());
    near(year.energyKwh.light, 2336, 1e-9);
    expect(Math.abs(year.netLightEnergyKwh)).toBeLessThan(1e-6);
  });

  it('drivers outside the tent warm it no more: their share is the lamps’ net energy', () => {
    const doc = workedTent();
    doc.fixtures[0]!.driverOutsideFrac = 0.1;
    near(evaluateScenario(doc).year.netLightEnergyKwh, 233.6, 1e-6);
  });
});

describe('a heater that is too small', () => {
  // 300 W on UA 74.40576 W/K over a room of 15.6 °C: 4.0319 K; no lamps.
  it('runs all the time, and the tent slips to where its watts hold it', () => {
    const doc = workedTent();
    doc.placements = [];
    doc.climate.heater = { ratedPowerW: 300 };
    const evaluation = evaluateScenario(doc);
    const { year } = evaluation;
    near(year.energyKwh.heater, 0.3 * 8760, 1e-9);
    const slippedC = 15.6 + 300 / 74.40576;
    near(year.months[0]!.airTempC.mean, slippedC, 1e-6);
    near(year.months[0]!.unmetHeatKh, (24 - slippedC) * 744, 1e-6);
    expect(evaluation.cautions.find((each) => each.code === 'heater.short')?.text).toContain(slippedC.toFixed(1));
  });

  it('leaves a tent without a heater at its free float', () => {
    const doc = alwaysLit(400);
    doc.climate.heater = null;
    const { heat, year } = evaluateScenario(doc);
    near(year.months[3]!.airTempC.mean, heat.freeFloatTempC.light!, 1e-6);
    near(heat.freeFloatTempC.light!, 15.6 + 400 / 74.40576, 1e-9);
  });
});

/** A tent with everything: floating, heated and cooled hours, plants, pump, two lamp groups. */
function busy(): ScenarioDocument {
  const doc = rackScenario({ lamps: 4, tiers: 2 });
  doc.room.airTempC = { kind: 'monthly', values: [6, 6, 8, 11, 15, 19, 23, 22, 17, 12, 9, 7], dailySwingK: 4 };
  doc.schedules.push({ id: 'late', onAt: '18:30', hours: 9.25 });
  doc.placements[1]!.schedule = 'late';
  doc.climate.heater = { ratedPowerW: 900 };
  doc.climate.exhaust = { maxAirflowM3H: 220, minAirflowM3H: 6, inputPowerW: 28 };
  doc.climate.circulation = { inputPowerW: 15 };
  doc.water = { pump: { inputPowerW: 25 }, flood: { minutes: 10, everyMinutes: 120 } };
  return doc;
}

describe('a year of a tent with everything', () => {
  const doc = busy();
  const evaluation = evaluateScenario(doc);
  const { year } = evaluation;

  it('is the sum of its months, in energy, money, and by device', () => {
    for (const device of [...DEVICES, 'total'] as const)
      near(year.energyKwh[device], sum(year.months.map((month) => month.energyKwh[device])), 1e-12);
    near(year.cost, sum(year.months.map((month) => month.cost)), 1e-12);
    for (const part of [year, ...year.months]) {
      near(part.energyKwh.total, sum(DEVICES.map((device) => part.energyKwh[device])), 1e-12);
      near(part.cost, sum(DEVICES.map((device) => part.costByDevice[device])), 1e-9);
    }
  });

  it('burns lamps, fan and pump for exactly their hours', () => {
    near(year.energyKwh.light, (365 * (3 * 60 * 16 + 60 * 9.25)) / 1000, 1e-9);
    near(year.energyKwh.circulation, 15 * 8.76, 1e-9);
    near(year.energyKwh.pump, (25 / 12) * 8.76, 1e-9);
  });

  it('takes no more at its peak than everything together, and no less than lamps and heater on the coldest day', () => {
    const { coldLight } = evaluation.heat;
    expect(year.peakPowerW).toBeLessThanOrEqual(240 + 900 + 28 + 15 + 25);
    expect(year.peakPowerW).toBeGreaterThanOrEqual(coldLight.lampsW + Math.min(900, coldLight.heaterW));
  });

  it('keeps temperatures and humidity in order and within bounds', () => {
    for (const { airTempC, relHumidityPct, vpdKpa, waterL } of year.months) {
      expect(airTempC.min).toBeLessThanOrEqual(airTempC.mean);
      expect(airTempC.mean).toBeLessThanOrEqual(airTempC.max);
      expect(relHumidityPct.min).toBeGreaterThanOrEqual(0);
      expect(relHumidityPct.max).toBeLessThanOrEqual(100 + 1e-9);
      expect(vpdKpa.mean).toBeGreaterThanOrEqual(0);
      expect(waterL).toBeGreaterThan(0);
    }
  });

  it('costs the same at one price, at two equal prices by the clock, and on steps of one price', () => {
    const cost = (tariff: ScenarioDocument['power']['tariff']) =>
      evaluateScenario({ ...doc, power: { ...doc.power, tariff } }).year;
    const common = { currency: 'EUR', taxPct: 19, fixedPerMonth: 8 };
    const flat = cost({ ...common, kind: 'flat', pricePerKwh: 0.21 });
    const others = [
      cost({
        ...common,
        kind: 'timeOfUse',
        periods: [{ price: 0.21, from: '16:20', to: '21:00', weekdays: 'weekday' }],
        otherwise: 0.21,
      }),
      cost({ ...common, kind: 'tiered', tiers: [{ upToKwh: 100, price: 0.21 }, { price: 0.21 }] }),
    ];
    near(flat.cost, (flat.energyKwh.total * 0.21 + 12 * 8) * 1.19, 1e-9);
    for (const other of others) {
      near(other.cost, flat.cost, 1e-9);
      for (const device of DEVICES) near(other.costByDevice[device], flat.costByDevice[device], 1e-9);
    }
  });

  it('is the same again to the last bit, and its rough form within 3 % of it', () => {
    expect(evaluateScenario(busy())).toEqual(evaluation);
    near(evaluateScenario(busy(), { dayStep: 5 }).year.energyKwh.total, year.energyKwh.total, 0.03);
  });

  it('leaves light and heat alone when the year is left out', () => {
    const quick = evaluateScenario(busy(), { year: false });
    expect(quick.heat).toEqual(evaluation.heat);
    expect(quick.tiers).toEqual(evaluation.tiers);
    expect(quick.year.energyKwh.total).toBe(0);
  });
});

describe('clocks', () => {
  it('timers follow the wall through daylight saving: 16 h of lamps a day in every month but for the hour that is skipped or doubled', () => {
    const doc = workedTent();
    doc.place.timeZone = 'Europe/Oslo';
    const { months } = evaluateScenario(doc).year;
    near(months[2]!.energyKwh.light, 0.4 * 16 * 31, 1e-9);
    doc.schedules[0]!.onAt = '22:00';
    doc.schedules[0]!.hours = 8;
    const night = evaluateScenario(doc).year.months;
    // 29 March 2026 has no 02:00, 25 October has it twice.
    near(night[2]!.energyKwh.light, 0.4 * (8 * 31 - 1), 1e-9);
    near(night[9]!.energyKwh.light, 0.4 * (8 * 31 + 1), 1e-9);
  });

  it('does not mind when the lamps burn, in a room that stands still and needs heat at every hour', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 23 }), fc.integer({ min: 0, max: 59 }), (hour, minute) => {
        const doc = workedTent();
        doc.schedules[0]!.onAt = `${String(hour).padStart(2, '0')}:${String(minute).padStart(2, '0')}`;
        near(evaluateScenario(doc).year.energyKwh.total, 5475.07344, 1e-8);
      }),
      { numRuns: 10 },
    );
  });

  it('counts 8,784 hours in a leap year', () => {
    const doc = workedTent();
    doc.placements = [];
    doc.calendar = { year: 2028 };
    near(evaluateScenario(doc).year.energyKwh.heater, (5475.07344 / 365) * 366, 1e-8);
  });
});

describe('the pump’s highest five minutes', () => {
  it.each([
    [10, 120, 25],
    [5, 60, 25],
    [2, 60, 10],
    [2, 4, 15],
    [1, 1, 25],
    [0, 60, 0],
  ])('floods of %s min every %s min at 25 W: %s W', (minutes, everyMinutes, watts) =>
    expect(pumpPeakW({ pumpW: 25, flood: { minutes, everyMinutes } } as never)).toBeCloseTo(watts, 12),
  );
});

describe('a year', () => {
  it('that was not asked for has no months, so that no zero can pass for a figure', () => {
    expect(evaluateScenario(rackScenario({ lamps: 2, tiers: 2 }), { year: false }).year.months).toEqual([]);
  });
});
