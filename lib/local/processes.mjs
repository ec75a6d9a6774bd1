import { readdirSync, readFileSync } from 'node:fs';

/** When a process began, in the kernel's ticks; with its id this names it for good. Null when it is gone. */
export function birthOf(pid) {
  try {
    return readFileSync(`/proc/${pid}/stat`, 'utf8').split(') ').at(-1).split(' ')[19];
  } catch {
    return null;
  }
}

/** A name for this very process, which outlives no restart and no reuse of its id. */
export const whoAmI = () => ({ pid: process.pid, birth: birthOf(process.pid) });

export const lives = (who) => Boolean(who?.birth) && birthOf(who.pid) === who.birth;

export function signal(pid, name) {
  try {
    process.kill(pid, name);
  } catch {
    // It ended by itself in the meantime.
  }
}

/** Ids of the processes for which the question is answered yes; those that are gone or not ours to ask are left out. */
export function processesWhere(question) {
  return readdirSync('/proc')
    .filter((name) => /^\d+$/.test(name) && Number(name) !== process.pid)
    .map(Number)
    .filter((pid) => {
      try {
        return question(pid);
      } catch {
        return false;
      }
    });
}
