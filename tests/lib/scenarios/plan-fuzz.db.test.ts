import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import * as fixturesRoute from '@/app/api/v1/gardens/[gardenId]/fixtures/route';
import * as roomsRoute from '@/app/api/v1/gardens/[gardenId]/rooms/route';
import * as evaluationRoute from '@/app/api/v1/gardens/[gardenId]/scenarios/[scenarioId]/evaluation/route';
import * as scenarioRoute from '@/app/api/v1/gardens/[gardenId]/scenarios/[scenarioId]/route';
import * as targetsRoute from '@/app/api/v1/gardens/[gardenId]/targets/route';
import * as tentsRoute from '@/app/api/v1/gardens/[gardenId]/tents/route';
import { closePools } from '@/lib/db/client';
import { getWorkbench } from '@/lib/scenarios/garden-data';
import { callRoute } from '../../support/call-route';
import { fullPlan } from '../../support/full-plan';
import { fuzzedDocument } from '../../support/fuzzed-document';
import { fixtureInput, newPlannedGarden, roomInput, type PlannedGarden } from '../../support/planned-garden';

let garden: PlannedGarden;
beforeAll(async () => {
  garden = await newPlannedGarden('Fuzzed');
}, 60_000);
afterAll(closePools);

/** A valid text with a few of its letters changed, taken out or doubled. */
const tornText = (text: string) =>
  fc
    .array(
      fc.tuple(fc.nat(text.length - 1), fc.constantFrom('', '"', '}', '\\u0000', '\\ud800', '1e999', 'null', '[', '-')),
      {
        minLength: 1,
        maxLength: 3,
      },
    )
    .map((tears) => tears.reduce((torn, [at, letters]) => torn.slice(0, at) + letters + torn.slice(at + 1), text));

const refused = [400, 413, 422];

/** Figures that formats.md allows to be null; in JSON any other null was no number. */
const MAY_BE_NULL =
  /strayPpfdUmolM2S|exhaustAirflowM3H|recommendedHeaterCircuit|recommendedExhaustM3H|moistureAirflowM3H\.(light|dark)|^assumptions/;

function nullsIn(value: unknown, path = ''): string[] {
  if (value === null) return MAY_BE_NULL.test(path) ? [] : [path];
  if (typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, inner]) => nullsIn(inner, path ? `${path}.${key}` : key));
}

type Path = (string | number)[];

function numbersIn(value: unknown, path: Path = []): Path[] {
  if (typeof value === 'number') return [path];
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, inner]) =>
    numbersIn(inner, [...path, Array.isArray(value) ? Number(key) : key]),
  );
}

function put(row: object, path: Path, value: unknown): void {
  let at = row as Record<string | number, unknown>;
  for (const key of path.slice(0, -1)) at = at[key] as Record<string | number, unknown>;
  at[path.at(-1)!] = value;
}

async function whole(response: Response, allowed: readonly number[]): Promise<void> {
  const text = await response.text();
  expect(allowed, text).toContain(response.status);
  if (response.ok) return;
  const problem = JSON.parse(text) as { title: string; detail: string; problems?: { path: string; message: string }[] };
  expect(problem.title.length).toBeGreaterThan(0);
  expect(problem.detail.length).toBeGreaterThan(0);
  for (const each of problem.problems ?? []) expect(each.message.length).toBeGreaterThan(0);
}

describe('the plan of a scenario, by its route', () => {
  const counts = { taken: 0, refused: 0 };
  const patch = async (text: string) => {
    const { scenario } = await getWorkbench(garden.owner, garden.scenarioId);
    const call = { as: garden.people.planner, params: { gardenId: garden.gardenId, scenarioId: garden.scenarioId } };
    const response = await callRoute(scenarioRoute.PATCH, { ...call, text });
    await whole(response, [200, 409, ...refused]);
    const after = (await getWorkbench(garden.owner, garden.scenarioId)).scenario;
    counts[response.ok ? 'taken' : 'refused'] += 1;
    if (!response.ok) {
      expect(after).toEqual(scenario);
      return;
    }
    // What was taken can be evaluated, and every figure of it is a number.
    const evaluation = await callRoute(evaluationRoute.GET, call);
    expect(evaluation.status, text).toBe(200);
    expect(nullsIn(await evaluation.json()), text).toEqual([]);
  };
  const sent = (version: number, plan: unknown) => JSON.stringify({ version, plan });
  const version = async () => (await getWorkbench(garden.owner, garden.scenarioId)).scenario.version;

  it('takes or refuses each of 400 broken plans in words, saves none that it refuses, evaluates each that it takes', async () => {
    await fc.assert(
      fc.asyncProperty(fuzzedDocument(fullPlan(garden.fixtureId)), async (plan) => patch(sent(await version(), plan))),
      { numRuns: 400 },
    );
    expect(counts.refused).toBeGreaterThan(200);
  }, 240_000);

  it('evaluates whatever it takes of 150 plans with figures at the edge of what may be', async () => {
    const before = counts.taken;
    const plan = fullPlan(garden.fixtureId);
    const edges = fc.constantFrom(
      0,
      1e-12,
      0.001,
      0.01,
      0.1,
      0.5,
      0.99,
      1,
      2,
      12,
      24,
      59,
      60,
      99,
      100,
      1000,
      -20,
      1440,
    );
    const edged = fc
      .array(fc.tuple(fc.constantFrom(...numbersIn(plan)), edges), { minLength: 1, maxLength: 3 })
      .map((changes) => {
        const copy = structuredClone(plan);
        for (const [path, value] of changes) put(copy, path, value);
        return copy;
      });
    await fc.assert(
      fc.asyncProperty(edged, async (each) => patch(sent(await version(), each))),
      { numRuns: 150 },
    );
    expect(counts.taken - before).toBeGreaterThan(30);
  }, 240_000);

  it('takes or refuses each of 100 torn texts in words', async () => {
    const text = sent(1, fullPlan(garden.fixtureId));
    await fc.assert(fc.asyncProperty(tornText(text), patch), { numRuns: 100 });
  }, 120_000);
});

describe('the other rows of a garden, by their routes', () => {
  const rows = {
    rooms: [roomsRoute.POST, () => roomInput],
    fixtures: [fixturesRoute.POST, () => fixtureInput],
    targets: [
      targetsRoute.POST,
      () => ({ crop: 'Cress', stage: 'production', figures: { dliLowMolM2D: 8, dliTargetMolM2D: 10 }, note: 'ours' }),
    ],
    tents: [
      tentsRoute.POST,
      () => ({ roomId: garden.roomId, name: 'Tent', body: { widthM: 1, depthM: 1, heightM: 2 }, tierCount: 2 }),
    ],
  } as const;

  it.each(Object.keys(rows) as (keyof typeof rows)[])(
    'take or refuse each of 120 broken %s in words',
    async (noun) => {
      const [handler, valid] = rows[noun];
      await fc.assert(
        fc.asyncProperty(fuzzedDocument(valid()), async (body) => {
          const call = { as: garden.people.planner, params: { gardenId: garden.gardenId }, body };
          await whole(await callRoute(handler, call), [201, 404, 409, ...refused]);
        }),
        { numRuns: 120 },
      );
    },
    60_000,
  );
});
