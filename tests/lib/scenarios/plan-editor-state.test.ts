import { describe, expect, it } from 'vitest';
import { mergePlans, sameValue, setAtPath } from '@/lib/scenarios/merge-plans';
import { planEditorReducer, startPlanEditor, type PlanEditorAction } from '@/lib/scenarios/plan-editor-state';
import { setLampAboveLeaves, setLampOutput, setLampSchedule } from '@/lib/scenarios/edit-plan';
import { setHeater } from '@/lib/scenarios/edit-climate';
import { twoTierTent } from '../../app/section/two-tier-tent';

type Plan = typeof twoTierTent;
const run = (...actions: PlanEditorAction<Plan>[]) =>
  actions.reduce(planEditorReducer<Plan>, startPlanEditor({ plan: twoTierTent, version: 1 }));
const mine = setLampAboveLeaves(twoTierTent, ['lamp-2'], 0.3);
const theirs = setLampAboveLeaves(twoTierTent, ['lamp-2'], 0.2);
const heated = setHeater(twoTierTent, { ratedPowerW: 500 });
const apply = (plan: Plan, at = 0, label = 'edit'): PlanEditorAction<Plan> => ({ type: 'apply', plan, label, at });

describe('undo and redo', () => {
  it('go back to the very plan that was, and forward again', () => {
    const undone = run(apply(mine), { type: 'undo' });
    expect(undone.plan).toBe(twoTierTent);
    expect(undone.status).toBe('saved');
    expect(planEditorReducer(undone, { type: 'redo' }).plan).toBe(mine);
  });

  it('count quick nudges of one thing as one step, and slow ones as many', () => {
    expect(run(apply(mine, 0), apply(theirs, 200)).past).toHaveLength(1);
    expect(run(apply(mine, 0), apply(theirs, 5000)).past).toHaveLength(2);
    expect(run(apply(mine, 0, 'one'), apply(theirs, 100, 'other')).past).toHaveLength(2);
  });

  it('forget what lay ahead once something new is done', () => {
    expect(run(apply(mine), { type: 'undo' }, apply(heated, 9000)).future).toEqual([]);
  });

  it('never save or remember what is only held', () => {
    const held = run({ type: 'preview', plan: mine });
    expect(held.plan).toBe(twoTierTent);
    expect(held.status).toBe('saved');
    expect(planEditorReducer(held, { type: 'preview', plan: null }).preview).toBeNull();
  });
});

describe('saving', () => {
  it('says saved only when what was sent is what is shown', () => {
    const sent = run(apply(mine), { type: 'saving' }, apply(heated, 9000), {
      type: 'saved',
      plan: mine,
      version: 2,
      at: 1,
    });
    expect(sent.status).toBe('waiting');
    expect(sent.saved.version).toBe(2);
    expect(planEditorReducer(sent, { type: 'saved', plan: heated, version: 3, at: 2 }).status).toBe('saved');
  });

  it('keeps the plan when the server cannot be reached or refuses', () => {
    const offline = run(apply(mine), { type: 'notSaved', offline: true, problem: 'gone' });
    expect(offline).toMatchObject({ status: 'offline', plan: mine });
    expect(planEditorReducer(offline, { type: 'retry' }).status).toBe('waiting');
  });
});

