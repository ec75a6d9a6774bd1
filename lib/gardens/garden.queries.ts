import 'server-only';

import { sql } from 'kysely';
import { authDb } from '../db/client';
import type { Role } from '../db/database';
import type { GardenTransaction } from '../db/transactions';
import type { Garden } from './garden.schema';

/** The gardens that an account belongs to. Read by the auth role: no single garden is named yet. */
export async function gardensOf(accountId: string): Promise<Garden[]> {
  const { rows } = await sql<Garden>`
    select g.garden_id as "gardenId", g.name, g.currency, g.version, m.role,
           (select count(*)::int from memberships c where c.garden_id = g.garden_id) as "memberCount"
    from memberships m join gardens g using (garden_id)
    where m.account_id = ${accountId}
    order by g.created_at, g.garden_id
  `.execute(authDb());
  return rows;
}

export async function gardenById(trx: GardenTransaction, gardenId: string): Promise<Omit<Garden, 'role'> | undefined> {
  return trx
    .selectFrom('gardens')
    .where('garden_id', '=', gardenId)
    .select(['garden_id as gardenId', 'name', 'currency', 'version'])
    .select((eb) =>
      eb
        .selectFrom('memberships')
        .where('memberships.garden_id', '=', gardenId)
        .select(sql<number>`count(*)::int`.as('count'))
        .as('memberCount'),
    )
    .$narrowType<{ memberCount: number }>()
    .executeTakeFirst();
}

export async function membersOf(trx: GardenTransaction, gardenId: string) {
  return trx
    .selectFrom('memberships')
    .innerJoin('accounts', 'accounts.account_id', 'memberships.account_id')
    .where('memberships.garden_id', '=', gardenId)
    .select(['accounts.account_id as accountId', 'display_name as displayName', 'email', 'role'])
    .orderBy('joined_at')
    .execute();
}

/** Locks the garden's owners, so that two of them cannot leave at once and orphan it. */
export async function lockOwners(trx: GardenTransaction, gardenId: string): Promise<string[]> {
  const owners = await trx
    .selectFrom('memberships')
    .where('garden_id', '=', gardenId)
    .where('role', '=', 'owner')
    .select('account_id')
    .orderBy('account_id')
    .forUpdate()
    .execute();
  return owners.map((owner) => owner.account_id);
}

export async function roleOfMember(
  trx: GardenTransaction,
  gardenId: string,
  accountId: string,
): Promise<Role | undefined> {
  const row = await trx
    .selectFrom('memberships')
    .where('garden_id', '=', gardenId)
    .where('account_id', '=', accountId)
    .select('role')
    .executeTakeFirst();
  return row?.role;
}
