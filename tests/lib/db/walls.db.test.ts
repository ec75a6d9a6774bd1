import { sql } from 'kysely';
import { Pool } from 'pg';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { appDb, authDb, closePools } from '@/lib/db/client';
import { sharedTables } from '@/lib/db/database';
import { refuseUnsafeRole } from '@/lib/db/refuse-unsafe-role';
import { inGarden } from '@/lib/db/transactions';
import { newPlannedGarden, type PlannedGarden } from '../../support/planned-garden';

interface Wall {
  table: string;
  forced: boolean;
  policies: number;
  firstKey: string | null;
}

const superuser = new Pool({ connectionString: inject('database').superuserUrl, max: 1 });

async function tables(): Promise<Wall[]> {
  const { rows } = await superuser.query<Wall>(`
    select c.relname as table, c.relrowsecurity and c.relforcerowsecurity as forced,
           (select count(*)::int from pg_policy p where p.polrelid = c.oid) as policies,
           (select a.attname from pg_index i join pg_attribute a on a.attrelid = c.oid and a.attnum = i.indkey[0]
            where i.indrelid = c.oid and i.indisprimary) as "firstKey"
    from pg_class c join pg_namespace n on n.oid = c.relnamespace
    where n.nspname = 'public' and c.relkind in ('r', 'p') order by 1`);
  return rows;
}

let ours: PlannedGarden;
let theirs: PlannedGarden;
let tenantTables: string[];

beforeAll(async () => {
  ours = await newPlannedGarden('Ours');
  theirs = await newPlannedGarden('Theirs');
  const shared = new Set<string>(sharedTables);
  tenantTables = (await tables()).map((each) => each.table).filter((table) => !shared.has(table));
}, 60_000);

afterAll(async () => {
  await superuser.end();
  await closePools();
});

