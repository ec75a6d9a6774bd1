import { gardenParams, joinCodeInputSchema } from '@/lib/gardens/garden.schema';
import { createJoinCode, listJoinCodes } from '@/lib/gardens/join-code.service';
import { handle } from '@/lib/http/handle';

/** GET /api/v1/gardens/:gardenId/join-codes: the codes not used yet. */
export const GET = handle({ who: 'garden', params: gardenParams }, ({ actor }) => listJoinCodes(actor));

/** POST /api/v1/gardens/:gardenId/join-codes: make a one-use code, shown this once. */
export const POST = handle(
  { who: 'garden', params: gardenParams, body: joinCodeInputSchema, status: 201 },
  ({ actor, body }) => createJoinCode(actor, body.role),
);
