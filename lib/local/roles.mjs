import { postgresTool } from './postgres-tools.mjs';
import { run } from './run.mjs';

export const SUPERUSER = 'cellarsun_superuser';
const ROLES = ['owner', 'app', 'auth'];

export const roleName = (role) => `cellarsun_${role}`;

/** Least privilege: three roles that may sign in and nothing else, one database that the owner owns. */
function statements({ secrets, database }) {
  const roles = ROLES.map(
    (role) => `do $$ begin
  if not exists (select 1 from pg_roles where rolname = '${roleName(role)}') then create role ${roleName(role)}; end if;
end $$;
alter role ${roleName(role)} login nosuperuser nocreatedb nocreaterole noreplication nobypassrls password '${secrets[role]}';`,
  );
  return [
    ...roles,
    `select 'create database ${database} owner ${roleName('owner')}' where not exists (select 1 from pg_database where datname = '${database}')\\gexec`,
    `revoke all on database ${database} from public;`,
    `grant connect on database ${database} to ${roleName('app')}, ${roleName('auth')};`,
    `\\connect ${database}`,
    `alter schema public owner to ${roleName('owner')};`,
    'revoke create on schema public from public;',
  ].join('\n');
}

/** Makes the roles and the database, or brings them to what they should be. */
export async function arrangeRoles({ port, secrets, database, as }) {
  const args = [
    '-X',
    '-v',
    'ON_ERROR_STOP=1',
    '-q',
    '-h',
    '127.0.0.1',
    '-p',
    String(port),
    '-U',
    SUPERUSER,
    'postgres',
  ];
  await run(postgresTool('psql'), args, {
    ...as,
    env: { ...as.env, PGPASSWORD: secrets.superuser },
    input: statements({ secrets, database }),
  });
}
