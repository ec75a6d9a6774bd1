import { DomainError } from '../domain-error';

export const DAY_MIN = 1440;

/** Minutes after midnight of a wall clock's HH:MM; 24:00 is the end of the day. */
export function minuteOfDay(clock: string): number {
  const match = /^(\d{2}):(\d{2})$/.exec(clock);
  const minute = match ? Number(match[1]) * 60 + Number(match[2]) : NaN;
  if (!(minute >= 0 && minute <= DAY_MIN))
    throw new DomainError({ quantity: 'time of day', value: clock, min: 0, max: DAY_MIN, unit: 'min' });
  return minute;
}

/** A part of the day, minutes after midnight, not wrapping. */
export interface Span {
  fromMin: number;
  toMin: number;
}

/** When a timer is on: off = on + hours, on the wall clock; cut at midnight where it runs through. */
export function spansOf({ onAt, hours }: { onAt: string; hours: number }): Span[] {
  const lastsMin = Math.min(DAY_MIN, hours * 60);
  if (!(lastsMin > 0)) return [];
  const fromMin = minuteOfDay(onAt) % DAY_MIN;
  const toMin = fromMin + lastsMin;
  if (toMin <= DAY_MIN) return [{ fromMin, toMin }];
  return [
    { fromMin: 0, toMin: toMin - DAY_MIN },
    { fromMin, toMin: DAY_MIN },
  ];
}

export const isOn = (spans: readonly Span[], minute: number): boolean =>
  spans.some((span) => minute >= span.fromMin && minute < span.toMin);

/** The day cut at every minute where any of the timers turns. */
export function daySegments(timers: readonly (readonly Span[])[], extraCuts: readonly number[] = []): Span[] {
  const cuts = new Set<number>([0, DAY_MIN, ...extraCuts]);
  for (const spans of timers) for (const { fromMin, toMin } of spans) cuts.add(fromMin).add(toMin);
  const sorted = [...cuts].filter((cut) => cut >= 0 && cut <= DAY_MIN).sort((a, b) => a - b);
  return sorted
    .slice(1)
    .map((toMin, index) => ({ fromMin: sorted[index]!, toMin }))
    .filter(({ fromMin, toMin }) => toMin - fromMin > 1e-9);
}

/** Hours of the day in which at least one of the timers is on. */
export function unionHours(timers: readonly (readonly Span[])[]): number {
  return (
    daySegments(timers)
      .filter(({ fromMin, toMin }) => timers.some((spans) => isOn(spans, (fromMin + toMin) / 2)))
      .reduce((sum, { fromMin, toMin }) => sum + toMin - fromMin, 0) / 60
  );
}
