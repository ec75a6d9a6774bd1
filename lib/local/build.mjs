import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { run } from './run.mjs';
import { BUILD_INPUTS, hashOf, root } from './sources.mjs';

const next = path.join(root, 'node_modules', 'next', 'dist', 'bin', 'next');

/** Builds the app; the text is what the build printed. */
export async function build({ env, tell = () => {} }) {
  const onOutput = (text) => {
    const line = text.trim().split('\n').at(-1);
    // The words before a count say which stage it is at.
    if (/^[\w ✓-]/.test(line))
      tell(
        line
          .replace(/\s*\.\.\..*$/, '')
          .replace(/^✓ /, '')
          .slice(0, 60)
          .toLowerCase(),
      );
  };
  const { output } = await run(process.execPath, [next, 'build'], { cwd: root, env, onOutput });
  return output;
}

/** Builds only when something that the build reads has changed since the last finished one. */
export async function buildOnce({ env, tell, folder = '.next' }) {
  const stampFile = path.join(root, folder, 'cellarsun-sources');
  const mark = hashOf(BUILD_INPUTS);
  const whole = existsSync(path.join(root, folder, 'BUILD_ID'));
  if (whole && existsSync(stampFile) && readFileSync(stampFile, 'utf8') === mark) return 'nothing changed';
  rmSync(stampFile, { force: true });
  await build({ env, tell });
  writeFileSync(stampFile, mark);
  return 'built';
}
