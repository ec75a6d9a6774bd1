import 'server-only';

import { createHash } from 'node:crypto';
import { setImmediate as breathe } from 'node:timers/promises';
import { DomainError } from '@/physics/domain-error';
import { requireAllowed } from '../auth/require-allowed';
import type { GardenActor } from '../auth/session';
import { inGarden } from '../db/transactions';
import { evaluateScenario, type Evaluation, type ScenarioDocument } from '../evaluation/evaluate-scenario';
import { invalid, notFoundHere } from '../http/app-error';
import { keepEvaluations, keptEvaluations, type KeptEvaluation } from './evaluation.queries';
import { documentOf, readGardenData, workbenchOf } from './garden-data';
import type { EvaluatedScenario, Scenario, Workbench } from './scenario.schema';

const hashOf = (document: ScenarioDocument) => createHash('sha256').update(JSON.stringify(document)).digest('hex');

/** What the physics refuses is told as a problem of the scenario, in its own words. */
function evaluate({ scenario }: Workbench, document: ScenarioDocument): Evaluation {
  try {
    return evaluateScenario(document);
  } catch (error) {
    if (!(error instanceof DomainError)) throw error;
    const { quantity, value, min, max, unit, message } = error;
    const problem = { path: quantity, value: String(value), range: `${min} to ${max}`, unit, message };
    throw invalid([problem], `“${scenario.name}” cannot be evaluated.`);
  }
}

interface Asked {
  workbench: Workbench;
  document: ScenarioDocument;
  documentHash: string;
}

function ask(data: Awaited<ReturnType<typeof readGardenData>>, actor: GardenActor, scenarioId: string): Asked {
  const scenario = data.scenarios.find((each) => each.scenarioId === scenarioId);
  if (!scenario) throw notFoundHere('scenario');
  const workbench = workbenchOf(data, actor, scenario);
  const document = documentOf(workbench);
  return { workbench, document, documentHash: hashOf(document) };
}

/**
 * Several scenarios of a garden with what the physics says of them, in the order asked for.
 *
 * Kept evaluations serve where document and physics are still the same; the others are reckoned outside any transaction, so
 * that no connection waits for the physics, and then kept.
 */
export async function evaluateScenarios(
  actor: GardenActor,
  choose: (scenarios: readonly Scenario[]) => readonly string[],
): Promise<EvaluatedScenario[]> {
  requireAllowed(actor, 'scenario.read');
  const { asked, kept } = await inGarden(actor.gardenId, async (trx) => {
    const data = await readGardenData(trx, actor);
    const wanted = choose(data.scenarios);
    return {
      asked: wanted.map((scenarioId) => ask(data, actor, scenarioId)),
      kept: await keptEvaluations(trx, actor.gardenId, wanted),
    };
  });
  const fresh: KeptEvaluation[] = [];
  const evaluated: EvaluatedScenario[] = [];
  for (const { workbench, document, documentHash } of asked) {
    const { scenarioId } = workbench.scenario;
    const known = kept.find((each) => each.scenarioId === scenarioId && each.documentHash === documentHash);
    // Others are served between two evaluations.
    if (!known) await breathe();
    const evaluation = known?.evaluation ?? evaluate(workbench, document);
    if (!known) fresh.push({ scenarioId, documentHash, evaluation });
    evaluated.push({ workbench, evaluation });
  }
  if (fresh.length > 0) await inGarden(actor.gardenId, (trx) => keepEvaluations(trx, actor.gardenId, fresh));
  return evaluated;
}

export async function getEvaluatedScenario(actor: GardenActor, scenarioId: string): Promise<EvaluatedScenario> {
  const [only] = await evaluateScenarios(actor, () => [scenarioId]);
  if (!only) throw notFoundHere('scenario');
  return only;
}
