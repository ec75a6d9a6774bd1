import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import * as cropsRoute from '@/app/api/v1/crops/route';
import * as targetRoute from '@/app/api/v1/gardens/[gardenId]/targets/[targetId]/route';
import * as targetsRoute from '@/app/api/v1/gardens/[gardenId]/targets/route';
import { closePools } from '@/lib/db/client';
import { getWorkbench } from '@/lib/scenarios/garden-data';
import { updateScenario } from '@/lib/scenarios/scenario.service';
import { createTarget, deleteTarget, listTargets, updateTarget } from '@/lib/targets/target.service';
import { callRoute } from '../../support/call-route';
import { actorOf } from '../../support/people';
import { newPlannedGarden, type PlannedGarden } from '../../support/planned-garden';

let garden: PlannedGarden;
let other: PlannedGarden;
const as = (role: 'planner' | 'tender' | 'viewer') => actorOf(garden.people[role], garden.gardenId, role);
const lettuce = { crop: 'Lettuce, butterhead/leaf', stage: 'production' };

beforeAll(async () => {
  garden = await newPlannedGarden('Targets');
  other = await newPlannedGarden('Elsewhere');
}, 60_000);
afterAll(closePools);

async function plant(targetRef: { crop: string; stage: string } | null) {
  const { scenario } = await getWorkbench(garden.owner, garden.scenarioId);
  const [first, ...more] = scenario.plan.tiers;
  return updateScenario(garden.owner, garden.scenarioId, {
    version: scenario.version,
    plan: { ...scenario.plan, tiers: [{ ...first!, targetRef }, ...more] },
  });
}

describe('a target of the garden', () => {
  it('wins over the reference for its crop and stage, and gives way to it when deleted', async () => {
    await plant(lettuce);
    const reference = (await getWorkbench(as('viewer'), garden.scenarioId)).targets;
    expect(reference).toMatchObject([{ ...lettuce, standing: expect.not.stringMatching('own') }]);
    const own = await createTarget(as('planner'), { ...lettuce, figures: { dliTargetMolM2D: 9.5 } });
    expect((await getWorkbench(as('viewer'), garden.scenarioId)).targets).toMatchObject([
      { ...lettuce, standing: 'own', target: { dliTargetMolM2D: 9.5 } },
    ]);
    await deleteTarget(as('planner'), own.targetId);
    expect((await getWorkbench(as('viewer'), garden.scenarioId)).targets).toEqual(reference);
  });

  it('is never seen by another garden', async () => {
    const own = await createTarget(garden.owner, {
      crop: 'Canary cress',
      stage: 'production',
      figures: { dliTargetMolM2D: 8 },
    });
    const listed = await callRoute(targetsRoute.GET, { as: other.people.owner, params: { gardenId: other.gardenId } });
    expect(await listed.text()).not.toContain('Canary cress');
    const params = { gardenId: other.gardenId, targetId: own.targetId };
    for (const [handler, body] of [
      [targetRoute.PATCH, { version: 1, note: 'Taken' }],
      [targetRoute.DELETE, {}],
    ] as const)
      expect((await callRoute(handler, { as: other.people.owner, params, body })).status).toBe(404);
  });

  it('for a crop and stage that has one already is a clash with that one', async () => {
    const basil = { crop: 'Our basil', stage: 'production', figures: { dliTargetMolM2D: 12 } };
    const first = await createTarget(garden.owner, basil);
    await expect(createTarget(garden.owner, { ...basil, figures: { dliTargetMolM2D: 13 } })).rejects.toMatchObject({
      status: 409,
      current: first,
    });
    const changed = await updateTarget(garden.owner, first.targetId, { version: 1, figures: { dliTargetMolM2D: 13 } });
    expect(changed).toMatchObject({ version: 2, figures: { dliTargetMolM2D: 13 } });
    await expect(updateTarget(garden.owner, first.targetId, { version: 1, note: 'late' })).rejects.toMatchObject({
      status: 409,
      current: changed,
    });
  });

  it('of a crop that the reference does not know stays while it is planned; the refusal names the scenario', async () => {
    const cress = { crop: 'Grandmother’s cress', stage: 'production' };
    const own = await createTarget(garden.owner, { ...cress, figures: { dliTargetMolM2D: 8 } });
    await plant(cress);
    await expect(deleteTarget(garden.owner, own.targetId)).rejects.toMatchObject({
      status: 409,
      detail: expect.stringContaining('First layout'),
    });
    await plant(null);
    await deleteTarget(garden.owner, own.targetId);
    expect((await listTargets(garden.owner)).map((target) => target.targetId)).not.toContain(own.targetId);
  });

  it('is set by owners and planners alone', async () => {
    for (const role of ['tender', 'viewer'] as const)
      await expect(
        createTarget(as(role), { crop: 'x', stage: 'y', figures: { dliTargetMolM2D: 1 } }),
      ).rejects.toMatchObject({ status: 403 });
  });
});

describe('the crop reference', () => {
  it('is given to whoever is signed in, and to nobody else', async () => {
    const response = await callRoute(cropsRoute.GET, { as: other.people.viewer });
    expect(response.status).toBe(200);
    expect(((await response.json()) as unknown[]).length).toBeGreaterThan(47);
    expect((await callRoute(cropsRoute.GET, {})).status).toBe(401);
  });
});
