import type { ReactNode } from 'react';

const WORDS = { danger: 'Danger.', warning: 'Warning.', note: 'Caution.' } as const;

interface CautionNoteProps {
  severity?: keyof typeof WORDS;
  text: ReactNode;
  source?: ReactNode;
  /** A way to put it right. */
  children?: ReactNode;
}

/** What can hurt somebody, said where the decision is made, with its source. */
export function CautionNote({ severity = 'note', text, source, children }: CautionNoteProps) {
  return (
    <div role="note" className="flex max-w-[36rem] gap-2 text-12">
      <CautionSign />
      <p>
        <span className="font-semibold text-ember-ink">{WORDS[severity]}</span> {text}
        {source && <span className="text-ink-soft"> {source}</span>}
        {children && <> {children}</>}
      </p>
    </div>
  );
}

export function CautionSign() {
  return (
    <svg aria-hidden="true" viewBox="0 0 16 14" className="mt-0.5 h-3.5 w-4 shrink-0 text-ember">
      <path d="M8 1l7 12H1z" fill="none" stroke="currentColor" strokeWidth={1.25} />
      <path d="M8 5.2v4M8 10.4v1.2" stroke="currentColor" strokeWidth={1.25} />
    </svg>
  );
}
