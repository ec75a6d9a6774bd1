import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import * as copyRoute from '@/app/api/v1/gardens/[gardenId]/scenarios/[scenarioId]/copy/route';
import * as documentRoute from '@/app/api/v1/gardens/[gardenId]/scenarios/[scenarioId]/document/route';
import * as evaluationRoute from '@/app/api/v1/gardens/[gardenId]/scenarios/[scenarioId]/evaluation/route';
import * as scenarioRoute from '@/app/api/v1/gardens/[gardenId]/scenarios/[scenarioId]/route';
import { closePools } from '@/lib/db/client';
import { parseScenarioDocument } from '@/lib/evaluation/problems';
import { createFixture } from '@/lib/fixtures/fixture.service';
import { createRoom } from '@/lib/rooms/room.service';
import { getWorkbench } from '@/lib/scenarios/garden-data';
import type { Plan } from '@/lib/scenarios/plan.schema';
import {
  copyScenario,
  createScenario,
  deleteScenario,
  listScenarios,
  updateScenario,
} from '@/lib/scenarios/scenario.service';
import { createTent, getTent } from '@/lib/tents/tent.service';
import { callRoute } from '../../support/call-route';
import { fullPlan } from '../../support/full-plan';
import { actorOf } from '../../support/people';
import { fixtureInput, newPlannedGarden, roomInput, type PlannedGarden } from '../../support/planned-garden';

let garden: PlannedGarden;
let other: PlannedGarden;
const as = (role: 'planner' | 'tender' | 'viewer') => actorOf(garden.people[role], garden.gardenId, role);
const fresh = (name = 'Fresh', plan?: Plan) =>
  createScenario(garden.owner, garden.tentId, { name, note: '', plan: plan ?? fullPlan(garden.fixtureId) });

beforeAll(async () => {
  garden = await newPlannedGarden('Scenarios');
  other = await newPlannedGarden('Elsewhere');
}, 60_000);
afterAll(closePools);

