import { memberChangeSchema, memberParams } from '@/lib/gardens/garden.schema';
import { removeMember, updateMember } from '@/lib/gardens/member.service';
import { handle } from '@/lib/http/handle';

/** PATCH /api/v1/gardens/:gardenId/members/:accountId: change a person's role. */
export const PATCH = handle(
  { who: 'garden', params: memberParams, body: memberChangeSchema },
  ({ actor, params, body }) => updateMember(actor, params.accountId, body.role),
);

/** DELETE /api/v1/gardens/:gardenId/members/:accountId: remove a person, or leave. */
export const DELETE = handle({ who: 'garden', params: memberParams }, ({ actor, params }) =>
  removeMember(actor, params.accountId),
);
