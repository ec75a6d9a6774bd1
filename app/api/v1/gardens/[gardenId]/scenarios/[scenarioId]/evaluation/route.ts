import { handle } from '@/lib/http/handle';
import { getEvaluatedScenario } from '@/lib/scenarios/evaluation.service';
import { scenarioParams } from '@/lib/scenarios/scenario.schema';

/** GET /api/v1/gardens/:gardenId/scenarios/:scenarioId/evaluation: what the physics says, evaluation/1. */
export const GET = handle({ who: 'garden', params: scenarioParams }, async ({ actor, params }) => {
  const { evaluation } = await getEvaluatedScenario(actor, params.scenarioId);
  return evaluation;
});
