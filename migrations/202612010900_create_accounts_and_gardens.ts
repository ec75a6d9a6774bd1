import { sql, type Kysely } from 'kysely';

/**
 * Accounts, sign-ins and gardens.
 *
 * Three roles: the owner migrates and owns; the app role serves and obeys row-level security; the auth role reads
 * accounts, sign-ins and memberships before a garden is known. Their names are what the connections say: the runner
 * passes them in as the settings `cellarsun.app_role` and `cellarsun.auth_role`.
 */
export async function up(db: Kysely<never>): Promise<void> {
  await sql`
    create table accounts (
      account_id uuid primary key,
      email text not null,
      display_name text not null,
      password_hash text not null,
      unit_system text not null default 'metric' check (unit_system in ('metric', 'us')),
      theme text not null default 'system' check (theme in ('system', 'limewash', 'cellar')),
      created_at timestamptz not null default now()
    );
    create unique index accounts_email on accounts (lower(email));

    create table sessions (
      session_hash bytea primary key,
      account_id uuid not null references accounts on delete cascade,
      created_at timestamptz not null default now(),
      last_seen_at timestamptz not null default now()
    );
    create index sessions_account on sessions (account_id);

    create table sign_in_attempts (
      subject text primary key,
      window_started_at timestamptz not null default now(),
      attempts integer not null default 0
    );

    create table gardens (
      garden_id uuid primary key,
      name text not null,
      currency text not null check (currency ~ '^[A-Z]{3}$'),
      version integer not null default 1,
      created_at timestamptz not null default now()
    );

    create table memberships (
      garden_id uuid not null references gardens on delete cascade,
      account_id uuid not null references accounts on delete cascade,
      role text not null check (role in ('owner', 'planner', 'tender', 'viewer')),
      joined_at timestamptz not null default now(),
      primary key (garden_id, account_id)
    );
    create index memberships_account on memberships (account_id);

    create table join_codes (
      garden_id uuid not null references gardens on delete cascade,
      join_code_id uuid not null,
      code_hash bytea not null unique,
      role text not null check (role in ('planner', 'tender', 'viewer')),
      created_by uuid not null references accounts on delete cascade,
      created_at timestamptz not null default now(),
      expires_at timestamptz not null,
      primary key (garden_id, join_code_id)
    );

    create table audit_events (
      garden_id uuid not null,
      audit_event_id uuid not null,
      at timestamptz not null default now(),
      account_id uuid,
      action text not null,
      target_id text,
      detail jsonb not null default '{}',
      primary key (garden_id, audit_event_id)
    );
    create index audit_events_at on audit_events (garden_id, at);
  `.execute(db);

  await sql`
    create function current_garden() returns uuid language sql stable parallel safe
      as $$ select nullif(current_setting('app.garden', true), '')::uuid $$;
  `.execute(db);

  await sql`
    do $$
    declare
      app_role text := current_setting('cellarsun.app_role');
      auth_role text := current_setting('cellarsun.auth_role');
      t text;
    begin
      execute format('grant usage on schema public to %I, %I', app_role, auth_role);
      foreach t in array array['gardens', 'memberships', 'join_codes', 'audit_events'] loop
        execute format('alter table %I enable row level security', t);
        execute format('alter table %I force row level security', t);
        execute format(
          'create policy garden_wall on %I to %I using (garden_id = (select current_garden())) with check (garden_id = (select current_garden()))',
          t, app_role);
      end loop;

      -- The app role: its garden's rows only.
      execute format('grant select, insert, update, delete on gardens, memberships, join_codes to %I', app_role);
      execute format('grant select, insert on audit_events to %I', app_role);
      -- … and of accounts only those who belong to it.
      execute 'alter table accounts enable row level security';
      execute 'alter table accounts force row level security';
      execute format('grant select (account_id, email, display_name) on accounts to %I', app_role);
      execute format(
        'create policy fellow_members on accounts for select to %I using (exists (select 1 from memberships m where m.account_id = accounts.account_id))',
        app_role);
      execute format('create policy who_is_asking on accounts to %I using (true) with check (true)', auth_role);

      -- The auth role: who is asking, and which gardens they belong to.
      execute format('grant select, insert, update, delete on accounts, sessions, sign_in_attempts to %I', auth_role);
      execute format('grant select on gardens, memberships to %I', auth_role);
      execute format('grant select, delete on join_codes to %I', auth_role);
      execute format('grant insert on memberships, audit_events to %I', auth_role);
      execute format('create policy who_is_asking on gardens for select to %I using (true)', auth_role);
      execute format('create policy who_is_asking on memberships for select to %I using (true)', auth_role);
      execute format('create policy redeem on memberships for insert to %I with check (true)', auth_role);
      execute format('create policy find_code on join_codes for select to %I using (true)', auth_role);
      execute format('create policy spend_code on join_codes for delete to %I using (true)', auth_role);
      execute format('create policy record_joining on audit_events for insert to %I with check (true)', auth_role);
    end
    $$;
  `.execute(db);
}