describe('a scenario', () => {
  it('keeps its plan exactly as it was sent, defaults left out included', async () => {
    const plan = fullPlan(garden.fixtureId);
    const scenario = await fresh('Exact', plan);
    expect((await getWorkbench(as('viewer'), scenario.scenarioId)).scenario.plan).toEqual(plan);
    expect(scenario).toMatchObject({ version: 1, updatedByName: 'Owner' });
    const bare: Plan = {
      tiers: [],
      placements: [],
      schedules: [],
      climate: { dayTempC: 20, nightTempC: 16, maxTempC: 27 },
    };
    expect((await fresh('Bare', bare)).plan).toEqual(bare);
  });

  it('is made, copied, changed and deleted by owners and planners alone', async () => {
    const { scenarioId } = await fresh();
    for (const role of ['tender', 'viewer'] as const) {
      expect((await getWorkbench(as(role), scenarioId)).can['scenario.update']).toBe(false);
      await expect(createScenario(as(role), garden.tentId, { name: 'x', note: '' })).rejects.toMatchObject({
        status: 403,
      });
      await expect(copyScenario(as(role), scenarioId, {})).rejects.toMatchObject({ status: 403 });
      await expect(updateScenario(as(role), scenarioId, { version: 1, name: 'x' })).rejects.toMatchObject({
        status: 403,
      });
      await expect(deleteScenario(as(role), scenarioId)).rejects.toMatchObject({ status: 403 });
    }
    expect(await updateScenario(as('planner'), scenarioId, { version: 1, name: 'Renamed' })).toMatchObject({
      name: 'Renamed',
      version: 2,
      updatedByName: 'planner',
    });
    await deleteScenario(as('planner'), scenarioId);
    await expect(getWorkbench(garden.owner, scenarioId)).rejects.toMatchObject({ status: 404 });
  });

  it('answers a clash of two edits with both: the row as it stands, and nothing overwritten', async () => {
    const { scenarioId, plan } = await fresh();
    const mine = { ...plan, climate: { ...plan.climate, dayTempC: 23 } };
    const first = await updateScenario(as('planner'), scenarioId, { version: 1, plan: mine });
    const response = await callRoute(scenarioRoute.PATCH, {
      as: garden.people.owner,
      params: { gardenId: garden.gardenId, scenarioId },
      body: { version: 1, plan },
    });
    expect(response.status).toBe(409);
    expect(await response.json()).toMatchObject({ type: '/problems/clash', current: first });
    expect((await getWorkbench(garden.owner, scenarioId)).scenario).toEqual(first);
  });

  it('loses none of 60 edits by six people at once: each is kept once, or told of a clash', async () => {
    const { scenarioId } = await fresh('0');
    let clashes = 0;
    const edit = async (): Promise<void> => {
      const { scenario } = await getWorkbench(garden.owner, scenarioId);
      try {
        await updateScenario(garden.owner, scenarioId, {
          version: scenario.version,
          name: String(Number(scenario.name) + 1),
        });
      } catch (error) {
        expect(error).toMatchObject({ status: 409 });
        clashes += 1;
        await edit();
      }
    };
    const person = async () => {
      for (let turn = 0; turn < 10; turn += 1) await edit();
    };
    await Promise.all(Array.from({ length: 6 }, person));
    expect((await getWorkbench(garden.owner, scenarioId)).scenario).toMatchObject({ name: '60', version: 61 });
    expect(clashes).toBeGreaterThan(0);
  });

  it('is copied with all that it holds, and the copy goes its own way', async () => {
    const from = await fresh('Panel on top');
    const copy = await copyScenario(as('planner'), from.scenarioId, {});
    expect(copy).toMatchObject({ name: 'Panel on top, a copy', plan: from.plan, tentId: from.tentId, version: 1 });
    await updateScenario(garden.owner, copy.scenarioId, { version: 1, plan: { ...copy.plan, placements: [] } });
    expect((await getWorkbench(garden.owner, from.scenarioId)).scenario).toEqual(from);
  });

  it('keeps both of two clashing plans when one is laid beside the other', async () => {
    const from = await fresh();
    const plan = { ...from.plan, placements: [] };
    const response = await callRoute(copyRoute.POST, {
      as: garden.people.planner,
      params: { gardenId: garden.gardenId, scenarioId: from.scenarioId },
      body: { name: 'Mine', plan },
    });
    expect(response.status).toBe(201);
    expect(await response.json()).toMatchObject({ name: 'Mine', plan });
    expect((await getWorkbench(garden.owner, from.scenarioId)).scenario).toEqual(from);
  });

  it('is made once from eight clicks at once with one id', async () => {
    const scenarioId = randomUUID();
    const send = () =>
      callRoute(copyRoute.POST, {
        as: garden.people.planner,
        params: { gardenId: garden.gardenId, scenarioId: garden.scenarioId },
        body: { scenarioId, name: 'Clicked' },
      });
    const statuses = (await Promise.all(Array.from({ length: 8 }, send))).map((response) => response.status);
    expect(statuses).toEqual(Array.from({ length: 8 }, () => 201));
    const made = (await listScenarios(garden.owner, garden.tentId)).filter((each) => each.name === 'Clicked');
    expect(made).toHaveLength(1);
    await expect(
      copyScenario(garden.owner, garden.scenarioId, { scenarioId, name: 'Otherwise' }),
    ).rejects.toMatchObject({ status: 422, problems: [{ path: 'scenarioId' }] });
  });
});

describe('the scenarios of a tent', () => {
  const tentOf = async () => {
    const body = { widthM: 1, depthM: 1, heightM: 1.8 };
    return createTent(garden.owner, { roomId: garden.roomId, name: 'T', body, tierCount: 1 });
  };

  it('are never all deleted: the last one stays, and says what to do instead', async () => {
    const tent = await tentOf();
    await expect(deleteScenario(garden.owner, tent.currentScenarioId!)).rejects.toMatchObject({
      status: 409,
      detail: expect.stringContaining('at least one scenario'),
    });
  });

  it('hand their place in use on when that one is deleted', async () => {
    const tent = await tentOf();
    const next = await createScenario(garden.owner, tent.tentId, { name: 'Next', note: '' });
    await deleteScenario(garden.owner, tent.currentScenarioId!);
    expect((await getTent(garden.owner, tent.tentId)).currentScenarioId).toBe(next.scenarioId);
  });

  it('keep one when two people delete the last two at one moment, 20 times', async () => {
    for (let round = 0; round < 20; round += 1) {
      const tent = await tentOf();
      const second = await createScenario(garden.owner, tent.tentId, { name: 'Second', note: '' });
      const both = await Promise.allSettled([
        deleteScenario(garden.owner, tent.currentScenarioId!),
        deleteScenario(garden.owner, second.scenarioId),
      ]);
      expect(both.map((each) => each.status).sort()).toEqual(['fulfilled', 'rejected']);
      for (const each of both) if (each.status === 'rejected') expect(each.reason).toMatchObject({ code: 'in-use' });
      const left = await listScenarios(garden.owner, tent.tentId);
      expect(left).toHaveLength(1);
      expect((await getTent(garden.owner, tent.tentId)).currentScenarioId).toBe(left[0]!.scenarioId);
    }
  });
});

