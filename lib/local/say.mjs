/** One line for each step; long ones say how long they have been at it. */
const started = Date.now();
const PROGRESS_EVERY_MS = 10_000;

const seconds = (ms) => `${(ms / 1000).toFixed(1)} s`;

// A reader that went away (`npm start | head`) is no reason to leave the database running.
process.stdout.on('error', () => {});
process.stderr.on('error', () => {});

export function say(line) {
  process.stdout.write(`${line}\n`);
}

/** Runs a step and prints one line when it is done. On a terminal the line counts up while the step works. */
export async function step(name, work) {
  const from = Date.now();
  const live = process.stdout.isTTY;
  let doing = '';
  const line = () => `${name} … ${seconds(Date.now() - from)}${doing && `, ${doing}`}`;
  const timer = live
    ? setInterval(() => process.stdout.write(`\r\x1b[K${line()}`), 500)
    : setInterval(() => say(line()), PROGRESS_EVERY_MS);
  const end = (words) => {
    clearInterval(timer);
    say(`${live ? '\r\x1b[K' : ''}${name}: ${words} (${seconds(Date.now() - from)})`);
  };
  try {
    end((await work((words) => (doing = words))) ?? 'done');
  } catch (error) {
    end('not finished');
    throw error;
  }
}

export const sinceStart = () => seconds(Date.now() - started);

/** An error whose message is all that a person needs; no stack is printed for it. */
export class Stop extends Error {}
