'use client';

import type { Route } from 'next';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { TextField } from '@/app/_components/text-field';
import { ApiError } from '@/lib/http/api-client';
import { saveScenario, useCopyScenario, useDeleteScenario } from '@/lib/scenarios/scenario.hooks';
import type { Workbench } from '@/lib/scenarios/scenario.schema';
import { useUpdateTent } from '@/lib/tents/tent.hooks';
import type { Tent } from '@/lib/tents/tent.schema';

interface ScenarioVerbsProps {
  workbench: Workbench;
  tent: Tent;
  name: string;
  rename: (name: string) => void;
  version: number;
}

type Open = 'rename' | 'delete' | null;
const said = (error: unknown) =>
  error instanceof ApiError ? (error.problem.detail ?? error.problem.title) : 'The server did not answer. Try again.';

/** What can be done with a whole scenario: try another, rename, take into use, delete. */
export function ScenarioVerbs({ workbench, tent, name, rename, version }: ScenarioVerbsProps) {
  const { scenario, garden, siblings, can } = workbench;
  const { gardenId } = garden;
  const router = useRouter();
  const copy = useCopyScenario(gardenId);
  const remove = useDeleteScenario(gardenId);
  const update = useUpdateTent(gardenId);
  const [open, setOpen] = useState<Open>(null);
  const [problem, setProblem] = useState<string | null>(null);
  const go = (scenarioId: string) => router.push(`/gardens/${gardenId}/tents/${tent.tentId}/${scenarioId}` as Route);
  const inUse = tent.currentScenarioId === scenario.scenarioId;
  const fail = (error: unknown) => setProblem(said(error));
  const word = 'min-h-6 touch-44 cursor-pointer text-12 link-opens';
  return (
    <div className="max-w-80">
      <div className="flex flex-wrap items-baseline gap-x-4">
        {can['scenario.create'] && (
          <button
            type="button"
            className="min-h-6 cursor-pointer touch-44 text-14 font-semibold link-does"
            disabled={copy.isPending}
            onClick={() =>
              copy.mutate({ fromId: scenario.scenarioId }, { onSuccess: (made) => go(made.scenarioId), onError: fail })
            }
          >
            Try another
          </button>
        )}
        {can['scenario.update'] && (
          <button
            type="button"
            className={word}
            aria-expanded={open === 'rename'}
            onClick={() => setOpen(open === 'rename' ? null : 'rename')}
          >
            Rename
          </button>
        )}
        {inUse ? (
          <span className="text-12 text-ink-soft">This one is in use</span>
        ) : (
          can['tent.update'] && (
            <button
              type="button"
              className={word}
              onClick={() =>
                update.mutate(
                  { tentId: tent.tentId, version: tent.version, currentScenarioId: scenario.scenarioId },
                  { onSuccess: () => router.refresh(), onError: fail },
                )
              }
            >
              Use this one
            </button>
          )
        )}
        {can['scenario.delete'] && siblings.length > 1 && (
          <button
            type="button"
            className={word}
            aria-expanded={open === 'delete'}
            onClick={() => setOpen(open === 'delete' ? null : 'delete')}
          >
            Delete
          </button>
        )}
      </div>
      {open === 'rename' && (
        <RenameField
          name={name}
          onDone={async (next) => {
            try {
              await saveScenario(gardenId, scenario.scenarioId, { version, name: next });
              rename(next);
              setOpen(null);
              router.refresh();
            } catch (error) {
              fail(error);
            }
          }}
        />
      )}
      {open === 'delete' && (
        <p className="text-12">
          “{name}” goes for everybody, and undo does not reach it.{' '}
          <button
            type="button"
            className="min-h-6 cursor-pointer font-semibold text-ember-ink underline underline-offset-4"
            onClick={() =>
              remove.mutate(scenario.scenarioId, {
                onSuccess: () => {
                  const next = siblings.find((each) => each.scenarioId !== scenario.scenarioId);
                  if (next) go(next.scenarioId);
                },
                onError: fail,
              })
            }
          >
            Delete it
          </button>{' '}
          <button type="button" className={word} onClick={() => setOpen(null)}>
            Keep it
          </button>
        </p>
      )}
      {problem && (
        <p role="alert" className="text-12 text-ember-ink">
          {problem}
        </p>
      )}
    </div>
  );
}

function RenameField({ name, onDone }: { name: string; onDone: (name: string) => void }) {
  const [typed, setTyped] = useState(name);
  const wrong = typed.trim() === '' ? 'Type a name.' : typed.length > 80 ? 'Use at most 80 letters.' : undefined;
  return (
    <form
      method="post"
      className="flex items-end gap-3"
      onSubmit={(event) => {
        event.preventDefault();
        if (!wrong) onDone(typed.trim());
      }}
    >
      <TextField label="Its name" value={typed} onChange={setTyped} error={wrong} autoFocus />
      <button type="submit" className="min-h-7 cursor-pointer touch-44 text-14 font-semibold link-does">
        Rename
      </button>
    </form>
  );
}
