/** The year beside the page, so that a lamp can be dragged while it is reckoned. */
import { evaluateScenario } from '@/physics/plan/evaluate-scenario';
import type { Evaluation } from '@/physics/plan/evaluation-document';
import type { ScenarioDocument } from '@/physics/plan/scenario-document';

export interface YearRequest {
  ticket: number;
  document: ScenarioDocument;
}

export interface YearAnswer {
  ticket: number;
  evaluation: Evaluation | null;
}

self.onmessage = ({ data }: MessageEvent<YearRequest>) => {
  let evaluation: Evaluation | null = null;
  try {
    evaluation = evaluateScenario(data.document);
  } catch {
    // An impossible scenario has no year; the page says what is wrong with it.
  }
  self.postMessage({ ticket: data.ticket, evaluation } satisfies YearAnswer);
};
