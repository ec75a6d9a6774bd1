/** One process that brings a database to where the app needs it: migrations, a check of the serving role, the demo where asked. */
import { closePools } from '../db/client';
import { migrateToLatest, roleOf } from '../db/migrate';
import { refuseUnsafeRole } from '../db/refuse-unsafe-role';
import { seedDemo } from '../demo/seed-demo';
import { referenceData } from '../reference-data/reference-data';

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
  const { crops, colours } = referenceData();
  console.log(`reference data checked: ${crops.length} crops and stages, ${colours.length} spectra`);
  if (process.argv.includes('--demo')) await loadDemo();
}

async function loadDemo(): Promise<void> {
  const { loaded, signIns } = await seedDemo();
  console.log(loaded === 0 ? 'demo there already' : `${loaded} demo gardens loaded`);
  for (const { email, passphrase, what } of signIns) console.log(`sign-in ${email}, “${passphrase}”: ${what}`);
}

try {
  await prepare();
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
} finally {
  await closePools();
}
