import { gardenParams } from '@/lib/gardens/garden.schema';
import { handle } from '@/lib/http/handle';
import { tentInputSchema } from '@/lib/tents/tent.schema';
import { createTent, listTents } from '@/lib/tents/tent.service';

/** GET /api/v1/gardens/:gardenId/tents */
export const GET = handle({ who: 'garden', params: gardenParams }, ({ actor }) => listTents(actor));

/** POST /api/v1/gardens/:gardenId/tents */
export const POST = handle(
  { who: 'garden', params: gardenParams, body: tentInputSchema, status: 201 },
  ({ actor, body }) => createTent(actor, body),
);
