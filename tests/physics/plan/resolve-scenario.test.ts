import { describe, expect, it } from 'vitest';
import { defaults, type DefaultKey } from '@/physics/plan/defaults';
import { evaluateScenario } from '@/physics/plan/evaluate-scenario';
import { resolveScenario } from '@/physics/plan/resolve-scenario';
import type { ScenarioDocument } from '@/physics/plan/scenario-document';
import { sources } from '@/physics/sources';
import { rackScenario } from '../../support/rack-scenario';
import { withValue } from '@/physics/plan/set-value';

const doc = (): ScenarioDocument => rackScenario({ lamps: 2, tiers: 2 });

describe('defaults', () => {
  it('lie within their own ranges and name a source that exists', () => {
    for (const key of Object.keys(defaults) as DefaultKey[]) {
      const { value, source, why, range } = defaults[key] as (typeof defaults)[DefaultKey] & {
        range?: readonly [number, number];
      };
      expect(sources[source], key).toBeDefined();
      expect(why.length, key).toBeGreaterThan(5);
      if (range) {
        expect(range[0], key).toBeLessThanOrEqual(value);
        expect(range[1], key).toBeGreaterThanOrEqual(value);
      }
    }
  });

  it('are listed where they are used, with value, unit, source and standing', () => {
    const { scenario, assumptions } = resolveScenario(doc());
    const of = (path: string) => assumptions.find((each) => each.path === path);
    expect(of('tent.floorUWM2K')).toEqual({
      path: 'tent.floorUWM2K',
      value: 1.5,
      unit: 'W/m²K',
      source: sources.JUDGEMENT.citation,
      standing: 'judgement',
    });
    expect(scenario.tent.floorUWM2K).toBe(1.5);
    expect(of('tiers[1].leafAreaIndex')?.value).toBe(defaults['tier.leafAreaIndex'].value);
    expect(of('water.transpiration')?.value).toBe('model');
    // From films of still air with a lining of 0.5: 3.15 W/m²K (ISO 6946 film coefficients).
    expect(of('tent.fabricUWM2K')?.value as number).toBeCloseTo(3.15, 2);
  });

  it('are confirmed by writing the same figure down: the result stays, the assumption goes', () => {
    const open = doc();
    const before = evaluateScenario(open);
    const numbers = before.assumptions.filter(
      ({ path, value }) =>
        typeof value === 'number' && /^(tent|tiers|fixtures|placements)/.test(path) && path !== 'tent.fabricUWM2K',
    );
    expect(numbers.length).toBeGreaterThan(10);
    const confirmed = numbers.reduce((each, { path, value }) => withValue(each, path, value as number)!, open);
    const after = evaluateScenario(confirmed);
    for (const { path } of numbers)
      expect(
        after.assumptions.some((each) => each.path === path),
        path,
      ).toBe(false);
    expect({ ...after, assumptions: [] }).toEqual({ ...before, assumptions: [] });
  });

  it('stirred air lets the wall pass 3.6 W/m²K instead of 3.15 (film of 4 W/m²K, worked by hand)', () => {
    const stirred = doc();
    stirred.climate.circulation = { inputPowerW: 15 };
    expect(resolveScenario(stirred).scenario.tent.wallUWM2K).toBeCloseTo(3.61, 2);
  });

  it('take the year’s own 1st and 99th percentile where no coldest and hottest room is given, and say so', () => {
    const monthly = doc();
    monthly.room.airTempC = { kind: 'hourly', values: Array.from({ length: 8760 }, (_, hour) => hour / 1000) };
    const { heat, assumptions } = evaluateScenario(monthly, { year: false });
    expect(heat.coldDark.roomTempC).toBeCloseTo(0.08759, 9);
    expect(heat.hotLight.roomTempC).toBeCloseTo(8.67141, 9);
    expect(assumptions.find((each) => each.path === 'room.designTempC')?.value).toBe(heat.coldDark.roomTempC);
    monthly.room.designTempC = -3;
    const given = evaluateScenario(monthly, { year: false });
    expect(given.heat.coldDark.roomTempC).toBe(-3);
    expect(given.assumptions.some((each) => each.path === 'room.designTempC')).toBe(false);
  });

  it('of tray and leaves keep to the tent: no thicker than the room beneath, no higher than the ceiling', () => {
    const tight = doc();
    tight.tiers[0]!.topHeightM = 0.01;
    delete tight.tiers[0]!.thicknessM;
    tight.tiers[1]!.topHeightM = 2.15;
    delete tight.tiers[1]!.canopyHeightM;
    const { scenario, assumptions } = resolveScenario(tight);
    expect(scenario.tiers[0]!.thicknessM).toBe(0.01);
    expect(scenario.tiers[1]!.canopyHeightM).toBeCloseTo(0.05, 12);
    expect(assumptions.find((each) => each.path === 'tiers[0].thicknessM')?.value).toBe(0.01);
  });
});

describe('the humidity of a design day', () => {
  it('is that of the month that gives its temperature', () => {
    const rooms = doc();
    rooms.room.airTempC = { kind: 'monthly', values: [4, 5, 8, 11, 14, 17, 19, 18, 15, 11, 8, 5] };
    rooms.room.relHumidityPct = { kind: 'monthly', values: [80, 78, 70, 65, 60, 55, 50, 52, 58, 66, 74, 78] };
    rooms.room.designTempC = 4;
    rooms.room.hotDayTempC = 24;
    rooms.water = { transpiration: { kind: 'fixed', lightKgH: 0, darkKgH: 0 } };
    rooms.climate.nightTempC = 4;
    const { heat } = evaluateScenario(rooms, { year: false });
    // At the room's own temperature and without evaporation the tent's humidity is the room's: January's.
    expect(heat.coldDark.tentRelHumidityPct).toBeGreaterThan(78);
    expect(heat.coldDark.tentRelHumidityPct).toBeLessThan(82);
  });
});
