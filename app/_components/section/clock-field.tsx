'use client';

import { TextField } from '../text-field';
import { useState } from 'react';

interface ClockFieldProps {
  label: string;
  /** HH:MM. */
  value: string;
  onCommit: (value: string) => void;
  disabled?: boolean;
}

/** 6, 6:30, 06.30, 0630 and 6 pm all work. */
export function parseClock(text: string): string | null {
  const match = /^\s*(\d{1,2})(?:[:.h]?(\d{2}))?\s*(am|pm)?\s*$/i.exec(text);
  if (!match) return null;
  let hour = Number(match[1]);
  const minute = Number(match[2] ?? 0);
  const half = match[3]?.toLowerCase();
  if (half && (hour < 1 || hour > 12)) return null;
  if (half) hour = (hour % 12) + (half === 'pm' ? 12 : 0);
  if (hour > 23 || minute > 59) return null;
  return `${String(hour).padStart(2, '0')}:${String(minute).padStart(2, '0')}`;
}

export function ClockField({ label, value, onCommit, disabled }: ClockFieldProps) {
  const [typed, setTyped] = useState<string | null>(null);
  const [wrong, setWrong] = useState(false);
  const commit = () => {
    if (typed === null) return;
    const clock = parseClock(typed);
    setWrong(clock === null);
    if (clock === null) return;
    setTyped(null);
    if (clock !== value) onCommit(clock);
  };
  return (
    <TextField
      label={label}
      value={typed ?? value}
      disabled={disabled}
      error={wrong ? `“${typed}” is not a time of day. Type it as 06:30, 6.30 or 6 pm.` : undefined}
      onChange={(text: string) => {
        setTyped(text);
        setWrong(false);
      }}
      onBlur={commit}
      onKeyDown={(event: React.KeyboardEvent) => {
        if (event.key === 'Enter') commit();
      }}
    />
  );
}
