'use client';

import type { SavedRow } from '@/lib/http/use-saved-row';
import { Button } from './button';
import { SaveState } from './save-state';

/** Save state and undo of a row's page. */
export function RowState<T extends { version: number }>({
  saved,
  readOnly,
}: {
  saved: SavedRow<T>;
  readOnly: boolean;
}) {
  if (readOnly) return <SaveState status="read-only" />;
  return (
    <span className="inline-flex items-center gap-4">
      <button
        type="button"
        className="link-opens min-h-6 disabled:text-ink-soft disabled:no-underline"
        disabled={!saved.canUndo}
        onClick={saved.undo}
      >
        Undo
      </button>
      <SaveState status={saved.status} at={saved.savedAt} />
    </span>
  );
}

/** What stands against a row: a refusal, or somebody else's edit. Nothing was overwritten and nothing is lost. */
export function RowTrouble<T extends { version: number }>({ saved }: { saved: SavedRow<T> }) {
  if (saved.theirs) {
    return (
      <div role="alert" className="mt-6 border-l-[3px] border-slate py-1 pl-4">
        <p className="text-17 font-semibold">Somebody else changed this while you did.</p>
        <p className="pt-1 text-14 text-ink-soft">
          Yours stays on the page and is not saved yet. Choose whose to keep.
        </p>
        <p className="flex flex-wrap gap-4 pt-3">
          <Button onClick={saved.keepMine}>Keep mine</Button>
          <Button look="plain" onClick={saved.takeTheirs}>
            Take theirs
          </Button>
        </p>
      </div>
    );
  }
  if (!saved.problem) return null;
  return (
    <div role="alert" className="mt-6 border-l-[3px] border-ember py-1 pl-4">
      <p className="text-14 font-semibold text-ember-ink">{saved.problem}</p>
      <p className="text-12 text-ink-soft">What you typed stays here; the last figures that fitted are kept.</p>
    </div>
  );
}
