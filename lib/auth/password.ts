import 'server-only';

import { readFileSync } from 'node:fs';
import path from 'node:path';
import { hash, verify } from '@node-rs/argon2';
import { AppError } from '../http/app-error';

/** OWASP Password Storage Cheat Sheet: argon2id, 19 MiB, two passes, one lane. */
const ARGON2ID = { memoryCost: 19456, timeCost: 2, parallelism: 1 } as const;
const AT_ONCE = 2;
const WAITING = 20;

let running = 0;
const queue: (() => void)[] = [];

/** Hashing is heavy on purpose; a flood of sign-ins waits its turn and is then refused, so that other work goes on. */
async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (running >= AT_ONCE) {
    if (queue.length >= WAITING) {
      throw new AppError({
        status: 503,
        code: 'busy',
        title: 'Too many people are signing in just now.',
        detail: 'Try again in a few seconds.',
        retryAfterS: 5,
      });
    }
    await new Promise<void>((resolve) => queue.push(resolve));
  }
  running += 1;
  try {
    return await work();
  } finally {
    running -= 1;
    queue.shift()?.();
  }
}

export const hashPassword = (password: string) => inTurn(() => hash(password, ARGON2ID));

// The hash of a random string nobody knows: verifying against it costs the same as against a real account's.
let dummy: Promise<string> | undefined;

/** True when the password is the account's. Takes the same time when there is no account. */
export async function verifyPassword(passwordHash: string | undefined, password: string): Promise<boolean> {
  dummy ??= hashPassword(crypto.randomUUID());
  const against = passwordHash ?? (await dummy);
  const matches = await inTurn(() => verify(against, password).catch(() => false));
  return matches && passwordHash !== undefined;
}

let common: Set<string> | undefined;

/** Folded so that case, spaces and punctuation do not hide a common password. */
const fold = (password: string) => password.toLowerCase().replaceAll(/[^a-z0-9]/g, '');

export function isCommonPassword(password: string): boolean {
  common ??= new Set(
    readFileSync(path.join(process.cwd(), 'reference-data', 'common-passwords.txt'), 'utf8')
      .split('\n')
      .map((line) => line.trim())
      .filter((line) => line !== '' && !line.startsWith('#'))
      .map(fold),
  );
  const folded = fold(password);
  if (common.has(folded)) return true;
  // One short piece over and over: aaaaaaaaaaaaaaa, abcabcabcabcabc, a common word said twice.
  for (let size = 1; size <= folded.length / 2; size += 1) {
    if (folded.length % size !== 0) continue;
    const piece = folded.slice(0, size);
    if (piece.repeat(folded.length / size) === folded && (size <= 4 || common.has(piece))) return true;
  }
  return false;
}
