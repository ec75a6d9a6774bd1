import { createHash } from 'node:crypto';
import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { npm } from './run.mjs';
import { root } from './sources.mjs';

const stampFile = path.join(root, 'node_modules', '.cellarsun-lock');

function wanted() {
  const hash = createHash('sha256').update(`${process.version} ${process.arch}`);
  for (const file of ['package-lock.json', 'package.json', '.npmrc']) hash.update(readFileSync(path.join(root, file)));
  return hash.digest('hex');
}

/**
 * Installs what the lock names, unless node_modules says that it holds just that.
 *
 * @param keep true leaves any finished installation alone: in development, others may be working with it
 */
export async function ensurePackages({ env, tell, keep = false }) {
  if (keep && existsSync(path.join(root, 'node_modules', '.package-lock.json'))) return 'as they are';
  const mark = wanted();
  if (existsSync(stampFile) && readFileSync(stampFile, 'utf8') === mark) return 'there already';
  // Gone first: an install that is cut short leaves no mark, and the next start does it again.
  rmSync(stampFile, { force: true });
  tell('about 450 packages, a minute or two');
  // The build needs the development packages, whatever NODE_ENV says.
  await npm(['ci', '--include=dev', '--no-audit', '--no-fund'], { cwd: root, env });
  writeFileSync(stampFile, mark);
  return 'installed';
}
