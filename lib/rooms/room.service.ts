import 'server-only';

import { randomUUID } from 'node:crypto';
import { sql } from 'kysely';
import { audit } from '../audit/audit';
import { requireAllowed } from '../auth/require-allowed';
import type { GardenActor } from '../auth/session';
import { changedColumns } from '../db/changed-columns';
import { inGarden, type GardenTransaction } from '../db/transactions';
import { clash, inUse, notFoundHere } from '../http/app-error';
import { roomInputSchema, type Room, type RoomChange, type RoomInput } from './room.schema';

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

export async function roomById(trx: GardenTransaction, gardenId: string, roomId: string): Promise<Room> {
  const row = await trx
    .selectFrom('rooms')
    .where('garden_id', '=', gardenId)
    .where('room_id', '=', roomId)
    .select(columns)
    .executeTakeFirst();
  if (!row) throw notFoundHere('room');
  return toRoom(row);
}

export async function listRooms(actor: GardenActor): Promise<Room[]> {
  requireAllowed(actor, 'room.read');
  return inGarden(actor.gardenId, (trx) => roomsOf(trx, actor.gardenId));
}

export async function getRoom(actor: GardenActor, roomId: string): Promise<Room> {
  requireAllowed(actor, 'room.read');
  return inGarden(actor.gardenId, (trx) => roomById(trx, actor.gardenId, roomId));
}

/** Adds a room. Sent twice with one id, it is added once. */
export async function createRoom(actor: GardenActor, input: RoomInput): Promise<Room> {
  requireAllowed(actor, 'room.create');
  const { roomId = randomUUID(), residualCurrentDevice, ...rest } = roomInputSchema.parse(input);
  return inGarden(actor.gardenId, async (trx) => {
    const made = await trx
      .insertInto('rooms')
      .values({
        garden_id: actor.gardenId,
        room_id: roomId,
        name: rest.name,
        place: JSON.stringify(rest.place),
        climate: JSON.stringify(rest.climate),
        power: JSON.stringify(rest.power),
        residual_current_device: residualCurrentDevice,
      })
      .onConflict((conflict) => conflict.doNothing())
      .executeTakeFirst();
    if (made.numInsertedOrUpdatedRows) await audit(trx, { ...actor, action: 'room.create', targetId: roomId });
    return roomById(trx, actor.gardenId, roomId);
  });
}

export async function updateRoom(
  actor: GardenActor,
  roomId: string,
  { version, residualCurrentDevice, ...change }: RoomChange,
): Promise<Room> {
  requireAllowed(actor, 'room.update');
  return inGarden(actor.gardenId, async (trx) => {
    const updated = await trx
      .updateTable('rooms')
      .set({
        ...changedColumns({ ...change, residual_current_device: residualCurrentDevice }),
        version: sql`version + 1`,
        updated_at: sql`now()`,
      })
      .where('garden_id', '=', actor.gardenId)
      .where('room_id', '=', roomId)
      .where('version', '=', version)
      .executeTakeFirst();
    const room = await roomById(trx, actor.gardenId, roomId);
    if (!updated.numUpdatedRows) throw clash(room);
    await audit(trx, { ...actor, action: 'room.update', targetId: roomId, detail: { version: room.version } });
    return room;
  });
}

export async function deleteRoom(actor: GardenActor, roomId: string): Promise<void> {
  requireAllowed(actor, 'room.delete');
  await inGarden(actor.gardenId, async (trx) => {
    const room = await roomById(trx, actor.gardenId, roomId);
    const tents = await trx
      .selectFrom('tents')
      .where('garden_id', '=', actor.gardenId)
      .where('room_id', '=', roomId)
      .select('name')
      .execute();
    if (tents.length > 0)
      throw inUse(
        `${tents.map((tent) => tent.name).join(', ')} ${tents.length === 1 ? 'stands' : 'stand'} in ${room.name}. Move or delete ${tents.length === 1 ? 'it' : 'them'} first.`,
      );
    await trx.deleteFrom('rooms').where('garden_id', '=', actor.gardenId).where('room_id', '=', roomId).execute();
    await audit(trx, { ...actor, action: 'room.delete', targetId: roomId, detail: { name: room.name } });
  });
}
