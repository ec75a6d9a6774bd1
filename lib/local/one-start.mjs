import { readFileSync, rmSync } from 'node:fs';
import path from 'node:path';
import { lives, processesWhere, signal, whoAmI } from './processes.mjs';
import { Stop } from './say.mjs';
import { recall, remember } from './state-file.mjs';

/** Everything that a start runs carries this mark in its environment, so that the next start finds what a killed one left behind. */
export const MARK = 'CELLARSUN_STARTED_FROM';

const pause = (ms) => new Promise((resolve) => setTimeout(resolve, ms));

/** Takes the checkout for this start. Refuses when another start of it still runs. */
export function takeTurn(stateFolder, what = 'Cellarsun is running') {
  const file = path.join(stateFolder, 'running.json');
  const other = recall(file);
  if (other && other.pid !== process.pid && lives(other)) {
    const where = other.address ? ` at ${other.address}` : '';
    throw new Stop(`${what} already${where} (process ${other.pid}). Stop that one first, or use it.`);
  }
  const mine = whoAmI();
  remember(file, mine);
  return {
    announce: (address) => remember(file, { ...mine, address }),
    release: () => rmSync(file, { force: true }),
  };
}

/** Processes of an earlier start of this checkout whose script is gone. */
function leftovers(mark) {
  const needle = `${MARK}=${mark}\0`;
  return processesWhere((pid) => readFileSync(`/proc/${pid}/environ`, 'utf8').includes(needle));
}

/** Ends what a killed start left running: its app, a package installation, a build. */
export async function endLeftovers(mark) {
  const found = leftovers(mark);
  for (const pid of found) signal(pid, 'SIGTERM');
  const until = Date.now() + 3_000;
  while (leftovers(mark).length > 0 && Date.now() < until) await pause(100);
  for (const pid of leftovers(mark)) signal(pid, 'SIGKILL');
  while (leftovers(mark).length > 0) await pause(50);
  return found.length;
}
