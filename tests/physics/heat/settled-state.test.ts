import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bracketedRoot } from '@/physics/heat/bracketed-root';
import { freeFloat } from '@/physics/heat/free-float';
import { hourState, type HourState } from '@/physics/heat/hour-state';
import { airflowFor, COLDEST_C, HOTTEST_C, temperatureFor } from '@/physics/heat/settled-state';
import { roomSide, tentAir, tentState, type TentModel, type WaterSource } from '@/physics/heat/tent-state';

const tent: TentModel = {
  fabricWK: 69.12,
  floorWK: 4.32,
  volumeM3: 5.76,
  leakageM3H: 2.88,
  exhaustMinM3H: 0,
  exhaustMaxM3H: 500,
  maxRelHumidityPct: 65,
  pressurePa: 101325,
};
const room = roomSide({ tempC: 15.6, relHumidityPct: 60, slabTempC: 14 }, 101325);
const dry: WaterSource = { kind: 'fixed', kgH: 0 };

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
/** Any tent within what a document may say, plants and water included. */
const anyTent = fc.record({
  tent: fc.record({
    fabricWK: number(0.5, 200),
    floorWK: number(0, 30),
    volumeM3: number(0.1, 20),
    leakageM3H: number(0, 50),
    exhaustMinM3H: number(0, 50),
    exhaustMaxM3H: fc.oneof(fc.constant(0), number(50, 1500)),
    maxRelHumidityPct: number(30, 100),
    pressurePa: number(60_000, 104_000),
  }),
  room: fc.record({ tempC: number(-20, 45), relHumidityPct: number(0, 100), slabTempC: number(-20, 40) }),
  source: fc.oneof(
    fc.record({ kind: fc.constant('fixed' as const), kgH: number(0, 3) }),
    fc.record({
      kind: fc.constant('model' as const),
      openWaterM2: number(0, 1),
      tiers: fc.array(
        fc.record({
          areaM2: number(0.1, 3),
          wetM2: number(0, 1),
          canopy: fc.record({ ppfdUmolM2S: number(0, 1200), leafAreaIndex: number(0, 6), coverFrac: number(0, 1) }),
        }),
        { maxLength: 4 },
      ),
    }),
  ),
  gainW: number(0, 3000),
  heaterRatedW: fc.oneof(fc.constant(0), number(50, 3000)),
  setTempC: number(5, 32),
  overK: number(0, 12),
});
type Any = typeof anyTent extends fc.Arbitrary<infer T> ? T : never;

function reckon({ tent: model, room: air, source, gainW, heaterRatedW, setTempC, overK }: Any): HourState {
  return hourState({
    tent: model,
    room: roomSide(air, model.pressurePa),
    source,
    gainW,
    setAir: tentAir(model, source, setTempC),
    maxAir: tentAir(model, source, setTempC + overK),
    heaterRatedW,
    exhaustMaxM3H: model.exhaustMaxM3H,
  });
}

describe('an hour in any tent', () => {
  it('is in balance: what is lost is what lamps and heater give, to 0.01 %, whatever the room and the plants', () => {
    fc.assert(
      fc.property(anyTent, (any) => {
        const { state, heaterW } = reckon(any);
        if (state.tempC <= COLDEST_C || state.tempC >= HOTTEST_C) return;
        const given = any.gainW + heaterW;
        expect(Math.abs(state.lossW - given)).toBeLessThan(1e-4 * Math.max(10, given));
      }),
      { numRuns: 4000 },
    );
  });

  it('keeps the heater within its rating, unmet and excess apart, and humidity between 0 and 100 %', () => {
    fc.assert(
      fc.property(anyTent, (any) => {
        const { state, heaterW, unmetK, overK } = reckon(any);
        expect(heaterW).toBeGreaterThanOrEqual(0);
        expect(heaterW).toBeLessThanOrEqual(any.heaterRatedW);
        expect(Math.min(unmetK, overK)).toBe(0);
        if (unmetK > 0) {
          expect(heaterW).toBe(any.heaterRatedW);
          expect(state.tempC).toBeCloseTo(any.setTempC - unmetK, 9);
        }
        if (overK > 0) expect(heaterW).toBe(0);
        expect(state.relHumidityPct).toBeGreaterThanOrEqual(0);
        expect(state.relHumidityPct).toBeLessThanOrEqual(100 + 1e-9);
        expect(state.evaporationKgH).toBeGreaterThanOrEqual(0);
        for (const value of Object.values(state))
          if (typeof value === 'number') expect(Number.isFinite(value)).toBe(true);
      }),
      { numRuns: 4000 },
    );
  });

  it('never asks more heat for more gains, a lower set-point or a thinner loss', () => {
    fc.assert(
      fc.property(anyTent, number(1, 500), number(0.1, 5), (any, moreW, lessK) => {
        const dryTent: Any = { ...any, source: { kind: 'fixed', kgH: 0 }, heaterRatedW: 1e6 };
        const needed = (of: Partial<Any>) => reckon({ ...dryTent, ...of }).heaterW;
        const now = needed({});
        const hair = 1e-6 * Math.max(1, now);
        expect(needed({ gainW: any.gainW + moreW })).toBeLessThanOrEqual(now + hair);
        expect(needed({ setTempC: any.setTempC - lessK })).toBeLessThanOrEqual(now + hair);
        if (any.room.tempC < any.setTempC)
          expect(needed({ tent: { ...any.tent, fabricWK: any.tent.fabricWK * 1.2 } })).toBeGreaterThanOrEqual(
            now - hair,
          );
      }),
      { numRuns: 1500 },
    );
  });

  it('gives back the same temperatures when every conductance and every watt is doubled', () => {
    fc.assert(
      fc.property(anyTent, (any) => {
        const base: Any = { ...any, source: { kind: 'fixed', kgH: 0 }, tent: { ...any.tent, exhaustMaxM3H: 0 } };
        const { tent: model } = base;
        const doubled: Any = {
          ...base,
          gainW: 2 * base.gainW,
          heaterRatedW: 2 * base.heaterRatedW,
          tent: {
            ...model,
            fabricWK: 2 * model.fabricWK,
            floorWK: 2 * model.floorWK,
            leakageM3H: 2 * model.leakageM3H,
            exhaustMinM3H: 2 * model.exhaustMinM3H,
          },
        };
        expect(reckon(doubled).state.tempC).toBeCloseTo(reckon(base).state.tempC, 4);
      }),
      { numRuns: 1000 },
    );
  });
});

