import { gardenParams } from '@/lib/gardens/garden.schema';
import { handle } from '@/lib/http/handle';
import { roomInputSchema } from '@/lib/rooms/room.schema';
import { createRoom, listRooms } from '@/lib/rooms/room.service';

/** GET /api/v1/gardens/:gardenId/rooms */
export const GET = handle({ who: 'garden', params: gardenParams }, ({ actor }) => listRooms(actor));

/** POST /api/v1/gardens/:gardenId/rooms */
export const POST = handle(
  { who: 'garden', params: gardenParams, body: roomInputSchema, status: 201 },
  ({ actor, body }) => createRoom(actor, body),
);
