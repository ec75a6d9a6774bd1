import 'server-only';

import type { GardenTransaction } from '../db/transactions';
import { notFoundHere } from '../http/app-error';
import type { Tent } from './tent.schema';

const columns = ['tent_id', 'room_id', 'name', 'body', 'current_scenario_id', 'version'] as const;

const toTent = (row: {
  tent_id: string;
  room_id: string;
  name: string;
  body: unknown;
  current_scenario_id: string | null;
  version: number;
}): Tent => ({
  tentId: row.tent_id,
  roomId: row.room_id,
  name: row.name,
  body: row.body as Tent['body'],
  currentScenarioId: row.current_scenario_id,
  version: row.version,
});

export async function tentsOf(trx: GardenTransaction, gardenId: string): Promise<Tent[]> {
  const rows = await trx
    .selectFrom('tents')
    .where('garden_id', '=', gardenId)
    .select(columns)
    .orderBy('created_at')
    .orderBy('tent_id')
    .execute();
  return rows.map(toTent);
}

/** `hold`: until the transaction ends the tent stays as it is; `keep` lets others hold it likewise, `change` nobody. */
export async function tentById(
  trx: GardenTransaction,
  gardenId: string,
  tentId: string,
  hold?: 'keep' | 'change',
): Promise<Tent> {
  const row = await trx
    .selectFrom('tents')
    .where('garden_id', '=', gardenId)
    .where('tent_id', '=', tentId)
    .select(columns)
    .$if(hold === 'keep', (query) => query.forShare())
    .$if(hold === 'change', (query) => query.forUpdate())
    .executeTakeFirst();
  if (!row) throw notFoundHere('tent');
  return toTent(row);
}
