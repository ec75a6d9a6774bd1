import { Fragment } from 'react';

/**
 * A figure whose digits stand in cells of one width, so that it does not jitter while it changes.
 * Lexend has no tabular figures. Readers of the page by ear get the plain number.
 */
export function Num({ text, bold }: { text: string; bold?: boolean }) {
  const cell = bold ? 'w-[0.66em]' : 'w-[0.62em] [.font-semibold_&]:w-[0.66em]';
  return (
    <span className="whitespace-nowrap">
      <span className="sr-only">{text}</span>
      <span aria-hidden="true">
        {Array.from(text, (sign, index) =>
          /\d/.test(sign) ? (
            <span key={index} className={`inline-block text-center ${cell}`}>
              {sign}
            </span>
          ) : (
            <Fragment key={index}>{sign}</Fragment>
          ),
        )}
      </span>
    </span>
  );
}
