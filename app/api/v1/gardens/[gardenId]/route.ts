import { gardenChangeSchema, gardenParams } from '@/lib/gardens/garden.schema';
import { deleteGarden, getGarden, updateGarden } from '@/lib/gardens/garden.service';
import { handle } from '@/lib/http/handle';

/** GET /api/v1/gardens/:gardenId */
export const GET = handle({ who: 'garden', params: gardenParams }, ({ actor }) => getGarden(actor));

/** PATCH /api/v1/gardens/:gardenId: rename it or change its currency. */
export const PATCH = handle({ who: 'garden', params: gardenParams, body: gardenChangeSchema }, ({ actor, body }) =>
  updateGarden(actor, body),
);

/** DELETE /api/v1/gardens/:gardenId: with everything in it. */
export const DELETE = handle({ who: 'garden', params: gardenParams }, ({ actor }) => deleteGarden(actor));
