import { DomainError } from '@/physics/domain-error';
import { evaluateLightScene } from '@/physics/light/evaluate-light-scene';
import type { LightResult } from '@/physics/light/light-documents';
import { evaluateScenario } from '@/physics/plan/evaluate-scenario';
import type { Evaluation } from '@/physics/plan/evaluation-document';
import { parseLightScene, parseScenarioDocument, type DocumentProblem } from './problems';

/** The same in the command, the route and the app: one document in, its result or its problems out. */
export type Evaluated = { ok: true; result: Evaluation | LightResult } | { ok: false; problems: DocumentProblem[] };

function schemaOf(input: unknown): unknown {
  return typeof input === 'object' && input !== null && 'schema' in input ? input.schema : undefined;
}

/** Physics refuses what no schema can see; that too is told as a problem of the document. */
function refused(error: unknown): Evaluated {
  if (!(error instanceof DomainError)) throw error;
  const problem = {
    path: error.quantity,
    value: String(error.value),
    range: `${error.min} to ${error.max}`,
    unit: error.unit,
    message: error.message,
  };
  return { ok: false, problems: [problem] };
}

export function evaluateDocument(input: unknown): Evaluated {
  const schema = schemaOf(input);
  const started = performance.now();
  try {
    if (schema === 'light-scene/1') {
      const parsed = parseLightScene(input);
      if (!parsed.ok) return parsed;
      return { ok: true, result: { ...evaluateLightScene(parsed.value), elapsedMs: performance.now() - started } };
    }
    if (schema === 'scenario/1') {
      const parsed = parseScenarioDocument(input);
      if (!parsed.ok) return parsed;
      const result = evaluateScenario(parsed.value);
      const elapsed = performance.now() - started;
      return { ok: true, result: { ...result, elapsedMs: { light: 0, year: elapsed } } };
    }
  } catch (error) {
    return refused(error);
  }
  const message = 'Say which document this is: light-scene/1 or scenario/1.';
  return {
    ok: false,
    problems: [{ path: 'schema', value: schema ?? 'missing', range: 'light-scene/1, scenario/1', unit: '', message }],
  };
}