describe('a plan that cannot be', () => {
  const broken: [string, (plan: Plan) => unknown, string][] = [
    [
      'a tier above the tent',
      (plan) => ({ ...plan, tiers: [{ ...plan.tiers[0]!, topHeightM: 1.9 }] }),
      'plan.tiers[0].topHeightM',
    ],
    [
      'a lamp outside',
      (plan) => ({ ...plan, placements: [{ ...plan.placements[0]!, positionM: [1.3, 0.3, 1] }] }),
      'plan.placements[0].positionM[0]',
    ],
    [
      'a lamp that nobody has',
      (plan) => ({ ...plan, placements: [{ ...plan.placements[0]!, fixture: randomUUID() }] }),
      'plan.placements[0].fixture',
    ],
    [
      'a lamp by a word',
      (plan) => ({ ...plan, placements: [{ ...plan.placements[0]!, fixture: 'constructor' }] }),
      'plan.placements[0].fixture',
    ],
    ['a schedule that is not there', (plan) => ({ ...plan, schedules: [] }), 'plan.placements[0].schedule'],
    ['two tiers of one id', (plan) => ({ ...plan, tiers: [plan.tiers[0], plan.tiers[0]] }), 'plan.tiers[1].id'],
    ['a load on two circuits', (plan) => ({ ...plan, circuitLoads: { c1: ['light', 'light'] } }), 'plan.circuitLoads'],
    ['a load of no kind', (plan) => ({ ...plan, circuitLoads: { c1: ['kettle'] } }), 'plan.circuitLoads'],
    [
      'a box through the wall',
      (plan) => ({ ...plan, boxes: [{ ...plan.boxes![0]!, max: [2, 0.5, 0.3] }] }),
      'plan.boxes[0]',
    ],
    [
      'a night of 99 °C',
      (plan) => ({ ...plan, climate: { ...plan.climate, nightTempC: 99 } }),
      'plan.climate.nightTempC',
    ],
    [
      'a lamp that aims nowhere',
      (plan) => ({ ...plan, placements: [{ ...plan.placements[0]!, aim: [0, 0, 0] }] }),
      'plan.placements[0].aim',
    ],
    ['a key that is not known', (plan) => ({ ...plan, music: 'loud' }), 'plan.music'],
    [
      'nine tiers',
      (plan) => ({ ...plan, tiers: Array.from({ length: 9 }, (_, i) => ({ ...plan.tiers[0]!, id: `t${i}` })) }),
      'plan.tiers',
    ],
  ];

  it.each(broken)('with %s is told at its path, and nothing is saved', async (_, breakIt, path) => {
    const scenario = await fresh();
    const response = await callRoute(scenarioRoute.PATCH, {
      as: garden.people.owner,
      params: { gardenId: garden.gardenId, scenarioId: scenario.scenarioId },
      body: { version: 1, name: 'Broken', plan: breakIt(scenario.plan) },
    });
    expect(response.status).toBe(422);
    const { problems } = (await response.json()) as { problems: { path: string; message: string }[] };
    expect(problems.map((problem) => problem.path)).toContain(path);
    for (const problem of problems) expect(problem.message.length).toBeGreaterThan(8);
    expect((await getWorkbench(garden.owner, scenario.scenarioId)).scenario).toEqual(scenario);
  });

  it('hangs no lamp of another garden', async () => {
    const plan = fullPlan(other.fixtureId);
    await expect(fresh('Borrowed', plan)).rejects.toMatchObject({
      status: 422,
      problems: [{ path: 'plan.placements[0].fixture' }, { path: 'plan.placements[1].fixture' }],
    });
  });

  it('is refused before it is read where it is larger than 256 kB', async () => {
    const response = await callRoute(scenarioRoute.PATCH, {
      as: garden.people.owner,
      params: { gardenId: garden.gardenId, scenarioId: garden.scenarioId },
      body: { version: 1, note: 'x'.repeat(300_000) },
    });
    expect(response.status).toBe(413);
  });
});

