import { isDeepStrictEqual } from 'node:util';
import { invalid } from '../http/app-error';

const asKept = (value: unknown): unknown => (value === undefined ? undefined : JSON.parse(JSON.stringify(value)));

/**
 * A new row may bring its own id; sent again it is the same row, once. The id with other contents is a mistake and is told.
 *
 * What others have changed since is left alone: such a row is simply answered as it stands.
 */
export function requireSame<R extends { version: number }>(
  idName: string,
  sent: Partial<Record<keyof R, unknown>>,
  kept: R,
): void {
  if (kept.version > 1) return;
  const keys = Object.keys(sent) as (keyof R)[];
  if (keys.every((key) => isDeepStrictEqual(asKept(sent[key]), asKept(kept[key])))) return;
  throw invalid(
    [{ path: idName, message: 'This id is taken by a row that says otherwise. Send it with a new one.' }],
    'This id is taken.',
  );
}
