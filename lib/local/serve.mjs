import { spawn } from 'node:child_process';
import { createWriteStream } from 'node:fs';
import path from 'node:path';
import { signal } from './processes.mjs';
import { Halted } from './run.mjs';
import { Stop } from './say.mjs';
import { root } from './sources.mjs';

const next = path.join(root, 'node_modules', 'next', 'dist', 'bin', 'next');
const pause = (ms) => new Promise((resolve) => setTimeout(resolve, ms));

/**
 * Starts the app and waits until it answers for itself.
 *
 * An older server on the same port would answer too. So the answer must carry this start's own token, and the app must still live.
 *
 * @param mode 'start' serves the build, 'dev' serves the sources
 * @param log a file for what the app prints; without it, it prints here once it is ready
 */
export function launchApp({ mode, port, host, env, log }) {
  const child = spawn(process.execPath, [next, mode, '-p', String(port), '-H', host], {
    cwd: root,
    env,
    detached: true,
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  const file = log ? createWriteStream(log, { flags: 'a' }) : null;
  let early = '';
  let shown = mode === 'dev';
  const take = (target) => (chunk) => {
    file?.write(chunk);
    if (shown && !file) target.write(chunk);
    else if (early.length < 100_000) early += chunk;
  };
  child.stdout.on('data', take(process.stdout));
  child.stderr.on('data', take(process.stderr));
  const ended = new Promise((resolve) => child.on('exit', (code, by) => resolve(code ?? by)));
  let over = false;
  void ended.then(() => (over = true));
  return {
    pid: child.pid,
    ended,
    async ready({ token, seconds = 60, isHalted = () => false }) {
      const until = Date.now() + seconds * 1000;
      while (Date.now() < until) {
        if (isHalted()) throw new Halted();
        // A refusal at boot leaves the process there, answering nothing.
        if (over || early.includes('Failed to prepare server')) {
          throw new Stop(`The app did not come up. It said:\n\n${early}`);
        }
        if (await answers({ port, host, token })) {
          shown = true;
          return;
        }
        await pause(100);
      }
      throw new Stop(`The app did not answer within ${seconds} s. It said:\n\n${early}`);
    },
    async stop() {
      if (over) return;
      signal(-child.pid, 'SIGTERM');
      const late = pause(10_000).then(() => 'late');
      if ((await Promise.race([ended, late])) === 'late') signal(-child.pid, 'SIGKILL');
      await ended;
    },
  };
}

async function answers({ port, host, token }) {
  const name = host === '0.0.0.0' || host === '::' ? '127.0.0.1' : host;
  try {
    const response = await fetch(`http://${name.includes(':') ? `[${name}]` : name}:${port}/readyz`, {
      signal: AbortSignal.timeout(30_000),
    });
    const body = await response.json();
    return body.ready === true && body.token === token;
  } catch {
    return false;
  }
}
