'use client';

import { useId, type ReactNode } from 'react';

export interface ChoiceOption<V extends string> {
  value: V;
  label: string;
  hint?: ReactNode;
  disabled?: boolean;
}

interface ChoiceProps<V extends string> {
  label: string;
  value: V | null;
  options: readonly ChoiceOption<V>[];
  onChange: (value: V) => void;
  /** A column where the choice decides what the form asks next. */
  layout?: 'row' | 'column';
  hideLabel?: boolean;
  hint?: ReactNode;
  error?: string | undefined;
  disabled?: boolean | undefined;
  className?: string;
}

/** Two to four choices, in words: the chosen one is strong, with a lamp rule below or at its left. */
export function Choice<V extends string>(props: ChoiceProps<V>) {
  const { label, value, options, onChange, layout = 'row', hideLabel, hint, error, disabled, className } = props;
  const id = useId();
  const row = layout === 'row';
  return (
    <div className={className}>
      <div
        role="radiogroup"
        aria-labelledby={`${id}label`}
        aria-describedby={`${id}below`}
        className={row ? 'flex flex-wrap items-baseline gap-x-5' : 'flex flex-col'}
      >
        <p id={`${id}label`} className={hideLabel ? 'sr-only' : 'w-full pb-0.5 text-12 text-ink-soft'}>
          {label}
        </p>
        {options.map((option) => (
          <Option
            key={option.value}
            name={id}
            option={option}
            row={row}
            checked={option.value === value}
            disabled={disabled || option.disabled}
            onChoose={() => onChange(option.value)}
          />
        ))}
      </div>
      <div id={`${id}below`} aria-live="polite">
        {error && <p className="pt-1 text-14 font-semibold text-ember-ink">{error}</p>}
        {hint && <p className="pt-1 text-12 text-ink-soft">{hint}</p>}
      </div>
    </div>
  );
}

interface OptionProps<V extends string> {
  name: string;
  option: ChoiceOption<V>;
  row: boolean;
  checked: boolean;
  disabled: boolean | undefined;
  onChoose: () => void;
}

function Option<V extends string>({ name, option, row, checked, disabled, onChoose }: OptionProps<V>) {
  const rule = row
    ? `border-b-[2.5px] ${checked ? 'border-b-lamp' : 'border-b-transparent'}`
    : `-ml-3 border-l-[3px] py-1 pl-2.25 ${checked ? 'border-l-lamp' : 'border-l-transparent'}`;
  const tone = disabled ? 'text-ink-soft' : checked ? 'text-ink' : 'text-ink-soft hover:text-ink';
  return (
    <label
      className={`relative flex min-h-7 touch-44 flex-col justify-center text-14 ${rule} ${tone} ${disabled ? '' : 'cursor-pointer'} has-[:focus-visible]:outline-2 has-[:focus-visible]:outline-offset-1 has-[:focus-visible]:outline-lamp`}
    >
      <input
        type="radio"
        name={name}
        value={option.value}
        checked={checked}
        disabled={disabled}
        onChange={onChoose}
        className="absolute inset-0 size-full cursor-[inherit] appearance-none outline-none"
      />
      {/* The strong word is as wide as the plain one would be, so that nothing moves. */}
      <span className="grid">
        <span aria-hidden="true" className="invisible col-start-1 row-start-1 font-semibold">
          {option.label}
        </span>
        <span className={`col-start-1 row-start-1 ${checked ? 'font-semibold' : ''}`}>{option.label}</span>
      </span>
      {option.hint && <span className="text-12 text-ink-soft">{option.hint}</span>}
    </label>
  );
}
