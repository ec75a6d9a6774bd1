import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { PATCH } from '@/app/api/v1/gardens/[gardenId]/scenarios/[scenarioId]/route';
import { closePools } from '@/lib/db/client';
import { createFixture, deleteFixture } from '@/lib/fixtures/fixture.service';
import { createRoom, deleteRoom, updateRoom } from '@/lib/rooms/room.service';
import { getEvaluatedScenario } from '@/lib/scenarios/evaluation.service';
import { getWorkbench } from '@/lib/scenarios/garden-data';
import { copyScenario, deleteScenario, updateScenario } from '@/lib/scenarios/scenario.service';
import type { Scenario } from '@/lib/scenarios/scenario.schema';
import { fuzzedDocument } from '../../support/fuzzed-document';
import { fixtureInput, newPlannedGarden, roomInput, type PlannedGarden } from '../../support/planned-garden';

let garden: PlannedGarden;
let scenario: Scenario;

beforeAll(async () => {
  garden = await newPlannedGarden();
  scenario = (await getWorkbench(garden.owner, garden.scenarioId)).scenario;
}, 60_000);
afterAll(closePools);

describe('a scenario', () => {
  it('is saved against the version that was seen; a clash keeps both and overwrites nothing', async () => {
    const { owner, scenarioId } = garden;
    const saved = await updateScenario(owner, scenarioId, { version: scenario.version, note: 'first' });
    await expect(
      updateScenario(owner, scenarioId, { version: scenario.version, note: 'second' }),
    ).rejects.toMatchObject({ status: 409, current: { note: 'first', version: saved.version } });
    scenario = saved;
  });

  it('loses none of 40 edits that are made at once: each is kept or told that it clashes', async () => {
    const { owner, scenarioId } = garden;
    let kept = 0;
    await Promise.all(
      Array.from({ length: 40 }, async (_, at) => {
        for (;;) {
          const { version } = (await getWorkbench(owner, scenarioId)).scenario;
          try {
            await updateScenario(owner, scenarioId, { version, note: `edit ${at}` });
            kept += 1;
            return;
          } catch (error) {
            if ((error as { status?: number }).status !== 409) throw error;
          }
        }
      }),
    );
    const after = (await getWorkbench(owner, scenarioId)).scenario;
    expect(kept).toBe(40);
    expect(after.version).toBe(scenario.version + 40);
    scenario = after;
  }, 60_000);

  it('is made once, however often its creation is sent', async () => {
    const { owner, scenarioId } = garden;
    const id = crypto.randomUUID();
    const copies = await Promise.all(
      Array.from({ length: 8 }, () => copyScenario(owner, scenarioId, { scenarioId: id, name: 'Twice' })),
    );
    expect(new Set(copies.map((copy) => copy.scenarioId))).toEqual(new Set([id]));
    expect((await getWorkbench(owner, scenarioId)).siblings.filter((sibling) => sibling.name === 'Twice')).toHaveLength(
      1,
    );
    await deleteScenario(owner, id);
  });

  it('cannot lose the last of its kind, nor a lamp that hangs in it', async () => {
    const { owner, scenarioId, fixtureId, roomId } = garden;
    await expect(deleteScenario(owner, scenarioId)).rejects.toMatchObject({ status: 409 });
    await expect(deleteFixture(owner, fixtureId)).rejects.toMatchObject({
      status: 409,
      detail: expect.stringContaining('First layout') as string,
    });
    await expect(deleteRoom(owner, roomId)).rejects.toMatchObject({ status: 409 });
    const free = await createFixture(owner, fixtureInput);
    await deleteFixture(owner, free.fixtureId);
    const empty = await createRoom(owner, roomInput);
    await deleteRoom(owner, empty.roomId);
  });

  it('refuses a lamp of nobody’s, and one outside the tent, naming the place', async () => {
    const { owner, scenarioId } = garden;
    const lamp = scenario.plan.placements[0]!;
    const withLamp = (patch: object) =>
      updateScenario(owner, scenarioId, {
        version: scenario.version,
        plan: { ...scenario.plan, placements: [{ ...lamp, ...patch }] },
      });
    await expect(withLamp({ fixture: crypto.randomUUID() })).rejects.toMatchObject({
      status: 422,
      problems: [{ path: 'plan.placements[0].fixture' }],
    });
    await expect(withLamp({ positionM: [9, 0.3, 0.8] })).rejects.toMatchObject({
      status: 422,
      problems: [{ path: 'plan.placements[0].positionM[0]' }],
    });
  });

  it('is evaluated anew when its room changes, and answers from the store when nothing did', async () => {
    const { owner, scenarioId, roomId } = garden;
    const before = await getEvaluatedScenario(owner, scenarioId);
    expect((await getEvaluatedScenario(owner, scenarioId)).evaluation).toEqual(before.evaluation);
    const { room } = before.workbench;
    await updateRoom(owner, roomId, {
      version: room.version,
      climate: { ...room.climate, airTempC: { kind: 'constant', value: 6 } },
    });
    const after = await getEvaluatedScenario(owner, scenarioId);
    expect(after.evaluation.heat.coldDark.heaterW).toBeGreaterThan(before.evaluation.heat.coldDark.heaterW);
  });

  it('meets 500 broken plans at its route without a crash, a 500 or a change', async () => {
    const { people, gardenId, scenarioId } = garden;
    const { version } = (await getWorkbench(garden.owner, scenarioId)).scenario;
    const send = (body: unknown) =>
      PATCH(
        new Request(`http://localhost:3000/api/v1/gardens/${gardenId}/scenarios/${scenarioId}`, {
          method: 'PATCH',
          headers: {
            'content-type': 'application/json',
            'sec-fetch-site': 'same-origin',
            origin: 'http://localhost:3000',
            cookie: people.owner.cookie,
          },
          body: JSON.stringify(body),
        }),
        { params: Promise.resolve({ gardenId, scenarioId }) },
      );
    await fc.assert(
      fc.asyncProperty(fuzzedDocument(scenario.plan), async (plan) => {
        // A version that nobody saw: what fits is told to clash, what does not fit is told why, and nothing is saved.
        const answer = await send({ version: version + 1_000_000, plan });
        expect([409, 422]).toContain(answer.status);
        if (answer.status === 422)
          expect(((await answer.json()) as { problems: unknown[] }).problems.length).toBeGreaterThan(0);
      }),
      { numRuns: 500 },
    );
    expect((await getWorkbench(garden.owner, scenarioId)).scenario.version).toBe(version);
  }, 120_000);
});
