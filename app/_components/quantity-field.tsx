'use client';

import { useId, useRef, type KeyboardEvent, type ReactNode } from 'react';
import { useController, type Control, type FieldPath, type FieldValues } from 'react-hook-form';
import { FieldFrame, fieldBox, type FieldWords } from './field-frame';
import { useTypedQuantity, type TypedQuantityInput } from './use-typed-quantity';

export interface QuantityFieldProps extends FieldWords, TypedQuantityInput {
  /** Nobody has typed this: dashed below, and the word. */
  isDefault?: boolean | undefined;
  defaultReason?: ReactNode;
  /** Stores the default as a value of the person's own. */
  onConfirmDefault?: (() => void) | undefined;
  /** What follows from it, right-aligned: "207 ft", "to 22:00". */
  derived?: ReactNode;
  disabled?: boolean | undefined;
  /** Up and down keys walk by this much of the stored unit, with Shift ten times. */
  step?: number;
  inputRef?: React.Ref<HTMLInputElement>;
  /** Instead of the unit of the kind, such as "° north" or "€". */
  unit?: string;
  onFocus?: () => void;
  onBlur?: () => void;
}

/** A number with its unit inside. Any unit of the trade can be typed; it shows the person's own after. */
export function QuantityField(props: QuantityFieldProps) {
  const { label, hint, safe, hideLabel, className, isDefault, defaultReason, onConfirmDefault, derived, disabled } =
    props;
  const typed = useTypedQuantity(props);
  const own = useRef<HTMLInputElement>(null);
  const unitId = useId();
  const reasonId = useId();
  const reason = isDefault && (defaultReason || onConfirmDefault);
  const still = typed.standing ? `Nothing changed: ${typed.standing} still stands.` : undefined;
  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    if (event.key === 'Enter') typed.commit();
    if (event.key === 'Escape') typed.restore();
    const up = event.key === 'ArrowUp' ? 1 : event.key === 'ArrowDown' ? -1 : 0;
    if (!up || !props.step || disabled) return;
    event.preventDefault();
    typed.walk(up * props.step * (event.shiftKey ? 10 : 1));
  };
  return (
    <FieldFrame
      label={label}
      hint={hint}
      hideLabel={hideLabel ?? false}
      className={className ?? ''}
      error={typed.problem ?? undefined}
      safe={safe ?? still}
      describedBy={[unitId, reason ? reasonId : undefined]}
    >
      {({ id, describedBy }) => (
        <>
          <div
            className={fieldBox({ error: typed.problem !== null, isDefault: !!isDefault, disabled: !!disabled })}
            onClick={() => own.current?.focus()}
          >
            <span className="inline-grid max-w-full min-w-0 items-center self-stretch">
              <span aria-hidden="true" className="invisible col-start-1 row-start-1 min-w-2 whitespace-pre">
                {typed.text}
              </span>
              <input
                id={id}
                ref={(node) => {
                  own.current = node;
                  if (typeof props.inputRef === 'function') props.inputRef(node);
                  else if (props.inputRef) props.inputRef.current = node;
                }}
                size={1}
                inputMode="text"
                autoComplete="off"
                spellCheck={false}
                className="col-start-1 row-start-1 w-0 min-w-full self-stretch bg-transparent outline-none"
                value={typed.text}
                disabled={disabled}
                aria-invalid={typed.problem !== null || undefined}
                aria-describedby={describedBy}
                onChange={(event) => typed.type(event.target.value)}
                onFocus={(event) => {
                  event.target.select();
                  props.onFocus?.();
                }}
                onBlur={() => {
                  typed.commit();
                  props.onBlur?.();
                }}
                onKeyDown={onKeyDown}
              />
            </span>
            <span id={unitId} className="shrink-0 pl-1.5 text-ink-soft">
              {typed.showsUnit && (props.unit ?? typed.unit)}
            </span>
            <span className="ml-auto pl-2 text-right text-12 text-ink-soft">{isDefault ? 'default' : derived}</span>
          </div>
          {reason && (
            <p id={reasonId} className="pt-1 text-12 text-ink-soft">
              {defaultReason}{' '}
              {onConfirmDefault && (
                <button
                  type="button"
                  className="inline-flex min-h-6 touch-44 items-center link-does"
                  onClick={onConfirmDefault}
                  disabled={disabled}
                >
                  Confirm {typed.standing}
                </button>
              )}
            </p>
          )}
        </>
      )}
    </FieldFrame>
  );
}

type RhfProps<V extends FieldValues> = Omit<QuantityFieldProps, 'value' | 'onCommit' | 'error' | 'inputRef'> & {
  control: Control<V>;
  name: FieldPath<V>;
};

/** The same inside a form of react-hook-form. */
export function RhfQuantityField<V extends FieldValues>({ control, name, ...props }: RhfProps<V>) {
  const { field, fieldState } = useController({ control, name });
  return (
    <QuantityField
      {...props}
      value={field.value as number | null}
      onCommit={field.onChange}
      onBlur={field.onBlur}
      inputRef={field.ref}
      error={fieldState.error?.message}
    />
  );
}
