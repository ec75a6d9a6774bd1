import { handle } from '@/lib/http/handle';
import { getWorkbench } from '@/lib/scenarios/garden-data';
import { scenarioChangeSchema, scenarioParams } from '@/lib/scenarios/scenario.schema';
import { deleteScenario, updateScenario } from '@/lib/scenarios/scenario.service';

/** GET /api/v1/gardens/:gardenId/scenarios/:scenarioId: the scenario with its tent, room, lamps and targets. */
export const GET = handle({ who: 'garden', params: scenarioParams }, ({ actor, params }) =>
  getWorkbench(actor, params.scenarioId),
);

/** PATCH /api/v1/gardens/:gardenId/scenarios/:scenarioId: against the version that was seen. */
export const PATCH = handle(
  { who: 'garden', params: scenarioParams, body: scenarioChangeSchema },
  ({ actor, params, body }) => updateScenario(actor, params.scenarioId, body),
);

/** DELETE /api/v1/gardens/:gardenId/scenarios/:scenarioId */
export const DELETE = handle({ who: 'garden', params: scenarioParams }, ({ actor, params }) =>
  deleteScenario(actor, params.scenarioId),
);
