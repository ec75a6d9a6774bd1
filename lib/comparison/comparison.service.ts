import 'server-only';

import type { GardenActor } from '../auth/session';
import { evaluateScenarios } from '../scenarios/evaluation.service';
import { documentOf } from '../scenarios/garden-data';
import { comparisonColumn, type ComparisonColumn } from './comparison';
import { comparisonCsv } from './comparison-csv';

export interface Comparison {
  base: string;
  columns: ComparisonColumn[];
}

interface Wanted {
  ids: readonly string[];
  base?: string | undefined;
}

/** Scenarios of one garden side by side; an id of another garden is not found. */
export async function compareScenarios(actor: GardenActor, { ids, base }: Wanted): Promise<Comparison> {
  const wanted = [...new Set(ids)];
  const evaluated = await evaluateScenarios(actor, () => wanted);
  const columns = evaluated.map(({ workbench, evaluation }) =>
    comparisonColumn({
      scenarioId: workbench.scenario.scenarioId,
      tentId: workbench.tent.tentId,
      tentName: workbench.tent.name,
      name: workbench.scenario.name,
      document: documentOf(workbench),
      evaluation,
    }),
  );
  return { base: base && wanted.includes(base) ? base : wanted[0]!, columns };
}

export async function comparisonAsCsv(actor: GardenActor, wanted: Wanted): Promise<string> {
  const { base, columns } = await compareScenarios(actor, wanted);
  return comparisonCsv(columns, base);
}