describe('the workbench of a scenario', () => {
  it("counts on each circuit the rated watts of the other tents' scenarios in use, by hand", async () => {
    const power = {
      ...roomInput.power,
      circuits: [
        { id: 'c1', name: 'Left', ratingA: 16, otherLoadsW: 100 },
        { id: 'c2', name: 'Right', ratingA: 16 },
      ],
    };
    const { roomId } = await createRoom(garden.owner, { ...roomInput, power });
    const { fixtureId } = await createFixture(garden.owner, fixtureInput);
    const body = { widthM: 1.2, depthM: 0.6, heightM: 1.8 };
    const ours = await createTent(garden.owner, { roomId, name: 'Ours', body, tierCount: 1 });
    const theirs = await createTent(garden.owner, { roomId, name: 'Theirs', body, tierCount: 1 });
    const plan = {
      ...fullPlan(fixtureId),
      circuitLoads: { c1: ['light', 'pump'], c2: ['heater', 'exhaust', 'circulation', 'lamp-2'] },
    };
    await updateScenario(garden.owner, theirs.currentScenarioId!, { version: 1, plan });
    const bench = await getWorkbench(garden.owner, ours.currentScenarioId!);
    // c1: one bar of 40 W and the pump's 15 W; c2: heater 500, exhaust 20, circulation 10, the other bar 40.
    expect(bench.otherLoads).toEqual({ c1: 55, c2: 570 });
    // A scenario that is not in use counts for nothing.
    await createScenario(garden.owner, theirs.tentId, { name: 'Not in use', note: '', plan });
    expect((await getWorkbench(garden.owner, ours.currentScenarioId!)).otherLoads).toEqual({ c1: 55, c2: 570 });
    expect((await getWorkbench(garden.owner, theirs.currentScenarioId!)).otherLoads).toEqual({ c1: 0, c2: 0 });
    const response = await callRoute(documentRoute.GET, {
      as: garden.people.viewer,
      params: { gardenId: garden.gardenId, scenarioId: ours.currentScenarioId! },
    });
    const document = (await response.json()) as { power: { circuits: unknown } };
    expect(document.power.circuits).toMatchObject([
      { id: 'c1', otherLoadsW: 155 },
      { id: 'c2', otherLoadsW: 570 },
    ]);
  });

  it('gives a document that the command and the route of evaluations would take', async () => {
    const scenario = await fresh();
    const response = await callRoute(documentRoute.GET, {
      as: garden.people.viewer,
      params: { gardenId: garden.gardenId, scenarioId: scenario.scenarioId },
    });
    const document: unknown = await response.json();
    expect(parseScenarioDocument(document)).toMatchObject({ ok: true });
    expect(document).toMatchObject({ schema: 'scenario/1', name: 'Fresh', app: { view: 'front' } });
  });

  it('is not found from another garden, by any verb, nor told apart from one that is not there', async () => {
    const answers = [];
    for (const scenarioId of [garden.scenarioId, randomUUID()]) {
      const call = { as: other.people.owner, params: { gardenId: other.gardenId, scenarioId } };
      for (const response of [
        await callRoute(scenarioRoute.GET, call),
        await callRoute(scenarioRoute.PATCH, { ...call, body: { version: 1, name: 'Taken' } }),
        await callRoute(scenarioRoute.DELETE, { ...call, body: {} }),
        await callRoute(copyRoute.POST, { ...call, body: {} }),
        await callRoute(evaluationRoute.GET, call),
        await callRoute(documentRoute.GET, call),
      ])
        answers.push(`${response.status} ${await response.text()}`);
    }
    expect(new Set(answers).size).toBe(1);
    expect(answers[0]).toMatch(/^404 /);
  });
});
