import { describe, expect, it } from 'vitest';
import {
  addLamp,
  duplicateLamp,
  freshId,
  isMirrorPair,
  mirrorLamp,
  put,
  removeLamps,
  setLampAboveLeaves,
  setLampAcross,
  setLampHeight,
  setLampOutput,
  setLampSchedule,
  setLampSwing,
  setLampTier,
} from '@/lib/scenarios/edit-plan';
import { setExhaust, setFlood, setHeater, setPump, setSetPoints, setWater } from '@/lib/scenarios/edit-climate';
import { addTier, duplicateTier, removeTier, setTier, slideTier, tierRange } from '@/lib/scenarios/edit-rack';
import { aboveLeavesM, aimWithSwing, lampCorners, lampExtent, servedTier, swingDeg } from '@/lib/scenarios/lamp-pose';
import { twoTierTent as plan } from '../../app/section/two-tier-tent';

const clamps = { lead: 'lamp-2', ids: ['lamp-2', 'lamp-3'], view: 'front', middleM: 0.6 } as const;
const lamp = (from: typeof plan, id: string) => from.placements.find((placement) => placement.id === id)!;
const frozen = JSON.stringify(plan);

describe('edits of lamps', () => {
  it('leave the plan they were given as it was', () => {
    setLampHeight(plan, ['lamp-2'], 0.8);
    setLampSwing(plan, clamps, 10);
    removeLamps(plan, ['lamp-1']);
    slideTier(plan, 'low', 0.5);
    setHeater(plan, null);
    expect(JSON.stringify(plan)).toBe(frozen);
  });

  it('hang a lamp 24 cm above the leaves of the tier it serves: 0.45 + 0.12 + 0.24 m above the floor', () => {
    const next = setLampAboveLeaves(plan, ['lamp-2'], 0.24);
    expect(lamp(next, 'lamp-2').positionM[2]).toBeCloseTo(0.81, 10);
    expect(aboveLeavesM(lamp(next, 'lamp-2'), servedTier(lamp(next, 'lamp-2'), next.tiers))).toBeCloseTo(0.24, 10);
    expect(lamp(next, 'lamp-3')).toBe(lamp(plan, 'lamp-3'));
  });

  it('move a mirror image mirrored: 5 cm to the right on one side is 5 cm to the left on the other', () => {
    const next = setLampAcross(plan, clamps, 0.22);
    expect(lamp(next, 'lamp-2').positionM[0]).toBeCloseTo(0.22, 10);
    expect(lamp(next, 'lamp-3').positionM[0]).toBeCloseTo(0.98, 10);
  });

  it('move lamps that are no mirror images alike', () => {
    const row = setLampAcross(plan, { ...clamps, ids: ['lamp-3'], lead: 'lamp-3' }, 0.9);
    const next = setLampAcross(row, clamps, 0.27);
    expect(lamp(next, 'lamp-3').positionM[0]).toBeCloseTo(1.0, 10);
  });

  it('swing to the angle asked for and back, and a mirror image the other way', () => {
    const next = setLampSwing(plan, clamps, 30);
    expect(swingDeg(lamp(next, 'lamp-2'), 'front')).toBeCloseTo(30, 9);
    expect(swingDeg(lamp(next, 'lamp-3'), 'front')).toBeCloseTo(-30, 9);
    expect(Math.hypot(...lamp(next, 'lamp-2').aim)).toBeCloseTo(1, 12);
  });

  it('keep the swing of one plane while the other is changed', () => {
    const both = { aim: aimWithSwing({ aim: aimWithSwing({ aim: [0, 0, -1] }, 'front', 25) }, 'side', -12) };
    expect(swingDeg(both, 'front')).toBeCloseTo(25, 9);
    expect(swingDeg(both, 'side')).toBeCloseTo(-12, 9);
  });

  it('split a timer that other lamps share, and only then', () => {
    const split = setLampSchedule(plan, ['lamp-2', 'lamp-3'], { hours: 16 });
    expect(split.schedules).toHaveLength(2);
    expect(lamp(split, 'lamp-1').schedule).toBe('day');
    expect(split.schedules.find((s) => s.id === lamp(split, 'lamp-2').schedule)).toMatchObject({
      onAt: '06:00',
      hours: 16,
    });
    const all = setLampSchedule(plan, ['lamp-1', 'lamp-2', 'lamp-3'], { hours: 16 });
    expect(all.schedules).toEqual([{ id: 'day', onAt: '06:00', hours: 16 }]);
  });

  it('join a timer that already runs at those hours, and drop the one left without lamps', () => {
    const split = setLampSchedule(plan, ['lamp-2', 'lamp-3'], { hours: 16 });
    const joined = setLampSchedule(split, ['lamp-1'], { hours: 16 });
    expect(lamp(joined, 'lamp-1').schedule).toBe('day');
    const again = setLampSchedule(split, ['lamp-2'], { hours: 14 });
    expect(lamp(again, 'lamp-2').schedule).toBe('day');
    const home = setLampSchedule(again, ['lamp-3'], { hours: 14 });
    expect(home.schedules.every((s) => home.placements.some((p) => p.schedule === s.id))).toBe(true);
  });

  it('dim to zero as well, and hand a lamp to another tier at the same height above its leaves', () => {
    expect(lamp(setLampOutput(plan, ['lamp-1'], 0), 'lamp-1').dimFrac).toBe(0);
    const next = setLampTier(plan, ['lamp-2'], 'high');
    expect(lamp(next, 'lamp-2').positionM[2]).toBeCloseTo(1.12 + 0.16 + 0.36, 10);
  });

  it('give new lamps ids that no lamp has', () => {
    expect(freshId('lamp', plan.placements)).toBe('lamp-4');
    const { plan: next, id } = addLamp(plan, { fixture: 'bar', tier: 'low', positionM: [0.6, 0.6, 0.9] });
    expect(id).toBe('lamp-4');
    expect(lamp(next, id)).toMatchObject({ schedule: 'day', dimFrac: 1, aim: [0, 0, -1] });
  });

  it('mirror a lamp so that the two are a pair, and duplicate it towards the middle', () => {
    const alone = removeLamps(plan, ['lamp-3']);
    const { plan: next, id } = mirrorLamp(alone, 'lamp-2', 0.6);
    expect(isMirrorPair(lamp(next, 'lamp-2'), lamp(next, id), 'front', 0.6)).toBe(true);
    const twice = duplicateLamp(plan, 'lamp-3', { acrossM: 0.2, middleM: 0.6 });
    expect(lamp(twice.plan, twice.id).positionM[0]).toBeCloseTo(0.83, 10);
  });

  it('take a removed lamp off its circuit too', () => {
    const wired = { ...plan, circuitLoads: { c1: ['heater', 'lamp-1'] } };
    expect(removeLamps(wired, ['lamp-1']).circuitLoads).toEqual({ c1: ['heater'] });
  });
});

