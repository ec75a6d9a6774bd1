import 'server-only';

import { sql } from 'kysely';
import { authDb } from '../db/client';

/** Whether the database answers within a second. */
export async function checkReady(): Promise<{ ready: boolean; token?: string }> {
  const late = new Promise<never>((_, reject) =>
    setTimeout(() => reject(new Error('the database is slow')), 1000).unref(),
  );
  try {
    await Promise.race([sql`select count(*) from gardens`.execute(authDb()), late]);
    // A start script gives each server its own token, so that it never takes an older server on the same port for the new one.
    return {
      ready: true,
      ...(process.env['CELLARSUN_START_TOKEN'] && { token: process.env['CELLARSUN_START_TOKEN'] }),
    };
  } catch {
    return { ready: false };
  }
}
