/** One line for each step; long ones say how long they have been at it. */
const started = Date.now();

const seconds = (ms) => `${(ms / 1000).toFixed(1)} s`;

export function say(line) {
  process.stdout.write(`${line}\n`);
}

/** Runs a step and prints one line when it is done. On a terminal the line counts up while the step works. */
export async function step(name, work) {
  const from = Date.now();
  const live = process.stdout.isTTY;
  const show = () => process.stdout.write(`\r${name} … ${seconds(Date.now() - from)} `);
  const timer = live
    ? setInterval(show, 500)
    : setInterval(() => say(`${name} … ${seconds(Date.now() - from)}`), 20_000);
  try {
    const note = await work();
    clearInterval(timer);
    say(`${live ? '\r' : ''}${name}: ${note ?? 'done'} (${seconds(Date.now() - from)})`);
  } catch (error) {
    clearInterval(timer);
    say(`${live ? '\r' : ''}${name}: failed after ${seconds(Date.now() - from)}`);
    throw error;
  }
}

export const sinceStart = () => seconds(Date.now() - started);

/** An error whose message is all that a person needs; no stack is printed for it. */
export class Stop extends Error {}
