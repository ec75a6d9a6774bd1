import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

export const root = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '');

function* filesUnder(folder) {
  for (const entry of readdirSync(folder, { withFileTypes: true }).sort((a, b) => (a.name < b.name ? -1 : 1))) {
    const full = path.join(folder, entry.name);
    if (entry.isDirectory()) yield* filesUnder(full);
    else if (entry.isFile()) yield full;
  }
}

/** One hash over the names and contents of files and folders of the checkout; missing ones count as missing. */
export function hashOf(names) {
  const hash = createHash('sha256').update(process.version);
  for (const name of names) {
    const full = path.join(root, name);
    if (!existsSync(full)) {
      hash.update(`\0missing ${name}`);
      continue;
    }
    for (const file of statSync(full).isDirectory() ? filesUnder(full) : [full]) {
      hash.update(`\0${path.relative(root, file)}\0`).update(readFileSync(file));
    }
  }
  return hash.digest('hex');
}

/** What `next build` reads. */
export const BUILD_INPUTS = [
  ...['app', 'lib', 'physics', 'public', 'reference-data'],
  ...['instrumentation.ts', 'next.config.ts', 'package.json', 'package-lock.json', 'postcss.config.mjs', 'proxy.ts'],
  ...['tailwind.config.ts', 'tsconfig.json'],
];

/** What a database is prepared from: its schema, the reference data, the demo and the services that write it. */
export const DATABASE_INPUTS = ['migrations', 'reference-data', 'lib', 'physics', 'package-lock.json'];
