import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { Stop } from './say.mjs';
import { recall, remember } from './state-file.mjs';

/** Reads a `.env` file: NAME=value lines, quotes allowed. What the environment names already stays. */
export function readDotEnv(file) {
  if (!existsSync(file)) return;
  for (const line of readFileSync(file, 'utf8').split('\n')) {
    const found = /^\s*(?:export\s+)?([A-Z][A-Z0-9_]*)\s*=\s*(.*?)\s*$/.exec(line);
    if (!found) continue;
    const [, name, raw] = found;
    const quoted = /^(["'])(.*)\1$/.exec(raw);
    process.env[name] ??= quoted ? quoted[2] : raw.replace(/\s+#.*$/, '');
  }
}

export function portFromEnvironment(fallback) {
  const text = process.env.PORT?.trim();
  if (!text) return { port: fallback, asked: false };
  const port = Number(text);
  if (!Number.isInteger(port) || port < 1 || port > 65_535) {
    throw new Stop(`PORT is "${text}". It must be a whole number from 1 to 65535.`);
  }
  return { port, asked: true };
}

/** The secret that signs sign-in cookies: made once, kept, so that a restart signs nobody out. */
export function keptSecret(stateFolder) {
  const file = path.join(stateFolder, 'secret.json');
  const kept = recall(file)?.nextauthSecret;
  return kept ?? remember(file, { nextauthSecret: randomBytes(32).toString('base64url') }).nextauthSecret;
}

const ADDRESSES = {
  DATABASE_URL: 'the app role: it serves, owns nothing and obeys row-level security',
  DATABASE_AUTH_URL: 'the auth role: it reads accounts and sign-ins before a garden is known',
  DATABASE_OWNER_URL: 'the owner role: it runs the migrations and owns the tables',
};

/** The three addresses of a database server of the user's own; null when none is named. */
export function databaseFromEnvironment() {
  const missing = Object.keys(ADDRESSES).filter((name) => !process.env[name]);
  if (missing.length === Object.keys(ADDRESSES).length) return null;
  if (missing.length > 0) {
    const lines = missing.map((name) => `  ${name}  ${ADDRESSES[name]}`);
    throw new Stop(
      `A database server of your own needs three addresses, one for each role. Missing:\n\n${lines.join('\n')}\n\n` +
        'README.md says how to make the roles. Without any of them a local database is made under .data.',
    );
  }
  return {
    appUrl: process.env.DATABASE_URL,
    authUrl: process.env.DATABASE_AUTH_URL,
    ownerUrl: process.env.DATABASE_OWNER_URL,
  };
}

/** What the app is told, on top of the environment of this process. */
export function appEnvironment({ database, secret, address, token, mark }) {
  return {
    ...process.env,
    DATABASE_URL: database.appUrl,
    DATABASE_AUTH_URL: database.authUrl,
    NEXTAUTH_URL: process.env.NEXTAUTH_URL || address,
    NEXTAUTH_SECRET: process.env.NEXTAUTH_SECRET || secret,
    NEXT_TELEMETRY_DISABLED: '1',
    ...(token && { CELLARSUN_START_TOKEN: token }),
    ...mark,
  };
}
