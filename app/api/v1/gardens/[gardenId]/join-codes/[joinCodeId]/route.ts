import { joinCodeParams } from '@/lib/gardens/garden.schema';
import { deleteJoinCode } from '@/lib/gardens/join-code.service';
import { handle } from '@/lib/http/handle';

/** DELETE /api/v1/gardens/:gardenId/join-codes/:joinCodeId: take a code back. */
export const DELETE = handle({ who: 'garden', params: joinCodeParams }, ({ actor, params }) =>
  deleteJoinCode(actor, params.joinCodeId),
);
