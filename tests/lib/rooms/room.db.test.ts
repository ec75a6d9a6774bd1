import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { closePools } from '@/lib/db/client';
import { updateGarden } from '@/lib/gardens/garden.service';
import { createRoom, deleteRoom, getRoom, listRooms, updateRoom } from '@/lib/rooms/room.service';
import { createTent, deleteTent, listTents, updateTent } from '@/lib/tents/tent.service';
import { updateScenario, listScenarios } from '@/lib/scenarios/scenario.service';
import { actorOf, newGarden, type TestGarden } from '../../support/people';
import { roomInput } from '../../support/planned-garden';
import * as roomRoute from '@/app/api/v1/gardens/[gardenId]/rooms/[roomId]/route';
import * as roomsRoute from '@/app/api/v1/gardens/[gardenId]/rooms/route';
import { callRoute } from '../../support/call-route';

let garden: TestGarden;
let other: TestGarden;
const as = (role: 'planner' | 'tender' | 'viewer') => actorOf(garden.people[role], garden.gardenId, role);

beforeAll(async () => {
  garden = await newGarden('Rooms');
  other = await newGarden('Elsewhere');
}, 60_000);
afterAll(closePools);

const tentOf = (roomId: string) => ({
  roomId,
  name: 'Tent',
  body: { widthM: 1, depthM: 1, heightM: 1.6 },
  tierCount: 1,
});

