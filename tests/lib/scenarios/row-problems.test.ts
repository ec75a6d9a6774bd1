import { describe, expect, it } from 'vitest';
import type { z } from 'zod';
import { toProblems } from '@/lib/evaluation/problems';
import { fixtureInputSchema } from '@/lib/fixtures/fixture.schema';
import { roomInputSchema } from '@/lib/rooms/room.schema';
import { planSchema } from '@/lib/scenarios/plan.schema';
import { targetInputSchema } from '@/lib/targets/target.schema';
import { tentInputSchema } from '@/lib/tents/tent.schema';
import { fullPlan } from '../../support/full-plan';

type Path = (string | number)[];

const monthly = (value: number) => ({
  kind: 'monthly',
  values: Array.from({ length: 12 }, () => value),
  dailySwingK: 2,
});

/** Every row that people send, with every optional number set. */
const rows: Record<string, [z.ZodType, object]> = {
  plan: [planSchema, fullPlan('a-lamp')],
  room: [
    roomInputSchema,
    {
      name: 'Cellar',
      place: { latitudeDeg: 55, longitudeDeg: 10, timeZone: 'Europe/Copenhagen', altitudeM: 20 },
      climate: {
        airTempC: monthly(12),
        relHumidityPct: { kind: 'constant', value: 60 },
        slabTempC: { kind: 'offset', value: -1 },
        designTempC: 8,
        hotDayTempC: 24,
      },
      power: {
        supplyV: 230,
        circuits: [{ id: 'c1', name: 'Sockets', ratingA: 16, otherLoadsW: 100 }],
        tariff: {
          kind: 'timeOfUse',
          currency: 'EUR',
          fixedPerMonth: 5,
          taxPct: 20,
          householdBaseKwhPerMonth: 200,
          periods: [{ price: 0.4, from: '16:00', to: '21:00', months: [1, 2] }],
          otherwise: 0.2,
        },
        co2GKwh: 200,
      },
    },
  ],
  tent: [
    tentInputSchema,
    {
      roomId: '7f9c24e8-3b12-4fef-91e0-5d3f7b0a1c22',
      name: 'Tent',
      tierCount: 2,
      body: {
        widthM: 1.2,
        depthM: 0.6,
        heightM: 1.8,
        liningReflectanceFrac: 0.85,
        floorReflectanceFrac: 0.3,
        fabricUWM2K: 3.5,
        floorUWM2K: 1.5,
        leakageAch: 0.5,
        liningEmittanceFrac: 0.5,
        ports: [{ kind: 'exhaust', wall: 'xMax', atM: [0.3, 1.5], diameterM: 0.1 }],
      },
    },
  ],
  lamp: [
    fixtureInputSchema,
    {
      name: 'Bar',
      spec: {
        inputPowerW: 40,
        rating: { kind: 'lumens', lumens: 4000, colour: 'cool' },
        shape: 'rect',
        lengthM: 0.8,
        widthM: 0.05,
        distribution: { type: 'cosinePower', beamAngleDeg: 90 },
        housingThicknessM: 0.04,
        housingReflectanceFrac: 0.4,
        driverOutsideFrac: 0,
        powerFactor: 0.95,
        priceMinor: 2500,
        owned: 1,
        lifeH: 30_000,
      },
    },
  ],
  target: [
    targetInputSchema,
    {
      crop: 'Cress',
      stage: 'production',
      figures: {
        dliLowMolM2D: 8,
        dliTargetMolM2D: 10,
        dliHighMolM2D: 12,
        photoperiodMinH: 12,
        photoperiodMaxH: 18,
        dayTempC: 22,
        nightTempC: 17,
        vpdLowKpa: 0.5,
        vpdHighKpa: 1,
      },
    },
  ],
};

function numbersIn(value: unknown, path: Path = []): Path[] {
  if (typeof value === 'number') return [path];
  if (typeof value !== 'object' || value === null || path[0] === 'app') return [];
  return Object.entries(value).flatMap(([key, inner]) =>
    numbersIn(inner, [...path, Array.isArray(value) ? Number(key) : key]),
  );
}

function withValue(row: object, path: Path, value: unknown): object {
  const copy = structuredClone(row);
  let at = copy as Record<string | number, unknown>;
  for (const key of path.slice(0, -1)) at = at[key] as Record<string | number, unknown>;
  at[path.at(-1)!] = value;
  return copy;
}

const text = (path: Path) =>
  path.reduce<string>((sum, key) => (typeof key === 'number' ? `${sum}[${key}]` : sum ? `${sum}.${key}` : key), '');

describe.each(Object.keys(rows))('a %s', (name) => {
  const [schema, row] = rows[name]!;
  const fields = numbersIn(row).map((path) => [text(path), path] as const);

  it('is taken as it stands, with zero wherever a physical zero is', () => {
    expect(schema.safeParse(row).error).toBeUndefined();
  });

  it.each(fields)('names path, value, range and unit of %s when it is no number, none at all or absurd', (at, path) => {
    for (const bad of ['12', null, true, Number.NaN, Number.POSITIVE_INFINITY, -1e12, 1e12, {}, []]) {
      // Null stands for “none” in a few places; an object for the lining's six faces is told face by face.
      const broken = withValue(row, path, bad);
      const { error } = schema.safeParse(broken);
      if (bad === null && !error) continue;
      expect(error, `${at} took ${String(bad)}`).toBeDefined();
      const problems = toProblems(error!, broken);
      const problem = problems.find(
        (each) => each.path === at || (typeof bad === 'object' && each.path.startsWith(`${at}.`)),
      );
      expect(problem, `${at} as ${String(bad)}`).toBeDefined();
      expect(problem!.range).toMatch(/^-?[\d.e+]+ to [\d.e+]+$/);
      expect(problem!.message).toMatch(/^Give a (whole )?number from /);
      expect(problem).toHaveProperty('value');
      expect(typeof problem!.unit).toBe('string');
    }
  });
});
