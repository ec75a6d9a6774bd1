import 'server-only';

import { randomUUID } from 'node:crypto';
import { sql } from 'kysely';
import { audit } from '../audit/audit';
import { requireAllowed } from '../auth/require-allowed';
import type { GardenActor } from '../auth/session';
import { targetKey } from '../crops/crop.schema';
import { resolveTarget } from '../crops/reference-target';
import { changedColumns } from '../db/changed-columns';
import { requireSame } from '../db/sent-twice';
import { inGarden, type GardenTransaction } from '../db/transactions';
import { clash, inUse, notFoundHere } from '../http/app-error';
import { referenceData } from '../reference-data/reference-data';
import { scenariosOf } from '../scenarios/scenario.queries';
import { targetById, targetsOf } from './target.queries';
import type { GardenTarget, TargetChange, TargetInput } from './target.schema';

export async function listTargets(actor: GardenActor): Promise<GardenTarget[]> {
  requireAllowed(actor, 'target.read');
  return inGarden(actor.gardenId, (trx) => targetsOf(trx, actor.gardenId));
}

/** Sets the garden's own target for a crop and stage, or adds a crop of its own. */
export async function createTarget(
  actor: GardenActor,
  { targetId = randomUUID(), crop, stage, figures, note = '' }: TargetInput,
): Promise<GardenTarget> {
  requireAllowed(actor, 'target.create');
  return inGarden(actor.gardenId, async (trx) => {
    const made = await trx
      .insertInto('targets')
      .values({ garden_id: actor.gardenId, target_id: targetId, crop, stage, figures: JSON.stringify(figures), note })
      .onConflict((conflict) => conflict.doNothing())
      .executeTakeFirst();
    if (made.numInsertedOrUpdatedRows) {
      await audit(trx, { ...actor, action: 'target.create', targetId });
      return targetById(trx, actor.gardenId, targetId);
    }
    const own = await targetsOf(trx, actor.gardenId);
    const standing =
      own.find((each) => each.targetId === targetId) ?? own.find((each) => each.crop === crop && each.stage === stage);
    if (!standing) throw notFoundHere('target');
    if (standing.targetId !== targetId) throw clash(standing);
    requireSame('targetId', { crop, stage, figures, note }, standing);
    return standing;
  });
}

export async function updateTarget(
  actor: GardenActor,
  targetId: string,
  { version, ...change }: TargetChange,
): Promise<GardenTarget> {
  requireAllowed(actor, 'target.update');
  return inGarden(actor.gardenId, async (trx) => {
    const updated = await trx
      .updateTable('targets')
      .set({ ...changedColumns(change), version: sql`version + 1`, updated_at: sql`now()` })
      .where('garden_id', '=', actor.gardenId)
      .where('target_id', '=', targetId)
      .where('version', '=', version)
      .executeTakeFirst();
    const target = await targetById(trx, actor.gardenId, targetId);
    if (!updated.numUpdatedRows) throw clash(target);
    await audit(trx, { ...actor, action: 'target.update', targetId });
    return target;
  });
}

/** Where the reference knows the crop, its figures take over; a crop of the garden's own that is planned on has no other. */
async function requireDispensable(trx: GardenTransaction, gardenId: string, target: GardenTarget): Promise<void> {
  if (resolveTarget(target, [], referenceData().crops)) return;
  const uses = (await scenariosOf(trx, gardenId)).filter(({ plan }) =>
    plan.tiers.some(({ targetRef }) => targetRef && targetKey(targetRef) === targetKey(target)),
  );
  if (uses.length > 0)
    throw inUse(
      `${target.crop}, ${target.stage}, is planned in ${uses.map((use) => `“${use.name}”`).join(', ')}, and the reference does not know it. Choose another crop there first.`,
    );
}

/** Goes back to the reference. */
export async function deleteTarget(actor: GardenActor, targetId: string): Promise<void> {
  requireAllowed(actor, 'target.delete');
  await inGarden(actor.gardenId, async (trx) => {
    const target = await targetById(trx, actor.gardenId, targetId);
    await requireDispensable(trx, actor.gardenId, target);
    await trx.deleteFrom('targets').where('garden_id', '=', actor.gardenId).where('target_id', '=', targetId).execute();
    await audit(trx, { ...actor, action: 'target.delete', targetId });
  });
}
