import 'server-only';

import { createHash, randomBytes, randomUUID } from 'node:crypto';
import { sql } from 'kysely';
import { audit } from '../audit/audit';
import { countAttempt } from '../auth/attempts';
import { requireAllowed } from '../auth/require-allowed';
import type { Actor, GardenActor } from '../auth/session';
import { authDb } from '../db/client';
import type { Role } from '../db/database';
import { inGarden } from '../db/transactions';
import { AppError, invalid, notFoundHere } from '../http/app-error';
import type { JoinCode } from './garden.schema';

const DAYS = 7;

// Crockford's base 32: no I, L, O, U, so that a code can be read aloud and typed.
const ALPHABET = '0123456789ABCDEFGHJKMNPQRSTVWXYZ';
/** 26 characters of 5 bits: 130 bits of chance. */
const LENGTH = 26;

function newCode(): string {
  const letters = Array.from(randomBytes(LENGTH), (byte) => ALPHABET[byte % 32]!);
  return letters.join('').replace(/(.{5})(?=.)/g, '$1-');
}

/** Reads what was typed: hyphens and spaces do not matter, nor does mistaking O for 0 or I for 1. */
function hashCode(typed: string): Buffer {
  const plain = typed
    .toUpperCase()
    .replaceAll(/[^0-9A-Z]/g, '')
    .replaceAll('O', '0')
    .replaceAll(/[IL]/g, '1');
  return createHash('sha256').update(plain).digest();
}

export async function listJoinCodes(actor: GardenActor): Promise<JoinCode[]> {
  requireAllowed(actor, 'joinCode.read');
  const rows = await inGarden(actor.gardenId, (trx) =>
    trx
      .selectFrom('join_codes')
      .where('garden_id', '=', actor.gardenId)
      .where('expires_at', '>', sql<Date>`now()`)
      .select(['join_code_id as joinCodeId', 'role', 'expires_at as expiresAt'])
      .orderBy('created_at')
      .execute(),
  );
  return rows.map((row) => ({ ...row, expiresAt: row.expiresAt.toISOString() }));
}

/** Makes a one-use code. It is shown this once; only its hash is kept. */
export async function createJoinCode(actor: GardenActor, role: JoinCode['role']): Promise<JoinCode & { code: string }> {
  requireAllowed(actor, 'joinCode.create');
  const code = newCode();
  const joinCodeId = randomUUID();
  const row = await inGarden(actor.gardenId, async (trx) => {
    await audit(trx, { ...actor, action: 'joinCode.create', targetId: joinCodeId, detail: { role } });
    return trx
      .insertInto('join_codes')
      .values({
        garden_id: actor.gardenId,
        join_code_id: joinCodeId,
        code_hash: hashCode(code),
        role,
        created_by: actor.accountId,
        expires_at: sql<string>`now() + make_interval(days => ${DAYS})`,
      })
      .returning('expires_at')
      .executeTakeFirstOrThrow();
  });
  return { joinCodeId, role, code, expiresAt: row.expires_at.toISOString() };
}

export async function deleteJoinCode(actor: GardenActor, joinCodeId: string): Promise<void> {
  requireAllowed(actor, 'joinCode.delete');
  const deleted = await inGarden(actor.gardenId, (trx) =>
    trx
      .deleteFrom('join_codes')
      .where('garden_id', '=', actor.gardenId)
      .where('join_code_id', '=', joinCodeId)
      .executeTakeFirst(),
  );
  if (!deleted.numDeletedRows) throw notFoundHere('code');
}

const badCode = () =>
  invalid([
    { path: 'code', message: 'This code opens nothing: it is mistyped, used or out of date. Ask for a new one.' },
  ]);

/** Spends a code and makes the actor a member. Deleting and reading are one statement, so a code works once. */
export async function join(actor: Actor, typed: string): Promise<{ gardenId: string; role: Role }> {
  const allowed = await countAttempt({ subject: `join:${actor.accountId}`, most: 20, windowMinutes: 60 });
  if (!allowed) {
    throw new AppError({
      status: 429,
      code: 'too-many',
      title: 'Too many codes were tried.',
      detail: 'Try again in an hour.',
      retryAfterS: 3600,
    });
  }
  return authDb()
    .transaction()
    .execute(async (trx) => {
      const code = await trx
        .deleteFrom('join_codes')
        .where('code_hash', '=', hashCode(typed))
        .where('expires_at', '>', sql<Date>`now()`)
        .returning(['garden_id', 'role'])
        .executeTakeFirst();
      if (!code) throw badCode();
      await trx
        .insertInto('memberships')
        .values({ garden_id: code.garden_id, account_id: actor.accountId, role: code.role })
        .onConflict((conflict) => conflict.columns(['garden_id', 'account_id']).doNothing())
        .execute();
      await audit(trx, {
        gardenId: code.garden_id,
        accountId: actor.accountId,
        action: 'garden.join',
        detail: { role: code.role },
      });
      return { gardenId: code.garden_id, role: code.role };
    });
}