describe("a lamp's body", () => {
  it('is as long along its axis as the fixture and sits behind its face', () => {
    const corners = lampCorners(lamp(plan, 'lamp-1'), plan.fixtures[0]!);
    const extent = lampExtent(lamp(plan, 'lamp-1'), plan.fixtures[0]!);
    expect(extent.max[0] - extent.min[0]).toBeCloseTo(0.6, 12);
    expect(extent.max[1] - extent.min[1]).toBeCloseTo(0.5, 12);
    expect(corners.slice(0, 4).every((corner) => Math.abs(corner[2] - 1.65) < 1e-12)).toBe(true);
    expect(extent.max[2]).toBeCloseTo(1.69, 12);
  });
});

describe('edits of the rack', () => {
  const tent = plan.tent;

  it('slide a shelf only between the leaves below it and the lamps above it', () => {
    const range = tierRange(plan, 'high', tent);
    expect(range.lowM).toBeCloseTo(0.93 + 0.04 + 0.03, 6);
    expect(range.highM).toBeCloseTo(1.65 - 0.02 - 0.16, 6);
    expect(slideTier(plan, 'high', 1.2).tiers[1]!.topHeightM).toBe(1.2);
  });

  it('put a shelf into the tallest free stretch, as wide as the others', () => {
    const { plan: next, id } = addTier(plan, tent);
    const tier = next.tiers.find((candidate) => candidate.id === id)!;
    expect(tier).toMatchObject({ x0M: 0.1, x1M: 1.1 });
    expect(tier.topHeightM).toBeGreaterThan(1.12);
    expect(tier.topHeightM).toBeLessThan(1.8);
  });

  it('duplicate a tier with its lamps, and remove one with them or without', () => {
    const twice = duplicateTier(plan, 'low', tent);
    expect(twice.plan.placements.filter((placement) => placement.tier === twice.id)).toHaveLength(2);
    expect(removeTier(plan, 'low', 'remove').placements.map((p) => p.id)).toEqual(['lamp-1']);
    const kept = removeTier(plan, 'low', 'keep');
    expect(kept.placements).toHaveLength(3);
    expect(kept.placements[1]!.tier).toBeNull();
  });

  it('turn a figure back into its default by leaving it out', () => {
    const next = setTier(plan, 'low', { canopyHeightM: undefined, leafAreaIndex: 3 });
    expect('canopyHeightM' in next.tiers[0]!).toBe(false);
    expect(next.tiers[0]!.leafAreaIndex).toBe(3);
    expect(put({ a: 1, b: 2 } as { a?: number; b: number }, { a: undefined })).toEqual({ b: 2 });
  });
});

describe('edits of climate and water', () => {
  it('set the heater, take it out, and put one in with an unknown clearance', () => {
    expect(setHeater(plan, { ratedPowerW: 500 }).climate.heater).toMatchObject({ ratedPowerW: 500, clearanceM: null });
    const cold = setHeater(plan, null);
    expect(cold.climate.heater).toBeNull();
    expect(setHeater(cold, { ratedPowerW: 400 }).climate.heater).toEqual({ ratedPowerW: 400, clearanceM: null });
  });

  it('set fan, pump, floods, reservoir and set-points each alone', () => {
    expect(setExhaust(plan, { maxAirflowM3H: 90 }).climate.exhaust).toEqual({ maxAirflowM3H: 90, inputPowerW: 12 });
    expect(setPump(plan, null).water).toMatchObject({ pump: null, reservoirL: 40 });
    expect(setFlood(plan, { everyMinutes: 240 }).water!.flood).toEqual({ minutes: 10, everyMinutes: 240 });
    expect('water' in setWater(plan, null)).toBe(false);
    const warm = setSetPoints(plan, { nightTempC: 18, maxRelHumidityPct: undefined });
    expect(warm.climate).toMatchObject({ dayTempC: 21, nightTempC: 18 });
    expect('maxRelHumidityPct' in warm.climate).toBe(false);
  });
});
