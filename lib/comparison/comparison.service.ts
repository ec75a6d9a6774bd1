import 'server-only';

import type { GardenActor } from '../auth/session';
import { getGarden } from '../gardens/garden.service';
import { evaluateScenarios } from '../scenarios/evaluation.service';
import { documentOf } from '../scenarios/garden-data';
import { comparisonColumn, type ComparisonColumn } from './comparison';
import { comparisonCsv, comparisonFileName } from './comparison-csv';

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
  // The baseline is compared too, whether or not it was named again.
  const wanted = [...new Set(base === undefined || ids.includes(base) ? ids : [base, ...ids])];
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
  return { base: base ?? wanted[0]!, columns };
}

/** The comparison as a table to save, with a name to save it under. */
export async function comparisonAsCsv(actor: GardenActor, wanted: Wanted): Promise<{ fileName: string; text: string }> {
  const { base, columns } = await compareScenarios(actor, wanted);
  const { name } = await getGarden(actor);
  return { fileName: comparisonFileName(name), text: comparisonCsv(columns, base) };
}