describe('rooms', () => {
  it('are read by every role and made, changed and deleted by owners and planners alone', async () => {
    const room = await createRoom(as('planner'), roomInput);
    for (const role of ['planner', 'tender', 'viewer'] as const)
      expect(await getRoom(as(role), room.roomId)).toEqual(room);
    for (const role of ['tender', 'viewer'] as const) {
      await expect(createRoom(as(role), roomInput)).rejects.toMatchObject({ status: 403 });
      await expect(updateRoom(as(role), room.roomId, { version: 1, name: 'x' })).rejects.toMatchObject({ status: 403 });
      await expect(deleteRoom(as(role), room.roomId)).rejects.toMatchObject({ status: 403 });
    }
    expect((await getRoom(as('viewer'), room.roomId)).name).toBe('Cellar');
    await deleteRoom(as('planner'), room.roomId);
    await expect(getRoom(as('planner'), room.roomId)).rejects.toMatchObject({ status: 404 });
  });

  it('keep exactly what was sent, the unknown tariff as unknown and a default as absent', async () => {
    const input = { ...roomInput, power: { ...roomInput.power, tariff: null } };
    const room = await createRoom(garden.owner, input);
    expect(room).toMatchObject(input);
    expect(room.climate).toEqual(input.climate);
    expect(room.power).toEqual(input.power);
    expect(room).toMatchObject({ version: 1, residualCurrentDevice: 'unknown' });
  });

  it('answer a clash with the row as it stands, and keep the first of two edits', async () => {
    const room = await createRoom(garden.owner, roomInput);
    const first = await updateRoom(garden.owner, room.roomId, { version: 1, name: 'First' });
    expect(first).toMatchObject({ name: 'First', version: 2 });
    await expect(updateRoom(garden.owner, room.roomId, { version: 1, name: 'Second' })).rejects.toMatchObject({
      status: 409,
      current: first,
    });
    expect(await getRoom(garden.owner, room.roomId)).toEqual(first);
  });

  it('lose none of 40 edits made at once: each is kept or told of a clash', async () => {
    const room = await createRoom(garden.owner, roomInput);
    let clashes = 0;
    const edit = async (): Promise<void> => {
      const seen = await getRoom(garden.owner, room.roomId);
      try {
        await updateRoom(garden.owner, room.roomId, { version: seen.version, name: `${Number(seen.name) + 1 || 1}` });
      } catch (error) {
        expect(error).toMatchObject({ status: 409 });
        clashes += 1;
        return edit();
      }
    };
    await Promise.all(Array.from({ length: 40 }, edit));
    expect(await getRoom(garden.owner, room.roomId)).toMatchObject({ name: '40', version: 41 });
    expect(clashes).toBeGreaterThan(0);
  });

  it('are made once when sent eight times at once with one id, and refuse the id with other contents', async () => {
    const roomId = randomUUID();
    const made = await Promise.all(
      Array.from({ length: 8 }, () => createRoom(garden.owner, { ...roomInput, roomId, name: 'Once' })),
    );
    expect(new Set(made.map((room) => JSON.stringify(room))).size).toBe(1);
    expect((await listRooms(garden.owner)).filter((room) => room.name === 'Once')).toHaveLength(1);
    await expect(createRoom(garden.owner, { ...roomInput, roomId, name: 'Another' })).rejects.toMatchObject({
      status: 422,
      problems: [{ path: 'roomId' }],
    });
  });

  it('with a tent in them are not deleted; the refusal names the tent', async () => {
    const room = await createRoom(garden.owner, roomInput);
    const tent = await createTent(garden.owner, { ...tentOf(room.roomId), name: 'Boiler-house tent' });
    await expect(deleteRoom(garden.owner, room.roomId)).rejects.toMatchObject({
      status: 409,
      code: 'in-use',
      detail: expect.stringContaining('Boiler-house tent'),
    });
    await deleteTent(garden.owner, tent.tentId);
    await deleteRoom(garden.owner, room.roomId);
  });

  it('and tents that are put into them at the same moment leave no tent without a room', async () => {
    for (let round = 0; round < 10; round += 1) {
      const { roomId } = await createRoom(garden.owner, roomInput);
      const [tent, gone] = await Promise.allSettled([
        createTent(garden.owner, tentOf(roomId)),
        deleteRoom(garden.owner, roomId),
      ]);
      const refused = tent.status === 'rejected' ? tent.reason : gone.status === 'rejected' ? gone.reason : null;
      expect(refused).toMatchObject({ status: expect.toSatisfy((status: number) => status === 404 || status === 409) });
      const standing = (await listTents(garden.owner)).filter((each) => each.roomId === roomId);
      expect(standing).toHaveLength(tent.status === 'fulfilled' ? 1 : 0);
    }
  });

  it('take a tariff only in the currency of the garden, and say which that is', async () => {
    const power = { ...roomInput.power, tariff: { kind: 'flat' as const, currency: 'USD', pricePerKwh: 0.2 } };
    await expect(createRoom(garden.owner, { ...roomInput, power })).rejects.toMatchObject({
      status: 422,
      problems: [{ path: 'power.tariff.currency', range: 'EUR', value: 'USD' }],
    });
    const room = await createRoom(garden.owner, roomInput);
    await expect(updateRoom(garden.owner, room.roomId, { version: 1, power })).rejects.toMatchObject({ status: 422 });
    expect(await getRoom(garden.owner, room.roomId)).toEqual(room);
  });

  it('keep prices from before the garden changed its currency until new ones are typed', async () => {
    const moved = await newGarden('Moved');
    const room = await createRoom(moved.owner, roomInput);
    await updateGarden(moved.owner, { version: 1, currency: 'USD' });
    const circuits = [{ id: 'c1', name: 'Renamed', ratingA: 10 }];
    const kept = await updateRoom(moved.owner, room.roomId, { version: 1, power: { ...room.power, circuits } });
    expect(kept.power).toEqual({ ...room.power, circuits });
    const tariff = { kind: 'flat' as const, currency: 'EUR', pricePerKwh: 0.31 };
    await expect(
      updateRoom(moved.owner, room.roomId, { version: 2, power: { ...kept.power, tariff } }),
    ).rejects.toMatchObject({ status: 422, problems: [{ path: 'power.tariff.currency', range: 'USD' }] });
  });

  it('refuse hours of another year than their scenarios reckon, and name the scenario', async () => {
    const room = await createRoom(garden.owner, roomInput);
    const tent = await createTent(garden.owner, tentOf(room.roomId));
    const [scenario] = await listScenarios(garden.owner, tent.tentId);
    await updateScenario(garden.owner, scenario!.scenarioId, {
      version: 1,
      plan: { ...scenario!.plan, calendar: { year: 2028 } },
    });
    const hourly = (hours: number) => ({
      airTempC: { kind: 'hourly' as const, values: Array.from({ length: hours }, () => 12) },
    });
    await expect(updateRoom(garden.owner, room.roomId, { version: 1, climate: hourly(8760) })).rejects.toMatchObject({
      status: 422,
      problems: [{ path: 'climate', message: expect.stringMatching(/First layout.*2028 has 8784 hours/) }],
    });
    expect(await updateRoom(garden.owner, room.roomId, { version: 1, climate: hourly(8784) })).toMatchObject({
      version: 2,
    });
  });
});

