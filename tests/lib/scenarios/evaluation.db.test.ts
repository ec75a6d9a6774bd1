import { Pool } from 'pg';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { closePools } from '@/lib/db/client';
import { evaluateScenario, physicsVersion } from '@/lib/evaluation/evaluate-scenario';
import { createFixture, updateFixture } from '@/lib/fixtures/fixture.service';
import { evaluateScenarios, getEvaluatedScenario } from '@/lib/scenarios/evaluation.service';
import { documentOf, getWorkbench } from '@/lib/scenarios/garden-data';
import { listGardenOverviews } from '@/lib/scenarios/overview.service';
import { copyScenario, deleteScenario, updateScenario } from '@/lib/scenarios/scenario.service';
import { fullPlan } from '../../support/full-plan';
import { actorOf, newPerson } from '../../support/people';
import { fixtureInput, newPlannedGarden, type PlannedGarden } from '../../support/planned-garden';

const behind = new Pool({ connectionString: inject('database').superuserUrl, max: 1 });
let garden: PlannedGarden;

beforeAll(async () => {
  garden = await newPlannedGarden('Evaluations');
}, 60_000);
afterAll(async () => {
  await behind.end();
  await closePools();
});

const kept = async (scenarioId: string) =>
  (
    await behind.query<{ physics_version: string; document_hash: string; evaluated_at: Date }>(
      'select physics_version, document_hash, evaluated_at from evaluations where scenario_id = $1',
      [scenarioId],
    )
  ).rows;

const fresh = async () => copyScenario(garden.owner, garden.scenarioId, { plan: fullPlan(garden.fixtureId) });

describe('the evaluation of a scenario', () => {
  it('is what the physics says of its document, to the last bit, fresh and kept', async () => {
    const { scenarioId } = await fresh();
    const expected = evaluateScenario(documentOf(await getWorkbench(garden.owner, scenarioId)));
    expect((await getEvaluatedScenario(garden.owner, scenarioId)).evaluation).toEqual(expected);
    expect(await kept(scenarioId)).toMatchObject([{ physics_version: physicsVersion }]);
    expect((await getEvaluatedScenario(garden.owner, scenarioId)).evaluation).toEqual(expected);
  });

  it('is kept once and read again as long as nothing that it rests on changes', async () => {
    const { scenarioId } = await fresh();
    await getEvaluatedScenario(garden.owner, scenarioId);
    await behind.query(`update evaluations set result = '{"marked": true}' where scenario_id = $1`, [scenarioId]);
    expect((await getEvaluatedScenario(garden.owner, scenarioId)).evaluation).toEqual({ marked: true });
  });

  it('is made anew when the plan, a lamp or the physics changes', async () => {
    const { fixtureId } = await createFixture(garden.owner, fixtureInput);
    const { scenarioId } = await copyScenario(garden.owner, garden.scenarioId, { plan: fullPlan(fixtureId) });
    const light = async () =>
      (await getEvaluatedScenario(garden.owner, scenarioId)).evaluation.tiers[0]!.dliMolM2D.mean;
    const before = await light();
    const spec = { ...fixtureInput.spec, rating: { kind: 'ppf' as const, ppfUmolS: 200 } };
    await updateFixture(garden.owner, fixtureId, { version: 1, spec });
    // Twice the photons from every lamp: twice the daily light.
    expect(await light()).toBeCloseTo(2 * before, 8);
    const { scenario } = await getWorkbench(garden.owner, scenarioId);
    await updateScenario(garden.owner, scenarioId, { version: 1, plan: { ...scenario.plan, placements: [] } });
    expect(await light()).toBe(0);
    await behind.query(`update evaluations set physics_version = 'older', result = '{}' where scenario_id = $1`, [
      scenarioId,
    ]);
    expect(await light()).toBe(0);
    expect(await kept(scenarioId)).toMatchObject([{ physics_version: physicsVersion }]);
  });

  it('does no harm when the scenario is deleted while it is reckoned', async () => {
    for (let round = 0; round < 4; round += 1) {
      const { scenarioId } = await fresh();
      const [evaluated, deleted] = await Promise.allSettled([
        getEvaluatedScenario(garden.owner, scenarioId),
        deleteScenario(garden.owner, scenarioId),
      ]);
      expect(deleted.status).toBe('fulfilled');
      if (evaluated.status === 'rejected') expect(evaluated.reason).toMatchObject({ status: 404 });
      expect(await kept(scenarioId)).toEqual([]);
    }
  });

  it('is kept once when two ask for the same scenarios in opposite order', async () => {
    const ids = [(await fresh()).scenarioId, (await fresh()).scenarioId, (await fresh()).scenarioId];
    await Promise.all([
      evaluateScenarios(garden.owner, () => ids),
      evaluateScenarios(garden.owner, () => [...ids].reverse()),
    ]);
    for (const id of ids) expect(await kept(id)).toHaveLength(1);
  });
});

describe("the overview of a person's gardens", () => {
  it("holds every tent of every garden of theirs with its scenario in use, and nobody else's", async () => {
    const other = await newPlannedGarden('Not theirs');
    const overviews = await listGardenOverviews(actorOf(garden.people.viewer, '', 'viewer'));
    expect(overviews.map(({ garden: { gardenId, role } }) => ({ gardenId, role }))).toEqual([
      { gardenId: garden.gardenId, role: 'viewer' },
    ]);
    const [{ rooms }] = overviews as [(typeof overviews)[number]];
    expect(rooms[0]!.tents).toMatchObject([{ tent: { tentId: garden.tentId }, scenarioName: 'First layout' }]);
    expect(rooms[0]!.tents[0]!.evaluation.tiers).toHaveLength(2);
    expect(JSON.stringify(overviews)).not.toContain(other.gardenId);
    expect(await listGardenOverviews(actorOf(await newPerson(), '', 'viewer'))).toEqual([]);
  });
});
