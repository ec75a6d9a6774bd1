import { sql } from 'kysely';
import { Pool } from 'pg';
import { afterAll, describe, expect, it } from 'vitest';
import { closePools } from '@/lib/db/client';
import { inGarden } from '@/lib/db/transactions';
import { problemResponse } from '@/lib/http/problem-response';
import { newGarden } from '../../support/people';

afterAll(closePools);

const answerTo = async (work: Promise<unknown>) => {
  const response = await work.then(
    () => {
      throw new Error('expected this to fail');
    },
    (error: unknown) => problemResponse(error),
  );
  return { status: response.status, retryAfter: response.headers.get('retry-after'), body: await response.json() };
};

const BUSY = { status: 503, retryAfter: '3', body: { type: '/problems/busy', status: 503 } };

describe('what passes by itself is told as 503 with a time to wait', () => {
  it('when a row stays locked', async () => {
    const { gardenId } = await newGarden();
    let release = () => {};
    const held = new Promise<void>((resolve) => (release = resolve));
    let locked = () => {};
    const isLocked = new Promise<void>((resolve) => (locked = resolve));
    const holder = inGarden(gardenId, async (trx) => {
      await trx.selectFrom('gardens').select('garden_id').where('garden_id', '=', gardenId).forUpdate().execute();
      locked();
      await held;
    });
    await isLocked;
    const waiting = inGarden(gardenId, async (trx) => {
      await sql`set local lock_timeout = '50ms'`.execute(trx);
      await trx.selectFrom('gardens').select('garden_id').where('garden_id', '=', gardenId).forUpdate().execute();
    });
    expect(await answerTo(waiting)).toMatchObject(BUSY);
    release();
    await holder;
  });

  it('when a statement takes too long', async () => {
    const { gardenId } = await newGarden();
    const slow = inGarden(gardenId, async (trx) => {
      await sql`set local statement_timeout = '50ms'`.execute(trx);
      await sql`select pg_sleep(5)`.execute(trx);
    });
    expect(await answerTo(slow)).toMatchObject(BUSY);
  });

  it('when the database cannot be reached', async () => {
    const nowhere = new Pool({ connectionString: 'postgres://nobody@127.0.0.1:1/none' });
    expect(await answerTo(nowhere.query('select 1'))).toMatchObject(BUSY);
    await nowhere.end();
  });

  it('and a fault of ours stays a 500 that names a number and nothing else', async () => {
    const { gardenId } = await newGarden();
    const { status, body } = await answerTo(inGarden(gardenId, (trx) => sql`select nothing_such`.execute(trx)));
    expect(status).toBe(500);
    expect(JSON.stringify(body)).not.toContain('nothing_such');
  });
});
