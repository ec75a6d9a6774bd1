'use client';

/** The tent page: the section with a scenario behind it that saves itself. */
import { useCallback, useMemo, useState } from 'react';
import type { ScenarioPlate } from '@/app/_components/scenario-plates';
import { FirstVisit } from '@/app/_components/section/first-visit';
import type { PlanChange, SectionEdit } from '@/app/_components/section/plan-edit';
import { SectionExplain } from '@/app/_components/section/section-explain';
import { SectionStage } from '@/app/_components/section/section-stage';
import { useUndoKeys } from '@/app/_components/section/use-undo-keys';
import { TentFrame } from '@/app/_components/tent-frame';
import type { Evaluation } from '@/lib/evaluation/evaluate-scenario';
import { useLiveEvaluation } from '@/lib/evaluation/evaluation.hooks';
import type { Plan } from '@/lib/scenarios/plan.schema';
import { saveScenario } from '@/lib/scenarios/scenario.hooks';
import type { Workbench } from '@/lib/scenarios/scenario.schema';
import { usePlanEditor } from '@/lib/scenarios/use-plan-editor';
import { EditorState } from './editor-state';
import { plateFact } from './plate-facts';
import { ScenarioVerbs } from './scenario-verbs';
import { useDocuments, useTargets } from './use-scenario-document';
import { useSlots } from './use-slots';
import { useTentBody } from './use-tent-body';

interface SectionWorkbenchProps {
  workbench: Workbench;
  evaluation: Evaluation;
  plates: readonly ScenarioPlate[];
  initialWidthPx: number;
}

const READ_ONLY = 'Your role reads plans and changes none. An owner or a planner of the garden can.';

export function SectionWorkbench({ workbench, evaluation, plates, initialWidthPx }: SectionWorkbenchProps) {
  const { scenario, garden, room } = workbench;
  const { gardenId } = garden;
  const { scenarioId } = scenario;
  const initial = useMemo(() => ({ plan: scenario.plan, version: scenario.version }), [scenario]);
  const save = useCallback(
    (plan: Plan, version: number) => saveScenario(gardenId, scenarioId, { version, plan }),
    [gardenId, scenarioId],
  );
  const mayEdit = workbench.can['scenario.update'];
  const editor = usePlanEditor<Plan>({
    draftKey: mayEdit ? `cellarsun.plan.${scenarioId}` : null,
    initial,
    save: mayEdit ? save : null,
  });
  const { settled, apply, preview } = editor;
  useUndoKeys(editor.undo, editor.redo);

  const [name, setName] = useState(scenario.name);
  const body = useTentBody(gardenId, workbench.tent);
  const targets = useTargets(workbench, editor.plan);
  const documentOf = useDocuments(workbench, targets, body.tent);
  const doc = useMemo(() => documentOf(editor.plan), [documentOf, editor.plan]);
  const live = useLiveEvaluation(doc, evaluation);

  const edit = useMemo(
    (): SectionEdit => ({
      readOnly: mayEdit ? null : READ_ONLY,
      held: editor.held,
      apply: (change: PlanChange, label: string) => apply(change(settled), label),
      preview: (change) => preview(change && change(settled)),
    }),
    [mayEdit, editor.held, settled, apply, preview],
  );
  const slots = useSlots({ workbench, editor, documentOf, targets, setTent: body.set });
  const tierHeightsFrac = doc.tiers.map((tier) => tier.topHeightM / doc.tent.heightM);
  const shownPlates = plates.map((plate) =>
    plate.scenarioId === scenarioId
      ? { ...plate, name, fact: plateFact(workbench, live.evaluation ?? evaluation), tierHeightsFrac }
      : plate,
  );
  return (
    <TentFrame
      gardenId={gardenId}
      tent={body.tent}
      room={room}
      scenarios={shownPlates}
      scenarioId={scenarioId}
      page="section"
      wide
      onTryAnother={
        <ScenarioVerbs workbench={workbench} tent={body.tent} name={name} rename={setName} version={editor.version} />
      }
      right={<EditorState editor={editor} readOnly={!mayEdit} tentProblem={body.problem} />}
    >
      <SectionExplain doc={doc} evaluation={live.evaluation}>
        <SectionStage
          input={{
            doc,
            evaluation: live.evaluation,
            yearPending: live.yearStatus === 'pending',
            edit,
            slots,
          }}
          initialWidthPx={initialWidthPx}
          firstVisit={(context) => <FirstVisit context={context} />}
        />
      </SectionExplain>
    </TentFrame>
  );
}
