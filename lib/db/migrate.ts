import { readdir } from 'node:fs/promises';
import path from 'node:path';
import { pathToFileURL } from 'node:url';
import { Kysely, Migrator, PostgresDialect, sql, type Migration, type MigrationProvider } from 'kysely';
import { Pool } from 'pg';

/** Reads migrations/*.ts. The import stands here, in project code, so that tsx and vitest both transform it. */
class FolderProvider implements MigrationProvider {
  constructor(private readonly folder: string) {}

  async getMigrations(): Promise<Record<string, Migration>> {
    const migrations: Record<string, Migration> = {};
    for (const file of (await readdir(this.folder)).sort()) {
      if (!file.endsWith('.ts')) continue;
      migrations[file.slice(0, -3)] = (await import(pathToFileURL(path.join(this.folder, file)).href)) as Migration;
    }
    return migrations;
  }
}

export interface MigrationRoles {
  ownerUrl: string;
  /** The name of the role that serves, as its connection says. */
  appRole: string;
  /** The name of the role that reads accounts and sign-ins. */
  authRole: string;
  folder?: string;
}

/** Brings the database to the newest schema, as owner. Returns the names of the migrations that ran. */
export async function migrateToLatest({ ownerUrl, appRole, authRole, folder }: MigrationRoles): Promise<string[]> {
  // One connection: the role names are settings of the session that the migrations read.
  const pool = new Pool({ connectionString: ownerUrl, max: 1 });
  const db = new Kysely<never>({ dialect: new PostgresDialect({ pool }) });
  try {
    await sql`select set_config('cellarsun.app_role', ${appRole}, false), set_config('cellarsun.auth_role', ${authRole}, false)`.execute(
      db,
    );
    const provider = new FolderProvider(folder ?? path.join(process.cwd(), 'migrations'));
    const { error, results } = await new Migrator({ db, provider }).migrateToLatest();
    if (error) throw error;
    return (results ?? []).filter((result) => result.status === 'Success').map((result) => result.migrationName);
  } finally {
    await db.destroy();
  }
}

/** The role that a connection address names. */
export function roleOf(url: string): string {
  return decodeURIComponent(new URL(url).username);
}
