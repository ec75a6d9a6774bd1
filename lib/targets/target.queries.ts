import 'server-only';

import type { TargetFigures } from '../crops/crop.schema';
import type { GardenTransaction } from '../db/transactions';
import { notFoundHere } from '../http/app-error';
import type { GardenTarget } from './target.schema';

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

export async function targetById(trx: GardenTransaction, gardenId: string, targetId: string): Promise<GardenTarget> {
  const row = await trx
    .selectFrom('targets')
    .where('garden_id', '=', gardenId)
    .where('target_id', '=', targetId)
    .select(columns)
    .executeTakeFirst();
  if (!row) throw notFoundHere('target');
  return toTarget(row);
}
