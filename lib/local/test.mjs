/**
 * `npm test`: everything that is checked, from a clean checkout to one last line `N passed, N failed`.
 *
 * It has its own throw-away databases, its own ports and its own build folder, so an app that runs from this checkout goes on
 * undisturbed. Node built-ins only: this runs before any package is installed.
 */
import { rmSync } from 'node:fs';
import path from 'node:path';
import { endLeftovers, MARK, takeTurn } from './one-start.mjs';
import { ensurePackages } from './packages.mjs';
import { ensureChromium, ensurePostgres } from './postgres-tools.mjs';
import { Halted, haltRuns, run } from './run.mjs';
import { say, sinceStart, step, Stop } from './say.mjs';
import { root } from './sources.mjs';
import { testBuildEnvironment, testSettings } from './test-build.mjs';
import { countPlaywright, countVitest } from './test-counts.mjs';
import { arrangeServer, buildEnvironment, reports } from './test-server.mjs';
import { throwAwayCluster } from './throw-away.mjs';

const mark = { [MARK]: reports };
const base = { ...process.env, ...mark, NEXT_TELEMETRY_DISABLED: '1', CI: '1', NO_COLOR: '1' };
// What a person set for their own server is not for the tests.
for (const name of ['DATABASE_URL', 'DATABASE_AUTH_URL', 'DATABASE_OWNER_URL', 'NODE_ENV', 'PORT', 'FORCE_COLOR'])
  delete base[name];
const bin = (name) => path.join(root, 'node_modules', name);
const NEXT = bin('next/dist/bin/next');

const total = { passed: 0, failed: 0, skipped: 0 };
const failures = [];
const toRemove = [];

function add(name, counts, output) {
  for (const key of Object.keys(total)) total[key] += counts[key] ?? 0;
  if (counts.failed > 0) failures.push({ name, output });
  const skipped = counts.skipped ? `, ${counts.skipped} skipped` : '';
  return counts.failed > 0
    ? `${counts.failed} failed, ${counts.passed} passed${skipped}`
    : `${counts.passed} passed${skipped}`;
}

/** A check that passes or fails as one. */
async function check(name, commands) {
  let good = true;
  await step(name, async () => {
    let output = '';
    for (const [args, env] of commands) {
      const done = await run(process.execPath, args, { cwd: root, env: env ?? base, allowFailure: true });
      output += done.output;
      if (done.code !== 0) {
        add(name, { failed: 1, passed: 0 }, output);
        good = false;
        return 'failed';
      }
    }
    add(name, { passed: 1, failed: 0 });
    return 'passed';
  });
  return good;
}

const checkFormat = () => check('Format', [[[bin('prettier/bin/prettier.cjs'), '--check', '.']]]);

function checkTypes() {
  const env = testBuildEnvironment({ name: 'types', env: base });
  const tsc = [bin('typescript/bin/tsc'), '--noEmit', '-p', testSettings('types')];
  return check('Types', [
    [[NEXT, 'typegen'], env],
    [tsc, env],
  ]);
}

const checkLint = () => check('Lint and folder boundaries', [[[bin('eslint/bin/eslint.js'), '.']]]);

const checkBuild = () => check('Build', [[[NEXT, 'build'], buildEnvironment(base)]]);

async function runVitest() {
  const file = path.join(reports, 'vitest.json');
  rmSync(file, { force: true });
  const reporters = ['--reporter=dot', '--reporter=json', `--outputFile.json=${file}`];
  await step('Unit, database and API tests', async () => {
    const args = [bin('vitest/vitest.mjs'), 'run', ...reporters];
    const { code, output } = await run(process.execPath, args, { cwd: root, env: base, allowFailure: true });
    return add('Unit, database and API tests', countVitest(file, code), output);
  });
}

/** Serves the build with a database and a demo of its own. */
async function serveForBrowser() {
  const database = await throwAwayCluster();
  toRemove.push(database.remove);
  const server = await arrangeServer({ base, database });
  const app = await server.launch();
  toRemove.unshift(app.stop);
  return server.address;
}

async function runBrowser() {
  const file = path.join(reports, 'playwright.json');
  rmSync(file, { force: true });
  await step('Browser tests', async (tell) => {
    const address = await serveForBrowser();
    const env = { ...base, CELLARSUN_TEST_URL: address, PLAYWRIGHT_JSON_OUTPUT_NAME: file };
    const args = [bin('@playwright/test/cli.js'), 'test', '--reporter=line,json'];
    const onOutput = (text) => tell(/\[\d+\/\d+\]/.exec(text)?.[0] ?? '');
    const { code, output } = await run(process.execPath, args, { cwd: root, env, allowFailure: true, onOutput });
    return add('Browser tests', countPlaywright(file, code), output);
  });
}

async function everything() {
  const turn = takeTurn(reports, 'A test run of this checkout is under way');
  toRemove.push(turn.release);
  await endLeftovers(reports);
  await step('Packages', (tell) => ensurePackages({ env: base, tell }));
  await step('PostgreSQL', (tell) => ensurePostgres(tell));
  await step('Chromium', (tell) => ensureChromium(tell));
  // The build fills one core while the checks that need no build fill the other.
  const building = checkBuild();
  const [built] = await Promise.all([building, checkTypes().then(checkLint).then(checkFormat)]);
  await runVitest();
  // An older build may lie there still; it is not what was asked about.
  if (built) await runBrowser();
  else say('Browser tests: left out, because the build failed');
}

async function cleanUp() {
  for (const remove of toRemove.splice(0)) await remove();
}

async function main() {
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, haltRuns);
  try {
    await everything();
  } catch (error) {
    const output = error instanceof Halted || error instanceof Stop || error.output ? error.message : error.stack;
    failures.push({ name: 'The tests themselves', output });
    total.failed += 1;
  }
  await cleanUp();
  for (const { name, output } of failures) say(`\n──── ${name}: failed ────\n${(output ?? '').trim()}`);
  say(`\nAll of it took ${sinceStart()}.`);
  say(`${total.passed} passed, ${total.failed} failed`);
  process.exit(total.failed === 0 ? 0 : 1);
}

await main();
