import 'server-only';

import { randomUUID } from 'node:crypto';
import { sql } from 'kysely';
import { audit } from '../audit/audit';
import { requireAllowed } from '../auth/require-allowed';
import type { GardenActor } from '../auth/session';
import type { TargetFigures } from '../crops/crop.schema';
import { changedColumns } from '../db/changed-columns';
import { inGarden, type GardenTransaction } from '../db/transactions';
import { clash, notFoundHere } from '../http/app-error';
import type { GardenTarget, TargetChange, TargetInput } from './target.schema';

const columns = ['target_id', 'crop', 'stage', 'figures', 'note', 'version'] as const;

const toTarget = (row: {
  target_id: string;
  crop: string;
  stage: string;
  figures: unknown;
  note: string;
  version: number;
}): GardenTarget => ({
  targetId: row.target_id,
  crop: row.crop,
  stage: row.stage,
  figures: row.figures as TargetFigures,
  note: row.note,
  version: row.version,
});

export async function targetsOf(trx: GardenTransaction, gardenId: string): Promise<GardenTarget[]> {
  const rows = await trx
    .selectFrom('targets')
    .where('garden_id', '=', gardenId)
    .select(columns)
    .orderBy('crop')
    .orderBy('stage')
    .execute();
  return rows.map(toTarget);
}

async function targetById(trx: GardenTransaction, gardenId: string, targetId: string): Promise<GardenTarget> {
  const row = await trx
    .selectFrom('targets')
    .where('garden_id', '=', gardenId)
    .where('target_id', '=', targetId)
    .select(columns)
    .executeTakeFirst();
  if (!row) throw notFoundHere('target');
  return toTarget(row);
}

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
    const standing = (await targetsOf(trx, actor.gardenId)).find(
      (each) => each.targetId === targetId || (each.crop === crop && each.stage === stage),
    );
    if (!standing) throw notFoundHere('target');
    if (standing.targetId !== targetId) throw clash(standing);
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

export async function deleteTarget(actor: GardenActor, targetId: string): Promise<void> {
  requireAllowed(actor, 'target.delete');
  await inGarden(actor.gardenId, async (trx) => {
    await targetById(trx, actor.gardenId, targetId);
    await trx.deleteFrom('targets').where('garden_id', '=', actor.gardenId).where('target_id', '=', targetId).execute();
    await audit(trx, { ...actor, action: 'target.delete', targetId });
  });
}
