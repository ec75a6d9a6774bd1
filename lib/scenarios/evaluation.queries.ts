import 'server-only';

import type { GardenTransaction } from '../db/transactions';
import { physicsVersion, type Evaluation } from '../evaluation/evaluate-scenario';

/** An evaluation with the hash of the document that it is of. */
export interface KeptEvaluation {
  scenarioId: string;
  documentHash: string;
  evaluation: Evaluation;
}

/** What this version of the physics said of these scenarios when they were last evaluated. */
export async function keptEvaluations(
  trx: GardenTransaction,
  gardenId: string,
  scenarioIds: readonly string[],
): Promise<KeptEvaluation[]> {
  if (scenarioIds.length === 0) return [];
  const rows = await trx
    .selectFrom('evaluations')
    .where('garden_id', '=', gardenId)
    .where('scenario_id', 'in', scenarioIds)
    .where('physics_version', '=', physicsVersion)
    .select(['scenario_id', 'document_hash', 'result'])
    .execute();
  return rows.map((row) => ({
    scenarioId: row.scenario_id,
    documentHash: row.document_hash,
    evaluation: row.result as Evaluation,
  }));
}

/** Keeps evaluations beside their scenarios; one that was deleted meanwhile is passed over. */
export async function keepEvaluations(
  trx: GardenTransaction,
  gardenId: string,
  fresh: readonly KeptEvaluation[],
): Promise<void> {
  const held = await trx
    .selectFrom('scenarios')
    .where('garden_id', '=', gardenId)
    .where(
      'scenario_id',
      'in',
      fresh.map((each) => each.scenarioId),
    )
    .select('scenario_id')
    .orderBy('scenario_id')
    .forKeyShare()
    .execute();
  // In one order for everybody, so that two who evaluate the same scenarios do not wait for each other in a ring.
  for (const { scenario_id: scenarioId } of held) {
    const { documentHash, evaluation } = fresh.find((each) => each.scenarioId === scenarioId)!;
    const row = { physics_version: physicsVersion, document_hash: documentHash, result: JSON.stringify(evaluation) };
    await trx
      .insertInto('evaluations')
      .values({ garden_id: gardenId, scenario_id: scenarioId, ...row })
      .onConflict((conflict) => conflict.columns(['garden_id', 'scenario_id']).doUpdateSet(row))
      .execute();
  }
}