describe('the wall around each garden', () => {
  it('stands about every table that is not on the short list of shared ones, with the garden first in its key', async () => {
    const shared = new Set<string>(sharedTables);
    const walls = (await tables()).filter((each) => !shared.has(each.table));
    expect(walls.length).toBeGreaterThanOrEqual(11);
    for (const wall of walls) {
      expect(wall, wall.table).toMatchObject({ forced: true, firstKey: 'garden_id' });
      expect(wall.policies, wall.table).toBeGreaterThan(0);
    }
  });

  it('shows no foreign row to a query without a where, table by table', async () => {
    for (const table of tenantTables) {
      const behind = await superuser.query<{ garden_id: string }>(`select distinct garden_id from ${table}`);
      const all = behind.rows.map((row) => row.garden_id);
      expect(all, `${table} holds rows of both gardens`).toEqual(
        expect.arrayContaining([ours.gardenId, theirs.gardenId]),
      );
      const { rows } = await inGarden(ours.gardenId, (trx) =>
        sql<{ garden_id: string }>`select garden_id from ${sql.table(table)}`.execute(trx),
      );
      expect(rows.length, table).toBeGreaterThan(0);
      expect(new Set(rows.map((row) => row.garden_id)), table).toEqual(new Set([ours.gardenId]));
    }
  });

  it('shows nothing at all where no garden is named', async () => {
    for (const table of tenantTables) {
      const { rows } = await sql`select 1 from ${sql.table(table)}`.execute(appDb());
      expect(rows, table).toHaveLength(0);
    }
  });

  it('carries nothing over to the next transaction on the same connection', async () => {
    await inGarden(ours.gardenId, async (trx) => sql`select 1`.execute(trx));
    const { rows } = await sql<{
      garden: string | null;
    }>`select nullif(current_setting('app.garden', true), '') as garden`.execute(appDb());
    expect(rows[0]!.garden).toBeNull();
  });

  it('refuses to write into a foreign garden or move a row there', async () => {
    await expect(
      inGarden(ours.gardenId, (trx) =>
        trx
          .insertInto('rooms')
          .values({
            garden_id: theirs.gardenId,
            room_id: crypto.randomUUID(),
            name: 'x',
            place: '{}',
            climate: '{}',
            power: '{}',
          })
          .execute(),
      ),
    ).rejects.toThrow(/row-level security/);
    await expect(
      inGarden(ours.gardenId, (trx) => trx.updateTable('rooms').set({ garden_id: theirs.gardenId }).execute()),
    ).rejects.toThrow(/row-level security/);
    const { numUpdatedRows } = await inGarden(ours.gardenId, (trx) =>
      trx.updateTable('rooms').set({ name: 'taken' }).where('room_id', '=', theirs.roomId).executeTakeFirst(),
    );
    expect(numUpdatedRows).toBe(0n);
  });

  it('lets no row point into a foreign garden', async () => {
    await expect(
      inGarden(ours.gardenId, (trx) =>
        trx
          .insertInto('tents')
          .values({
            garden_id: ours.gardenId,
            tent_id: crypto.randomUUID(),
            room_id: theirs.roomId,
            name: 'x',
            body: '{}',
          })
          .execute(),
      ),
    ).rejects.toThrow(/foreign key/);
  });

  it('shows of accounts only those who belong to the garden', async () => {
    const { rows } = await inGarden(ours.gardenId, (trx) =>
      sql<{ account_id: string }>`select account_id from accounts`.execute(trx),
    );
    expect(new Set(rows.map((row) => row.account_id))).toEqual(
      new Set(Object.values(ours.people).map((person) => person.accountId)),
    );
  });

  it('keeps the record of changes from being altered', async () => {
    await expect(
      inGarden(ours.gardenId, (trx) => sql`update audit_events set action = 'x'`.execute(trx)),
    ).rejects.toThrow(/permission denied/);
    await expect(inGarden(ours.gardenId, (trx) => sql`delete from audit_events`.execute(trx))).rejects.toThrow(
      /permission denied/,
    );
  });

  it('keeps passwords and sessions from the app role', async () => {
    await expect(sql`select password_hash from accounts`.execute(appDb())).rejects.toThrow(/permission denied/);
    await expect(sql`select * from sessions`.execute(appDb())).rejects.toThrow(/permission denied/);
    await expect(sql`select * from rooms`.execute(authDb())).rejects.toThrow(/permission denied/);
  });
});

describe('who may serve', () => {
  async function asked(url: string): Promise<unknown> {
    const before = process.env['DATABASE_URL'];
    await closePools();
    const { resetEnv } = await import('@/lib/env');
    try {
      process.env['DATABASE_URL'] = url;
      resetEnv();
      return await refuseUnsafeRole().then(
        () => 'served',
        (error: Error) => error.message,
      );
    } finally {
      await closePools();
      process.env['DATABASE_URL'] = before;
      resetEnv();
    }
  }

  it('refuses the owner and the superuser, and serves the app role', async () => {
    expect(await asked(inject('database').ownerUrl)).toMatch(/app role/);
    expect(await asked(inject('database').superuserUrl)).toMatch(/app role/);
    expect(await asked(inject('database').appUrl)).toBe('served');
  });
});

describe('a migration that backfills', () => {
  it('touches no row under FORCE, and its rows once it lifts FORCE in its own transaction', async () => {
    const owner = new Pool({ connectionString: inject('database').ownerUrl, max: 1 });
    try {
      const blind = await owner.query("update rooms set name = name || ''");
      expect(blind.rowCount).toBe(0);
      await owner.query('begin');
      await owner.query('alter table rooms no force row level security');
      const seen = await owner.query("update rooms set name = name || ''");
      await owner.query('alter table rooms force row level security');
      await owner.query('commit');
      expect(seen.rowCount).toBeGreaterThanOrEqual(2);
    } finally {
      await owner.end();
    }
    expect((await tables()).find((each) => each.table === 'rooms')!.forced).toBe(true);
  });
});
