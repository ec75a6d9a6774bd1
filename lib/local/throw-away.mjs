import { chmodSync, mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { lives, whoAmI } from './processes.mjs';
import { findCluster, removeCluster, startCluster } from './cluster.mjs';
import { recall, remember } from './state-file.mjs';

const PREFIX = 'cellarsun-throw-away-';

/** Takes away the clusters of test runs that were killed before they could. */
async function sweep() {
  for (const name of readdirSync(tmpdir()).filter((each) => each.startsWith(PREFIX))) {
    const stateFolder = path.join(tmpdir(), name);
    const owner = recall(path.join(stateFolder, 'owner.json'));
    if (!owner || lives(owner)) continue;
    const cluster = findCluster({ stateFolder });
    if (cluster) await removeCluster(cluster);
    rmSync(stateFolder, { recursive: true, force: true });
  }
}

/** A cluster in the system's temporary folder that lives as long as the tests; nothing in it survives a crash. */
export async function throwAwayCluster({ durable = false } = {}) {
  await sweep();
  const stateFolder = mkdtempSync(path.join(tmpdir(), PREFIX));
  // The postgres user must be able to enter it; what is secret in it is readable by its owner alone.
  chmodSync(stateFolder, 0o755);
  remember(path.join(stateFolder, 'owner.json'), whoAmI());
  let stop;
  const remove = async () => {
    await stop?.();
    const cluster = findCluster({ stateFolder });
    if (cluster) await removeCluster(cluster);
    rmSync(stateFolder, { recursive: true, force: true });
  };
  try {
    const cluster = await startCluster({ stateFolder, durable, onFound: (found) => (stop = found) });
    return { ...cluster, stateFolder, remove };
  } catch (error) {
    await remove();
    throw error;
  }
}
