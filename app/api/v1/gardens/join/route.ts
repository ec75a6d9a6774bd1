import { joinSchema } from '@/lib/gardens/garden.schema';
import { join } from '@/lib/gardens/join-code.service';
import { handle } from '@/lib/http/handle';

/** POST /api/v1/gardens/join: spend a one-use code and become a member. */
export const POST = handle({ who: 'account', body: joinSchema }, ({ actor, body }) => join(actor, body.code));
