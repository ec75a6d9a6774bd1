import { gardenParams } from '@/lib/gardens/garden.schema';
import { handle } from '@/lib/http/handle';
import { targetInputSchema } from '@/lib/targets/target.schema';
import { createTarget, listTargets } from '@/lib/targets/target.service';

/** GET /api/v1/gardens/:gardenId/targets */
export const GET = handle({ who: 'garden', params: gardenParams }, ({ actor }) => listTargets(actor));

/** POST /api/v1/gardens/:gardenId/targets */
export const POST = handle(
  { who: 'garden', params: gardenParams, body: targetInputSchema, status: 201 },
  ({ actor, body }) => createTarget(actor, body),
);
