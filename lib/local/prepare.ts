/** One process that brings a database to where the app needs it: migrations, then the demo where it is asked for. */
import { migrateToLatest, roleOf } from '../db/migrate';

const need = (name: string): string => {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is missing. See .env.example.`);
  return value;
};

const ran = await migrateToLatest({
  ownerUrl: need('DATABASE_OWNER_URL'),
  appRole: roleOf(need('DATABASE_URL')),
  authRole: roleOf(need('DATABASE_AUTH_URL')),
});
console.log(ran.length === 0 ? 'schema up to date' : `${ran.length} migrations ran`);
