'use client';

import { type ReactNode } from 'react';
import { FieldFrame, fieldBox, type FieldWords } from './field-frame';

export interface SelectOption {
  value: string;
  label: string;
  disabled?: boolean;
}

interface SelectFieldProps extends FieldWords {
  value: string;
  options: readonly SelectOption[];
  onChange: (value: string) => void;
  disabled?: boolean | undefined;
  isDefault?: boolean;
  derived?: ReactNode;
  name?: string;
}

/** For five choices and more; fewer are words in a row (`Choice`). */
export function SelectField(props: SelectFieldProps) {
  const { label, hint, error, safe, hideLabel, className, value, options, onChange, disabled, isDefault } = props;
  return (
    <FieldFrame
      label={label}
      hint={hint}
      error={error}
      safe={safe}
      hideLabel={hideLabel ?? false}
      className={className ?? ''}
    >
      {({ id, describedBy }) => (
        <div className={`${fieldBox({ error: !!error, isDefault: !!isDefault, disabled: !!disabled })} relative`}>
          <select
            id={id}
            name={props.name}
            value={value}
            disabled={disabled}
            aria-invalid={error ? true : undefined}
            aria-describedby={describedBy}
            onChange={(event) => onChange(event.target.value)}
            className="w-full min-w-0 cursor-pointer appearance-none self-stretch bg-transparent pr-5 outline-none"
          >
            {options.map((option) => (
              <option key={option.value} value={option.value} disabled={option.disabled} className="bg-sheet text-ink">
                {option.label}
              </option>
            ))}
          </select>
          {props.derived && <span className="shrink-0 pr-5 text-12 text-ink-soft">{props.derived}</span>}
          <svg
            aria-hidden="true"
            viewBox="0 0 10 6"
            className="pointer-events-none absolute right-2 h-1.5 w-2.5 stroke-ink-soft"
            fill="none"
          >
            <path d="M1 1l4 4 4-4" strokeWidth={1.25} />
          </svg>
        </div>
      )}
    </FieldFrame>
  );
}
