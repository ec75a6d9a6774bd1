import 'server-only';

import { requireAllowed } from '../auth/require-allowed';
import type { Actor, GardenActor } from '../auth/session';
import type { Evaluation, ScenarioDocument } from '../evaluation/evaluate-scenario';
import { listGardens } from '../gardens/garden.service';
import type { Garden } from '../gardens/garden.schema';
import { inGarden } from '../db/transactions';
import type { Room } from '../rooms/room.schema';
import type { Tent } from '../tents/tent.schema';
import { evaluateScenarios } from './evaluation.service';
import { documentOf, readGardenData } from './garden-data';

export interface TentOverview {
  tent: Tent;
  scenarioName: string;
  document: ScenarioDocument;
  evaluation: Evaluation;
}

export interface GardenOverview {
  garden: Garden;
  rooms: { room: Room; tents: TentOverview[] }[];
}

/** A garden with its rooms, its tents and what their scenarios in use come to. */
export async function getGardenOverview(actor: GardenActor): Promise<GardenOverview> {
  requireAllowed(actor, 'garden.read');
  const data = await inGarden(actor.gardenId, (trx) => readGardenData(trx, actor));
  const evaluated = await evaluateScenarios(actor, (scenarios) => {
    const known = new Set(scenarios.map((scenario) => scenario.scenarioId));
    return data.tents.flatMap((tent) =>
      tent.currentScenarioId && known.has(tent.currentScenarioId) ? [tent.currentScenarioId] : [],
    );
  });
  return {
    garden: data.garden,
    rooms: data.rooms.map((room) => ({
      room,
      tents: evaluated
        .filter(({ workbench }) => workbench.room.roomId === room.roomId)
        .map(({ workbench, evaluation }) => ({
          tent: workbench.tent,
          scenarioName: workbench.scenario.name,
          document: documentOf(workbench),
          evaluation,
        })),
    })),
  };
}

export async function listGardenOverviews(actor: Actor): Promise<GardenOverview[]> {
  const overviews: GardenOverview[] = [];
  for (const garden of await listGardens(actor))
    overviews.push(await getGardenOverview({ ...actor, gardenId: garden.gardenId, role: garden.role }));
  return overviews;
}
