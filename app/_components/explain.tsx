'use client';

import { use, useEffect, useMemo, useRef, useState, type ReactNode } from 'react';
import type { Explanation } from '@/lib/evaluation/evaluate-scenario';
import { ExplainContext, useExplain, type Band, type ExplainState } from './explain-context';

export { useExplain } from './explain-context';
export { ExplainSheet } from './explain-sheet';

interface ExplainProviderProps {
  /** How a figure comes about; called when it is opened, for a range takes a moment. */
  explain: (path: string) => Explanation | null;
  wanted?: (path: string) => Band | null;
  children: ReactNode;
}

type Trail = readonly { path: string; words: string }[];

/** Lets the figures inside it be opened. One at a time. */
export function ExplainProvider({ explain, wanted, children }: ExplainProviderProps) {
  const [trail, setTrail] = useState<Trail>([]);
  const openers = useRef<string | null>(null);
  const open = trail.at(-1)?.path ?? null;
  const explanation = useMemo(() => (open ? explain(open) : null), [open, explain]);
  const shut = explanation === null && open !== null ? null : open;

  // The number that opened it may have stepped aside meanwhile: it is found again by its path.
  useEffect(() => {
    if (open !== null || openers.current === null) return;
    const path = openers.current;
    openers.current = null;
    for (const node of document.querySelectorAll<HTMLElement>('[data-explains]')) {
      if (node.dataset['explains'] === path && node.offsetParent !== null) return node.focus();
    }
  }, [open]);

  const state: ExplainState = {
    open: shut,
    explanation,
    wanted: open ? (wanted?.(open) ?? null) : null,
    trail: trail.slice(0, -1),
    show: (path) => {
      openers.current = path;
      setTrail([{ path, words: '' }]);
    },
    follow: (path, from) =>
      setTrail((now) => [...now.slice(0, -1), { path: now.at(-1)!.path, words: from }, { path, words: '' }]),
    back: () => setTrail((now) => now.slice(0, -1)),
    close: () => setTrail([]),
  };
  return <ExplainContext value={state}>{children}</ExplainContext>;
}

interface ExplainableProps {
  path: string;
  children: ReactNode;
}

/** A dotted figure: Enter or a touch opens how it comes about, and again closes it. */
export function Explainable({ path, children }: ExplainableProps) {
  const within = use(ExplainContext);
  const state = useExplain();
  if (!within) return <>{children}</>;
  const isOpen = state.open === path;
  return (
    <button
      type="button"
      data-explains={path}
      aria-expanded={isOpen}
      aria-controls={isOpen ? 'explain-sheet' : undefined}
      title="How it comes about"
      className={`inline cursor-pointer text-left [font:inherit] ${isOpen ? 'outline-2 outline-offset-2 outline-lamp' : 'border-b border-dotted border-ink-soft'}`}
      onClick={() => (isOpen ? state.close() : state.show(path))}
    >
      {children}
    </button>
  );
}
