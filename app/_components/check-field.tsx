'use client';

import { useId, type ReactNode } from 'react';

interface CheckFieldProps {
  label: ReactNode;
  checked: boolean;
  onChange: (checked: boolean) => void;
  hint?: ReactNode;
  disabled?: boolean | undefined;
  name?: string;
}

/** A yes or no that changes nothing else on the form. */
export function CheckField({ label, checked, onChange, hint, disabled, name }: CheckFieldProps) {
  const hintId = useId();
  return (
    <div>
      <label className="inline-flex min-h-6 touch-44 cursor-pointer items-center gap-2 text-12 text-ink">
        <span className="relative inline-flex size-3.5 shrink-0">
          <input
            type="checkbox"
            name={name}
            checked={checked}
            disabled={disabled}
            aria-describedby={hint ? hintId : undefined}
            onChange={(event) => onChange(event.target.checked)}
            className="peer size-3.5 cursor-pointer appearance-none border border-ink bg-sheet disabled:border-ink-soft"
          />
          <svg
            aria-hidden="true"
            viewBox="0 0 14 14"
            fill="none"
            className="pointer-events-none absolute inset-0 hidden stroke-ink peer-checked:block"
          >
            <path d="M3 7.2l2.8 2.8L11 4.2" strokeWidth={1.5} />
          </svg>
        </span>
        <span>{label}</span>
      </label>
      {hint && (
        <p id={hintId} className="pl-5.5 text-12 text-ink-soft">
          {hint}
        </p>
      )}
    </div>
  );
}
