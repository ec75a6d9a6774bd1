import { existsSync, mkdirSync, rmSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { Client } from 'pg';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { startCluster } from '../../../lib/local/cluster.mjs';
import { throwAwayCluster } from '../../../lib/local/throw-away.mjs';

/** A cluster of this file's own, which it may end as it likes. */
let cluster;
beforeAll(async () => {
  cluster = await throwAwayCluster({ durable: true });
}, 60_000);
afterAll(() => cluster.remove());

const again = () => startCluster({ stateFolder: cluster.stateFolder });
const secretsFile = () => path.join(cluster.stateFolder, 'pg.secrets.json');

async function ask(url, sql) {
  const client = new Client({ connectionString: url });
  client.on('error', () => {});
  await client.connect();
  try {
    return (await client.query(sql)).rows;
  } finally {
    await client.end();
  }
}

async function killServer() {
  const pid = cluster.serverPid();
  process.kill(pid, 'SIGKILL');
  while (existsSync(`/proc/${pid}/cmdline`) && cluster.serverPid() === pid)
    await new Promise((go) => setTimeout(go, 20));
}

test('it listens on loopback TCP alone, with data checksums', async () => {
  const [settings] = await ask(
    cluster.superuserUrl,
    `select current_setting('listen_addresses') as listens, current_setting('unix_socket_directories') as sockets,
            current_setting('data_checksums') as checksums`,
  );
  expect(settings).toEqual({ listens: '127.0.0.1', sockets: '', checksums: 'on' });
});

test('its three roles may sign in and nothing else, and only the owner may make tables', async () => {
  const roles = await ask(
    cluster.superuserUrl,
    `select rolname, rolsuper or rolbypassrls or rolcreatedb or rolcreaterole or rolreplication as more
     from pg_roles where rolname like 'cellarsun_%' and rolname <> 'cellarsun_superuser' order by rolname`,
  );
  expect(roles).toEqual(['app', 'auth', 'owner'].map((role) => ({ rolname: `cellarsun_${role}`, more: false })));
  await ask(cluster.ownerUrl, 'create table kept (id int); insert into kept values (7)');
  await expect(ask(cluster.appUrl, 'create table mine (id int)')).rejects.toThrow(/permission denied/);
  await expect(ask(cluster.authUrl, 'select * from kept')).rejects.toThrow(/permission denied/);
});

test('its passwords are readable by their owner alone, and a wrong one is refused', async () => {
  expect(statSync(secretsFile()).mode & 0o777).toBe(0o600);
  const wrong = new URL(cluster.appUrl);
  wrong.password = 'wrong';
  await expect(ask(wrong.href, 'select 1')).rejects.toThrow(/password authentication failed/);
});

test('a running one is picked up as it is', async () => {
  const found = await again();
  expect(found.ranAlready).toBe(true);
  expect(found.port).toBe(cluster.port);
});

test('after kill -9 it comes back at its port with what was in it', async () => {
  await killServer();
  const back = await again();
  expect(back.ranAlready).toBe(false);
  expect(back.port).toBe(cluster.port);
  expect(await ask(back.ownerUrl, 'select id from kept')).toEqual([{ id: 7 }]);
});

test('a postmaster.pid that names a stranger does not stop it', async () => {
  await cluster.stop();
  writeFileSync(path.join(cluster.folder, 'postmaster.pid'), `${process.pid}\n${cluster.folder}\n0\n${cluster.port}\n`);
  const back = await again();
  expect(await ask(back.ownerUrl, 'select id from kept')).toEqual([{ id: 7 }]);
});

test('with its passwords lost it gets new ones and keeps what is in it', async () => {
  rmSync(secretsFile());
  const back = await again();
  expect(back.ownerUrl).not.toBe(cluster.ownerUrl);
  expect(await ask(back.ownerUrl, 'select id from kept')).toEqual([{ id: 7 }]);
});

test('one that was never finished is made anew, beside nothing', async () => {
  const half = path.join(cluster.stateFolder, 'second.making');
  mkdirSync(half);
  writeFileSync(path.join(half, 'PG_VERSION'), '15\n');
  const second = await startCluster({ stateFolder: cluster.stateFolder, name: 'second', durable: false });
  try {
    expect(existsSync(half)).toBe(false);
    expect(await ask(second.appUrl, 'select 1 as one')).toEqual([{ one: 1 }]);
  } finally {
    await second.stop();
  }
});
