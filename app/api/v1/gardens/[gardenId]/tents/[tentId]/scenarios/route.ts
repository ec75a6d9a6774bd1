import { handle } from '@/lib/http/handle';
import { scenarioInputSchema } from '@/lib/scenarios/scenario.schema';
import { createScenario, listScenarios } from '@/lib/scenarios/scenario.service';
import { tentParams } from '@/lib/tents/tent.schema';

/** GET /api/v1/gardens/:gardenId/tents/:tentId/scenarios */
export const GET = handle({ who: 'garden', params: tentParams }, ({ actor, params }) =>
  listScenarios(actor, params.tentId),
);

/** POST /api/v1/gardens/:gardenId/tents/:tentId/scenarios */
export const POST = handle(
  { who: 'garden', params: tentParams, body: scenarioInputSchema, status: 201 },
  ({ actor, params, body }) => createScenario(actor, params.tentId, body),
);
