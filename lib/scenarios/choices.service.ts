import 'server-only';

import { requireAllowed } from '../auth/require-allowed';
import type { GardenActor } from '../auth/session';
import { inGarden } from '../db/transactions';
import type { Garden } from '../gardens/garden.schema';
import { readGardenData } from './garden-data';

export interface TentChoices {
  tentId: string;
  name: string;
  scenarios: { scenarioId: string; name: string }[];
}

/** The scenarios of a garden by tent, to choose from. */
export async function listChoices(actor: GardenActor): Promise<{ garden: Garden; choices: TentChoices[] }> {
  requireAllowed(actor, 'scenario.read');
  const { garden, tents, scenarios } = await inGarden(actor.gardenId, (trx) => readGardenData(trx, actor));
  const choices = tents.map(({ tentId, name }) => ({
    tentId,
    name,
    scenarios: scenarios
      .filter((scenario) => scenario.tentId === tentId)
      .map((scenario) => ({ scenarioId: scenario.scenarioId, name: scenario.name })),
  }));
  return { garden, choices };
}
