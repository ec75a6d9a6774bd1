import { comparisonQuery } from '@/lib/comparison/comparison.schema';
import { compareScenarios } from '@/lib/comparison/comparison.service';
import { gardenParams } from '@/lib/gardens/garden.schema';
import { handle } from '@/lib/http/handle';

/** GET /api/v1/gardens/:gardenId/comparison?ids=a,b&base=a: scenarios side by side. */
export const GET = handle({ who: 'garden', params: gardenParams, query: comparisonQuery }, ({ actor, query }) =>
  compareScenarios(actor, query),
);
