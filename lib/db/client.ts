import 'server-only';

import { Kysely, PostgresDialect } from 'kysely';
import { Pool, types } from 'pg';
import { env } from '../env';
import type { Database } from './database';

// bigint counts come back as numbers; nothing here counts beyond 2^53.
types.setTypeParser(types.builtins.INT8, Number);

function createPool(connectionString: string, max: number): Pool {
  const pool = new Pool({
    connectionString,
    max,
    connectionTimeoutMillis: 4000,
    options: '-c statement_timeout=5000 -c idle_in_transaction_session_timeout=10000 -c lock_timeout=3000',
  });
  // Both handlers are needed to outlive a database restart: one for idle clients, one for those checked out.
  const note = (error: Error) => console.error('database connection lost:', error.message);
  pool.on('error', note);
  pool.on('connect', (client) => client.on('error', note));
  return pool;
}

type Pools = { app: Kysely<Database>; auth: Kysely<Database> };

// Kept on globalThis so that a reload in development does not open a new pool each time.
const holder = globalThis as typeof globalThis & { cellarsunPools?: Pools };

function pools(): Pools {
  holder.cellarsunPools ??= {
    app: new Kysely({
      dialect: new PostgresDialect({ pool: createPool(env().DATABASE_URL, env().DATABASE_POOL_SIZE) }),
    }),
    auth: new Kysely({ dialect: new PostgresDialect({ pool: createPool(env().DATABASE_AUTH_URL, 3) }) }),
  };
  return holder.cellarsunPools;
}

/** The app role's connection. Only `inGarden` may use it; a query outside a garden sees no tenant row. */
export const appDb = () => pools().app;

/** The auth role's connection: accounts, sign-ins, memberships. */
export const authDb = () => pools().auth;

export async function closePools(): Promise<void> {
  const open = holder.cellarsunPools;
  holder.cellarsunPools = undefined;
  await Promise.all([open?.app.destroy(), open?.auth.destroy()]);
}
