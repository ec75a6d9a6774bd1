'use client';

/** The chosen lamp's height with two buttons of 44 px: a finger's twin of the drag. Held down, they go on. */
import { useEffect, useRef } from 'react';
import { setLampAboveLeaves } from '@/lib/scenarios/edit-plan';
import { lampRange } from '@/lib/scenarios/lamp-range';
import { groupOf } from './lamp-groups';
import type { SectionContext } from './section-context';

const STEP_M = 0.01;
const FIRST_MS = 380;
const NEXT_MS = 90;

export function StepperRow({ context }: { context: SectionContext }) {
  const { selection, model, edit, words, doc } = context;
  const group = selection?.kind === 'lamp' ? groupOf(model.groups, selection.id) : undefined;
  const timer = useRef<number | undefined>(undefined);
  const step = useRef<(by: number) => void>(() => {});
  useEffect(() => {
    step.current = (by) => {
      if (!group || edit.readOnly !== null) return;
      const ids = group.lamps.map((lamp) => lamp.id);
      const range = lampRange(doc, ids);
      const to = Math.round(Math.min(range.highM, Math.max(range.lowM, group.aboveLeavesM + by)) * 1e4) / 1e4;
      edit.apply((plan) => setLampAboveLeaves(plan, ids, to), `step ${group.id}`);
    };
  });
  useEffect(() => () => window.clearTimeout(timer.current), []);
  if (!group) return null;
  const stop = () => window.clearTimeout(timer.current);
  const hold = (by: number) => {
    const again = (wait: number) => {
      timer.current = window.setTimeout(() => {
        step.current(by);
        again(NEXT_MS);
      }, wait);
    };
    again(FIRST_MS);
  };
  const button = (by: number, sign: string, says: string) => (
    <button
      type="button"
      aria-label={says}
      disabled={edit.readOnly !== null}
      className="grid h-11 w-11 cursor-pointer place-items-center border border-ink text-17 font-semibold disabled:text-ink-soft"
      onClick={() => step.current(by)}
      onPointerDown={() => hold(by)}
      onPointerUp={stop}
      onPointerLeave={stop}
      onPointerCancel={stop}
      onContextMenu={(event) => event.preventDefault()}
    >
      {sign}
    </button>
  );
  return (
    <div className="flex items-center justify-between gap-3 border-b border-line py-2">
      <p className="min-w-0">
        <span className="block font-semibold text-lamp-ink">{words.group(group)}</span>
        <span className="block text-12 text-ink-soft">{group.tier ? 'above the leaves' : 'above the floor'}</span>
      </p>
      <div className="flex flex-none">
        {button(-STEP_M, '−', 'Lower by 1 centimetre')}
        <output className="grid h-11 min-w-[4.5rem] place-items-center border-y border-ink bg-sheet text-14 font-semibold">
          {words.say(group.aboveLeavesM, 'length')}
        </output>
        {button(STEP_M, '+', 'Higher by 1 centimetre')}
      </div>
    </div>
  );
}
