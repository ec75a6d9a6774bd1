import { existsSync } from 'node:fs';
import path from 'node:path';
import { run } from './run.mjs';
import { Stop } from './say.mjs';
import { DATABASE_INPUTS, hashOf, root } from './sources.mjs';
import { recall, remember } from './state-file.mjs';

/** The one extra process that understands TypeScript: migrations, the check of the reference data, the demo. */
export async function prepareDatabase({ env, demo }) {
  const args = ['--import', 'tsx', '--import', './lib/local/server-only.mjs', 'lib/local/prepare.ts'];
  const options = { cwd: root, env, allowFailure: true };
  const { code, output } = await run(process.execPath, [...args, ...(demo ? ['--demo'] : [])], options);
  if (code !== 0) throw new Stop(`The database could not be prepared:\n\n${output.trim()}`);
  return output.trim().split('\n').filter(Boolean);
}

/** The same, left out when this very cluster was prepared from these very files. */
export async function prepareOnce({ stateFolder, cluster, env }) {
  const file = path.join(stateFolder, 'prepared.json');
  const mark = `${cluster.clusterId} ${hashOf(DATABASE_INPUTS)}`;
  const last = existsSync(file) ? recall(file) : null;
  if (last?.mark === mark) return { lines: ['nothing changed'], signIns: last.signIns };
  const lines = await prepareDatabase({ env, demo: true });
  const signIns = lines.filter((line) => line.startsWith('sign-in ')).map((line) => line.slice('sign-in '.length));
  remember(file, { mark, signIns });
  return { lines: lines.filter((line) => !line.startsWith('sign-in ')), signIns };
}
