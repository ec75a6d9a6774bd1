import type { Evaluation } from './evaluation-document';
import { explainCircuit, explainFixture, explainUpFront, explainYear } from './explain-money';
import { explainHeat } from './explain-heat';
import { explainTier } from './explain-light';
import type { Explanation } from './explanation';
import type { ScenarioDocument } from './scenario-document';
import { resolveScenario } from './resolve-scenario';

export type { Explanation, ExplanationTerm } from './explanation';

/** What the parts of an explanation are made from. */
export interface ExplainContext {
  document: ScenarioDocument;
  scenario: ReturnType<typeof resolveScenario>['scenario'];
  evaluation: Evaluation;
}

/** The explanation of a figure by the first part of its path. */
function partOf(document: ScenarioDocument, evaluation: Evaluation, path: string): Explanation | null {
  const context: ExplainContext = { document, evaluation, scenario: resolveScenario(document).scenario };
  const parts = path.split('.');
  switch (parts[0]) {
    case 'tiers':
      return explainTier(context, path, parts.slice(1, -1).join('.'), parts.at(-1) ?? '');
    case 'heat':
      return explainHeat(context, path, parts.slice(1).join('.'));
    case 'year':
      return explainYear(context, path, parts);
    case 'circuits':
      return explainCircuit(context, path, parts.slice(1, -1).join('.'));
    case 'upFront':
      return explainUpFront(context, path);
    case 'fixtures':
      return explainFixture(context, path, parts.slice(1, -1).join('.'));
    default:
      return null;
  }
}

/**
 * How a figure comes about: its formula, its terms with their standing, its range, its sources and what would make it surer.
 *
 * @param path such as `tiers.t1.dli`, `heat.coldDark.heater`, `year.months.1.cost`, `circuits.c1.continuous`
 * @returns null where the path names no figure, or one that has no bound (a tent that loses no heat warms without end)
 */
export function explainFigure(document: ScenarioDocument, evaluation: Evaluation, path: string): Explanation | null {
  const explanation = partOf(document, evaluation, path);
  if (!explanation || !Number.isFinite(explanation.result.value)) return null;
  const { range } = explanation;
  const bounded = range !== null && Number.isFinite(range.low) && Number.isFinite(range.high);
  return {
    ...explanation,
    terms: explanation.terms.filter((term) => Number.isFinite(term.value)),
    range: bounded ? range : null,
  };
}

/** Whether a figure was left to its default, so that its mark says so. */
export function standingAt(
  evaluation: Evaluation,
  path: string,
): Pick<import('./explanation').ExplanationTerm, 'standing' | 'source'> {
  const assumed = evaluation.assumptions.find((assumption) => assumption.path === path);
  return assumed
    ? { standing: assumed.standing, source: `Default: ${assumed.source}` }
    : { standing: 'given', source: 'Given in this scenario' };
}
