import { spawn } from 'node:child_process';
import { signal } from './processes.mjs';

/** Children that run now. Each leads its own process group, so that Ctrl-C reaches this script alone and it ends them in order. */
const live = new Set();
let halted = false;

/** Ends every command that runs now and lets no other start. */
export function haltRuns() {
  halted = true;
  for (const child of live) signal(-child.pid, 'SIGTERM');
}

export class Halted extends Error {
  constructor() {
    super('stopped by a signal');
  }
}

/**
 * Runs a command to its end and gives back what it printed; throws with the last lines when it fails.
 *
 * @param onOutput called with each piece of output as it comes
 * @param always runs even while everything else is being halted: the commands that shut things down
 */
export function run(command, args, { env, cwd, uid, gid, input, onOutput, allowFailure = false, always = false } = {}) {
  if (halted && !always) return Promise.reject(new Halted());
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, {
      env,
      cwd,
      uid,
      gid,
      detached: true,
      stdio: [input === undefined ? 'ignore' : 'pipe', 'pipe', 'pipe'],
    });
    if (!always) live.add(child);
    let output = '';
    const keep = (chunk) => {
      output += chunk;
      onOutput?.(String(chunk));
    };
    child.stdout.on('data', keep);
    child.stderr.on('data', keep);
    if (input !== undefined) {
      child.stdin.on('error', () => {});
      child.stdin.end(input);
    }
    child.on('error', (error) => {
      live.delete(child);
      reject(error);
    });
    child.on('close', (code, by) => {
      live.delete(child);
      if (halted && !always) reject(new Halted());
      else if (code === 0 || allowFailure) resolve({ code, output });
      else reject(failure(command, args, code ?? by, output));
    });
  });
}

function failure(command, args, ending, output) {
  const error = new Error(
    `${command} ${args.join(' ')} ended with ${ending}\n${output.split('\n').slice(-60).join('\n')}`,
  );
  error.output = output;
  return error;
}

/** npm as this process was started by it, or as it stands on the path. */
export function npm(args, options = {}) {
  const cli = process.env.npm_execpath;
  return cli ? run(process.execPath, [cli, ...args], options) : run('npm', args, options);
}
