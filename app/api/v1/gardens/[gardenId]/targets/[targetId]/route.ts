import { handle } from '@/lib/http/handle';
import { targetChangeSchema, targetParams } from '@/lib/targets/target.schema';
import { deleteTarget, updateTarget } from '@/lib/targets/target.service';

/** PATCH /api/v1/gardens/:gardenId/targets/:targetId: against the version that was seen. */
export const PATCH = handle(
  { who: 'garden', params: targetParams, body: targetChangeSchema },
  ({ actor, params, body }) => updateTarget(actor, params.targetId, body),
);

/** DELETE /api/v1/gardens/:gardenId/targets/:targetId */
export const DELETE = handle({ who: 'garden', params: targetParams }, ({ actor, params }) =>
  deleteTarget(actor, params.targetId),
);
