import { spawn } from 'node:child_process';

/** Runs a command to its end and gives back what it printed; throws with the last lines when it fails. */
export function run(command, args, { env, cwd, uid, gid, input, allowFailure = false } = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, {
      env,
      cwd,
      uid,
      gid,
      stdio: [input === undefined ? 'ignore' : 'pipe', 'pipe', 'pipe'],
    });
    let output = '';
    const keep = (chunk) => {
      output += chunk;
    };
    child.stdout.on('data', keep);
    child.stderr.on('data', keep);
    if (input !== undefined) child.stdin.end(input);
    child.on('error', reject);
    child.on('close', (code) => {
      if (code === 0 || allowFailure) resolve({ code, output });
      else
        reject(
          new Error(`${command} ${args.join(' ')} ended with ${code}\n${output.split('\n').slice(-40).join('\n')}`),
        );
    });
  });
}

/** npm as this process was started by it, or as it stands on the path. */
export function npm(args, options = {}) {
  const cli = process.env.npm_execpath;
  return cli ? run(process.execPath, [cli, ...args], options) : run('npm', args, options);
}
