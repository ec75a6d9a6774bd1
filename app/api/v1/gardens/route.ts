import { gardenInputSchema } from '@/lib/gardens/garden.schema';
import { createGarden, listGardens } from '@/lib/gardens/garden.service';
import { handle } from '@/lib/http/handle';

/** GET /api/v1/gardens: the gardens of whoever is signed in. */
export const GET = handle({ who: 'account' }, ({ actor }) => listGardens(actor));

/** POST /api/v1/gardens: make a garden. */
export const POST = handle({ who: 'account', body: gardenInputSchema, status: 201 }, ({ actor, body }) =>
  createGarden(actor, body),
);
