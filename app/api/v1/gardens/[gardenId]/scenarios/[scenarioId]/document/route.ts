import { handle } from '@/lib/http/handle';
import { documentOf, getWorkbench } from '@/lib/scenarios/garden-data';
import { scenarioParams } from '@/lib/scenarios/scenario.schema';

/** GET /api/v1/gardens/:gardenId/scenarios/:scenarioId/document: the scenario as scenario/1. */
export const GET = handle({ who: 'garden', params: scenarioParams }, async ({ actor, params }) =>
  documentOf(await getWorkbench(actor, params.scenarioId)),
);
