import 'server-only';

import { randomUUID } from 'node:crypto';
import { sql } from 'kysely';
import { audit } from '../audit/audit';
import { requireAllowed } from '../auth/require-allowed';
import type { GardenActor } from '../auth/session';
import { changedColumns } from '../db/changed-columns';
import { requireSame } from '../db/sent-twice';
import { inGarden, type GardenTransaction } from '../db/transactions';
import { clash, invalid } from '../http/app-error';
import { roomById } from '../rooms/room.queries';
import { requireScenariosFit } from '../scenarios/plan-fit.service';
import { starterPlan } from '../scenarios/starter-plan';
import { tentById, tentsOf } from './tent.queries';
import type { Tent, TentChange, TentInput } from './tent.schema';

export async function listTents(actor: GardenActor): Promise<Tent[]> {
  requireAllowed(actor, 'tent.read');
  return inGarden(actor.gardenId, (trx) => tentsOf(trx, actor.gardenId));
}

export async function getTent(actor: GardenActor, tentId: string): Promise<Tent> {
  requireAllowed(actor, 'tent.read');
  return inGarden(actor.gardenId, (trx) => tentById(trx, actor.gardenId, tentId));
}

/** Adds a tent with a first scenario to fill. Sent twice with one id, it is added once. */
export async function createTent(
  actor: GardenActor,
  { tentId = randomUUID(), roomId, name, body, tierCount }: TentInput,
): Promise<Tent> {
  requireAllowed(actor, 'tent.create');
  return inGarden(actor.gardenId, async (trx) => {
    await roomById(trx, actor.gardenId, roomId, 'keep');
    const made = await trx
      .insertInto('tents')
      .values({ garden_id: actor.gardenId, tent_id: tentId, room_id: roomId, name, body: JSON.stringify(body) })
      .onConflict((conflict) => conflict.doNothing())
      .executeTakeFirst();
    if (made.numInsertedOrUpdatedRows) {
      const scenarioId = randomUUID();
      await trx
        .insertInto('scenarios')
        .values({
          garden_id: actor.gardenId,
          scenario_id: scenarioId,
          tent_id: tentId,
          name: 'First layout',
          plan: JSON.stringify(starterPlan(body, tierCount)),
          updated_by: actor.accountId,
        })
        .execute();
      await trx
        .updateTable('tents')
        .set({ current_scenario_id: scenarioId })
        .where('garden_id', '=', actor.gardenId)
        .where('tent_id', '=', tentId)
        .execute();
      await audit(trx, { ...actor, action: 'tent.create', targetId: tentId });
    }
    const kept = await tentById(trx, actor.gardenId, tentId);
    requireSame('tentId', { roomId, name, body }, kept);
    return kept;
  });
}

export async function updateTent(
  actor: GardenActor,
  tentId: string,
  { version, roomId, currentScenarioId, ...change }: TentChange,
): Promise<Tent> {
  requireAllowed(actor, 'tent.update');
  return inGarden(actor.gardenId, async (trx) => {
    const before = await tentById(trx, actor.gardenId, tentId, 'change');
    if (before.version !== version) throw clash(before);
    if (roomId || change.body) {
      const room = await roomById(trx, actor.gardenId, roomId ?? before.roomId, 'keep');
      const path = change.body ? 'body' : 'roomId';
      const after = { ...before, body: change.body ?? before.body };
      await requireScenariosFit(trx, actor.gardenId, { tent: after, room, path });
    }
    if (currentScenarioId) await requireOwnScenario(trx, actor.gardenId, tentId, currentScenarioId);
    await trx
      .updateTable('tents')
      .set({
        ...changedColumns({ ...change, room_id: roomId, current_scenario_id: currentScenarioId }),
        version: sql`version + 1`,
        updated_at: sql`now()`,
      })
      .where('garden_id', '=', actor.gardenId)
      .where('tent_id', '=', tentId)
      .execute();
    const tent = await tentById(trx, actor.gardenId, tentId);
    await audit(trx, { ...actor, action: 'tent.update', targetId: tentId, detail: { version: tent.version } });
    return tent;
  });
}

async function requireOwnScenario(
  trx: GardenTransaction,
  gardenId: string,
  tentId: string,
  scenarioId: string,
): Promise<void> {
  const own = await trx
    .selectFrom('scenarios')
    .where('garden_id', '=', gardenId)
    .where('tent_id', '=', tentId)
    .where('scenario_id', '=', scenarioId)
    .select('scenario_id')
    .executeTakeFirst();
  if (!own)
    throw invalid([
      { path: 'currentScenarioId', message: 'This scenario belongs to another tent. Choose one of this tent.' },
    ]);
}

/** Deletes a tent with all its scenarios. */
export async function deleteTent(actor: GardenActor, tentId: string): Promise<void> {
  requireAllowed(actor, 'tent.delete');
  await inGarden(actor.gardenId, async (trx) => {
    const tent = await tentById(trx, actor.gardenId, tentId);
    await trx
      .updateTable('tents')
      .set({ current_scenario_id: null })
      .where('garden_id', '=', actor.gardenId)
      .where('tent_id', '=', tentId)
      .execute();
    await trx.deleteFrom('tents').where('garden_id', '=', actor.gardenId).where('tent_id', '=', tentId).execute();
    await audit(trx, { ...actor, action: 'tent.delete', targetId: tentId, detail: { name: tent.name } });
  });
}
