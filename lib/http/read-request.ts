import 'server-only';

import type { z } from 'zod';
import { isUnsaid, toProblems } from '../evaluation/problems';
import { AppError, invalid, type Problem } from './app-error';
import { parseJsonText } from './json-text';

export const LARGEST_BODY_BYTES = 256 * 1024;

const tooLarge = () =>
  new AppError({
    status: 413,
    code: 'too-large',
    title: 'This is larger than 256 kB.',
    detail: 'Send less at once. Nothing was saved.',
  });

/** Reads the body as text, and stops as soon as it is larger than it may be. */
export async function readText(request: Request): Promise<string> {
  if (Number(request.headers.get('content-length') ?? 0) > LARGEST_BODY_BYTES) throw tooLarge();
  if (!request.body) return '';
  const chunks: Uint8Array[] = [];
  let bytes = 0;
  for await (const chunk of request.body as unknown as AsyncIterable<Uint8Array>) {
    bytes += chunk.byteLength;
    if (bytes > LARGEST_BODY_BYTES) throw tooLarge();
    chunks.push(chunk);
  }
  return Buffer.concat(chunks).toString('utf8');
}

/** Reads a JSON body of at most 256 kB. */
export async function readJson(request: Request): Promise<unknown> {
  const type = request.headers.get('content-type') ?? '';
  if (!/^application\/(json|[a-z.+-]+\+json)\b/i.test(type)) {
    throw new AppError({
      status: 415,
      code: 'not-json',
      title: 'This address takes JSON.',
      detail: 'Send it with content-type: application/json.',
    });
  }
  return parseJsonText(await readText(request));
}

/** What is wrong, field by field; where a field says what it takes, with the value, its range and its unit. */
export function problemsOf(error: z.ZodError, input: unknown): Problem[] {
  return toProblems(error, input)
    .slice(0, 50)
    .map(({ path, message, value, range, unit }) =>
      // Only fields of a plan say a range. What stands in others, a passphrase among them, is not sent back.
      isUnsaid(range) ? { path, message } : { path, message, value, range, unit },
    );
}

/** Parses with a schema; what does not fit becomes a 422 with a problem for each field. */
export function parseWith<T>(schema: z.ZodType<T> | undefined, value: unknown, otherwise?: () => AppError): T {
  if (!schema) return undefined as T;
  const result = schema.safeParse(value);
  if (result.success) return result.data;
  throw otherwise?.() ?? invalid(problemsOf(result.error, value));
}

export function parseQuery<T>(schema: z.ZodType<T> | undefined, request: Request): T {
  return parseWith(schema, schema ? Object.fromEntries(new URL(request.url).searchParams) : undefined);
}
