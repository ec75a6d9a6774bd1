/**
 * `npm run soak`: ends the app and the database without warning while people save, again and again, and counts what was
 * acknowledged and is gone, what was made twice, and what is torn.
 *
 * Every write carries an id that its writer chose. A write whose answer never came is sent again with the same id.
 * SOAK_KILLS says how many ends; every third one is the database's.
 */
import { randomUUID } from 'node:crypto';
import { signal } from './processes.mjs';
import { say, step } from './say.mjs';
import { startCluster } from './cluster.mjs';
import { arrangeServer, buildForMeasuring, signIn } from './test-server.mjs';
import { throwAwayCluster } from './throw-away.mjs';

const KILLS = Number(process.env.SOAK_KILLS ?? 21);
const WRITERS = 6;
const base = { ...process.env, NEXT_TELEMETRY_DISABLED: '1' };
const pause = (ms) => new Promise((resolve) => setTimeout(resolve, ms));

const spec = (inputPowerW) => ({
  inputPowerW,
  rating: { kind: 'ppf', ppfUmolS: inputPowerW * 2.5 },
  shape: 'point',
  distribution: { type: 'lambertian' },
});

/** Sends until an answer comes; null when the run is over first. */
async function insist(state, { method, url, body }) {
  while (!state.over) {
    try {
      const response = await fetch(`${state.address}${url}`, {
        method,
        headers: { cookie: state.cookie, origin: state.address, 'content-type': 'application/json' },
        body: JSON.stringify(body),
        signal: AbortSignal.timeout(8_000),
      });
      if (response.status < 500) return { status: response.status, row: await response.json() };
      state.refused += 1;
    } catch {
      state.unanswered += 1;
    }
    await pause(60);
  }
  return null;
}

/** Makes lamps, and changes each once: the lamp's name says both what it is and how far it has come. */
async function write(state) {
  const url = `/api/v1/gardens/${state.gardenId}/fixtures`;
  for (let at = 1; !state.over; at += 1) {
    const fixtureId = randomUUID();
    const made = await insist(state, { method: 'POST', url, body: { fixtureId, name: 'made', spec: spec(at) } });
    if (!made) return;
    if (made.status >= 300) throw new Error(`a lamp was refused: ${JSON.stringify(made)}`);
    state.acknowledged.set(fixtureId, { name: 'made', power: at });
    const change = { version: 1, name: 'changed', spec: spec(at + 0.5) };
    const changed = await insist(state, { method: 'PATCH', url: `${url}/${fixtureId}`, body: change });
    if (!changed) return;
    // A change whose answer was lost clashes with itself when it is sent again: it was saved then.
    if (changed.status < 300 || changed.status === 409)
      state.acknowledged.set(fixtureId, { name: 'changed', power: at + 0.5 });
    else throw new Error(`a change was refused: ${JSON.stringify(changed)}`);
  }
}

async function endOne({ at, server, database, state }) {
  await pause(250 + Math.random() * 900);
  if (at % 3 === 2) {
    signal(database.serverPid(), 'SIGKILL');
    await pause(300);
    await startCluster({ stateFolder: database.stateFolder });
  } else {
    signal(-state.app.pid, 'SIGKILL');
    await state.app.ended;
    state.app = await server.launch();
  }
}

async function compare(state) {
  const url = `${state.address}/api/v1/gardens/${state.gardenId}/fixtures`;
  const rows = await (await fetch(url, { headers: { cookie: state.cookie } })).json();
  const byId = Map.groupBy ? Map.groupBy(rows, (row) => row.fixtureId) : groupBy(rows);
  let lost = 0;
  let torn = 0;
  for (const [id, { name, power }] of state.acknowledged) {
    const row = byId.get(id)?.[0];
    const behind = name === 'changed' && row?.name === 'made';
    if (!row || behind) lost += 1;
    else if (row.name === name && row.spec.inputPowerW !== power) torn += 1;
  }
  const double = [...byId.values()].filter((same) => same.length > 1).length;
  return { lost, double, torn };
}

function groupBy(rows) {
  const groups = new Map();
  for (const row of rows) groups.set(row.fixtureId, [...(groups.get(row.fixtureId) ?? []), row]);
  return groups;
}

async function soak(toStop) {
  await step('Build', (tell) => buildForMeasuring({ base, tell }));
  const database = await throwAwayCluster({ durable: true });
  toStop.push(database.remove);
  const server = await arrangeServer({ base, database });
  const state = { address: server.address, over: false, acknowledged: new Map(), unanswered: 0, refused: 0 };
  state.app = await server.launch();
  toStop.unshift(() => state.app.stop());
  state.cookie = await signIn({ address: server.address, ...server.signIns[0] });
  const gardens = await (await fetch(`${state.address}/api/v1/gardens`, { headers: { cookie: state.cookie } })).json();
  state.gardenId = gardens[0].gardenId;
  const writers = Array.from({ length: WRITERS }, () => write(state));
  await step(`${KILLS} ends without warning`, async (tell) => {
    for (let at = 0; at < KILLS; at += 1) {
      await endOne({ at, server, database, state });
      tell(`${at + 1} of ${KILLS}, ${state.acknowledged.size} saved`);
    }
    await pause(1500);
  });
  state.over = true;
  await Promise.all(writers);
  const { lost, double, torn } = await compare(state);
  say(
    `\n${state.acknowledged.size} acknowledged, ${state.unanswered} unanswered and ${state.refused} refused for a while, all sent again`,
  );
  say(`${lost} lost, ${double} double, ${torn} torn`);
  return lost + double + torn === 0 && state.acknowledged.size > KILLS;
}

const toStop = [];
let held = false;
try {
  held = await soak(toStop);
} finally {
  for (const stop of toStop) await stop();
}
process.exit(held ? 0 : 1);
