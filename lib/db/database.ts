import type { ColumnType, Generated } from 'kysely';

/** The tables as Kysely sees them. JSON columns are validated by the noun's zod schema on the way in and typed where they are read. */
type Timestamp = ColumnType<Date, Date | string | undefined, Date | string>;
type Json = ColumnType<unknown, string, string>;

export type Role = 'owner' | 'planner' | 'tender' | 'viewer';
export type UnitSystem = 'metric' | 'us';
export type Theme = 'system' | 'limewash' | 'cellar';

export interface Database {
  accounts: {
    account_id: string;
    email: string;
    display_name: string;
    password_hash: string;
    unit_system: Generated<UnitSystem>;
    theme: Generated<Theme>;
    created_at: Timestamp;
  };
  sessions: { session_hash: Buffer; account_id: string; created_at: Timestamp; last_seen_at: Timestamp };
  sign_in_attempts: { subject: string; window_started_at: Timestamp; attempts: Generated<number> };
  gardens: { garden_id: string; name: string; currency: string; version: Generated<number>; created_at: Timestamp };
  memberships: { garden_id: string; account_id: string; role: Role; joined_at: Timestamp };
  join_codes: {
    garden_id: string;
    join_code_id: string;
    code_hash: Buffer;
    role: Exclude<Role, 'owner'>;
    created_by: string;
    created_at: Timestamp;
    expires_at: Timestamp;
  };
  audit_events: {
    garden_id: string;
    audit_event_id: string;
    at: Timestamp;
    account_id: string | null;
    action: string;
    target_id: string | null;
    detail: Json;
  };
  rooms: {
    garden_id: string;
    room_id: string;
    name: string;
    place: Json;
    climate: Json;
    power: Json;
    residual_current_device: Generated<'yes' | 'no' | 'unknown'>;
    version: Generated<number>;
    created_at: Timestamp;
    updated_at: Timestamp;
  };
  tents: {
    garden_id: string;
    tent_id: string;
    room_id: string;
    name: string;
    body: Json;
    current_scenario_id: string | null;
    version: Generated<number>;
    created_at: Timestamp;
    updated_at: Timestamp;
  };
  fixtures: {
    garden_id: string;
    fixture_id: string;
    name: string;
    spec: Json;
    version: Generated<number>;
    created_at: Timestamp;
    updated_at: Timestamp;
  };
  targets: {
    garden_id: string;
    target_id: string;
    crop: string;
    stage: string;
    figures: Json;
    note: Generated<string>;
    version: Generated<number>;
    created_at: Timestamp;
    updated_at: Timestamp;
  };
  scenarios: {
    garden_id: string;
    scenario_id: string;
    tent_id: string;
    name: string;
    note: Generated<string>;
    plan: Json;
    version: Generated<number>;
    created_at: Timestamp;
    updated_at: Timestamp;
    updated_by: string | null;
  };
  scenario_fixtures: { garden_id: string; scenario_id: string; fixture_id: string };
  evaluations: {
    garden_id: string;
    scenario_id: string;
    physics_version: string;
    document_hash: string;
    result: Json;
    evaluated_at: Timestamp;
  };
}

/** Tables that belong to no garden. Every other table must have its wall: row-level security, forced, keyed by garden. */
export const sharedTables = [
  'accounts',
  'sessions',
  'sign_in_attempts',
  'kysely_migration',
  'kysely_migration_lock',
] as const;
