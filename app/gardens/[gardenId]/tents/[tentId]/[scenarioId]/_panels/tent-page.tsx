'use client';

import { useCallback, useMemo, type ReactNode } from 'react';
import { ExplainProvider, ExplainSheet, useExplain } from '@/app/_components/explain';
import { TentFrame, type TentPage } from '@/app/_components/tent-frame';
import { explainFigure, type Evaluation, type ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import type { Workbench } from '@/lib/scenarios/scenario.schema';

interface TentPanelPageProps {
  workbench: Workbench;
  document: ScenarioDocument;
  evaluation: Evaluation;
  page: TentPage;
  headline: ReactNode;
  lead?: ReactNode;
  children: ReactNode;
}

/** A page of a tent beside its section: the frame, and every number opening in a column of its own. */
export function TentPanelPage({ workbench, document, evaluation, page, headline, lead, children }: TentPanelPageProps) {
  const { garden, tent, room, siblings, scenario } = workbench;
  const explain = useCallback((path: string) => explainFigure(document, evaluation, path), [document, evaluation]);
  const { heightM } = tent.body;
  const plates = useMemo(
    () =>
      siblings.map(({ scenarioId, name, tierTopsM }) => ({
        scenarioId,
        name,
        tierHeightsFrac: tierTopsM.map((topM) => topM / heightM),
      })),
    [siblings, heightM],
  );
  return (
    <ExplainProvider explain={explain}>
      <TentFrame
        gardenId={garden.gardenId}
        tent={tent}
        room={room}
        scenarios={plates}
        scenarioId={scenario.scenarioId}
        page={page}
        headline={headline}
        lead={lead}
      >
        <WithExplanation>{children}</WithExplanation>
      </TentFrame>
    </ExplainProvider>
  );
}

/** The sheet stands beside the page's words, never over them; on a phone it comes first. */
function WithExplanation({ children }: { children: ReactNode }) {
  const { open } = useExplain();
  if (!open) return children;
  return (
    <div className="lg:grid lg:grid-cols-[minmax(0,1fr)_428px] lg:gap-10">
      <div className="min-w-0 max-lg:order-last">{children}</div>
      <div className="pt-6">
        <ExplainSheet />
      </div>
    </div>
  );
}
