import 'server-only';

import { sql } from 'kysely';
import { authDb } from '../db/client';

interface Limit {
  /** Such as `account:somebody@garden.example` or `address:192.0.2.7`. */
  subject: string;
  most: number;
  windowMinutes: number;
}

/**
 * Counts one more attempt and says whether it is still allowed.
 *
 * One atomic upsert in PostgreSQL, so that the limit holds across restarts and instances.
 */
export async function countAttempt({ subject, most, windowMinutes }: Limit): Promise<boolean> {
  const { rows } = await sql<{ attempts: number }>`
    insert into sign_in_attempts as a (subject, attempts) values (${subject.slice(0, 320)}, 1)
    on conflict (subject) do update set
      attempts = case when a.window_started_at < now() - make_interval(mins => ${windowMinutes}) then 1 else a.attempts + 1 end,
      window_started_at = case when a.window_started_at < now() - make_interval(mins => ${windowMinutes}) then now() else a.window_started_at end
    returning attempts
  `.execute(authDb());
  return (rows[0]?.attempts ?? Infinity) <= most;
}

export async function forgetAttempts(subject: string): Promise<void> {
  await authDb().deleteFrom('sign_in_attempts').where('subject', '=', subject.slice(0, 320)).execute();
}
