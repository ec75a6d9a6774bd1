import 'server-only';

import { randomUUID } from 'node:crypto';
import { sql } from 'kysely';
import { audit } from '../audit/audit';
import { requireAllowed } from '../auth/require-allowed';
import type { GardenActor } from '../auth/session';
import { changedColumns } from '../db/changed-columns';
import { requireSame } from '../db/sent-twice';
import { inGarden, type GardenTransaction } from '../db/transactions';
import { placedFixtures } from '../fixtures/fixture.queries';
import { clash, inUse, invalid } from '../http/app-error';
import { roomById } from '../rooms/room.queries';
import { tentById } from '../tents/tent.queries';
import type { Plan } from './plan.schema';
import { problemsOfPlan } from './plan-fit';
import { linkFixtures, scenarioById, scenariosOf } from './scenario.queries';
import type { Scenario, ScenarioChange, ScenarioCopy, ScenarioInput } from './scenario.schema';
import { starterPlan } from './starter-plan';

/**
 * What no schema of the plan alone can see: everything inside this tent, every lamp one of this garden, every load on one
 * circuit. Lamps and tent are held until the plan is written, so that neither goes from under it.
 */
async function requireFits(trx: GardenTransaction, gardenId: string, tentId: string, plan: Plan): Promise<void> {
  const tent = await tentById(trx, gardenId, tentId, 'keep');
  const room = await roomById(trx, gardenId, tent.roomId);
  const placed = [...new Set(plan.placements.map((placement) => placement.fixture))];
  const fixtures = await placedFixtures(trx, gardenId, placed);
  const problems = problemsOfPlan({ plan, tent, room, fixtures });
  if (problems.length > 0) throw invalid(problems, 'The plan does not fit this tent.');
}

export async function listScenarios(actor: GardenActor, tentId: string): Promise<Scenario[]> {
  requireAllowed(actor, 'scenario.read');
  return inGarden(actor.gardenId, async (trx) => {
    await tentById(trx, actor.gardenId, tentId);
    return scenariosOf(trx, actor.gardenId, tentId);
  });
}

interface NewRow {
  scenarioId: string;
  tentId: string;
  name: string;
  note: string;
  plan: Plan;
}

async function insert(
  trx: GardenTransaction,
  actor: GardenActor,
  { scenarioId, tentId, name, note, plan }: NewRow,
  action: string,
): Promise<Scenario> {
  await requireFits(trx, actor.gardenId, tentId, plan);
  const made = await trx
    .insertInto('scenarios')
    .values({
      garden_id: actor.gardenId,
      scenario_id: scenarioId,
      tent_id: tentId,
      name,
      note,
      plan: JSON.stringify(plan),
      updated_by: actor.accountId,
    })
    .onConflict((conflict) => conflict.doNothing())
    .executeTakeFirst();
  if (made.numInsertedOrUpdatedRows) {
    await linkFixtures(trx, actor.gardenId, scenarioId, plan);
    await audit(trx, { ...actor, action, targetId: scenarioId });
  }
  const kept = await scenarioById(trx, actor.gardenId, scenarioId);
  requireSame('scenarioId', { tentId, name, note, plan }, kept);
  return kept;
}

/** Adds a scenario to a tent. Sent twice with one id, it is added once. */
export async function createScenario(
  actor: GardenActor,
  tentId: string,
  { scenarioId = randomUUID(), name, note, plan }: ScenarioInput,
): Promise<Scenario> {
  requireAllowed(actor, 'scenario.create');
  return inGarden(actor.gardenId, async (trx) => {
    const tent = await tentById(trx, actor.gardenId, tentId);
    return insert(
      trx,
      actor,
      { scenarioId, tentId, name, note, plan: plan ?? starterPlan(tent.body, 2) },
      'scenario.create',
    );
  });
}

/** Copies a scenario, or lays a plan of somebody's own beside it: what "keep both" does. */
export async function copyScenario(
  actor: GardenActor,
  fromId: string,
  { scenarioId = randomUUID(), name, plan }: ScenarioCopy,
): Promise<Scenario> {
  requireAllowed(actor, 'scenario.create');
  return inGarden(actor.gardenId, async (trx) => {
    const from = await scenarioById(trx, actor.gardenId, fromId);
    const copy = {
      scenarioId,
      tentId: from.tentId,
      name: name ?? `${from.name.slice(0, 70)}, a copy`,
      note: from.note,
      plan: plan ?? from.plan,
    };
    return insert(trx, actor, copy, 'scenario.copy');
  });
}

/** Saves a scenario against the version that was seen; a clash answers with the row as it stands and overwrites nothing. */
export async function updateScenario(
  actor: GardenActor,
  scenarioId: string,
  { version, ...change }: ScenarioChange,
): Promise<Scenario> {
  requireAllowed(actor, 'scenario.update');
  return inGarden(actor.gardenId, async (trx) => {
    const before = await scenarioById(trx, actor.gardenId, scenarioId);
    if (before.version !== version) throw clash(before);
    if (change.plan) await requireFits(trx, actor.gardenId, before.tentId, change.plan);
    const updated = await trx
      .updateTable('scenarios')
      .set({
        ...changedColumns(change),
        version: sql`version + 1`,
        updated_at: sql`now()`,
        updated_by: actor.accountId,
      })
      .where('garden_id', '=', actor.gardenId)
      .where('scenario_id', '=', scenarioId)
      .where('version', '=', version)
      .executeTakeFirst();
    if (!updated.numUpdatedRows) throw clash(await scenarioById(trx, actor.gardenId, scenarioId));
    if (change.plan) await linkFixtures(trx, actor.gardenId, scenarioId, change.plan);
    await audit(trx, { ...actor, action: 'scenario.update', targetId: scenarioId, detail: { version: version + 1 } });
    return scenarioById(trx, actor.gardenId, scenarioId);
  });
}

export async function deleteScenario(actor: GardenActor, scenarioId: string): Promise<void> {
  requireAllowed(actor, 'scenario.delete');
  await inGarden(actor.gardenId, async (trx) => {
    const { tentId } = await scenarioById(trx, actor.gardenId, scenarioId);
    // One at a time for each tent: two people who delete its last two scenarios must not both succeed.
    await tentById(trx, actor.gardenId, tentId, 'change');
    const scenario = await scenarioById(trx, actor.gardenId, scenarioId);
    const others = (await scenariosOf(trx, actor.gardenId, scenario.tentId)).filter(
      (each) => each.scenarioId !== scenarioId,
    );
    if (others.length === 0) throw inUse('A tent keeps at least one scenario. Add another first, or delete the tent.');
    // The tent's scenario in use moves on before this one goes.
    await trx
      .updateTable('tents')
      .set({ current_scenario_id: others[0]!.scenarioId })
      .where('garden_id', '=', actor.gardenId)
      .where('current_scenario_id', '=', scenarioId)
      .execute();
    await trx
      .deleteFrom('scenarios')
      .where('garden_id', '=', actor.gardenId)
      .where('scenario_id', '=', scenarioId)
      .execute();
    await audit(trx, { ...actor, action: 'scenario.delete', targetId: scenarioId, detail: { name: scenario.name } });
  });
}
