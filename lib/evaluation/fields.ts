import { z } from 'zod';

/** What a field may hold, for the problem that names it. */
export interface Expectation {
  range: string;
  unit: string;
}

// zod carries a message with each issue and nothing else that survives a union; the message is the key to what was expected.
const expectations = new Map<string, Expectation>();

/** Ties a fixed message to what it asks for. What depends on other fields carries it along: see `misfit`. */
export function expecting(message: string, expectation: Expectation): string {
  expectations.set(message, expectation);
  return message;
}

/** What does not go together with another field: where, in words, and what would. */
export interface Misfit extends Expectation {
  path: PropertyKey[];
  message: string;
}

export const misfit = ({ path, message, range, unit }: Misfit) =>
  ({ code: 'custom', path, message, params: { range, unit } }) as const;

/** What an issue asks for, whichever way it carries it. */
export function expectationOf(issue: z.core.$ZodIssue): Expectation | undefined {
  const { range, unit } = (issue.code === 'custom' && issue.params) || {};
  return typeof range === 'string' ? { range, unit: String(unit) } : expectations.get(issue.message);
}

interface QuantityOptions {
  min: number;
  max: number;
  /** As it is printed: `m`, `W`, `%`, `of 1`. */
  unit: string;
  integer?: boolean;
}

/** A finite number within a physical range. Zero is legal wherever a physical zero is; nothing is clamped. */
export function quantity({ min, max, unit, integer = false }: QuantityOptions) {
  const range = `${min} to ${max}`;
  const message = expecting(`Give a ${integer ? 'whole ' : ''}number from ${range} ${unit}.`.replace(' .', '.'), {
    range,
    unit,
  });
  const base = integer ? z.int({ error: message }) : z.number({ error: message });
  return base.min(min, { error: message }).max(max, { error: message });
}

/** One of a few words. */
export function oneOf<const T extends readonly [string, ...string[]]>(words: T) {
  const range = words.join(', ');
  return z.enum(words, { error: expecting(`Give one of: ${range}.`, { range, unit: '' }) });
}

export function flag() {
  return z.boolean({ error: expecting('Give true or false.', { range: 'true or false', unit: '' }) });
}

export function words({ most = 200, least = 1 }: { most?: number; least?: number } = {}) {
  const message = expecting(`Give a text of ${least} to ${most} characters.`, {
    range: `${least} to ${most} characters`,
    unit: '',
  });
  return z.string({ error: message }).min(least, { error: message }).max(most, { error: message });
}

export function list<T extends z.ZodType>(of: T, { least = 0, most }: { least?: number; most: number }) {
  const message = expecting(`Give a list of ${least} to ${most}.`, { range: `${least} to ${most}`, unit: 'entries' });
  return z.array(of, { error: message }).min(least, { error: message }).max(most, { error: message });
}

const clockMessage = expecting('Give a time of day such as 06:30.', { range: '00:00 to 23:59', unit: 'h:min' });
export const clockTime = z.string({ error: clockMessage }).regex(/^([01]\d|2[0-3]):[0-5]\d$/, { error: clockMessage });

const clockEndMessage = expecting('Give a time of day such as 21:00, at most 24:00.', {
  range: '00:00 to 24:00',
  unit: 'h:min',
});
export const clockEnd = z
  .string({ error: clockEndMessage })
  .regex(/^(([01]\d|2[0-3]):[0-5]\d|24:00)$/, { error: clockEndMessage });

const zones = new Set<string>([...Intl.supportedValuesOf('timeZone'), 'UTC']);
const zoneMessage = expecting('Give an IANA time zone such as Europe/Oslo.', { range: 'an IANA time zone', unit: '' });
export const timeZone = z
  .string({ error: zoneMessage })
  .refine((zone) => zones.has(zone) || isZone(zone), { error: zoneMessage });

// Links such as Asia/Calcutta are not listed by every runtime, yet all of them know them.
function isZone(zone: string): boolean {
  if (!/^[A-Za-z_]+(\/[A-Za-z0-9_+-]+)*$/.test(zone)) return false;
  try {
    new Intl.DateTimeFormat('en', { timeZone: zone });
    return true;
  } catch {
    return false;
  }
}

const currencyMessage = expecting('Give the three letters of a currency such as EUR.', {
  range: 'three capital letters',
  unit: '',
});
export const currencyCode = z.string({ error: currencyMessage }).regex(/^[A-Z]{3}$/, { error: currencyMessage });

const idMessage = expecting('Give an id of 1 to 64 letters, digits, points, hyphens or underscores.', {
  range: '1 to 64 of a-z A-Z 0-9 . _ -',
  unit: '',
});
export const idField = z.string({ error: idMessage }).regex(/^[A-Za-z0-9._-]{1,64}$/, { error: idMessage });
