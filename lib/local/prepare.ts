/** One process that brings a database to where the app needs it: migrations, a check of the serving role, the demo where asked. */
import { closePools } from '../db/client';
import { migrateToLatest, roleOf } from '../db/migrate';
import { refuseUnsafeRole } from '../db/refuse-unsafe-role';

const need = (name: string): string => {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is missing. See .env.example.`);
  return value;
};

async function prepare(): Promise<void> {
  const ran = await migrateToLatest({
    ownerUrl: need('DATABASE_OWNER_URL'),
    appRole: roleOf(need('DATABASE_URL')),
    authRole: roleOf(need('DATABASE_AUTH_URL')),
  });
  console.log(ran.length === 0 ? 'schema up to date' : `${ran.length} migrations ran`);
  await refuseUnsafeRole();
}

try {
  await prepare();
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
} finally {
  await closePools();
}
