import 'server-only';

import type { GardenTransaction } from '../db/transactions';
import { notFoundHere } from '../http/app-error';
import type { Room } from './room.schema';

const columns = [
  'garden_id',
  'room_id',
  'name',
  'place',
  'climate',
  'power',
  'residual_current_device',
  'version',
] as const;

interface Row {
  garden_id: string;
  room_id: string;
  name: string;
  place: unknown;
  climate: unknown;
  power: unknown;
  residual_current_device: Room['residualCurrentDevice'];
  version: number;
}

const toRoom = (row: Row): Room => ({
  gardenId: row.garden_id,
  roomId: row.room_id,
  name: row.name,
  place: row.place as Room['place'],
  climate: row.climate as Room['climate'],
  power: row.power as Room['power'],
  residualCurrentDevice: row.residual_current_device,
  version: row.version,
});

export async function roomsOf(trx: GardenTransaction, gardenId: string): Promise<Room[]> {
  const rows = await trx
    .selectFrom('rooms')
    .where('garden_id', '=', gardenId)
    .select(columns)
    .orderBy('created_at')
    .orderBy('room_id')
    .execute();
  return rows.map(toRoom);
}

/** `hold`: until the transaction ends the room stays as it is; `keep` lets others hold it likewise, `change` nobody. */
export async function roomById(
  trx: GardenTransaction,
  gardenId: string,
  roomId: string,
  hold?: 'keep' | 'change',
): Promise<Room> {
  const row = await trx
    .selectFrom('rooms')
    .where('garden_id', '=', gardenId)
    .where('room_id', '=', roomId)
    .select(columns)
    .$if(hold === 'keep', (query) => query.forShare())
    .$if(hold === 'change', (query) => query.forUpdate())
    .executeTakeFirst();
  if (!row) throw notFoundHere('room');
  return toRoom(row);
}
