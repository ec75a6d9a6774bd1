'use client';

import { SaveState, type SaveStatus } from '@/app/_components/save-state';
import type { Plan } from '@/lib/scenarios/plan.schema';
import type { PlanEditor } from '@/lib/scenarios/use-plan-editor';

interface EditorStateProps {
  editor: PlanEditor<Plan>;
  readOnly: boolean;
  tentProblem: string | null;
}

const STATUS: Record<PlanEditor<Plan>['status'], SaveStatus> = {
  saved: 'saved',
  waiting: 'saving',
  saving: 'saving',
  offline: 'offline',
  failed: 'unsaved',
  clash: 'waiting',
};

/** Undo, redo, and whether all is kept. */
export function EditorState({ editor, readOnly, tentProblem }: EditorStateProps) {
  if (readOnly) return <SaveState status="read-only" />;
  const verb = 'min-h-6 cursor-pointer disabled:cursor-default disabled:text-ink-soft';
  const toClash = () =>
    document.querySelector<HTMLElement>('[data-clash]')?.scrollIntoView({ block: 'center', behavior: 'instant' });
  return (
    <div>
      <p className="flex items-baseline justify-end gap-5 max-md:gap-3">
        <button type="button" className={verb} disabled={!editor.canUndo} onClick={editor.undo}>
          Undo
        </button>
        <button type="button" className={verb} disabled={!editor.canRedo} onClick={editor.redo}>
          Redo
        </button>
        <span className="min-w-24 text-right">
          {editor.held ? (
            <span className="text-14">Saves when you let go</span>
          ) : (
            <SaveState
              status={STATUS[editor.status]}
              at={editor.savedAt}
              count={editor.clash?.conflicts.length ?? 1}
              onOpen={editor.status === 'clash' ? toClash : editor.retry}
            />
          )}
        </span>
      </p>
      {(editor.problem ?? tentProblem) && (
        <p role="alert" className="max-w-80 text-12 text-ember-ink">
          {editor.problem ?? tentProblem} {editor.problem && 'What you changed is kept in this tab.'}
        </p>
      )}
    </div>
  );
}
