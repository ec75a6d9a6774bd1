'use client';

import { formatQuantity, type QuantityKind } from '@/lib/format/quantity';
import { Num } from './num';
import { useUnits } from './units-context';

interface FigureProps {
  /** In the stored unit of the kind. */
  value: number;
  kind: QuantityKind;
  digits?: number;
  bold?: boolean;
}

/** A number in the person's units, with its unit in a softer tone. */
export function Figure({ value, kind, digits, bold }: FigureProps) {
  const { figure, unit } = formatQuantity(value, kind, useUnits(), digits === undefined ? {} : { digits });
  return (
    <span className="whitespace-nowrap">
      <span className={bold ? 'font-semibold' : undefined}>
        <Num text={figure} />
      </span>
      {unit && <span className="font-normal text-ink-soft"> {unit}</span>}
    </span>
  );
}
