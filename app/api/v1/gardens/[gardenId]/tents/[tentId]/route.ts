import { handle } from '@/lib/http/handle';
import { tentChangeSchema, tentParams } from '@/lib/tents/tent.schema';
import { deleteTent, getTent, updateTent } from '@/lib/tents/tent.service';

/** GET /api/v1/gardens/:gardenId/tents/:tentId */
export const GET = handle({ who: 'garden', params: tentParams }, ({ actor, params }) => getTent(actor, params.tentId));

/** PATCH /api/v1/gardens/:gardenId/tents/:tentId: against the version that was seen. */
export const PATCH = handle({ who: 'garden', params: tentParams, body: tentChangeSchema }, ({ actor, params, body }) =>
  updateTent(actor, params.tentId, body),
);

/** DELETE /api/v1/gardens/:gardenId/tents/:tentId */
export const DELETE = handle({ who: 'garden', params: tentParams }, ({ actor, params }) =>
  deleteTent(actor, params.tentId),
);
