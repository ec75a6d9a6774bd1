import 'server-only';

import { randomUUID } from 'node:crypto';
import { isDeepStrictEqual } from 'node:util';
import { sql } from 'kysely';
import { audit } from '../audit/audit';
import { requireAllowed } from '../auth/require-allowed';
import type { GardenActor } from '../auth/session';
import { changedColumns } from '../db/changed-columns';
import { requireSame } from '../db/sent-twice';
import { inGarden, type GardenTransaction } from '../db/transactions';
import { gardenById } from '../gardens/garden.queries';
import { clash, inUse, invalid } from '../http/app-error';
import { requireScenariosFit } from '../scenarios/plan-fit.service';
import { tentsOf } from '../tents/tent.queries';
import { roomById, roomsOf } from './room.queries';
import { roomInputSchema, type Room, type RoomChange, type RoomInput, type RoomPower } from './room.schema';

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
    await requireCurrency(trx, actor.gardenId, rest.power);
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
    const kept = await roomById(trx, actor.gardenId, roomId);
    requireSame('roomId', { ...rest, residualCurrentDevice }, kept);
    return kept;
  });
}

/** A garden reckons in one currency; its lamps are priced in it, and sums of two would be no sums. */
async function requireCurrency(trx: GardenTransaction, gardenId: string, { tariff }: RoomPower): Promise<void> {
  const garden = tariff && (await gardenById(trx, gardenId));
  if (garden && garden.currency !== tariff.currency)
    throw invalid([
      {
        path: 'power.tariff.currency',
        message: `This garden reckons in ${garden.currency}. Give the prices in ${garden.currency}.`,
        value: tariff.currency,
        range: garden.currency,
        unit: '',
      },
    ]);
}

async function requireTentsFit(trx: GardenTransaction, gardenId: string, room: Room): Promise<void> {
  const tents = (await tentsOf(trx, gardenId)).filter((tent) => tent.roomId === room.roomId);
  for (const tent of tents) await requireScenariosFit(trx, gardenId, { tent, room, path: 'climate' });
}

export async function updateRoom(
  actor: GardenActor,
  roomId: string,
  { version, residualCurrentDevice, ...change }: RoomChange,
): Promise<Room> {
  requireAllowed(actor, 'room.update');
  return inGarden(actor.gardenId, async (trx) => {
    const before = await roomById(trx, actor.gardenId, roomId, 'change');
    if (before.version !== version) throw clash(before);
    // Prices from before the garden changed its currency stay until somebody types new ones.
    if (change.power && !isDeepStrictEqual(change.power.tariff, before.power.tariff))
      await requireCurrency(trx, actor.gardenId, change.power);
    if (change.climate) await requireTentsFit(trx, actor.gardenId, { ...before, climate: change.climate });
    await trx
      .updateTable('rooms')
      .set({
        ...changedColumns({ ...change, residual_current_device: residualCurrentDevice }),
        version: sql`version + 1`,
        updated_at: sql`now()`,
      })
      .where('garden_id', '=', actor.gardenId)
      .where('room_id', '=', roomId)
      .execute();
    const room = await roomById(trx, actor.gardenId, roomId);
    await audit(trx, { ...actor, action: 'room.update', targetId: roomId, detail: { version: room.version } });
    return room;
  });
}

export async function deleteRoom(actor: GardenActor, roomId: string): Promise<void> {
  requireAllowed(actor, 'room.delete');
  await inGarden(actor.gardenId, async (trx) => {
    // Held first: a tent that is being put in this room is seen, or finds the room gone.
    const room = await roomById(trx, actor.gardenId, roomId, 'change');
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
