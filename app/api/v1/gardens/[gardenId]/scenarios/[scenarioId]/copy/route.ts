import { handle } from '@/lib/http/handle';
import { scenarioCopySchema, scenarioParams } from '@/lib/scenarios/scenario.schema';
import { copyScenario } from '@/lib/scenarios/scenario.service';

/** POST /api/v1/gardens/:gardenId/scenarios/:scenarioId/copy: the same, or a plan of one's own, as another scenario of the tent. */
export const POST = handle(
  { who: 'garden', params: scenarioParams, body: scenarioCopySchema, status: 201 },
  ({ actor, params, body }) => copyScenario(actor, params.scenarioId, body),
);
