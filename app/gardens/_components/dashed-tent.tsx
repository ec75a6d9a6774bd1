import type { ReactNode } from 'react';

/** A tent that is not there yet, on a floor that belongs to nobody; beside it the page's one button. */
export function DashedTent({
  children,
  tall = 150,
  wide = 101,
}: {
  children: ReactNode;
  tall?: number;
  wide?: number;
}) {
  return (
    <div className="flex max-w-full flex-wrap items-end gap-x-9 border-b border-dashed border-ink-soft max-md:flex-nowrap max-md:gap-x-5">
      <svg
        viewBox={`0 0 ${wide + 40} ${tall}`}
        className="block shrink-0 max-md:h-auto max-md:w-24"
        width={wide + 40}
        height={tall}
        fill="none"
        stroke="var(--ink-soft)"
        strokeDasharray="5 4"
        strokeWidth={1.25}
        aria-hidden="true"
      >
        <path d={`M38 ${tall}V1H${wide + 37}V${tall}`} />
        <path d={`M45 ${tall * 0.58}H${wide + 30}`} />
      </svg>
      <div className="max-w-72 pb-5">{children}</div>
    </div>
  );
}
