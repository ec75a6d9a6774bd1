'use client';

/** Every figure of the section opens: its sum from the physics, and beside it what the crop wants. */
import { useCallback, type ReactNode } from 'react';
import { explainFigure, type Evaluation, type ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import { targetEdges } from '@/lib/scenarios/ways-out';
import { ExplainProvider } from '../explain';

interface SectionExplainProps {
  doc: ScenarioDocument;
  evaluation: Evaluation | null;
  children: ReactNode;
}

export function SectionExplain({ doc, evaluation, children }: SectionExplainProps) {
  const explain = useCallback(
    (path: string) => (evaluation ? explainFigure(doc, evaluation, path) : null),
    [doc, evaluation],
  );
  const wanted = useCallback(
    (path: string) => {
      const match = /^tiers\.(.+)\.dli$/.exec(path);
      const target = doc.tiers.find((tier) => tier.id === match?.[1])?.target;
      return target ? targetEdges(target) : null;
    },
    [doc],
  );
  return (
    <ExplainProvider explain={explain} wanted={wanted}>
      {children}
    </ExplainProvider>
  );
}
