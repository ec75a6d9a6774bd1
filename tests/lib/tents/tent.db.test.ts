import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import * as tentRoute from '@/app/api/v1/gardens/[gardenId]/tents/[tentId]/route';
import * as tentsRoute from '@/app/api/v1/gardens/[gardenId]/tents/route';
import { closePools } from '@/lib/db/client';
import { getEvaluatedScenario } from '@/lib/scenarios/evaluation.service';
import { createScenario, listScenarios } from '@/lib/scenarios/scenario.service';
import { createTent, deleteTent, getTent, listTents, updateTent } from '@/lib/tents/tent.service';
import { callRoute } from '../../support/call-route';
import { actorOf } from '../../support/people';
import { newPlannedGarden, type PlannedGarden } from '../../support/planned-garden';

let garden: PlannedGarden;
let other: PlannedGarden;
const as = (role: 'planner' | 'tender' | 'viewer') => actorOf(garden.people[role], garden.gardenId, role);
const body = { widthM: 1.2, depthM: 0.6, heightM: 1.8 };
const input = () => ({ roomId: garden.roomId, name: 'Tent', body, tierCount: 2 });

beforeAll(async () => {
  garden = await newPlannedGarden('Tents');
  other = await newPlannedGarden('Elsewhere');
}, 60_000);
afterAll(closePools);

describe('a tent', () => {
  it('is made with a first scenario in use that can be evaluated at once', async () => {
    const tent = await createTent(as('planner'), { ...input(), tierCount: 3 });
    const scenarios = await listScenarios(as('viewer'), tent.tentId);
    expect(scenarios).toHaveLength(1);
    expect(tent.currentScenarioId).toBe(scenarios[0]!.scenarioId);
    expect(scenarios[0]!.plan.tiers.map((tier) => tier.name)).toEqual(['Lower', 'Middle', 'Upper']);
    const { evaluation } = await getEvaluatedScenario(as('viewer'), scenarios[0]!.scenarioId);
    expect(evaluation.tiers.map((tier) => tier.dliMolM2D.mean)).toEqual([0, 0, 0]);
    expect(evaluation.year.energyKwh.light).toBe(0);
  });

  it('is changed by owners and planners alone', async () => {
    const { tentId } = await createTent(garden.owner, input());
    for (const role of ['tender', 'viewer'] as const) {
      expect(await getTent(as(role), tentId)).toMatchObject({ name: 'Tent' });
      await expect(createTent(as(role), input())).rejects.toMatchObject({ status: 403 });
      await expect(updateTent(as(role), tentId, { version: 1, name: 'x' })).rejects.toMatchObject({ status: 403 });
      await expect(deleteTent(as(role), tentId)).rejects.toMatchObject({ status: 403 });
    }
    expect(await updateTent(as('planner'), tentId, { version: 1, name: 'Left' })).toMatchObject({ version: 2 });
  });

  it('answers a clash of two edits with the row as it stands', async () => {
    const { tentId } = await createTent(garden.owner, input());
    const first = await updateTent(garden.owner, tentId, { version: 1, body: { ...body, leakageAch: 1 } });
    await expect(
      updateTent(garden.owner, tentId, { version: 1, body: { ...body, leakageAch: 2 } }),
    ).rejects.toMatchObject({ status: 409, current: first });
  });

  it('is not made smaller than what stands in it; the refusal names the tier and the scenario', async () => {
    const tent = await createTent(garden.owner, input());
    await expect(
      updateTent(garden.owner, tent.tentId, { version: 1, body: { ...body, heightM: 0.5 } }),
    ).rejects.toMatchObject({
      status: 422,
      problems: [{ path: 'body', message: expect.stringMatching(/Upper of “First layout” would not fit/) }],
    });
    expect(await getTent(garden.owner, tent.tentId)).toEqual(tent);
    expect(await updateTent(garden.owner, tent.tentId, { version: 1, body: { ...body, heightM: 1.6 } })).toMatchObject({
      body: { heightM: 1.6 },
    });
  });

  it('is not made smaller around a scenario that somebody adds at the same moment', async () => {
    for (let round = 0; round < 8; round += 1) {
      const tent = await createTent(garden.owner, { ...input(), tierCount: 1 });
      const [first] = await listScenarios(garden.owner, tent.tentId);
      const high = { ...first!.plan, tiers: [{ ...first!.plan.tiers[0]!, topHeightM: 1.5 }] };
      const [shrunk, added] = await Promise.allSettled([
        updateTent(garden.owner, tent.tentId, { version: 1, body: { ...body, heightM: 1 } }),
        createScenario(garden.owner, tent.tentId, { name: 'High', note: '', plan: high }),
      ]);
      expect([shrunk.status, added.status].sort()).toEqual(['fulfilled', 'rejected']);
    }
  });

  it('takes only a scenario of its own into use', async () => {
    const tent = await createTent(garden.owner, input());
    const second = await createScenario(garden.owner, tent.tentId, { name: 'Second', note: '' });
    expect(
      await updateTent(garden.owner, tent.tentId, { version: 1, currentScenarioId: second.scenarioId }),
    ).toMatchObject({ currentScenarioId: second.scenarioId });
    for (const currentScenarioId of [garden.scenarioId, other.scenarioId, randomUUID()])
      await expect(updateTent(garden.owner, tent.tentId, { version: 2, currentScenarioId })).rejects.toMatchObject({
        status: 422,
        problems: [{ path: 'currentScenarioId' }],
      });
  });

  it('is deleted with its scenarios', async () => {
    const tent = await createTent(garden.owner, input());
    await deleteTent(garden.owner, tent.tentId);
    await expect(listScenarios(garden.owner, tent.tentId)).rejects.toMatchObject({ status: 404 });
    await expect(getEvaluatedScenario(garden.owner, tent.currentScenarioId!)).rejects.toMatchObject({ status: 404 });
  });

  it('is made once when sent eight times at once with one id, with one scenario', async () => {
    const tentId = randomUUID();
    await Promise.all(Array.from({ length: 8 }, () => createTent(garden.owner, { ...input(), tentId })));
    expect((await listTents(garden.owner)).filter((tent) => tent.tentId === tentId)).toHaveLength(1);
    expect(await listScenarios(garden.owner, tentId)).toHaveLength(1);
    await expect(createTent(garden.owner, { ...input(), tentId, name: 'Other' })).rejects.toMatchObject({
      status: 422,
    });
  });
});

