import fc from 'fast-check';
import psychrolib from 'psychrolib';
import { describe, expect, it } from 'vitest';
import {
  airVpd,
  density,
  dewPoint,
  enthalpy,
  humidityRatio,
  latentHeat,
  leafVpd,
  pressureAtAltitude,
  saturationPressure,
  saturationSlope,
  specificVolume,
  vapourPressure,
  vapourPressureOfRatio,
  wetBulb,
} from '@/physics/air/psychrometrics';

psychrolib.SetUnitSystem(psychrolib.SI);
const near = (value: number, expected: number, rel: number) =>
  expect(Math.abs(value / expected - 1), `${value} against ${expected}`).toBeLessThanOrEqual(rel);
const ratioAt = (tempC: number, relHumidityPct: number, pressurePa = 101325) =>
  humidityRatio({ vapourPa: vapourPressure({ tempC, relHumidityPct }), pressurePa });

describe('saturation pressure', () => {
  // ASHRAE Fundamentals 2017, chapter 1, table 3, read in the unit tests of a psychrometric library; 0.03 % is the table's own rounding and the fit.
  it.each([
    [5, 872.6],
    [25, 3169.7],
    [50, 12351.3],
    [100, 101418],
    [-5, 401.74],
  ])('matches ASHRAE 2017 table 3 at %s °C within 0.03 %%', (tempC, pascal) =>
    near(saturationPressure(tempC), pascal, 3e-4),
  );

  it('matches IAPWS-IF97 region 4 at 300 K within 0.03 % (recalled, recomputed)', () =>
    near(saturationPressure(26.85), 3536.58941, 3e-4));
  it('meets the triple point, 611.657 Pa, within 0.05 %', () => near(saturationPressure(0.01), 611.657, 5e-4));
  it('rises without a step where ice turns to water', () => {
    expect(Math.abs(saturationPressure(0.0101) - saturationPressure(0.01))).toBeLessThan(0.05);
    near(saturationSlope(24), 179.32, 2e-3);
  });
  it('refuses what is no temperature', () => expect(() => saturationPressure(NaN)).toThrow(/temperature/));
});

describe('moist air', () => {
  // ASHRAE 2017 chapter 1, table 1, within a pascal.
  it.each([
    [500, 95461],
    [1000, 89875],
    [4000, 61640],
    [190, 99063],
  ])('matches ASHRAE 2017 table 1 at %s m within 1 Pa', (altitudeM, pascal) =>
    expect(Math.abs(pressureAtAltitude(altitudeM) - pascal)).toBeLessThanOrEqual(1),
  );

  it('comes within 0.6 % of ASHRAE 2017 table 2, whose air is real and not ideal', () => {
    near(ratioAt(25, 100), 0.020173, 6e-3);
    near(ratioAt(5, 100), 0.005425, 6e-3);
    near(enthalpy({ tempC: 25, ratio: ratioAt(25, 100) }), 76.504, 6e-3);
  });

  it('matches the published values of the psychrometric library', () => {
    near(humidityRatio({ vapourPa: 3169.7, pressurePa: 95461 }), 0.0213603998, 1e-6);
    near(enthalpy({ tempC: 30, ratio: 0.02 }), 81.316, 1e-4);
    near(specificVolume({ tempC: 30, ratio: 0.02, pressurePa: 95461 }), 0.9408554, 1e-5);
    near(density({ tempC: 30, ratio: 0.02, pressurePa: 95461 }), 1.0841199, 1e-5);
    expect(dewPoint(vapourPressure({ tempC: 25, relHumidityPct: 80 }))).toBeCloseTo(21.3094, 3);
  });

  it('matches FAO-56 examples 3, 17 and 20, and annex 3 for latent heat', () => {
    near(saturationPressure(24.5) / 1000, 3.075, 1e-3);
    near(saturationPressure(15) / 1000, 1.705, 1e-3);
    near(saturationSlope(30.2) / 1000, 0.246, 5e-3);
    expect(saturationPressure(14.8) / 1000).toBeCloseTo(1.68, 2);
    near(latentHeat(20), 2.4538e6, 1e-4);
  });

  it('matches a thermodynamics text-book room: 5 × 5 × 3 m, 25 °C, 75 %, 100 kPa', () => {
    const vapourPa = vapourPressure({ tempC: 25, relHumidityPct: 75 });
    near(vapourPa, 2380, 5e-3);
    near(humidityRatio({ vapourPa, pressurePa: 100000 }), 0.0152, 5e-3);
  });

  it('reckons the deficit of the air and of a leaf, which may be negative', () => {
    near(airVpd({ tempC: 24, relHumidityPct: 65 }), 1.0448, 1e-3);
    near(leafVpd({ leafTempC: 22, tempC: 24, relHumidityPct: 65 }), 0.7044, 1e-3);
    expect(leafVpd({ leafTempC: 8, tempC: 10, relHumidityPct: 90 })).toBeCloseTo(-0.0324, 3);
  });

  it('agrees with psychrolib over 10,000 random states', () => {
    const state = fc.record({
      tempC: fc.double({ min: -20, max: 50, noNaN: true }),
      relHumidityPct: fc.double({ min: 1, max: 100, noNaN: true }),
      altitudeM: fc.double({ min: -400, max: 5000, noNaN: true }),
    });
    fc.assert(
      fc.property(state, ({ tempC, relHumidityPct, altitudeM }) => {
        const pressurePa = pressureAtAltitude(altitudeM);
        near(pressurePa, psychrolib.GetStandardAtmPressure(altitudeM), 1e-9);
        near(saturationPressure(tempC), psychrolib.GetSatVapPres(tempC), 1e-9);
        const ratio = ratioAt(tempC, relHumidityPct, pressurePa);
        // The library keeps humidity ratios above 1e-7.
        near(ratio, psychrolib.GetHumRatioFromRelHum(tempC, relHumidityPct / 100, pressurePa), 1e-6);
        near(density({ tempC, ratio, pressurePa }), psychrolib.GetMoistAirDensity(tempC, ratio, pressurePa), 1e-9);
        expect(Math.abs(enthalpy({ tempC, ratio }) - psychrolib.GetMoistAirEnthalpy(tempC, ratio) / 1000)).toBeLessThan(
          1e-6,
        );
        near(vapourPressureOfRatio({ ratio, pressurePa }), vapourPressure({ tempC, relHumidityPct }), 1e-9);
        // Its own tolerances: dew point 0.001 K.
        const dew = dewPoint(vapourPressure({ tempC, relHumidityPct }));
        expect(Math.abs(dew - psychrolib.GetTDewPointFromRelHum(tempC, relHumidityPct / 100))).toBeLessThan(0.003);
      }),
      { numRuns: 10_000 },
    );
  }, 60_000);

  it('finds the wet bulb that psychrolib finds, within its 0.002 K', () => {
    const state = fc.record({
      tempC: fc.double({ min: 2, max: 45, noNaN: true }),
      relHumidityPct: fc.double({ min: 5, max: 100, noNaN: true }),
    });
    fc.assert(
      fc.property(state, ({ tempC, relHumidityPct }) => {
        const expected = psychrolib.GetTWetBulbFromRelHum(tempC, relHumidityPct / 100, 101325);
        fc.pre(Math.abs(expected) > 0.1);
        expect(Math.abs(wetBulb({ tempC, relHumidityPct, pressurePa: 101325 }) - expected)).toBeLessThan(0.004);
      }),
      { numRuns: 2000 },
    );
  }, 60_000);
});
