import { sql, type Kysely } from 'kysely';

/** What a garden plans with. Every key begins with the garden, and so does every reference from one row to another. */
export async function up(db: Kysely<never>): Promise<void> {
  await sql`
    create table rooms (
      garden_id uuid not null references gardens on delete cascade,
      room_id uuid not null,
      name text not null,
      place jsonb not null,
      climate jsonb not null,
      power jsonb not null,
      residual_current_device text not null default 'unknown' check (residual_current_device in ('yes', 'no', 'unknown')),
      version integer not null default 1,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      primary key (garden_id, room_id)
    );

    create table tents (
      garden_id uuid not null,
      tent_id uuid not null,
      room_id uuid not null,
      name text not null,
      body jsonb not null,
      current_scenario_id uuid,
      version integer not null default 1,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      primary key (garden_id, tent_id),
      foreign key (garden_id, room_id) references rooms (garden_id, room_id)
    );
    create index tents_room on tents (garden_id, room_id);

    create table fixtures (
      garden_id uuid not null references gardens on delete cascade,
      fixture_id uuid not null,
      name text not null,
      spec jsonb not null,
      version integer not null default 1,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      primary key (garden_id, fixture_id)
    );

    create table targets (
      garden_id uuid not null references gardens on delete cascade,
      target_id uuid not null,
      crop text not null,
      stage text not null,
      figures jsonb not null,
      note text not null default '',
      version integer not null default 1,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      primary key (garden_id, target_id),
      unique (garden_id, crop, stage)
    );

    create table scenarios (
      garden_id uuid not null,
      scenario_id uuid not null,
      tent_id uuid not null,
      name text not null,
      note text not null default '',
      plan jsonb not null,
      version integer not null default 1,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      updated_by uuid references accounts on delete set null,
      primary key (garden_id, scenario_id),
      foreign key (garden_id, tent_id) references tents (garden_id, tent_id) on delete cascade,
      unique (garden_id, tent_id, scenario_id)
    );

    alter table tents add foreign key (garden_id, tent_id, current_scenario_id)
      references scenarios (garden_id, tent_id, scenario_id) deferrable initially deferred;

    create table scenario_fixtures (
      garden_id uuid not null,
      scenario_id uuid not null,
      fixture_id uuid not null,
      primary key (garden_id, scenario_id, fixture_id),
      foreign key (garden_id, scenario_id) references scenarios (garden_id, scenario_id) on delete cascade,
      foreign key (garden_id, fixture_id) references fixtures (garden_id, fixture_id)
    );
    create index scenario_fixtures_fixture on scenario_fixtures (garden_id, fixture_id);

    create table evaluations (
      garden_id uuid not null,
      scenario_id uuid not null,
      physics_version text not null,
      document_hash text not null,
      result jsonb not null,
      evaluated_at timestamptz not null default now(),
      primary key (garden_id, scenario_id),
      foreign key (garden_id, scenario_id) references scenarios (garden_id, scenario_id) on delete cascade
    );
  `.execute(db);

  await sql`
    do $$
    declare
      app_role text := current_setting('cellarsun.app_role');
      t text;
    begin
      foreach t in array array['rooms', 'tents', 'fixtures', 'targets', 'scenarios', 'scenario_fixtures', 'evaluations'] loop
        execute format('alter table %I enable row level security', t);
        execute format('alter table %I force row level security', t);
        execute format(
          'create policy garden_wall on %I to %I using (garden_id = (select current_garden())) with check (garden_id = (select current_garden()))',
          t, app_role);
        execute format('grant select, insert, update, delete on %I to %I', t, app_role);
      end loop;
    end
    $$;
  `.execute(db);
}
