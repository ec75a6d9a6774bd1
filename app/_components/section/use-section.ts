'use client';

/** Everything that the three layouts of the section share: model, verdicts, field, ways out, what is held and chosen. */
import { useMemo, useState } from 'react';
import { toldMonth } from '@/lib/scenarios/coldest-month';
import type { Evaluation, ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import { useUnits } from '../units-context';
import type { PlanChange, SectionEdit, Selection } from './plan-edit';
import type { Impossible, SectionContext, SectionSlots } from './section-context';
import type { SectionFrame } from './section-frame';
import { sectionModel } from './section-model';
import { sectionWords } from './section-words';
import { tierVerdict, worstTier, type TierVerdict } from './tier-verdict';
import { useDrag, type Drag } from './use-drag';
import { useWays } from './use-ways';

export interface SectionInput {
  /** With what a held thing makes of it. */
  doc: ScenarioDocument;
  evaluation: Evaluation | null;
  yearPending: boolean;
  edit: SectionEdit;
  slots: SectionSlots;
}

export interface SectionState {
  selection: Selection | null;
  select: (selection: Selection | null) => void;
  parted: ReadonlySet<string>;
  setParted: (ids: readonly string[], apart: boolean) => void;
  impossible: Impossible | null;
  setImpossible: (impossible: Impossible | null) => void;
}

/** What is chosen outlives a change of layout. */
export function useSectionState(first: Selection | null): SectionState {
  const [selection, setSelection] = useState<Selection | null>(first);
  const [parted, setPartedSet] = useState<ReadonlySet<string>>(new Set());
  const [impossible, setImpossible] = useState<Impossible | null>(null);
  return useMemo(
    () => ({
      selection,
      select: (next) => {
        setSelection(next);
        setImpossible((old) => (next?.kind === 'lamp' && old?.lampId === next.id ? old : null));
      },
      parted,
      setParted: (ids, apart) =>
        setPartedSet((before) => {
          const next = new Set(before);
          for (const id of ids)
            if (apart) next.add(id);
            else next.delete(id);
          return next;
        }),
      impossible,
      setImpossible,
    }),
    [selection, parted, impossible],
  );
}

function verdictsOf(doc: ScenarioDocument, evaluation: Evaluation | null): Map<string, TierVerdict> {
  const verdicts = new Map<string, TierVerdict>();
  for (const tier of doc.tiers) {
    const result = evaluation?.tiers.find((each) => each.id === tier.id);
    if (result) verdicts.set(tier.id, tierVerdict(tier, result));
  }
  return verdicts;
}

export interface Section {
  context: SectionContext;
  drag: Drag;
}

export function useSection(input: SectionInput, state: SectionState, frame: SectionFrame): Section {
  const { doc, evaluation, edit, slots, yearPending } = input;
  const units = useUnits();
  const [settled, setSettled] = useState({ doc, evaluation });
  // What stood on the page when something was taken hold of: the figures compare themselves with it.
  if (!edit.held && (settled.doc !== doc || settled.evaluation !== evaluation)) setSettled({ doc, evaluation });
  const watched = useMemo(
    (): SectionEdit => ({
      ...edit,
      apply: (change: PlanChange, label: string) => edit.apply(change, label),
    }),
    [edit],
  );
  const drag = useDrag({ doc, frame, edit: watched });
  const model = useMemo(
    () => sectionModel({ doc, evaluation, frame, parted: state.parted }),
    [doc, evaluation, frame, state.parted],
  );
  const verdicts = useMemo(() => verdictsOf(doc, evaluation), [doc, evaluation]);
  const verdictsBefore = useMemo(() => verdictsOf(settled.doc, settled.evaluation), [settled]);
  const words = useMemo(() => sectionWords(doc.tiers, units), [doc.tiers, units]);
  const worst = worstTier(verdicts);
  const ways = useWays(doc, evaluation, worst, !edit.held && !yearPending);
  const told = evaluation ? toldMonth(doc.room.airTempC, evaluation) : null;
  const context: SectionContext = {
    doc,
    evaluation,
    yearPending,
    model,
    verdicts,
    verdictsBefore: edit.held ? verdictsBefore : null,
    worst,
    told,
    ways: ways.ways,
    waysTier: ways.tierId,
    words,
    edit: watched,
    currency: doc.power.tariff.currency,
    fixtures: slots.fixtures ?? doc.fixtures,
    slots,
    ...state,
  };
  return { context, drag };
}
