import 'server-only';

import { randomUUID } from 'node:crypto';
import { sql } from 'kysely';
import { audit } from '../audit/audit';
import { requireAllowed } from '../auth/require-allowed';
import type { Actor, GardenActor } from '../auth/session';
import { inGarden } from '../db/transactions';
import { clash, notFoundHere } from '../http/app-error';
import { gardenById, gardensOf } from './garden.queries';
import type { Garden, GardenChange, GardenInput } from './garden.schema';

export function listGardens(actor: Actor): Promise<Garden[]> {
  return gardensOf(actor.accountId);
}

/** Makes a garden with the actor as its owner. Sent twice with one id, it is made once. */
export async function createGarden(actor: Actor, input: GardenInput): Promise<Garden> {
  const gardenId = input.gardenId ?? randomUUID();
  return inGarden(gardenId, async (trx) => {
    const made = await trx
      .insertInto('gardens')
      .values({ garden_id: gardenId, name: input.name, currency: input.currency })
      .onConflict((conflict) => conflict.doNothing())
      .executeTakeFirst();
    if (made.numInsertedOrUpdatedRows) {
      await trx
        .insertInto('memberships')
        .values({ garden_id: gardenId, account_id: actor.accountId, role: 'owner' })
        .execute();
      await audit(trx, { gardenId, accountId: actor.accountId, action: 'garden.create', targetId: gardenId });
    }
    return ownGarden({ ...actor, gardenId, role: 'owner' }, trx);
  });
}

async function ownGarden(actor: GardenActor, trx: Parameters<Parameters<typeof inGarden>[1]>[0]): Promise<Garden> {
  const membership = await trx
    .selectFrom('memberships')
    .where('garden_id', '=', actor.gardenId)
    .where('account_id', '=', actor.accountId)
    .select('role')
    .executeTakeFirst();
  const garden = membership && (await gardenById(trx, actor.gardenId));
  if (!garden || !membership) throw notFoundHere('garden');
  return { ...garden, role: membership.role };
}

export async function getGarden(actor: GardenActor): Promise<Garden> {
  requireAllowed(actor, 'garden.read');
  return inGarden(actor.gardenId, (trx) => ownGarden(actor, trx));
}

export async function updateGarden(actor: GardenActor, { version, ...change }: GardenChange): Promise<Garden> {
  requireAllowed(actor, 'garden.update');
  return inGarden(actor.gardenId, async (trx) => {
    const updated = await trx
      .updateTable('gardens')
      .set({ ...change, version: sql`version + 1` })
      .where('garden_id', '=', actor.gardenId)
      .where('version', '=', version)
      .executeTakeFirst();
    const garden = await ownGarden(actor, trx);
    if (!updated.numUpdatedRows) throw clash(garden);
    await audit(trx, { gardenId: actor.gardenId, accountId: actor.accountId, action: 'garden.update', detail: change });
    return garden;
  });
}

export async function deleteGarden(actor: GardenActor): Promise<void> {
  requireAllowed(actor, 'garden.delete');
  await inGarden(actor.gardenId, async (trx) => {
    // Tents refer to scenarios and rooms; they go first, the rest follows the garden.
    await trx.updateTable('tents').set({ current_scenario_id: null }).where('garden_id', '=', actor.gardenId).execute();
    await trx.deleteFrom('tents').where('garden_id', '=', actor.gardenId).execute();
    await trx.deleteFrom('gardens').where('garden_id', '=', actor.gardenId).execute();
    await audit(trx, {
      gardenId: actor.gardenId,
      accountId: actor.accountId,
      action: 'garden.delete',
      targetId: actor.gardenId,
    });
  });
}
