'use client';

import { useEffect, useMemo, useRef, useState } from 'react';
import { createLightCache, evaluateScenario, type Evaluation, type ScenarioDocument } from './evaluate-scenario';
import type { YearAnswer, YearRequest } from './evaluation.worker';

export type YearStatus = 'ready' | 'pending' | 'failed';

export interface LiveEvaluation {
  /** Light and design states at once; year and money those of a moment ago until the worker answers. Null for an impossible scenario. */
  evaluation: Evaluation | null;
  yearStatus: YearStatus;
}

const SETTLED_MS = 60;

/** The year of a document, reckoned in a worker once it has stood still for a moment. */
function useYear(
  document: ScenarioDocument,
  first: Evaluation | null,
): { whole: Evaluation | null; of: ScenarioDocument | null; status: YearStatus } {
  const [answer, setAnswer] = useState<{ whole: Evaluation | null; of: ScenarioDocument | null }>({
    whole: first,
    of: first ? document : null,
  });
  const [failedFor, setFailedFor] = useState<ScenarioDocument | null>(null);
  const worker = useRef<Worker | null>(null);
  const ticket = useRef(0);

  useEffect(() => {
    const made = new Worker(new URL('./evaluation.worker.ts', import.meta.url), { type: 'module' });
    worker.current = made;
    return () => made.terminate();
  }, []);

  useEffect(() => {
    const mine = ++ticket.current;
    const timer = setTimeout(() => {
      const listening = worker.current;
      if (!listening) return;
      listening.onmessage = ({ data }: MessageEvent<YearAnswer>) => {
        if (data.ticket !== ticket.current) return;
        if (data.evaluation) setAnswer({ whole: data.evaluation, of: document });
        else setFailedFor(document);
      };
      listening.postMessage({ ticket: mine, document } satisfies YearRequest);
    }, SETTLED_MS);
    return () => clearTimeout(timer);
  }, [document]);

  return { ...answer, status: answer.of === document ? 'ready' : failedFor === document ? 'failed' : 'pending' };
}

/**
 * What the physics says of a document while it is being changed.
 *
 * @param first an evaluation of this very document from the server, so that the first paint has its year
 */
export function useLiveEvaluation(document: ScenarioDocument, first: Evaluation | null = null): LiveEvaluation {
  const [lightCache] = useState(createLightCache);
  const { whole, of, status } = useYear(document, first);
  const quick = useMemo(() => {
    try {
      return evaluateScenario(document, { year: false, lightCache });
    } catch {
      return null;
    }
  }, [document, lightCache]);
  const evaluation = useMemo(() => {
    if (of === document) return whole;
    if (!quick) return null;
    return whole ? { ...quick, year: whole.year } : quick;
  }, [document, of, quick, whole]);
  return { evaluation, yearStatus: status };
}
