'use client';

import { useEffect, useState } from 'react';
import {
  createLightCache,
  evaluateScenario,
  type Evaluation,
  type ScenarioDocument,
} from '@/lib/evaluation/evaluate-scenario';
import { heightsInside, waysOut, type Evaluate, type WayOut } from '@/lib/scenarios/ways-out';
import { lampRange } from '@/lib/scenarios/lamp-range';

const QUIET_MS = 350;
const pause = () => new Promise<void>((resolve) => setTimeout(resolve, 0));

function trial(): Evaluate {
  const lightCache = createLightCache();
  return (doc, { year }) => evaluateScenario(doc, { year, lightCache });
}

/** Ways out for the tier that most wants one, tried in the quiet after the last change. */
export function useWays(
  doc: ScenarioDocument,
  evaluation: Evaluation | null,
  tierId: string | null,
  quiet: boolean,
): { ways: readonly WayOut[]; tierId: string | null } {
  const [evaluate] = useState(trial);
  const [found, setFound] = useState<{ doc: ScenarioDocument; tierId: string; ways: WayOut[] } | null>(null);
  useEffect(() => {
    if (!quiet || !evaluation || !tierId) return;
    const stop = new AbortController();
    const timer = window.setTimeout(async () => {
      try {
        const ways = await waysOut(doc, evaluation, tierId, { evaluate, pause, signal: stop.signal });
        if (!stop.signal.aborted) setFound({ doc, tierId, ways });
      } catch {
        // A trial that the physics refuses is no way out.
        if (!stop.signal.aborted) setFound({ doc, tierId, ways: [] });
      }
    }, QUIET_MS);
    return () => {
      stop.abort();
      window.clearTimeout(timer);
    };
  }, [doc, evaluation, tierId, quiet, evaluate]);
  const current = found && found.doc === doc && found.tierId === tierId ? found : null;
  return { ways: current?.ways ?? [], tierId: current?.tierId ?? null };
}

export interface Rail {
  lowM: number;
  highM: number;
  insideM: { fromM: number; toM: number } | null;
}

/** On taking hold of a lamp: its rail, and the heights at which its tier is inside its band. */
export function useRail(
  before: ScenarioDocument | null,
  lampId: string | null,
  ids: readonly string[],
  tierId: string | null,
): Rail | null {
  const [evaluate] = useState(trial);
  const [rail, setRail] = useState<{ before: ScenarioDocument; rail: Rail } | null>(null);
  const key = ids.join();
  useEffect(() => {
    if (!before || !lampId || !tierId) return;
    const lamps = key.split(',');
    const range = lampRange(before, lamps);
    const timer = window.setTimeout(() => {
      try {
        const insideM = heightsInside(before, { lamps, tierId, ...range, evaluate });
        setRail({ before, rail: { ...range, insideM } });
      } catch {
        setRail({ before, rail: { ...range, insideM: null } });
      }
    }, 60);
    return () => window.clearTimeout(timer);
  }, [before, lampId, tierId, key, evaluate]);
  return rail && rail.before === before ? rail.rail : null;
}
