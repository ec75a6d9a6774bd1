import 'server-only';

import { randomUUID } from 'node:crypto';
import type { Kysely } from 'kysely';
import type { Database } from '../db/database';

interface Event {
  gardenId: string;
  accountId: string;
  action: string;
  targetId?: string;
  detail?: Record<string, unknown>;
}

/** Writes down who changed what, in the transaction that changes it. The app may add to this record and read it, never alter it. */
export async function audit(
  db: Kysely<Database>,
  { gardenId, accountId, action, targetId, detail }: Event,
): Promise<void> {
  await db
    .insertInto('audit_events')
    .values({
      garden_id: gardenId,
      audit_event_id: randomUUID(),
      account_id: accountId,
      action,
      target_id: targetId ?? null,
      detail: JSON.stringify(detail ?? {}),
    })
    .execute();
}
