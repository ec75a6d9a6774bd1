'use client';

/** The tent cut open, with everything said and everything that can be done, at any width. */
import { useEffect, useMemo, useState, type ReactNode } from 'react';
import { useWidth } from '../chart/use-width';
import { useExplain } from '../explain';
import type { Evaluation } from '@/lib/evaluation/evaluate-scenario';
import { stripProfile } from './light-strip';
import { NarrowStage } from './narrow-stage';
import type { Selection } from './plan-edit';
import type { SectionContext } from './section-context';
import { TableStage } from './table-stage';
import { useSectionState, type SectionInput, type SectionState } from './use-section';
import type { SectionView } from './view-choice';
import { WideStage } from './wide-stage';

export const WIDE_FROM_PX = 1180;

export interface StageProps {
  input: SectionInput;
  state: SectionState;
  chooseView: (view: SectionView) => void;
  stripsBefore: (context: SectionContext) => ReadonlyMap<string, readonly number[]> | null;
  explaining: boolean;
  firstVisit?: ((context: SectionContext) => ReactNode) | undefined;
  /** In the foot, in place of the cautions. */
  footEnd?: ReactNode;
}

export interface SectionStageProps {
  input: SectionInput;
  /** What the server guesses of the page's width until the browser says. */
  initialWidthPx: number;
  initialSelection?: Selection | null;
  firstVisit?: (context: SectionContext) => ReactNode;
  left?: ReactNode;
  footEnd?: ReactNode;
}

export function SectionStage({
  input,
  initialWidthPx,
  initialSelection,
  firstVisit,
  left,
  footEnd,
}: SectionStageProps) {
  const [ref, measuredPx] = useWidth<HTMLDivElement>(initialWidthPx);
  // Narrower than any screen there is: a page that is being laid out or printed.
  const widthPx = Math.max(320, measuredPx);
  const [view, setView] = useState<SectionView>('front');
  const state = useSectionState(initialSelection ?? null);
  const explaining = useExplain().open !== null;
  const stripsBefore = useStripsBefore(input.evaluation, input.edit.held);
  const props: StageProps = {
    input,
    state,
    chooseView: setView,
    stripsBefore,
    explaining,
    firstVisit,
    footEnd,
  };
  return (
    <div ref={ref} data-section={view}>
      <Announcer input={input} />
      {view === 'table' ? (
        <TableStage {...props} widthPx={widthPx} />
      ) : widthPx >= WIDE_FROM_PX ? (
        <WideStage {...props} widthPx={widthPx} view={view} left={left} />
      ) : (
        <NarrowStage {...props} widthPx={widthPx} view={view} left={left} />
      )}
    </div>
  );
}

function useStripsBefore(evaluation: Evaluation | null, held: boolean) {
  const [settled, setSettled] = useState(evaluation);
  if (!held && settled !== evaluation) setSettled(evaluation);
  return useMemo(
    () => (context: SectionContext) =>
      held && settled
        ? new Map(settled.tiers.map((tier) => [tier.id, stripProfile(tier.grid, context.model.frame.view).mean]))
        : null,
    [held, settled],
  );
}

const SPOKEN_AFTER_MS = 500;

/** The verdicts, spoken politely half a second after the last change. */
function Announcer({ input }: { input: SectionInput }) {
  const { doc, evaluation } = input;
  const text = (evaluation?.tiers ?? [])
    .map((result, i) => {
      const name = doc.tiers.find((tier) => tier.id === result.id)?.name ?? `Tier ${i + 1}`;
      const where = { below: 'below its band', inside: 'inside its band', above: 'above its band', none: 'no crop' }[
        result.verdict
      ];
      return `${name}: ${result.dliMolM2D.mean.toFixed(1)} mol a day, ${where}.`;
    })
    .join(' ');
  const [spoken, setSpoken] = useState('');
  useEffect(() => {
    const timer = window.setTimeout(() => setSpoken(text), SPOKEN_AFTER_MS);
    return () => window.clearTimeout(timer);
  }, [text]);
  return (
    <p aria-live="polite" className="sr-only">
      {spoken}
    </p>
  );
}
