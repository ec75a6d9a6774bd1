import type { Assumption, Evaluation } from '@/physics/plan/evaluation-document';
import { explainFigure as explain, type Explanation } from '@/physics/plan/explain';
import type { ScenarioDocument } from '@/physics/plan/scenario-document';

function isAssumption(value: unknown): value is Assumption {
  if (typeof value !== 'object' || value === null) return false;
  const { path, source, standing } = value as Record<string, unknown>;
  return [path, source, standing].every((each) => typeof each === 'string');
}

/** What the mapper noted of figures that nobody gave: the price of a bill not read, photons reckoned from lumens. */
function notedIn({ app }: ScenarioDocument): Assumption[] {
  const noted = app?.['assumptions'];
  return Array.isArray(noted) ? noted.filter(isAssumption) : [];
}

/**
 * How a figure comes about. The physics never looks at `app`; what is noted there of assumed figures stands beside the
 * evaluation's own assumptions, so that an opened figure marks both alike.
 *
 * @returns null where the path names no figure of this evaluation
 */
export function explainFigure(document: ScenarioDocument, evaluation: Evaluation, path: string): Explanation | null {
  const assumptions = [...evaluation.assumptions, ...notedIn(document)];
  return explain(document, { ...evaluation, assumptions }, path);
}
