import { handle } from '@/lib/http/handle';
import { roomChangeSchema, roomParams } from '@/lib/rooms/room.schema';
import { deleteRoom, getRoom, updateRoom } from '@/lib/rooms/room.service';

/** GET /api/v1/gardens/:gardenId/rooms/:roomId */
export const GET = handle({ who: 'garden', params: roomParams }, ({ actor, params }) => getRoom(actor, params.roomId));

/** PATCH /api/v1/gardens/:gardenId/rooms/:roomId: against the version that was seen. */
export const PATCH = handle({ who: 'garden', params: roomParams, body: roomChangeSchema }, ({ actor, params, body }) =>
  updateRoom(actor, params.roomId, body),
);

/** DELETE /api/v1/gardens/:gardenId/rooms/:roomId */
export const DELETE = handle({ who: 'garden', params: roomParams }, ({ actor, params }) =>
  deleteRoom(actor, params.roomId),
);
