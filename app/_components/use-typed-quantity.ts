'use client';

import { useState } from 'react';
import { editableText, formatQuantity, parseQuantity, rangeProblem, type QuantityKind } from '@/lib/format/quantity';
import { useUnits } from './units-context';

export interface TypedQuantityInput {
  kind: QuantityKind;
  value: number | null | undefined;
  onCommit: (value: number) => void;
  /** When the field may be emptied. */
  onClear?: (() => void) | undefined;
  min?: number | undefined;
  max?: number | undefined;
  /** A whole number of the stored unit; a count is always whole. */
  whole?: boolean | undefined;
  /** Refused by whoever owns the value. */
  error?: string | undefined;
}

interface Typed {
  text: string;
  /** The value that stood when this was typed: once another stands, this is history. */
  over: number | null | undefined;
  editing: boolean;
  problem: string | null;
}

/** What is being typed into a quantity's field: parsed on Enter and on leaving, kept as typed while it does not fit. */
export function useTypedQuantity({ kind, value, onCommit, onClear, min, max, whole, error }: TypedQuantityInput) {
  const units = useUnits();
  const [typed, setTyped] = useState<Typed | null>(null);
  const stands = value === null || value === undefined ? '' : editableText(value, kind, units);
  const current = typed && typed.over === value ? typed : null;
  const keep = current && (current.editing || current.problem || error);
  const text = keep ? current.text : stands;
  const problem = current?.problem ?? error ?? null;

  const problemOf = (parsed: number): string | null =>
    rangeProblem({ value: parsed, min, max, kind, system: units }) ??
    ((whole || kind === 'count') && !Number.isInteger(parsed) ? 'Give a whole number.' : null);

  const commit = () => {
    if (!current?.editing) return;
    if (current.text.trim() === '' && onClear) {
      setTyped(null);
      onClear();
      return;
    }
    const parsed = parseQuantity(current.text, kind, units);
    const found = parsed.ok ? problemOf(parsed.value) : parsed.problem;
    setTyped({ ...current, editing: false, problem: found });
    if (parsed.ok && !found) onCommit(parsed.value);
  };
  return {
    text,
    problem,
    /** The unit stands in the field unless the person types one. */
    showsUnit: !/[a-zµ°%'"′″/]/i.test(text),
    unit: formatQuantity(0, kind, units).unit,
    standing: stands === '' ? null : `${stands}\u00a0${formatQuantity(0, kind, units).unit}`.trim(),
    type: (next: string) => setTyped({ text: next, over: value, editing: true, problem: null }),
    commit,
    restore: () => setTyped(null),
    /** Arrow keys, where the field walks in steps of the stored unit. */
    walk: (by: number) => {
      if (value === null || value === undefined) return;
      const next = Number((value + by).toFixed(6));
      if (rangeProblem({ value: next, min, max, kind, system: units })) return;
      setTyped(null);
      onCommit(next);
    },
  };
}
