import { readdirSync, readFileSync, rmSync } from 'node:fs';
import path from 'node:path';
import { Stop } from './say.mjs';
import { recall, remember } from './state-file.mjs';

/** Everything that a start runs carries this mark in its environment, so that the next start finds what a killed one left behind. */
export const MARK = 'CELLARSUN_STARTED_FROM';

const pause = (ms) => new Promise((resolve) => setTimeout(resolve, ms));

/** When a process began, in the kernel's ticks; with its id this names it for good. Null when it is gone. */
function birthOf(pid) {
  try {
    return readFileSync(`/proc/${pid}/stat`, 'utf8').split(') ').at(-1).split(' ')[19];
  } catch {
    return null;
  }
}

/** Takes the checkout for this start. Refuses when another start of it still runs. */
export function takeTurn(stateFolder) {
  const file = path.join(stateFolder, 'running.json');
  const other = recall(file);
  if (other && other.pid !== process.pid && birthOf(other.pid) === other.birth && other.birth) {
    const where = other.address ? ` at ${other.address}` : '';
    throw new Stop(`Cellarsun is running already${where} (process ${other.pid}). Stop that one first, or use it.`);
  }
  const mine = { pid: process.pid, birth: birthOf(process.pid) };
  remember(file, mine);
  return {
    announce: (address) => remember(file, { ...mine, address }),
    release: () => rmSync(file, { force: true }),
  };
}

/** Processes of an earlier start of this checkout whose script is gone. */
function leftovers(mark) {
  const needle = `${MARK}=${mark}\0`;
  return readdirSync('/proc')
    .filter((name) => /^\d+$/.test(name) && Number(name) !== process.pid)
    .filter((name) => {
      try {
        return readFileSync(`/proc/${name}/environ`, 'utf8').includes(needle);
      } catch {
        return false;
      }
    })
    .map(Number);
}

function end(pids, signal) {
  for (const pid of pids) {
    try {
      process.kill(pid, signal);
    } catch {
      // Gone meanwhile.
    }
  }
}

/** Ends what a killed start left running: its app, a package installation, a build. */
export async function endLeftovers(mark) {
  const found = leftovers(mark);
  end(found, 'SIGTERM');
  const until = Date.now() + 8_000;
  while (leftovers(mark).length > 0 && Date.now() < until) await pause(100);
  end(leftovers(mark), 'SIGKILL');
  while (leftovers(mark).length > 0) await pause(50);
  return found.length;
}