describe('the routes of rooms', () => {
  it('give a foreign, an unknown and a misspelt room the same answer, and change nothing', async () => {
    const room = await createRoom(garden.owner, { ...roomInput, name: 'Canary of the garden' });
    const answers = [];
    for (const params of [
      { gardenId: other.gardenId, roomId: room.roomId },
      { gardenId: other.gardenId, roomId: randomUUID() },
    ])
      for (const call of [
        callRoute(roomRoute.GET, { as: other.people.owner, params }),
        callRoute(roomRoute.PATCH, { as: other.people.owner, params, body: { version: 1, name: 'Taken' } }),
        callRoute(roomRoute.DELETE, { as: other.people.owner, params, body: {} }),
      ]) {
        const response = await call;
        answers.push(`${response.status} ${await response.text()}`);
      }
    expect(new Set(answers).size).toBe(1);
    expect(answers[0]).toMatch(/^404 /);
    const stranger = await callRoute(roomRoute.GET, {
      as: other.people.owner,
      params: { gardenId: garden.gardenId, roomId: room.roomId },
    });
    expect(stranger.status).toBe(404);
    expect(await getRoom(garden.owner, room.roomId)).toEqual(room);
  });

  it('name path, value, range and unit of every field that does not fit, and save nothing', async () => {
    const before = await listRooms(garden.owner);
    const body = {
      ...roomInput,
      place: { ...roomInput.place, latitudeDeg: 91, timeZone: 'Mars/Olympus' },
      climate: { airTempC: { kind: 'constant', value: 'cold' } },
      power: { ...roomInput.power, supplyV: -230 },
      colour: 'grey',
    };
    const response = await callRoute(roomsRoute.POST, {
      as: garden.people.owner,
      params: { gardenId: garden.gardenId },
      body,
    });
    expect(response.status).toBe(422);
    const { problems } = (await response.json()) as { problems: { path: string }[] };
    const at = (path: string) => problems.find((problem) => problem.path === path);
    expect(at('place.latitudeDeg')).toMatchObject({ value: 91, range: '-90 to 90', unit: '°' });
    expect(at('place.timeZone')).toMatchObject({ value: 'Mars/Olympus' });
    expect(at('climate.airTempC.value')).toMatchObject({ value: 'cold', range: '-40 to 60', unit: '°C' });
    expect(at('power.supplyV')).toMatchObject({ value: -230, range: '90 to 420', unit: 'V' });
    expect(at('colour')).toBeDefined();
    expect(await listRooms(garden.owner)).toEqual(before);
  });

  it.each([
    ['a NUL in a name', { name: 'Cel\u0000lar' }],
    ['half a character', { name: 'Cellar \ud83c' }],
    ['a NUL in a circuit', { power: { ...roomInput.power, circuits: [{ id: 'c1', name: '\u0000', ratingA: 16 }] } }],
  ])('refuse %s with words', async (_, part) => {
    const response = await callRoute(roomsRoute.POST, {
      as: garden.people.owner,
      params: { gardenId: garden.gardenId },
      body: { ...roomInput, ...part },
    });
    expect(response.status).toBe(422);
    expect(await response.json()).toMatchObject({ detail: expect.stringContaining('Nothing was saved') });
  });
});

describe('a tent', () => {
  it('moves to another room, and not to a room of another garden', async () => {
    const [from, to] = [await createRoom(garden.owner, roomInput), await createRoom(garden.owner, roomInput)];
    const foreign = await createRoom(other.owner, roomInput);
    const tent = await createTent(garden.owner, tentOf(from.roomId));
    const change = (roomId: string, version: number) => updateTent(garden.owner, tent.tentId, { version, roomId });
    expect(await change(to.roomId, 1)).toMatchObject({ roomId: to.roomId, version: 2 });
    await expect(change(foreign.roomId, 2)).rejects.toMatchObject({ status: 404 });
  });
});
