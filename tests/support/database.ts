import type { TestProject } from 'vitest/node';
import { migrateToLatest, roleOf } from '../../lib/db/migrate';
import { throwAwayCluster } from '../../lib/local/throw-away.mjs';

declare module 'vitest' {
  export interface ProvidedContext {
    /** Addresses of the throw-away database, one for each role; the superuser's is for arranging and looking behind the walls. */
    database: { appUrl: string; authUrl: string; ownerUrl: string; superuserUrl: string };
  }
}

/**
 * A PostgreSQL cluster of these tests' own: made before the first, migrated, gone after the last.
 *
 * The tests find it where the app would, in the environment; `inject('database')` gives the other roles' addresses.
 */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const cluster = await throwAwayCluster();
  const { appUrl, authUrl, ownerUrl, superuserUrl } = cluster;
  await migrateToLatest({ ownerUrl, appRole: roleOf(appUrl), authRole: roleOf(authUrl) });
  Object.assign(process.env, {
    DATABASE_URL: appUrl,
    DATABASE_AUTH_URL: authUrl,
    DATABASE_OWNER_URL: ownerUrl,
    NEXTAUTH_URL: 'http://localhost:3000',
    NEXTAUTH_SECRET: 'a secret of the tests, which guard nothing',
    // All tests come from one address; the tests of the limits bring their own subjects.
    SIGN_UPS_PER_HOUR: '100000',
  });
  project.provide('database', { appUrl, authUrl, ownerUrl, superuserUrl });
  return () => cluster.remove();
}
