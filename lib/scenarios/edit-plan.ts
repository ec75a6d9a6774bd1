/**
 * Edits of a plan's lamps. Each takes a plan and gives a new one; nothing is changed in place, so that
 * undo is a matter of keeping the old one. They work on stored plans and on scenario documents alike.
 */
import type { Vec3 } from '@/physics/light/light-documents';
import type { ClimateControl, Placement, Schedule, WaterSystem } from '@/physics/plan/scenario-document';
import { aimWithSwing, leafHeightM, servedTier, swingDeg, type RackTier, type View } from './lamp-pose';

export interface EditablePlan {
  tiers: RackTier[];
  placements: Placement[];
  schedules: Schedule[];
  climate: ClimateControl;
  water?: WaterSystem | undefined;
  circuitLoads?: Record<string, string[]> | undefined;
}

/** Lays `patch` over a thing; a key given as undefined goes away, and then means its default. */
export function put<T extends object>(thing: T, patch: Partial<T>): T {
  const next = { ...thing, ...patch };
  for (const key of Object.keys(patch) as (keyof T)[]) if (patch[key] === undefined) delete next[key];
  return next;
}

/** The first of prefix-1, prefix-2 … that is not taken. */
export function freshId(prefix: string, taken: readonly { id: string }[]): string {
  const ids = new Set(taken.map((thing) => thing.id));
  let n = 1;
  while (ids.has(`${prefix}-${n}`)) n += 1;
  return `${prefix}-${n}`;
}

function eachLamp<P extends EditablePlan>(plan: P, ids: readonly string[], change: (lamp: Placement) => Placement): P {
  const chosen = new Set(ids);
  return { ...plan, placements: plan.placements.map((lamp) => (chosen.has(lamp.id) ? change(lamp) : lamp)) };
}

const lampById = (plan: EditablePlan, id: string) => plan.placements.find((lamp) => lamp.id === id);
const withAxis = (at: Vec3, axis: 0 | 1 | 2, value: number): Vec3 =>
  [0, 1, 2].map((i) => (i === axis ? value : at[i]!)) as unknown as Vec3;
/** Millimetres are finer than anybody hangs a lamp, and keep stored numbers short. */
const tidy = (metres: number) => Math.round(metres * 1e4) / 1e4;

/** Sets the face's height above the floor. */
export function setLampHeight<P extends EditablePlan>(plan: P, ids: readonly string[], heightM: number): P {
  return eachLamp(plan, ids, (lamp) => ({ ...lamp, positionM: withAxis(lamp.positionM, 2, tidy(heightM)) }));
}

/** Sets the face's height above the leaves of the tier that each lamp serves. */
export function setLampAboveLeaves<P extends EditablePlan>(plan: P, ids: readonly string[], aboveM: number): P {
  return eachLamp(plan, ids, (lamp) => {
    const tier = servedTier(lamp, plan.tiers);
    return { ...lamp, positionM: withAxis(lamp.positionM, 2, tidy((tier ? leafHeightM(tier) : 0) + aboveM)) };
  });
}

/** True where two lamps hang as mirror images about the middle of the tent (front) or of its depth (side). */
export function isMirrorPair(one: Placement, other: Placement, view: View, middleM: number): boolean {
  const i = view === 'front' ? 0 : 1;
  const same = (a: number, b: number, within: number) => Math.abs(a - b) <= within;
  return (
    same(one.positionM[i] - middleM, middleM - other.positionM[i], 0.005) &&
    Math.abs(one.positionM[i] - middleM) > 0.01 &&
    same(swingDeg(one, view), -swingDeg(other, view), 0.5)
  );
}

export interface LampMove {
  /** The lamp that is held; the others follow. */
  lead: string;
  ids: readonly string[];
  view: View;
  /** The tent's middle across the view. */
  middleM: number;
}

/** Slides the lead lamp to a place across the view; mirror images move mirrored, others by as much. */
export function setLampAcross<P extends EditablePlan>(plan: P, move: LampMove, acrossM: number): P {
  const lead = lampById(plan, move.lead);
  if (!lead) return plan;
  const i = move.view === 'front' ? 0 : 1;
  const by = acrossM - lead.positionM[i];
  return eachLamp(plan, move.ids, (lamp) => {
    const mirrored = lamp.id !== lead.id && isMirrorPair(lead, lamp, move.view, move.middleM);
    const to = lamp.id === lead.id ? acrossM : lamp.positionM[i] + (mirrored ? -by : by);
    return { ...lamp, positionM: withAxis(lamp.positionM, i, tidy(to)) };
  });
}

/** Swings the lead lamp; mirror images swing the other way, others alike. */
export function setLampSwing<P extends EditablePlan>(plan: P, move: LampMove, deg: number): P {
  const lead = lampById(plan, move.lead);
  if (!lead) return plan;
  return eachLamp(plan, move.ids, (lamp) => {
    const mirrored = lamp.id !== lead.id && isMirrorPair(lead, lamp, move.view, move.middleM);
    return { ...lamp, aim: aimWithSwing(lamp, move.view, mirrored ? -deg : deg) };
  });
}

export function setLampOutput<P extends EditablePlan>(plan: P, ids: readonly string[], dimFrac: number): P {
  return eachLamp(plan, ids, (lamp) => ({ ...lamp, dimFrac }));
}

