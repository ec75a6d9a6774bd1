import { defaults, type DefaultKey } from './defaults';
import { evaluateScenario } from './evaluate-scenario';
import type { Assumption, Evaluation } from './evaluation-document';
import type { ScenarioDocument } from './scenario-document';

/** A figure that may lie between two values, by its path in the document. */
interface Uncertain {
  path: string;
  low: number;
  high: number;
}

/** Where a default's plausible range applies: the scenario's own keys, not lists. */
const RANGED: Record<string, DefaultKey> = {
  'tent.floorUWM2K': 'tent.floorUWM2K',
  'tent.leakageAch': 'tent.leakageAch',
  'tent.liningReflectanceFrac': 'tent.liningReflectanceFrac',
  'tent.floorReflectanceFrac': 'tent.floorReflectanceFrac',
  'tent.liningEmittanceFrac': 'tent.liningEmittanceFrac',
};

const FABRIC_U_RANGE = [2, 5] as const;

/** What is uncertain: what the scenario says itself, and the defaults it leans on. */
function uncertainOf(document: ScenarioDocument, assumptions: readonly Assumption[]): Uncertain[] {
  const said = Object.entries(document.range ?? {}).map(([path, [low, high]]) => ({ path, low, high }));
  const known = new Set(said.map((each) => each.path));
  const leaned = assumptions.flatMap((assumption): Uncertain[] => {
    if (known.has(assumption.path)) return [];
    if (assumption.path === 'tent.fabricUWM2K')
      return [{ path: assumption.path, low: FABRIC_U_RANGE[0], high: FABRIC_U_RANGE[1] }];
    const key = RANGED[assumption.path];
    const range =
      key && 'range' in defaults[key] ? (defaults[key] as { range: readonly [number, number] }).range : null;
    return range ? [{ path: assumption.path, low: range[0], high: range[1] }] : [];
  });
  return [...said, ...leaned];
}

/** The document with one figure set; only plain `part.key` paths can be set. */
function withValue(document: ScenarioDocument, path: string, value: number): ScenarioDocument | null {
  const [part, key, more] = path.split('.');
  if (!part || !key || more || !(part in document)) return null;
  const section = document[part as keyof ScenarioDocument];
  if (typeof section !== 'object' || section === null || Array.isArray(section)) return null;
  return { ...document, [part]: { ...section, [key]: value } };
}

/**
 * The range of a figure, from the ranges of what it rests on: each input moved alone to either end, the differences added as
 * independent errors are, root of the sum of squares.
 *
 * @param read takes the figure from an evaluation
 */
export function rangeOf(
  document: ScenarioDocument,
  evaluation: Evaluation,
  read: (evaluation: Evaluation) => number | null,
  withYear: boolean,
): { low: number; high: number; widestBy: string } | null {
  const middle = read(evaluation);
  if (middle === null) return null;
  let down = 0;
  let up = 0;
  let widest = { by: '', size: 0 };
  for (const { path, low, high } of uncertainOf(document, evaluation.assumptions)) {
    const ends = [low, high].flatMap((value) => {
      const changed = withValue(document, path, value);
      const figure = changed ? read(evaluateScenario(changed, { year: withYear })) : null;
      return figure === null ? [] : [figure - middle];
    });
    if (ends.length === 0) continue;
    const below = Math.min(0, ...ends);
    const above = Math.max(0, ...ends);
    down += below * below;
    up += above * above;
    if (above - below > widest.size) widest = { by: path, size: above - below };
  }
  if (widest.size < 1e-9) return null;
  return { low: middle - Math.sqrt(down), high: middle + Math.sqrt(up), widestBy: widest.by };
}
