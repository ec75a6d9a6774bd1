/**
 * `npm run bench`: how fast an evaluation is, and what the app's own work costs beside a route that does nothing.
 *
 * Absolute figures belong to the machine that is named; the shares are what is promised. Rounds are interleaved, so that a
 * neighbour's load falls on all of them, and medians are taken.
 */
import { readFileSync } from 'node:fs';
import { cpus, loadavg } from 'node:os';
import { fileURLToPath } from 'node:url';
import autocannon from 'autocannon';
import { run } from './run.mjs';
import { say, step } from './say.mjs';
import { root } from './sources.mjs';
import { arrangeServer, buildForMeasuring, signIn } from './test-server.mjs';
import { throwAwayCluster } from './throw-away.mjs';

const ROUNDS = Number(process.env.BENCH_ROUNDS ?? 3);
const SECONDS = Number(process.env.BENCH_SECONDS ?? 4);
const CONNECTIONS = 10;
const base = { ...process.env, NEXT_TELEMETRY_DISABLED: '1' };
const SCENE = fileURLToPath(new URL('../../tests/truth/light/p01_black_point.json', import.meta.url));

const median = (values) => [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)];

/** The demo's first scenario, as the document that the physics reads, and an address to read that scenario at. */
async function demoScenario({ address, cookie }) {
  const get = async (url) => (await fetch(`${address}/api/v1/${url}`, { headers: { cookie } })).json();
  const [garden] = await get('gardens');
  const [tent] = await get(`gardens/${garden.gardenId}/tents`);
  const url = `gardens/${garden.gardenId}/scenarios/${tent.currentScenarioId}`;
  return {
    document: await get(`${url}/document`),
    gardenUrl: `/api/v1/gardens/${garden.gardenId}`,
    workbenchUrl: `/api/v1/${url}`,
  };
}

async function timeEvaluation(document) {
  const args = ['--import', 'tsx', 'lib/local/bench-evaluation.ts'];
  const { output } = await run(process.execPath, args, { cwd: root, env: base, input: JSON.stringify(document) });
  return JSON.parse(output);
}

async function round({ address, path: url, ...request }) {
  const result = await autocannon({ url: `${address}${url}`, connections: CONNECTIONS, duration: SECONDS, ...request });
  if (result.non2xx > 0 || result.errors > 0)
    throw new Error(`${url}: ${result.non2xx} refusals, ${result.errors} errors; the figures would mean nothing`);
  return { perSecond: result.requests.average, latencyMs: result.latency.p97_5 };
}

async function measureRoutes({ address, cookie, scenario }) {
  const scene = JSON.stringify(JSON.parse(readFileSync(SCENE, 'utf8')).scene);
  const evaluate = {
    method: 'POST',
    body: scene,
    headers: { 'content-type': 'application/json', origin: address, 'sec-fetch-site': 'same-origin' },
  };
  const routes = {
    bare: { path: '/livez' },
    evaluate: { path: '/api/v1/evaluate', ...evaluate },
    read: { path: scenario.gardenUrl, headers: { cookie } },
    workbench: { path: scenario.workbenchUrl, headers: { cookie } },
  };
  for (const route of Object.values(routes)) await round({ address, ...route, duration: 2 });
  const seen = Object.fromEntries(Object.keys(routes).map((name) => [name, []]));
  for (let at = 0; at < ROUNDS; at += 1)
    for (const [name, route] of Object.entries(routes)) seen[name].push(await round({ address, ...route }));
  return Object.fromEntries(
    Object.entries(seen).map(([name, rounds]) => [
      name,
      {
        perSecond: median(rounds.map((each) => each.perSecond)),
        latencyMs: median(rounds.map((each) => each.latencyMs)),
      },
    ]),
  );
}

function line({ what, value, promise, held, note = '' }) {
  say(`  ${what.padEnd(58)} ${value.padStart(12)}   ${promise ? `${promise}: ${held ? 'held' : 'MISSED'}` : note}`);
  return held ?? true;
}

function report({ evaluation, routes }) {
  const share = (name) => routes[name].perSecond / routes.bare.perSecond;
  const ms = ({ processorMs }) => `${processorMs.toFixed(2)} ms`;
  const clock = ({ clockMs }) => `by the clock ${clockMs.toFixed(2)} ms`;
  const perSecond = (name) => `${routes[name].perSecond.toFixed(0)}/s`;
  say(`\n${cpus().length} × ${cpus()[0].model}, Node ${process.version}, load ${loadavg()[0].toFixed(1)}`);
  say(`${ROUNDS} rounds of ${SECONDS} s each, ${CONNECTIONS} connections, medians; evaluations in processor time\n`);
  const promises = [
    line({
      what: 'One evaluation of the demo, without its year',
      value: ms(evaluation.fresh),
      promise: `${clock(evaluation.fresh)}; under 5 ms`,
      held: evaluation.fresh.processorMs < 5,
    }),
    line({ what: '… while one lamp is dragged', value: ms(evaluation.drag), note: clock(evaluation.drag) }),
    line({ what: '… with its year', value: ms(evaluation.year), note: clock(evaluation.year) }),
    line({ what: 'A bare route (GET /livez)', value: perSecond('bare') }),
    line({ what: 'POST /api/v1/evaluate, light scene p01', value: perSecond('evaluate') }),
    line({
      what: '… as a share of the bare route',
      value: share('evaluate').toFixed(2),
      promise: 'at least 0.30',
      held: share('evaluate') >= 0.3,
    }),
    line({ what: 'A signed-in read through inGarden()', value: perSecond('read') }),
    line({
      what: '… as a share of the bare route',
      value: share('read').toFixed(2),
      promise: 'at least 0.40',
      held: share('read') >= 0.4,
    }),
    line({ what: 'A whole workbench, signed in', value: perSecond('workbench') }),
    line({ what: '… slowest of forty', value: `${routes.workbench.latencyMs.toFixed(0)} ms` }),
  ];
  return promises.every(Boolean);
}

async function measure(toStop) {
  await step('Build', (tell) => buildForMeasuring({ base, tell }));
  let server;
  await step('Database, demo and app', async () => {
    const database = await throwAwayCluster({ durable: true });
    toStop.push(database.remove);
    server = await arrangeServer({ base, database });
    toStop.unshift((await server.launch()).stop);
  });
  const { address, signIns } = server;
  const cookie = await signIn({ address, ...signIns[0] });
  const scenario = await demoScenario({ address, cookie });
  let evaluation;
  await step('Evaluations', async () => void (evaluation = await timeEvaluation(scenario.document)));
  let routes;
  await step('Routes', async () => void (routes = await measureRoutes({ address, cookie, scenario })));
  return report({ evaluation, routes });
}

const toStop = [];
let held = false;
try {
  held = await measure(toStop);
} finally {
  for (const stop of toStop) await stop();
}
process.exit(held ? 0 : 1);
