import 'server-only';

import { sql, type Transaction } from 'kysely';
import { appDb } from './client';
import type { Database } from './database';

export type GardenTransaction = Transaction<Database>;

/** serialization_failure and deadlock_detected: the whole transaction may be tried again. */
const RETRYABLE = new Set(['40001', '40P01']);
const ATTEMPTS = 5;

function isRetryable(error: unknown): boolean {
  return typeof error === 'object' && error !== null && 'code' in error && RETRYABLE.has(String(error.code));
}

/**
 * The only door to a garden's tables: one transaction in which row-level security shows this garden and no other.
 *
 * The setting lives as long as the transaction, so a connection that returns to the pool carries nothing over.
 * Do nothing in `work` that cannot be undone; it may run again after a serialization failure or a deadlock.
 */
export async function inGarden<T>(gardenId: string, work: (trx: GardenTransaction) => Promise<T>): Promise<T> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await appDb()
        .transaction()
        .execute(async (trx) => {
          await sql`select set_config('app.garden', ${gardenId}, true)`.execute(trx);
          return work(trx);
        });
    } catch (error) {
      if (attempt >= ATTEMPTS || !isRetryable(error)) throw error;
    }
  }
}
