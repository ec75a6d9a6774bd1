'use client';

/** A working tent without a server: every edit, undo and figure of the section, and nothing is sent anywhere. */
import { useEffect, useMemo, useRef, type ReactNode } from 'react';
import { useLiveEvaluation } from '@/lib/evaluation/evaluation.hooks';
import type { ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import { usePlanEditor } from '@/lib/scenarios/use-plan-editor';
import { FirstVisit } from './first-visit';
import type { PlanChange, SectionEdit, Selection } from './plan-edit';
import type { SectionSlots } from './section-context';
import { SectionExplain } from './section-explain';
import { SectionStage } from './section-stage';
import { useUndoKeys } from './use-undo-keys';

export interface LiveTentProps {
  document: ScenarioDocument;
  /** Told of each settled change; nothing else leaves this part. */
  onChange?: ((document: ScenarioDocument) => void) | undefined;
  initialWidthPx?: number;
  initialSelection?: Selection | null;
  /** The page's own words at the left of a wide tent, or above the rows of a narrow one. */
  left?: ReactNode;
  /** In the foot, in place of the cautions. */
  footEnd?: ReactNode;
  slots?: SectionSlots;
}

const NO_SLOTS: SectionSlots = {};

export function LiveTent(props: LiveTentProps) {
  const { document, onChange, initialWidthPx = 1440, initialSelection = null, left, footEnd, slots = NO_SLOTS } = props;
  const initial = useMemo(() => ({ plan: document, version: 0 }), [document]);
  const editor = usePlanEditor<ScenarioDocument>({ draftKey: null, initial, save: null });
  const { settled, apply, preview } = editor;
  const told = useRef(document);

  useEffect(() => {
    // The page changed the document from outside (a month, a crop, a price).
    if (document === told.current) return;
    told.current = document;
    apply(document, 'page');
  }, [document, apply]);
  useEffect(() => {
    if (settled === told.current) return;
    told.current = settled;
    onChange?.(settled);
  }, [settled, onChange]);
  useUndoKeys(editor.undo, editor.redo);

  const edit = useMemo(
    (): SectionEdit => ({
      readOnly: null,
      held: editor.held,
      apply: (change: PlanChange, label: string) => apply(change(settled), label),
      preview: (change) => preview(change && change(settled)),
    }),
    [editor.held, settled, apply, preview],
  );
  const allSlots = useMemo(
    (): SectionSlots => ({
      ...slots,
      setTent: (patch) => apply({ ...settled, tent: { ...settled.tent, ...patch } }, 'tent'),
    }),
    [slots, apply, settled],
  );
  const live = useLiveEvaluation(editor.plan);
  return (
    <SectionExplain doc={editor.plan} evaluation={live.evaluation}>
      <SectionStage
        input={{
          doc: editor.plan,
          evaluation: live.evaluation,
          yearPending: live.yearStatus === 'pending',
          edit,
          slots: allSlots,
        }}
        initialWidthPx={initialWidthPx}
        initialSelection={initialSelection}
        firstVisit={(context) => <FirstVisit context={context} />}
        left={left}
        footEnd={footEnd}
      />
    </SectionExplain>
  );
}