describe("a clash with somebody else's change", () => {
  const met = (plan: Plan, version = 7): PlanEditorAction<Plan> => ({
    type: 'clashed',
    theirs: { plan, version },
    theirName: 'Ada',
    theirsAt: null,
  });

  it('is none where the two changed different things: both are kept and saved on top of theirs', () => {
    const state = run(apply(mine), met(heated));
    expect(state.clash).toBeNull();
    expect(state.status).toBe('waiting');
    expect(state.saved.version).toBe(7);
    expect(state.plan.climate.heater!.ratedPowerW).toBe(500);
    expect(state.plan.placements[1]!.positionM[2]).toBeCloseTo(0.87, 10);
  });

  it('shows both values of one figure, goes on with mine, and loses neither', () => {
    const state = run(apply(mine), met(theirs));
    expect(state.status).toBe('clash');
    expect(state.clash!.conflicts.map((conflict) => conflict.path)).toEqual(['placements.lamp-2.positionM']);
    expect(state.plan.placements[1]!.positionM[2]).toBeCloseTo(0.87, 10);
    const kept = planEditorReducer(state, { type: 'choose', path: 'placements.lamp-2.positionM', whose: 'mine' });
    expect(kept).toMatchObject({ clash: null, status: 'waiting' });
    const taken = planEditorReducer(state, { type: 'choose', path: 'placements.lamp-2.positionM', whose: 'theirs' });
    expect(taken.plan.placements[1]!.positionM[2]).toBeCloseTo(0.77, 10);
    expect(planEditorReducer(taken, { type: 'undo' }).plan.placements[1]!.positionM[2]).toBeCloseTo(0.87, 10);
  });

  it('comes back after a reload: the draft keeps what it was made on until the clash is settled', () => {
    const state = run(apply(mine), met(theirs));
    expect(state.draftBase.version).toBe(1);
    const reloaded = [
      { type: 'saved', plan: state.draftBase.plan, version: 1, at: 0 },
      { type: 'restore', plan: state.plan },
      met(theirs),
    ].reduce(
      (from, action) => planEditorReducer<Plan>(from, action as PlanEditorAction<Plan>),
      startPlanEditor({ plan: theirs, version: 7 }),
    );
    expect(reloaded.clash!.conflicts).toHaveLength(1);
    const settled = planEditorReducer(state, { type: 'choose', path: 'placements.lamp-2.positionM', whose: 'mine' });
    expect(settled.draftBase.version).toBe(7);
  });

  it('stays open while editing goes on, so that nothing is saved over theirs unseen', () => {
    const state = run(apply(mine), met(theirs), apply(setLampOutput(mine, ['lamp-1'], 0.5), 9000));
    expect(state.status).toBe('clash');
  });
});

describe('the three-way merge', () => {
  it('keeps a lamp that one added and drops one that the other removed', () => {
    const added = {
      ...twoTierTent,
      placements: [...twoTierTent.placements, { ...twoTierTent.placements[0]!, id: 'lamp-9' }],
    };
    const removed = { ...twoTierTent, placements: twoTierTent.placements.slice(1) };
    const { merged, conflicts } = mergePlans(twoTierTent, added, removed);
    expect(merged.placements.map((lamp) => lamp.id)).toEqual(['lamp-2', 'lamp-3', 'lamp-9']);
    expect(conflicts).toEqual([]);
  });

  it('lays two edits of one lamp together where they touch different figures', () => {
    const dimmed = setLampOutput(twoTierTent, ['lamp-2'], 0.4);
    const { merged, conflicts } = mergePlans(twoTierTent, mine, dimmed);
    expect(conflicts).toEqual([]);
    expect(merged.placements[1]).toMatchObject({ dimFrac: 0.4 });
    expect(merged.placements[1]!.positionM[2]).toBeCloseTo(0.87, 10);
  });

  it('gives what was there when nobody or both did the same', () => {
    expect(mergePlans(twoTierTent, twoTierTent, twoTierTent).merged).toEqual(twoTierTent);
    const same = setLampSchedule(twoTierTent, ['lamp-1'], { hours: 12 });
    expect(mergePlans(twoTierTent, same, structuredClone(same)).merged).toEqual(same);
  });

  it('writes a chosen value back to its path', () => {
    const next = setAtPath(twoTierTent, 'placements.lamp-2.dimFrac', 0.1);
    expect(next.placements[1]!.dimFrac).toBe(0.1);
    expect(sameValue(next.placements[0], twoTierTent.placements[0])).toBe(true);
    expect(setAtPath(twoTierTent, 'placements.lamp-1', undefined).placements).toHaveLength(2);
  });
});
