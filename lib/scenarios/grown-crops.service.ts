import 'server-only';

import { requireAllowed } from '../auth/require-allowed';
import type { GardenActor } from '../auth/session';
import { targetKey } from '../crops/crop.schema';
import { inGarden } from '../db/transactions';
import { scenariosOf } from './scenario.queries';

/** Keys of the crops and stages that the garden's scenarios grow. */
export async function inGardenScenarioCrops(actor: GardenActor): Promise<string[]> {
  requireAllowed(actor, 'scenario.read');
  const scenarios = await inGarden(actor.gardenId, (trx) => scenariosOf(trx, actor.gardenId));
  return [
    ...new Set(
      scenarios.flatMap(({ plan }) =>
        plan.tiers.flatMap((tier) => (tier.targetRef ? [targetKey(tier.targetRef)] : [])),
      ),
    ),
  ];
}