// Exact algebra on UA 74.40576 W/K; the hand calculation takes air at 1.2 kg/m³, hence 0.002 K.
describe('the tent worked by hand, unheated', () => {
  it.each([
    [400, 20.883],
    [0, 15.5071],
  ])('settles with %s W of lamps at %s °C', (gainW, tempC) => {
    expect(Math.abs(freeFloat({ tent, room, gainW }).tempC! - tempC)).toBeLessThan(0.002);
    const found = temperatureFor({ tent, room, source: dry, heatW: gainW, lowC: -20, highC: 60 });
    expect(Math.abs(found.tempC - tempC)).toBeLessThan(0.002);
  });

  it('has no steady temperature where nothing lets the heat out, and the room’s where nothing gives any', () => {
    const closed = { ...tent, fabricWK: 0, floorWK: 0, leakageM3H: 0 };
    expect(freeFloat({ tent: closed, room, gainW: 1 }).tempC).toBeNull();
    expect(freeFloat({ tent: closed, room, gainW: 0 }).tempC).toBe(15.6);
    expect(freeFloat({ tent: { ...closed, fabricWK: 5e-324 }, room, gainW: 1 }).tempC).toBeNull();
  });
});

describe('air against heat', () => {
  const open = { ...tent, fabricWK: 0, floorWK: 0, leakageM3H: 0, exhaustMaxM3H: 0 };
  const airOf = (tempC: number) => tentAir(open, dry, tempC);

  // Q = P/(ρ·c_p·ΔT) with 1.2 kg/m³ and 1006 J/kgK; the room's own air at 20 °C and 40 % is 1.197 kg/m³ × 1016 J/kgK: 1 %.
  it.each([
    [400, 3, 397.6],
    [1000, 5, 596.4],
  ])('carries %s W off over %s K with %s m³/h', (heatW, riseK, airflow) => {
    const side = roomSide({ tempC: 20, relHumidityPct: 40, slabTempC: 20 }, 101325);
    const found = airflowFor({ tent: open, room: side, air: airOf(20 + riseK), heatW })!;
    expect(Math.abs(found / airflow - 1)).toBeLessThan(0.01);
  });

  it('takes 1.213 times the volume at 1,600 m: heat needs mass, p(0)/p(1600 m)', () => {
    const at = (pressurePa: number) =>
      airflowFor({
        tent: { ...open, pressurePa },
        room: roomSide({ tempC: 20, relHumidityPct: 0, slabTempC: 20 }, pressurePa),
        air: airOf(24),
        heatW: 500,
      })!;
    expect(at(83_523) / at(101_325)).toBeCloseTo(1.2131, 3);
  });

  it('cannot cool a tent to the temperature of its room', () => {
    expect(airflowFor({ tent: open, room, air: airOf(15.6), heatW: 100 })).toBeNull();
    expect(airflowFor({ tent: open, room, air: airOf(12), heatW: 100 })).toBeNull();
  });

  it('loses 973.5 W to one change of air a minute, 8.4 K warmer than the room (within the density of its air)', () => {
    const { airW } = tentState({ tent, room, source: dry, tempC: 24, airflowM3H: 345.6 });
    expect(Math.abs(airW / 973.5 - 1)).toBeLessThan(0.025);
  });

  it('carries off by heat and vapour what the enthalpies of both airs say, within the 3 % of the latent heat’s convention', () => {
    // Tent 24 °C at 65 %, room 15.6 °C at 60 %, 0.10 kg/h: ṁ(h_i − h_r) = 113.6 W.
    const { airW, latentW, relHumidityPct } = tentState({ tent, room, source: { kind: 'fixed', kgH: 0.1 }, tempC: 24 });
    expect(relHumidityPct).toBeCloseTo(65, 9);
    expect(Math.abs((airW + latentW) / 113.6 - 1)).toBeLessThan(0.03);
  });
});

describe('the search', () => {
  it('finds where a curve passes through zero', () => {
    fc.assert(
      fc.property(number(0.01, 5), number(-3, 3), (steep, zero) => {
        const errorAt = (x: number) => Math.expm1(steep * (x - zero));
        const root = bracketedRoot(errorAt, { low: -4, lowError: errorAt(-4), high: 4, highError: errorAt(4) }, 1e-10);
        expect(Math.abs(errorAt(root))).toBeLessThanOrEqual(1e-10);
      }),
    );
  });

  it('finds a jump where there is no zero', () => {
    const errorAt = (x: number) => (x < 0.3 ? -1 : 5);
    expect(bracketedRoot(errorAt, { low: 0, lowError: -1, high: 1, highError: 5 }, 1e-9)).toBeCloseTo(0.3, 9);
  });
});
