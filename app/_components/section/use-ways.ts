'use client';

import { useEffect, useRef, useState } from 'react';
import type { Evaluation, ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import { askWays, type WaysHelper } from '@/lib/scenarios/ways-out.hooks';
import type { WayOut } from '@/lib/scenarios/ways-out';
import { lampRange } from '@/lib/scenarios/lamp-range';

const QUIET_MS = 350;

/** One helper for as long as the part is on the page. */
function useHelper() {
  const helper = useRef<WaysHelper | null>(null);
  useEffect(() => {
    helper.current = askWays();
    return () => {
      helper.current?.end();
      helper.current = null;
    };
  }, []);
  return helper;
}

/** Ways out for the tier that most wants one, tried in the quiet after the last change. */
export function useWays(
  doc: ScenarioDocument,
  evaluation: Evaluation | null,
  tierId: string | null,
  quiet: boolean,
): { ways: readonly WayOut[]; tierId: string | null } {
  const helper = useHelper();
  const [found, setFound] = useState<{ doc: ScenarioDocument; tierId: string; ways: WayOut[] } | null>(null);
  useEffect(() => {
    if (!quiet || !evaluation || !tierId) return;
    const timer = window.setTimeout(() => {
      helper.current?.ask({ kind: 'ways', document: doc, evaluation, tierId }, ({ ways }) =>
        setFound({ doc, tierId, ways }),
      );
    }, QUIET_MS);
    return () => window.clearTimeout(timer);
  }, [doc, evaluation, tierId, quiet, helper]);
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
  const helper = useHelper();
  const [rail, setRail] = useState<{ before: ScenarioDocument; rail: Rail } | null>(null);
  const key = ids.join();
  useEffect(() => {
    if (!before || !lampId || !tierId) return;
    const lamps = key.split(',');
    const range = lampRange(before, lamps);
    helper.current?.ask({ kind: 'rail', document: before, lamps, tierId, ...range }, ({ insideM }) =>
      setRail({ before, rail: { ...range, insideM } }),
    );
  }, [before, lampId, tierId, key, helper]);
  return rail && rail.before === before ? rail.rail : null;
}
