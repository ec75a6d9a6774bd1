import { readdirSync } from 'node:fs';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { closePools } from '@/lib/db/client';
import type { Role } from '@/lib/db/database';
import { removeMember } from '@/lib/gardens/member.service';
import { createJoinCode, join } from '@/lib/gardens/join-code.service';
import { actorOf, newPerson, type Person } from '../../support/people';
import { newPlannedGarden, type PlannedGarden } from '../../support/planned-garden';
import { otherRoutes, routes, type RouteRow } from '../access-table';

type Handler = (request: Request, context: { params: Promise<Record<string, string>> }) => Promise<Response>;

function filesNamed(name: string, folder = 'app'): string[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    const full = path.join(folder, entry.name);
    return entry.isDirectory() ? filesNamed(name, full) : entry.name === name ? [full] : [];
  });
}

let garden: PlannedGarden;
let removed: Person;
let member: Person;
let other: Person;

beforeAll(async () => {
  garden = await newPlannedGarden();
  other = (await newPlannedGarden()).people.owner;
  removed = await newPerson('Removed');
  const { code } = await createJoinCode(garden.owner, 'planner');
  await join(actorOf(removed, garden.gardenId, 'planner'), code);
  await removeMember(garden.owner, removed.accountId);
  member = await newPerson('One more');
  await join(actorOf(member, garden.gardenId, 'viewer'), (await createJoinCode(garden.owner, 'viewer')).code);
}, 60_000);

afterAll(closePools);

async function ask(row: RouteRow, person: Person | null, ids: Record<string, string>): Promise<Response> {
  const handlers = (await import(/* @vite-ignore */ path.resolve(row.file))) as Record<string, Handler>;
  const params = Object.fromEntries([...row.file.matchAll(/\[(\w+)\]/g)].map(([, name]) => [name!, ids[name!]!]));
  const address = row.file
    .replace(/^app/, '')
    .replace(/\/route\.ts$/, '')
    .replaceAll(/\[(\w+)\]/g, (_, name: string) => ids[name]!);
  const query = (row.query ?? '').replaceAll(/\{(\w+)\}/g, (_, name: string) => ids[name]!);
  const request = new Request(`http://localhost:3000${address}${query}`, {
    method: row.method,
    headers: {
      'sec-fetch-site': 'same-origin',
      origin: 'http://localhost:3000',
      ...(person && { cookie: person.cookie }),
      ...(row.body && { 'content-type': 'application/json' }),
    },
    ...(row.body && { body: JSON.stringify(row.body(ids)) }),
  });
  return handlers[row.method]!(request, { params: Promise.resolve(params) });
}

const idsOf = (of: PlannedGarden): Record<string, string> => ({
  gardenId: of.gardenId,
  roomId: of.roomId,
  tentId: of.tentId,
  fixtureId: of.fixtureId,
  targetId: of.targetId,
  scenarioId: of.scenarioId,
  joinCodeId: of.joinCodeId,
  accountId: member.accountId,
});

describe('the access table', () => {
  it('has a row for every method of every route', async () => {
    const listed = new Set(routes.map((row) => `${row.method} ${row.file}`));
    const known = new Set(otherRoutes);
    for (const file of filesNamed('route.ts')) {
      if (known.has(file)) continue;
      const handlers = (await import(/* @vite-ignore */ path.resolve(file))) as Record<string, unknown>;
      for (const method of ['GET', 'POST', 'PUT', 'PATCH', 'DELETE']) {
        if (handlers[method])
          expect(listed, `${method} ${file} needs a row in tests/app/access-table.ts`).toContain(`${method} ${file}`);
      }
    }
  }, 60_000);

  it('answers those outside alike, whether the garden is there or not', async () => {
    const ids = idsOf(garden);
    for (const row of routes.filter((each) => each.strangers !== undefined)) {
      const where = `${row.method} ${row.file}`;
      expect((await ask(row, null, ids)).status, `${where}, signed out`).toBe(row.anonymous);
      const nowhere = await ask(row, other, { ...ids, gardenId: crypto.randomUUID() });
      for (const person of [removed, other]) {
        const answer = await ask(row, person, ids);
        expect(answer.status, `${where}, a stranger`).toBe(row.strangers);
        expect(await answer.text(), where).toBe(await nowhere.clone().text());
      }
    }
  }, 60_000);

  it('answers everybody signed in', async () => {
    for (const row of routes.filter((each) => each.signedIn !== undefined)) {
      expect((await ask(row, null, {})).status, `${row.method} ${row.file}, signed out`).toBe(row.anonymous);
      expect((await ask(row, other, {})).status, `${row.method} ${row.file}`).toBe(row.signedIn);
    }
  }, 60_000);

  it('answers each role as the table says', async () => {
    const ids = idsOf(garden);
    const order: Role[] = ['viewer', 'tender', 'owner', 'planner'];
    for (const row of routes.filter((each) => each.roles)) {
      for (const role of order) {
        const answer = await ask(row, garden.people[role], ids);
        expect(answer.status, `${row.method} ${row.file}, ${role}: ${await answer.clone().text()}`).toBe(
          row.roles![role],
        );
      }
    }
  }, 60_000);

  it('refuses what comes from another site', async () => {
    const somebody = await newPerson();
    const { POST } = (await import('@/app/api/v1/gardens/route')) as unknown as { POST: Handler };
    const send = (headers: Record<string, string>) =>
      POST(
        new Request('http://localhost:3000/api/v1/gardens', {
          method: 'POST',
          headers: { 'content-type': 'application/json', cookie: somebody.cookie, ...headers },
          body: '{"name":"x","currency":"EUR"}',
        }),
        { params: Promise.resolve({}) },
      );
    expect((await send({ 'sec-fetch-site': 'cross-site' })).status).toBe(403);
    expect((await send({ origin: 'https://elsewhere.example' })).status).toBe(403);
    expect((await send({})).status).toBe(403);
    expect((await send({ origin: 'http://127.0.0.1:3000' })).status).toBe(201);
  });
});
