/** Tries ways out, and the rail of a held lamp, beside the page: each takes many evaluations. */
import {
  createLightCache,
  evaluateScenario,
  type Evaluation,
  type ScenarioDocument,
} from '../evaluation/evaluate-scenario';
import { heightsInside, waysOut, type Evaluate, type WayOut } from './ways-out';

export type WaysRequest =
  | { ticket: number; kind: 'ways'; document: ScenarioDocument; evaluation: Evaluation; tierId: string }
  | {
      ticket: number;
      kind: 'rail';
      document: ScenarioDocument;
      lamps: string[];
      tierId: string;
      lowM: number;
      highM: number;
    };

export interface WaysAnswer {
  ticket: number;
  ways: WayOut[];
  insideM: { fromM: number; toM: number } | null;
}

const lightCache = createLightCache();
const evaluate: Evaluate = (document, { year }) => evaluateScenario(document, { year, lightCache });
let running = new AbortController();

async function answer(request: WaysRequest): Promise<WaysAnswer | null> {
  const { ticket, document, tierId } = request;
  // A newer question ends the one before it at its next pause.
  running.abort();
  const own = (running = new AbortController());
  if (request.kind === 'rail') return { ticket, ways: [], insideM: heightsInside(document, { ...request, evaluate }) };
  const pause = () => new Promise<void>((resolve) => setTimeout(resolve, 0));
  const ways = await waysOut(document, request.evaluation, tierId, { evaluate, pause, signal: own.signal });
  return own.signal.aborted ? null : { ticket, ways, insideM: null };
}

self.onmessage = async ({ data }: MessageEvent<WaysRequest>) => {
  try {
    const found = await answer(data);
    if (found) self.postMessage(found);
  } catch {
    // A trial that the physics refuses is no way out.
    self.postMessage({ ticket: data.ticket, ways: [], insideM: null } satisfies WaysAnswer);
  }
};
