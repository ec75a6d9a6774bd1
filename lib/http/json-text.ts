import { AppError } from './app-error';

/** Deeper than any document of ours goes; nesting without end would exhaust the stack of whoever writes it out again. */
const MOST_DEPTH = 40;

const refused = (status: 400 | 422, title: string, detail: string) =>
  new AppError({ status, code: 'not-keepable', title, detail: `${detail} Nothing was saved.` });

// PostgreSQL keeps no NUL in a text, and half a surrogate pair is no character in any encoding.
const UNKEEPABLE = /\u0000|[\uD800-\uDBFF](?![\uDC00-\uDFFF])|(?<![\uD800-\uDBFF])[\uDC00-\uDFFF]/;

function requireKeepable(text: string): void {
  if (UNKEEPABLE.test(text))
    throw refused(
      422,
      'A text holds a character that cannot be kept.',
      'Take out control characters and half characters, often left by cutting a text in the middle.',
    );
}

/** Parses JSON that the database can hold: every text a text, and no nesting without end. */
export function parseJsonText(text: string): unknown {
  let parsed: unknown;
  try {
    parsed = JSON.parse(text);
  } catch {
    throw new AppError({
      status: 400,
      code: 'not-json',
      title: 'This is not JSON.',
      detail: 'Check for a missing bracket, quote or comma. Nothing was saved.',
    });
  }
  const waiting: { value: unknown; depth: number }[] = [{ value: parsed, depth: 0 }];
  for (let next = waiting.pop(); next; next = waiting.pop()) {
    const { value, depth } = next;
    if (typeof value === 'string') requireKeepable(value);
    if (typeof value !== 'object' || value === null) continue;
    if (depth >= MOST_DEPTH)
      throw refused(422, 'This is nested too deeply.', `At most ${MOST_DEPTH} levels are read. Flatten it.`);
    if (!Array.isArray(value)) Object.keys(value).forEach(requireKeepable);
    for (const inner of Object.values(value)) waiting.push({ value: inner, depth: depth + 1 });
  }
  return parsed;
}
