import { mkdtempSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { takeTurn } from '../../../lib/local/one-start.mjs';
import { whoAmI } from '../../../lib/local/processes.mjs';
import { Stop } from '../../../lib/local/say.mjs';
import { databaseFromEnvironment, keptSecret, portFromEnvironment, readDotEnv } from '../../../lib/local/settings.mjs';
import { remember } from '../../../lib/local/state-file.mjs';

const folder = mkdtempSync(path.join(tmpdir(), 'cellarsun settings-'));
const before = { ...process.env };
beforeEach(() => {
  for (const name of ['DATABASE_URL', 'DATABASE_AUTH_URL', 'DATABASE_OWNER_URL', 'PORT']) delete process.env[name];
});
afterEach(() => {
  process.env = { ...before };
});

test('a database of one’s own needs all three addresses, and what is missing is named', () => {
  expect(databaseFromEnvironment()).toBeNull();
  process.env.DATABASE_URL = 'postgres://app@db/cellarsun';
  expect(databaseFromEnvironment).toThrow(Stop);
  expect(databaseFromEnvironment).toThrow(/DATABASE_AUTH_URL[\s\S]*DATABASE_OWNER_URL/);
  process.env.DATABASE_AUTH_URL = 'postgres://auth@db/cellarsun';
  process.env.DATABASE_OWNER_URL = 'postgres://owner@db/cellarsun';
  expect(databaseFromEnvironment()).toEqual({
    appUrl: 'postgres://app@db/cellarsun',
    authUrl: 'postgres://auth@db/cellarsun',
    ownerUrl: 'postgres://owner@db/cellarsun',
  });
});

test.each(['abc', '0', '65536', '80.5', '-1'])('PORT=%s is refused with what it must be', (text) => {
  process.env.PORT = text;
  expect(() => portFromEnvironment(3000)).toThrow(/whole number from 1 to 65535/);
});

test('PORT is honoured, and without it the fallback stands', () => {
  expect(portFromEnvironment(3000)).toEqual({ port: 3000, asked: false });
  process.env.PORT = '4123';
  expect(portFromEnvironment(3000)).toEqual({ port: 4123, asked: true });
});

test('a .env file fills in what the environment does not say, quotes and remarks taken off', () => {
  const file = path.join(folder, '.env');
  writeFileSync(file, '# PORT=1\nPORT=4000 # here\nexport CELLARSUN_A="two words"\nCELLARSUN_B=\'x # y\'\nnonsense\n');
  process.env.CELLARSUN_B = 'already';
  readDotEnv(file);
  expect(process.env.PORT).toBe('4000');
  expect(process.env.CELLARSUN_A).toBe('two words');
  expect(process.env.CELLARSUN_B).toBe('already');
});

test('the secret is made once, kept, and readable by its owner alone', () => {
  const first = keptSecret(folder);
  expect(first.length).toBeGreaterThanOrEqual(32);
  expect(keptSecret(folder)).toBe(first);
  expect(statSync(path.join(folder, 'secret.json')).mode & 0o777).toBe(0o600);
});

test('one start at a time: a second is refused, one whose process is gone is not', () => {
  const file = path.join(folder, 'running.json');
  const parent = {
    pid: process.ppid,
    birth: readFileSync(`/proc/${process.ppid}/stat`, 'utf8').split(') ').at(-1).split(' ')[19],
  };
  remember(file, { ...parent, address: 'http://localhost:3000' });
  expect(() => takeTurn(folder)).toThrow(/running already at http:\/\/localhost:3000/);
  // The same process id, but another process: it was begun at another moment.
  remember(file, { pid: process.ppid, birth: '1' });
  const turn = takeTurn(folder);
  expect(JSON.parse(readFileSync(file, 'utf8'))).toEqual(whoAmI());
  turn.release();
});
