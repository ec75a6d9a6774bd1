import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evaluateScenario } from '@/lib/evaluation/evaluate-scenario';
import { parseScenarioDocument } from '@/lib/evaluation/problems';
import { toScenarioDocument } from '@/lib/evaluation/scenario-document';
import { planSchema } from '@/lib/scenarios/plan.schema';
import { starterPlan } from '@/lib/scenarios/starter-plan';
import { photonsOf } from '@/lib/fixtures/fixture-rating';
import { fixtureSpecSchema } from '@/lib/fixtures/fixture.schema';
import { roomPowerSchema } from '@/lib/rooms/room.schema';

const power = roomPowerSchema.parse({
  supplyV: 230,
  circuits: [{ id: 'c1', name: 'Sockets', ratingA: 16 }],
  tariff: null,
});
const room = {
  place: { latitudeDeg: 55, longitudeDeg: 10, timeZone: 'Europe/Copenhagen', altitudeM: 20 },
  climate: { airTempC: { kind: 'constant' as const, value: 10 } },
  power,
};
const documentOf = (body: { widthM: number; depthM: number; heightM: number }, tierCount: number) =>
  toScenarioDocument({
    name: 'First layout',
    plan: starterPlan(body, tierCount),
    tent: { body },
    room,
    fixtures: [],
    targets: [],
    referenceTariff: {
      tariff: { kind: 'flat', currency: 'EUR', pricePerKwh: 0.3 },
      source: 'A source',
      standing: 'read',
    },
    otherLoads: {},
  });

// Sizes that a form takes: whole centimetres from the least tent to a hall.
const metres = (leastCm: number, mostCm: number) =>
  fc.integer({ min: leastCm, max: mostCm }).map((centimetres) => centimetres / 100);
const bodies = fc.record({ widthM: metres(10, 2000), depthM: metres(10, 2000), heightM: metres(10, 2000) });

describe('the plan that a new tent begins with', () => {
  it('spaces its tiers evenly, 0.40 m apart in a tent of 2 m with four', () => {
    const { tiers } = starterPlan({ widthM: 1.2, depthM: 0.6, heightM: 2 }, 4);
    expect(tiers.map((tier) => tier.topHeightM)).toEqual([0.4, 0.8, 1.2, 1.6]);
    expect(tiers[0]).toMatchObject({ x0M: 0.06, x1M: 1.14, y0M: 0.06, y1M: 0.54 });
  });

  it('holds nothing that nobody chose: no lamp, no heater, no fan, and defaults by their absence', () => {
    const plan = starterPlan({ widthM: 1.2, depthM: 0.6, heightM: 2 }, 2);
    expect(plan.placements).toEqual([]);
    expect(plan.climate.heater ?? null).toBeNull();
    expect(plan.climate.exhaust ?? null).toBeNull();
    expect(plan.tiers.flatMap((tier) => Object.keys(tier))).not.toContain('thicknessM');
    expect(plan.water).toBeUndefined();
  });

  it('fits any tent that can be described, with one tier to eight', () => {
    fc.assert(
      fc.property(bodies, fc.integer({ min: 1, max: 8 }), (body, tierCount) => {
        expect(planSchema.safeParse(starterPlan(body, tierCount)).error).toBeUndefined();
        const document = documentOf(body, tierCount);
        const sensors = document.tiers.reduce(
          (sum, tier) => sum + Math.ceil((tier.x1M - tier.x0M) / 0.1) * Math.ceil((tier.y1M - tier.y0M) / 0.1),
          0,
        );
        fc.pre(sensors <= 20_000);
        expect(parseScenarioDocument(document)).toMatchObject({ ok: true });
      }),
      { numRuns: 1000 },
    );
  });

  it('is evaluated to finite figures in any tent, the least included', () => {
    const least = { widthM: 0.1, depthM: 0.1, heightM: 0.1 };
    fc.assert(
      fc.property(bodies, fc.integer({ min: 1, max: 8 }), (body, tierCount) => {
        const { heat, tiers } = evaluateScenario(documentOf(body, tierCount), { year: false });
        expect(tiers).toHaveLength(tierCount);
        for (const figure of [heat.coldDark.lossW, heat.coldDark.heaterW, heat.freeFloatTempC.dark])
          expect(Number.isFinite(figure)).toBe(true);
      }),
      {
        numRuns: 25,
        examples: [
          [least, 8],
          [least, 1],
        ],
      },
    );
  }, 30_000);
});

describe('a document of a scenario whose price nobody has read', () => {
  it('marks the price as assumed, with its source and standing, and does not mark a given one', () => {
    const assumed = documentOf({ widthM: 1, depthM: 1, heightM: 2 }, 1);
    expect(assumed.app).toEqual({
      assumptions: [{ path: 'power.tariff', value: 0.3, unit: 'EUR/kWh', source: 'A source', standing: 'read' }],
    });
    expect(assumed.power.tariff).toMatchObject({ pricePerKwh: 0.3 });
  });

  it("marks the photons of a lamp whose box does not say them, after the plan's own notes", () => {
    const spec = fixtureSpecSchema.parse({
      inputPowerW: 10,
      shape: 'point',
      distribution: { type: 'isotropic' },
      rating: { kind: 'watts' },
    });
    const bulb = { fixtureId: 'bulb', name: 'Bulb', spec, version: 1, photons: photonsOf(spec, []) };
    const given = { ...spec, rating: { kind: 'ppf' as const, ppfUmolS: 20 } };
    const known = { ...bulb, fixtureId: 'known', spec: given, photons: photonsOf(given, []) };
    const body = { widthM: 1, depthM: 1, heightM: 2 };
    const { app } = toScenarioDocument({
      name: 'Bulbs',
      plan: { ...starterPlan(body, 1), app: { view: 'side' } },
      tent: { body },
      room: { ...room, power: { ...power, tariff: { kind: 'flat', currency: 'EUR', pricePerKwh: 0.2 } } },
      fixtures: [known, bulb],
      targets: [],
      referenceTariff: {
        tariff: { kind: 'flat', currency: 'EUR', pricePerKwh: 0.3 },
        source: 'A source',
        standing: 'read',
      },
      otherLoads: {},
    });
    expect(app).toMatchObject({
      view: 'side',
      assumptions: [{ path: 'fixtures[1].ppfUmolS', value: 18, unit: 'µmol/s', standing: 'recalled' }],
    });
  });
});
