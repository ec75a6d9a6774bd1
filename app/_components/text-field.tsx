'use client';

import { type InputHTMLAttributes, type ReactNode, type Ref } from 'react';
import { useController, type Control, type FieldPath, type FieldValues } from 'react-hook-form';
import { FieldFrame, fieldBox, type FieldWords } from './field-frame';

type InputProps = Omit<InputHTMLAttributes<HTMLInputElement>, 'onChange' | 'id' | 'className' | 'value'>;

export interface TextFieldProps extends FieldWords, InputProps {
  value: string;
  onChange: (text: string) => void;
  derived?: ReactNode;
  beside?: ReactNode;
  isDefault?: boolean;
  inputRef?: Ref<HTMLInputElement>;
}

export function TextField(props: TextFieldProps) {
  const {
    label,
    hint,
    error,
    safe,
    hideLabel,
    className,
    beside,
    derived,
    isDefault,
    inputRef,
    value,
    onChange,
    ...input
  } = props;
  return (
    <FieldFrame
      label={label}
      hint={hint}
      error={error}
      safe={safe}
      hideLabel={hideLabel ?? false}
      className={className ?? ''}
      beside={beside}
    >
      {({ id, describedBy }) => (
        <div className={fieldBox({ error: !!error, isDefault: !!isDefault, disabled: !!input.disabled })}>
          <input
            type="text"
            {...input}
            id={id}
            ref={inputRef}
            value={value}
            onChange={(event) => onChange(event.target.value)}
            aria-invalid={error ? true : undefined}
            aria-describedby={describedBy}
            className="w-full min-w-0 self-stretch bg-transparent outline-none"
          />
          {derived && <span className="shrink-0 pl-2 text-right text-12 text-ink-soft">{derived}</span>}
        </div>
      )}
    </FieldFrame>
  );
}

type RhfProps<V extends FieldValues> = Omit<TextFieldProps, 'value' | 'onChange' | 'error' | 'inputRef' | 'name'> & {
  control: Control<V>;
  name: FieldPath<V>;
};

export function RhfTextField<V extends FieldValues>({ control, name, ...props }: RhfProps<V>) {
  const { field, fieldState } = useController({ control, name });
  return (
    <TextField
      {...props}
      name={name}
      value={(field.value as string | undefined) ?? ''}
      onChange={field.onChange}
      onBlur={field.onBlur}
      inputRef={field.ref}
      error={fieldState.error?.message}
    />
  );
}
