'use client';

import type { KeyboardEvent } from 'react';

export type SectionView = 'front' | 'side' | 'table';
const VIEWS: readonly { view: SectionView; word: string; says: string }[] = [
  { view: 'front', word: 'Front', says: 'Cut through the middle, seen from the door' },
  { view: 'side', word: 'Side', says: 'Cut through the middle, seen from the right' },
  { view: 'table', word: 'Table', says: 'The drawing as words' },
];

interface ViewChoiceProps {
  view: SectionView;
  choose: (view: SectionView) => void;
  quiet?: boolean;
}

/** Front, Side, Table: one choice, walked with the arrow keys. */
export function ViewChoice({ view, choose, quiet }: ViewChoiceProps) {
  const walk = (event: KeyboardEvent) => {
    const step = { ArrowRight: 1, ArrowDown: 1, ArrowLeft: -1, ArrowUp: -1 }[event.key];
    if (!step) return;
    event.preventDefault();
    const at = VIEWS.findIndex((each) => each.view === view);
    const next = VIEWS[(at + step + VIEWS.length) % VIEWS.length]!;
    choose(next.view);
    const radios = event.currentTarget.querySelectorAll<HTMLElement>('[role="radio"]');
    radios[VIEWS.indexOf(next)]?.focus();
  };
  return (
    <div className="text-right">
      {!quiet && <p className="text-12 text-ink-soft">{VIEWS.find((each) => each.view === view)?.says}</p>}
      <div role="radiogroup" aria-label="How the tent is shown" className="inline-flex gap-5" onKeyDown={walk}>
        {VIEWS.map(({ view: each, word }) => (
          <button
            key={each}
            type="button"
            role="radio"
            aria-checked={view === each}
            tabIndex={view === each ? 0 : -1}
            className={`cursor-pointer border-b-[2.5px] py-0.5 text-14 ${view === each ? 'border-lamp font-semibold' : 'border-transparent text-ink-soft'}`}
            onClick={() => choose(each)}
          >
            {word}
          </button>
        ))}
      </div>
    </div>
  );
}