describe('the routes of tents', () => {
  it('find no tent of another garden, and do not say that it is there', async () => {
    const answers = await Promise.all(
      [garden.tentId, randomUUID()].map(async (tentId) => {
        const params = { gardenId: other.gardenId, tentId };
        const got = await callRoute(tentRoute.GET, { as: other.people.owner, params });
        const patched = await callRoute(tentRoute.PATCH, {
          as: other.people.owner,
          params,
          body: { version: 1, name: 'Taken' },
        });
        return `${got.status} ${await got.text()} ${patched.status} ${await patched.text()}`;
      }),
    );
    expect(answers[0]).toBe(answers[1]);
    expect(answers[0]).toMatch(/^404 /);
    expect(await getTent(garden.owner, garden.tentId)).toMatchObject({ name: 'Tent' });
  });

  it('put no tent into a room of another garden', async () => {
    const response = await callRoute(tentsRoute.POST, {
      as: garden.people.owner,
      params: { gardenId: garden.gardenId },
      body: { ...input(), roomId: other.roomId },
    });
    expect(response.status).toBe(404);
  });

  it.each([
    [{ body: { ...body, widthM: 0 } }, 'body.widthM', '0.1 to 20', 'm'],
    [{ body: { ...body, heightM: '2' } }, 'body.heightM', '0.1 to 20', 'm'],
    [{ body: { ...body, liningReflectanceFrac: 1.2 } }, 'body.liningReflectanceFrac', '0 to 0.99', 'of 1'],
    [{ tierCount: 9 }, 'tierCount', '1 to 8', 'tiers'],
    [{ tierCount: 1.5 }, 'tierCount', '1 to 8', 'tiers'],
  ])('refuse %j at its path with range and unit', async (part, path, range, unit) => {
    const before = await listTents(garden.owner);
    const response = await callRoute(tentsRoute.POST, {
      as: garden.people.planner,
      params: { gardenId: garden.gardenId },
      body: { ...input(), ...part },
    });
    expect(response.status).toBe(422);
    expect(await response.json()).toMatchObject({ problems: [{ path, range, unit }] });
    expect(await listTents(garden.owner)).toEqual(before);
  });
});
