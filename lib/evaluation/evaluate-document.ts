import { DomainError } from '@/physics/domain-error';
import { evaluateLightScene } from '@/physics/light/evaluate-light-scene';
import type { LightResult } from '@/physics/light/light-documents';
import { evaluateScenario } from '@/physics/plan/evaluate-scenario';
import type { Evaluation } from '@/physics/plan/evaluation-document';
import { parseLightScene, parseScenarioDocument, type DocumentProblem } from './problems';

/** The same in the command, the route and the app: one document in, its result or its problems out. */
export type Evaluated = { ok: true; result: Evaluation | LightResult } | { ok: false; problems: DocumentProblem[] };

/** Deeper than any document goes; nesting without end would exhaust the stack of whoever writes it out again. */
const MOST_DEPTH = 40;

const clock = () => performance.now();

function schemaOf(input: unknown): unknown {
  return typeof input === 'object' && input !== null && 'schema' in input ? input.schema : undefined;
}

function isTooDeep(input: unknown): boolean {
  const waiting: { value: unknown; depth: number }[] = [{ value: input, depth: 0 }];
  for (let next = waiting.pop(); next; next = waiting.pop()) {
    const { value, depth } = next;
    if (typeof value !== 'object' || value === null) continue;
    if (depth >= MOST_DEPTH) return true;
    for (const inner of Object.values(value)) waiting.push({ value: inner, depth: depth + 1 });
  }
  return false;
}

const problem = (part: DocumentProblem): Evaluated => ({ ok: false, problems: [part] });

/** Physics refuses what no schema can see; that too is told as a problem of the document. */
function refused(error: unknown): Evaluated {
  if (!(error instanceof DomainError)) throw error;
  return problem({
    path: '',
    value: `${error.quantity} ${String(error.value)}`,
    range: `${error.min} to ${error.max}`,
    unit: error.unit,
    message: error.message,
  });
}

function evaluated(input: unknown, schema: unknown): Evaluated {
  if (schema === 'light-scene/1') {
    const started = clock();
    const parsed = parseLightScene(input);
    if (!parsed.ok) return parsed;
    const result = evaluateLightScene(parsed.value);
    return { ok: true, result: { ...result, elapsedMs: clock() - started } };
  }
  if (schema === 'scenario/1') {
    const parsed = parseScenarioDocument(input);
    return parsed.ok ? { ok: true, result: evaluateScenario(parsed.value, { clock }) } : parsed;
  }
  return problem({
    path: 'schema',
    value: schema === undefined ? 'missing' : typeof schema === 'string' ? schema.slice(0, 80) : typeof schema,
    range: 'light-scene/1, scenario/1',
    unit: '',
    message: 'Say which document this is: light-scene/1 or scenario/1.',
  });
}

/** @param input a parsed JSON document of either schema; anything else is a problem, never a crash */
export function evaluateDocument(input: unknown): Evaluated {
  if (isTooDeep(input))
    return problem({
      path: '',
      value: 'nested too deeply',
      range: `0 to ${MOST_DEPTH}`,
      unit: 'levels',
      message: `This is nested too deeply; at most ${MOST_DEPTH} levels are read.`,
    });
  try {
    return evaluated(input, schemaOf(input));
  } catch (error) {
    return refused(error);
  }
}
