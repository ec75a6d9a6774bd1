import { randomBytes } from 'node:crypto';
import { rmSync } from 'node:fs';
import path from 'node:path';
import { buildOnce } from './build.mjs';
import { freePort } from './ports.mjs';
import { prepareDatabase } from './prepare-database.mjs';
import { launchApp } from './serve.mjs';
import { appEnvironment } from './settings.mjs';
import { root } from './sources.mjs';
import { testBuildEnvironment } from './test-build.mjs';

export const reports = path.join(root, '.data', 'test');

/** Next.js's build of the tests' own folder. */
export const buildEnvironment = (base) => ({
  ...testBuildEnvironment({ name: 'next', env: base }),
  NODE_ENV: 'production',
});

/** Builds into the tests' folder unless just these sources were built there; for measurements, not for the tests. */
export const buildForMeasuring = ({ base, tell }) =>
  buildOnce({ env: buildEnvironment(base), tell, folder: '.data/test/next' });

/** A database, prepared with the demo, and what the app needs to serve it at an address of its own. */
export async function arrangeServer({ base, database }) {
  const port = await freePort();
  const address = `http://localhost:${port}`;
  const token = randomBytes(16).toString('hex');
  const secret = randomBytes(32).toString('hex');
  const env = {
    ...appEnvironment({ database, secret, address, token, mark: {} }),
    ...buildEnvironment(base),
    // Everybody signs in from this one machine.
    SIGN_IN_ATTEMPTS: '100000',
    SIGN_UPS_PER_HOUR: '100000',
  };
  const lines = await prepareDatabase({ env: { ...env, DATABASE_OWNER_URL: database.ownerUrl }, demo: true });
  const log = path.join(reports, 'app.log');
  rmSync(log, { force: true });
  const launch = async () => {
    const app = launchApp({ mode: 'start', port, host: '127.0.0.1', env, log });
    try {
      await app.ready({ token });
    } catch (error) {
      await app.stop();
      throw error;
    }
    return app;
  };
  return { address, env, launch, signIns: lines.map(signInOf).filter(Boolean) };
}

/** A sign-in that the preparation printed: address and passphrase. */
function signInOf(line) {
  const found = /^sign-in (\S+), “(.+)”: /.exec(line);
  return found && { email: found[1], password: found[2] };
}

const cookiesOf = (response) => response.headers.getSetCookie().map((each) => each.split(';')[0]);

/** Signs in as a browser does and gives back the cookies to send. */
export async function signIn({ address, email, password }) {
  const asked = await fetch(`${address}/api/auth/csrf`);
  const { csrfToken } = await asked.json();
  const cookie = cookiesOf(asked).join('; ');
  const answer = await fetch(`${address}/api/auth/callback/credentials`, {
    method: 'POST',
    redirect: 'manual',
    headers: { cookie, origin: address, 'content-type': 'application/x-www-form-urlencoded' },
    body: new URLSearchParams({ csrfToken, email, password, json: 'true' }),
  });
  const session = cookiesOf(answer).filter((each) => each.includes('session'));
  if (session.length === 0) throw new Error(`${email} could not sign in: ${answer.status} ${await answer.text()}`);
  return session.join('; ');
}
