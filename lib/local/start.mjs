/**
 * `npm start`: from a fresh checkout to a served app; `--dev` serves the sources instead of a build.
 *
 * Each step looks first at what is there, so a start that was killed is picked up by the next one. Node built-ins only:
 * this runs before any package is installed.
 */
import { randomBytes } from 'node:crypto';
import path from 'node:path';
import { buildOnce } from './build.mjs';
import { startCluster } from './cluster.mjs';
import { endLeftovers, MARK, takeTurn } from './one-start.mjs';
import { ensurePackages } from './packages.mjs';
import { isFree } from './ports.mjs';
import { ensurePostgres } from './postgres-tools.mjs';
import { prepareDatabase, prepareOnce } from './prepare-database.mjs';
import { Halted, haltRuns } from './run.mjs';
import { say, sinceStart, step, Stop } from './say.mjs';
import { launchApp } from './serve.mjs';
import { appEnvironment, databaseFromEnvironment, keptSecret, portFromEnvironment, readDotEnv } from './settings.mjs';
import { root } from './sources.mjs';

const dev = process.argv.includes('--dev');
const stateFolder = path.join(root, '.data', ...(dev ? ['dev'] : []));
const markValue = `${stateFolder}`;

/** What runs and must be stopped, newest first. */
const toStop = [];
let halting = false;

function halt(signal) {
  if (halting) return;
  halting = true;
  say(`\n${signal === 'SIGINT' ? 'Ctrl-C' : signal}: stopping the app, then the database.`);
  haltRuns();
  void toStop[0]?.();
}

async function choosePort() {
  const { port, asked } = portFromEnvironment(dev ? 3100 : 3000);
  const host = process.env.HOST || '127.0.0.1';
  if (!(await isFree(port, host))) {
    const advice = asked ? 'Stop what listens there, or name another' : 'Name another';
    throw new Stop(`Port ${port} is taken. ${advice}, for example:\n\n  PORT=${port + 1} npm start\n`);
  }
  return { port, host };
}

async function localDatabase(own) {
  let database;
  await step('PostgreSQL', (tell) => ensurePostgres(tell));
  await step('Database', async () => {
    database = await startCluster({ stateFolder, onFound: (stop) => toStop.unshift(stop) });
    return database.ranAlready ? 'ran already, picked up' : 'started';
  });
  return { ...database, own };
}

async function prepare({ database, env }) {
  let signIns = [];
  await step('Schema, reference data and demo', async () => {
    const prepareEnv = { ...env, DATABASE_OWNER_URL: database.ownerUrl };
    if (database.own) return (await prepareDatabase({ env: prepareEnv, demo: false })).join(', ');
    const done = await prepareOnce({ stateFolder, cluster: database, env: prepareEnv });
    signIns = done.signIns;
    return done.lines.join(', ');
  });
  return signIns;
}

async function serve({ port, host, env, token }) {
  const app = launchApp({ mode: dev ? 'dev' : 'start', port, host, env });
  toStop.unshift(app.stop);
  await step('App', async () => {
    await app.ready({ token, seconds: dev ? 180 : 60, isHalted: () => halting });
    return 'ready';
  });
  return app;
}

function greet({ address, signIns, own }) {
  say(`\nCellarsun is ready after ${sinceStart()}:  ${address}`);
  if (own) say('It uses the database that DATABASE_URL names; no demo was loaded.');
  if (signIns.length > 0)
    say(`\nSign in to the demo with one of these:\n${signIns.map((line) => `  ${line}`).join('\n')}`);
  say('\nCtrl-C stops it; nothing is lost.');
}

async function start(turn) {
  const mark = { [MARK]: markValue };
  const given = databaseFromEnvironment();
  const left = await endLeftovers(markValue);
  if (left > 0) say(`Left by an earlier start that was killed: ${left} processes, ended`);
  const { port, host } = await choosePort();
  const address = `http://localhost:${port}`;
  const base = { ...process.env, ...mark, NEXT_TELEMETRY_DISABLED: '1' };
  await step('Packages', (tell) => ensurePackages({ env: base, tell, keep: dev }));
  const database = given ? { ...given, own: true } : await localDatabase(false);
  const token = randomBytes(16).toString('hex');
  const env = appEnvironment({ database, secret: keptSecret(stateFolder), address, token, mark });
  const signIns = await prepare({ database, env });
  if (!dev) await step('Build', (tell) => buildOnce({ env: { ...base, NODE_ENV: 'production' }, tell }));
  const app = await serve({ port, host, env: { ...env, NODE_ENV: dev ? 'development' : 'production' }, token });
  turn.announce(address);
  greet({ address, signIns, own: database.own });
  const ending = await app.ended;
  if (!halting)
    throw new Stop(`The app ended by itself (${ending}). What it said stands above. Start it again with npm start.`);
}

async function main() {
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => halt(signal));
  readDotEnv(path.join(root, '.env'));
  const turn = takeTurn(stateFolder);
  let code = 0;
  try {
    await start(turn);
  } catch (error) {
    if (!(error instanceof Halted)) {
      code = 1;
      process.stderr.write(`\n${error instanceof Stop || error.output ? error.message : error.stack}\n`);
    }
  }
  halting = true;
  for (const stop of toStop) await stop();
  turn.release();
  say('Stopped.');
  process.exit(code);
}

main().catch((error) => {
  process.stderr.write(`\n${error instanceof Stop || error.output ? error.message : error.stack}\n`);
  process.exit(1);
});