/** Changes the timer of these lamps only: one that others share is split first. */
export function setLampSchedule<P extends EditablePlan>(
  plan: P,
  ids: readonly string[],
  change: Partial<Pick<Schedule, 'onAt' | 'hours'>>,
): P {
  const first = lampById(plan, ids[0] ?? '');
  const old = plan.schedules.find((schedule) => schedule.id === first?.schedule);
  if (!first || !old) return plan;
  const next = { ...old, ...change };
  const chosen = new Set(ids);
  const shared = plan.placements.some((lamp) => lamp.schedule === old.id && !chosen.has(lamp.id));
  if (!shared) {
    const schedules = plan.schedules.map((schedule) => (schedule.id === old.id ? next : schedule));
    return dropIdleSchedules(eachLamp({ ...plan, schedules }, ids, (lamp) => ({ ...lamp, schedule: old.id })));
  }
  const twin = plan.schedules.find((schedule) => schedule.onAt === next.onAt && schedule.hours === next.hours);
  const id = twin?.id ?? freshId('timer', plan.schedules);
  const schedules = twin ? plan.schedules : [...plan.schedules, { ...next, id }];
  return dropIdleSchedules(eachLamp({ ...plan, schedules }, ids, (lamp) => ({ ...lamp, schedule: id })));
}

/** Timers that switch nothing go, but the last one stays for the next lamp. */
function dropIdleSchedules<P extends EditablePlan>(plan: P): P {
  const used = plan.schedules.filter((schedule) => plan.placements.some((lamp) => lamp.schedule === schedule.id));
  return { ...plan, schedules: used.length > 0 ? used : plan.schedules.slice(0, 1) };
}

export function setLampFixture<P extends EditablePlan>(plan: P, ids: readonly string[], fixture: string): P {
  return eachLamp(plan, ids, (lamp) => ({ ...lamp, fixture }));
}

/** Hands lamps to another tier and hangs them as far above its leaves as they hung before. */
export function setLampTier<P extends EditablePlan>(plan: P, ids: readonly string[], tierId: string): P {
  const to = plan.tiers.find((tier) => tier.id === tierId);
  if (!to) return plan;
  return eachLamp(plan, ids, (lamp) => {
    const from = servedTier(lamp, plan.tiers);
    const above = lamp.positionM[2] - (from ? leafHeightM(from) : 0);
    return { ...lamp, tier: tierId, positionM: withAxis(lamp.positionM, 2, tidy(leafHeightM(to) + above)) };
  });
}

export interface NewLamp {
  fixture: string;
  tier: string | null;
  positionM: Vec3;
  mount?: Placement['mount'];
}

/** Hangs a lamp, level, on the first timer there is (06:00 for 16 h where there is none). */
export function addLamp<P extends EditablePlan>(plan: P, lamp: NewLamp): { plan: P; id: string } {
  const id = freshId('lamp', plan.placements);
  const peer = plan.placements.find((other) => other.tier === lamp.tier) ?? plan.placements[0];
  const fallback = plan.schedules[0] ?? { id: 'timer-1', onAt: '06:00', hours: 16 };
  const placement: Placement = {
    id,
    fixture: lamp.fixture,
    tier: lamp.tier,
    mount: lamp.mount ?? 'hanging',
    positionM: lamp.positionM.map(tidy) as unknown as Vec3,
    aim: [0, 0, -1],
    axis: [1, 0, 0],
    dimFrac: 1,
    schedule: peer?.schedule ?? fallback.id,
  };
  const schedules = plan.schedules.length > 0 ? plan.schedules : [fallback];
  return { plan: { ...plan, schedules, placements: [...plan.placements, placement] }, id };
}

/** A second lamp like this one: at the place given, or 20 cm further to the middle. */
export function duplicateLamp<P extends EditablePlan>(
  plan: P,
  lampId: string,
  at: { acrossM: number; middleM: number },
): { plan: P; id: string } {
  const lamp = lampById(plan, lampId);
  if (!lamp) return { plan, id: lampId };
  const id = freshId('lamp', plan.placements);
  const step = lamp.positionM[0] > at.middleM ? -at.acrossM : at.acrossM;
  const copy = { ...lamp, id, positionM: withAxis(lamp.positionM, 0, tidy(lamp.positionM[0] + step)) };
  return { plan: { ...plan, placements: [...plan.placements, copy] }, id };
}

/** The lamp's mirror image about the tent's middle. */
export function mirrorLamp<P extends EditablePlan>(plan: P, lampId: string, middleM: number): { plan: P; id: string } {
  const lamp = lampById(plan, lampId);
  if (!lamp) return { plan, id: lampId };
  const id = freshId('lamp', plan.placements);
  const copy: Placement = {
    ...lamp,
    id,
    positionM: withAxis(lamp.positionM, 0, tidy(2 * middleM - lamp.positionM[0])),
    aim: aimWithSwing(lamp, 'front', -swingDeg(lamp, 'front')),
  };
  return { plan: { ...plan, placements: [...plan.placements, copy] }, id };
}

export function removeLamps<P extends EditablePlan>(plan: P, ids: readonly string[]): P {
  const gone = new Set(ids);
  const placements = plan.placements.filter((lamp) => !gone.has(lamp.id));
  const loads = plan.circuitLoads;
  const circuitLoads =
    loads &&
    Object.fromEntries(Object.entries(loads).map(([id, carried]) => [id, carried.filter((load) => !gone.has(load))]));
  return dropIdleSchedules({ ...plan, placements, ...(circuitLoads ? { circuitLoads } : {}) });
}
