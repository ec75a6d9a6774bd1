import { execFileSync } from 'node:child_process';
import { existsSync, readdirSync } from 'node:fs';
import path from 'node:path';
import { run } from './run.mjs';
import { Stop } from './say.mjs';

export const isRoot = process.getuid?.() === 0;

/** The newest PostgreSQL of this machine: Debian's versioned folders first, then the path. */
function binFolder() {
  const base = '/usr/lib/postgresql';
  const versions = existsSync(base) ? readdirSync(base).map(Number).filter(Number.isFinite) : [];
  const folders = versions.sort((a, b) => b - a).map((version) => path.join(base, String(version), 'bin'));
  const onPath = (process.env.PATH ?? '').split(':').filter(Boolean);
  return [...folders, ...onPath].find((folder) => existsSync(path.join(folder, 'initdb'))) ?? null;
}

/** Path of one of PostgreSQL's programs; of the given major version where a cluster asks for one. */
export function postgresTool(name, version) {
  const versioned = version && path.join('/usr/lib/postgresql', version, 'bin', name);
  if (versioned && existsSync(versioned)) return versioned;
  return path.join(binFolder(), name);
}

/** Installs a Debian package as root; without root, says the one command to run. */
async function installPackage({ name, what, isThere, tell }) {
  if (isThere()) return 'there already';
  const command = `apt-get update && apt-get install -y --no-install-recommends ${name}`;
  if (!isRoot) throw new Stop(`${what} is missing. Run this once, then start again:\n\n  sudo sh -c '${command}'\n`);
  const options = {
    env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
    onOutput: (text) => tell(text.trim().split('\n').at(-1).slice(0, 60)),
  };
  try {
    // A dpkg that was killed half-way refuses every later install until it has been told to finish.
    await run('dpkg', ['--configure', '-a'], options);
    await run('apt-get', ['update'], options);
    await run('apt-get', ['install', '-y', '--no-install-recommends', name], options);
  } catch (error) {
    if (error.code !== 'ENOENT' && !error.output) throw error;
    const said = error.output ? `\n\n${error.output.split('\n').slice(-8).join('\n')}` : '';
    throw new Stop(`${what} could not be installed. Run this by hand and read what it says:\n\n  ${command}${said}`);
  }
  if (!isThere()) throw new Stop(`${what} was installed but is not where it should be. Try by hand:\n\n  ${command}\n`);
  return 'installed';
}

export const ensurePostgres = (tell = () => {}) =>
  installPackage({ name: 'postgresql', what: 'PostgreSQL', isThere: () => binFolder() !== null, tell });

export const CHROMIUM = '/usr/bin/chromium';

export const ensureChromium = (tell = () => {}) =>
  installPackage({ name: 'chromium', what: 'Chromium', isThere: () => existsSync(CHROMIUM), tell });

const idOf = (flag) => Number(execFileSync('id', [flag, 'postgres'], { encoding: 'utf8' }).trim());

/** How PostgreSQL's programs are run. They refuse root, so root lends them the postgres user; `cwd` is a folder that it may enter. */
export function asPostgres() {
  const user = isRoot ? { uid: idOf('-u'), gid: idOf('-g') } : {};
  return { ...user, cwd: '/', env: { PATH: process.env.PATH, LC_ALL: 'C.UTF-8', TZ: 'UTC' } };
}

export function giveToPostgres(files) {
  if (isRoot) execFileSync('chown', ['postgres:postgres', ...files]);
}
