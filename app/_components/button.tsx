'use client';

import type { ButtonHTMLAttributes, ReactNode } from 'react';
import { buttonLook, type ButtonLook } from './button-look';

interface ButtonProps extends ButtonHTMLAttributes<HTMLButtonElement> {
  look?: ButtonLook;
  /** Said instead of the words while it works. */
  busy?: string | false | undefined;
  children: ReactNode;
}

export function Button({ look = 'solid', busy, children, className, disabled, type = 'button', ...rest }: ButtonProps) {
  return (
    <button
      {...rest}
      type={type}
      disabled={disabled || !!busy}
      aria-busy={busy ? true : undefined}
      className={`${buttonLook(look)} ${className ?? ''}`}
    >
      {busy || children}
    </button>
  );
}
