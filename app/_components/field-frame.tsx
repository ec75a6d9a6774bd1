'use client';

import { useId, type ReactNode } from 'react';

export interface FieldWords {
  label: string;
  hint?: ReactNode;
  /** What to do, with the number in it. */
  error?: string | undefined;
  /** What is safe, under the error. */
  safe?: ReactNode;
  /** For a label that the page already says beside the field. */
  hideLabel?: boolean;
  className?: string;
}

export interface FieldIds {
  id: string;
  describedBy: string | undefined;
}

interface FieldFrameProps extends FieldWords {
  /** Right of the label, such as a word that shows what is typed. */
  beside?: ReactNode;
  /** Further ids that describe the field. */
  describedBy?: (string | false | undefined)[];
  children: (ids: FieldIds) => ReactNode;
}

/** Label above, field, then hint or error below: one order for every field. */
export function FieldFrame({
  label,
  hint,
  error,
  safe,
  hideLabel,
  className,
  beside,
  describedBy,
  children,
}: FieldFrameProps) {
  const id = useId();
  const hintId = `${id}hint`;
  const errorId = `${id}error`;
  const described = [error && errorId, hint && hintId, ...(describedBy ?? [])].filter(Boolean).join(' ');
  return (
    <div className={`max-w-full ${/(^|\s)w-/.test(className ?? '') ? '' : 'w-53.5'} ${className ?? ''}`}>
      <div className={hideLabel ? 'sr-only' : 'flex items-baseline justify-between gap-3 pb-0.5'}>
        <label htmlFor={id} className="text-12 text-ink-soft">
          {label}
        </label>
        {beside}
      </div>
      {children({ id, describedBy: described || undefined })}
      <div id={errorId} aria-live="polite">
        {error && (
          <>
            <p className="pt-1 text-14 font-semibold text-ember-ink">{error}</p>
            {safe && <p className="text-12 text-ink-soft">{safe}</p>}
          </>
        )}
      </div>
      {hint && (
        <p id={hintId} className="pt-1 text-12 text-ink-soft">
          {hint}
        </p>
      )}
    </div>
  );
}

/** The bottom rule of a field: ink when it stands, dashed when a default, ember when it does not fit. */
export function fieldBox({ error, isDefault, disabled }: { error?: boolean; isDefault?: boolean; disabled?: boolean }) {
  const rule = error
    ? 'border-b-2 border-b-ember'
    : isDefault
      ? 'border-b-[1.25px] border-b-ink border-b-dashed'
      : 'border-b-[1.25px] border-b-ink';
  const tone = disabled ? 'bg-paper text-ink-soft' : 'bg-sheet text-ink';
  return `flex min-h-7 touch-44 items-center border border-line ${rule} ${tone} px-2 field-text has-[:focus-visible]:outline-2 has-[:focus-visible]:outline-offset-1 has-[:focus-visible]:outline-lamp`;
}
