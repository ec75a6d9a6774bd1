import 'server-only';

import { sql } from 'kysely';
import { appDb } from './client';

interface RoleFacts {
  name: string;
  passesWalls: boolean;
  ownsTables: boolean;
}

/**
 * Refuses to serve with a role that row-level security does not hold: a superuser, one that bypasses it, or one that owns tables.
 * Served as such a role, one forgotten `where` would show every garden to everybody.
 */
export async function refuseUnsafeRole(): Promise<void> {
  const { rows } = await sql<RoleFacts>`
    select r.rolname as name, r.rolsuper or r.rolbypassrls as "passesWalls",
           exists (select 1 from pg_class c join pg_namespace n on n.oid = c.relnamespace
                   where n.nspname = 'public' and c.relkind in ('r', 'p') and pg_has_role(current_user, c.relowner, 'member')) as "ownsTables"
    from pg_roles r where r.rolname = current_user
  `.execute(appDb());
  const role = rows[0];
  if (!role || role.passesWalls || role.ownsTables) {
    throw new Error(
      `DATABASE_URL connects as "${role?.name ?? 'nobody'}", which could see every garden's rows. ` +
        'Give it the app role, which owns nothing and is neither superuser nor allowed to bypass row-level security.',
    );
  }
}
