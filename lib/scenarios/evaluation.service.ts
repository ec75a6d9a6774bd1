import 'server-only';

import { createHash } from 'node:crypto';
import { requireAllowed } from '../auth/require-allowed';
import type { GardenActor } from '../auth/session';
import { inGarden, type GardenTransaction } from '../db/transactions';
import {
  evaluateScenario,
  physicsVersion,
  type Evaluation,
  type ScenarioDocument,
} from '../evaluation/evaluate-scenario';
import { notFoundHere } from '../http/app-error';
import { documentOf, readGardenData, workbenchOf } from './garden-data';
import type { EvaluatedScenario, Scenario } from './scenario.schema';

const hashOf = (document: ScenarioDocument) => createHash('sha256').update(JSON.stringify(document)).digest('hex');

/** What the physics says of a scenario: the stored word where document and physics are the same, else a new one that is stored. */
async function evaluationOf(
  trx: GardenTransaction,
  gardenId: string,
  scenarioId: string,
  document: ScenarioDocument,
): Promise<Evaluation> {
  const documentHash = hashOf(document);
  const stored = await trx
    .selectFrom('evaluations')
    .where('garden_id', '=', gardenId)
    .where('scenario_id', '=', scenarioId)
    .where('document_hash', '=', documentHash)
    .where('physics_version', '=', physicsVersion)
    .select('result')
    .executeTakeFirst();
  if (stored) return stored.result as Evaluation;
  const evaluation = evaluateScenario(document);
  const row = { physics_version: physicsVersion, document_hash: documentHash, result: JSON.stringify(evaluation) };
  await trx
    .insertInto('evaluations')
    .values({ garden_id: gardenId, scenario_id: scenarioId, ...row })
    .onConflict((conflict) => conflict.columns(['garden_id', 'scenario_id']).doUpdateSet(row))
    .execute();
  return evaluation;
}

/** Several scenarios of a garden with their evaluations, in the order asked for; all the tents' scenarios in use when none is named. */
export async function evaluateScenarios(
  actor: GardenActor,
  choose: (scenarios: readonly Scenario[]) => string[],
): Promise<EvaluatedScenario[]> {
  requireAllowed(actor, 'scenario.read');
  return inGarden(actor.gardenId, async (trx) => {
    const data = await readGardenData(trx, actor);
    const evaluated: EvaluatedScenario[] = [];
    for (const scenarioId of choose(data.scenarios)) {
      const scenario = data.scenarios.find((each) => each.scenarioId === scenarioId);
      if (!scenario) throw notFoundHere('scenario');
      const workbench = workbenchOf(data, actor, scenario);
      evaluated.push({
        workbench,
        evaluation: await evaluationOf(trx, actor.gardenId, scenarioId, documentOf(workbench)),
      });
    }
    return evaluated;
  });
}

export async function getEvaluatedScenario(actor: GardenActor, scenarioId: string): Promise<EvaluatedScenario> {
  const [only] = await evaluateScenarios(actor, () => [scenarioId]);
  if (!only) throw notFoundHere('scenario');
  return only;
}
