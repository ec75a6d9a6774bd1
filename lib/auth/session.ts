import 'server-only';

import { createHash, randomBytes } from 'node:crypto';
import { cookies } from 'next/headers';
import { decode } from 'next-auth/jwt';
import { cache } from 'react';
import { sql } from 'kysely';
import { authDb } from '../db/client';
import type { Role, Theme, UnitSystem } from '../db/database';
import { env } from '../env';

/** Who is asking. */
export interface Actor {
  accountId: string;
  displayName: string;
  email: string;
  unitSystem: UnitSystem;
  theme: Theme;
  sessionHash: Buffer;
}

/** Who is asking, as a member of one garden. */
export interface GardenActor extends Actor {
  gardenId: string;
  role: Role;
}

export const SESSION_IDLE_DAYS = 7;
export const SESSION_LONGEST_DAYS = 30;

export function sessionCookieName(): string {
  return env().NEXTAUTH_URL.startsWith('https://') ? '__Host-cellarsun.session' : 'cellarsun.session';
}

const hashOf = (sid: string) => createHash('sha256').update(sid).digest();

/** Opens a session and returns the random id that the cookie carries; only its hash is stored. */
export async function openSession(accountId: string): Promise<string> {
  const sid = randomBytes(32).toString('base64url');
  await authDb()
    .insertInto('sessions')
    .values({ session_hash: hashOf(sid), account_id: accountId })
    .execute();
  return sid;
}

export async function closeSession(sid: string): Promise<void> {
  await authDb().deleteFrom('sessions').where('session_hash', '=', hashOf(sid)).execute();
}

/** Ends every session of the account but, where given, the one that asks. */
export async function closeOtherSessions(accountId: string, keep?: Buffer): Promise<void> {
  let query = authDb().deleteFrom('sessions').where('account_id', '=', accountId);
  if (keep) query = query.where('session_hash', '!=', keep);
  await query.execute();
}

async function sidOf(cookie: string | undefined): Promise<string | null> {
  if (!cookie) return null;
  try {
    const token = await decode({ token: cookie, secret: env().NEXTAUTH_SECRET });
    return typeof token?.['sid'] === 'string' ? token['sid'] : null;
  } catch {
    return null;
  }
}

interface Found extends Omit<Actor, 'sessionHash'> {
  stale: boolean;
  role: Role | null;
}

async function find(sessionHash: Buffer, gardenId: string | null): Promise<Found | null> {
  const { rows } = await sql<Found>`
    select a.account_id as "accountId", a.display_name as "displayName", a.email, a.unit_system as "unitSystem", a.theme,
           s.last_seen_at < now() - interval '10 minutes' as stale, m.role
    from sessions s
    join accounts a using (account_id)
    left join memberships m on m.account_id = a.account_id and m.garden_id = ${gardenId}::uuid
    where s.session_hash = ${sessionHash}
      and s.last_seen_at > now() - make_interval(days => ${SESSION_IDLE_DAYS})
      and s.created_at > now() - make_interval(days => ${SESSION_LONGEST_DAYS})
  `.execute(authDb());
  return rows[0] ?? null;
}

/**
 * The actor behind a session cookie, and their role where a garden is named; null when the session is gone.
 *
 * One query: session, account and membership are read afresh on every request, so signing out, changing the passphrase
 * or removing a member ends access at once.
 */
export async function authenticate(
  cookie: string | undefined,
  gardenId: string | null,
): Promise<(Actor & { role: Role | null }) | null> {
  const sid = await sidOf(cookie);
  if (!sid) return null;
  const sessionHash = hashOf(sid);
  const found = await find(sessionHash, gardenId);
  if (!found) return null;
  // Rolled at most every ten minutes: a write on each read would cost more than the read.
  if (found.stale) {
    await authDb()
      .updateTable('sessions')
      .set({ last_seen_at: sql`now()` })
      .where('session_hash', '=', sessionHash)
      .execute();
  }
  const { stale: _stale, ...who } = found;
  return { ...who, sessionHash };
}

/** For pages: the person who is signed in, or null. */
export const getActor = cache(async (): Promise<Actor | null> => {
  const cookie = (await cookies()).get(sessionCookieName())?.value;
  return authenticate(cookie, null);
});

/** For pages: the person who is signed in as a member of this garden; null where they have no part in it. */
export const getGardenActor = cache(async (gardenId: string): Promise<GardenActor | null> => {
  const cookie = (await cookies()).get(sessionCookieName())?.value;
  const who = await authenticate(cookie, gardenId);
  return who?.role ? { ...who, role: who.role, gardenId } : null;
});
