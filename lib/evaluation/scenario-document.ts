import type { Assumption } from '@/physics/plan/evaluation-document';
import type { Circuit, ScenarioDocument, Target } from '@/physics/plan/scenario-document';
import type { ResolvedTarget } from '../crops/crop.schema';
import { targetKey } from '../crops/crop.schema';
import type { Fixture } from '../fixtures/fixture.schema';
import type { Room } from '../rooms/room.schema';
import { carriedBy } from '../scenarios/circuit-loads';
import type { Plan } from '../scenarios/plan.schema';
import type { ReferenceTariff } from '../tariffs/default-tariff';
import type { Tent } from '../tents/tent.schema';

interface Parts {
  name: string;
  plan: Plan;
  tent: Pick<Tent, 'body'>;
  room: Pick<Room, 'place' | 'climate' | 'power'>;
  fixtures: readonly Fixture[];
  targets: readonly ResolvedTarget[];
  referenceTariff: ReferenceTariff;
  otherLoads: Readonly<Record<string, number>>;
}

/** The room's circuits with what this scenario hangs on them, beside what hangs there already. */
function circuitsOf({ plan, room, otherLoads }: Parts): Circuit[] {
  const carried = new Map(carriedBy(plan, room.power.circuits).map(({ id, carries }) => [id, carries]));
  const others = new Map(Object.entries(otherLoads));
  return room.power.circuits.map(({ id, ratingA, otherLoadsW }) => {
    const othersW = others.get(id) ?? 0;
    return {
      id,
      ratingA,
      carries: carried.get(id) ?? [],
      ...((otherLoadsW !== undefined || othersW > 0) && { otherLoadsW: (otherLoadsW ?? 0) + othersW }),
    };
  });
}

/**
 * What stands in for figures that nobody has given, for pages to mark: the price of a bill that was not read, the photons of a
 * lamp whose box does not say them. The physics takes them as given and never looks at `app`.
 */
function assumedOf({ room, referenceTariff }: Parts, fixtures: readonly Fixture[]): Assumption[] {
  const { tariff, source, standing } = referenceTariff;
  const price: Assumption[] = room.power.tariff
    ? []
    : [
        {
          path: 'power.tariff',
          value: tariff.kind === 'flat' ? tariff.pricePerKwh : null,
          unit: `${tariff.currency}/kWh`,
          source,
          standing,
        },
      ];
  const lamps = fixtures.flatMap(({ spec, photons }, index): Assumption[] =>
    spec.rating.kind === 'ppf'
      ? []
      : [
          {
            path: `fixtures[${index}].ppfUmolS`,
            value: photons.ppfUmolS,
            unit: 'µmol/s',
            source: photons.how,
            standing: photons.standing,
          },
        ],
  );
  return [...price, ...lamps];
}

/** A scenario of the app as the document that the physics reads: the one mapper, in the browser and on the server. */
export function toScenarioDocument(parts: Parts): ScenarioDocument {
  const { name, plan, tent, room, fixtures, targets, referenceTariff } = parts;
  const wanted = new Map<string, Target>(targets.map(({ target, ...ref }) => [targetKey(ref), target]));
  const used = new Set(plan.placements.map((placement) => placement.fixture));
  const { circuitLoads: _loads, tiers, app, ...rest } = plan;
  // Every lamp of the garden, placed ones first: the section offers them; the document holds 64 at most.
  const offered = [...fixtures]
    .sort((a, b) => Number(used.has(b.fixtureId)) - Number(used.has(a.fixtureId)))
    .slice(0, 64);
  const assumptions = assumedOf(parts, offered);
  return {
    schema: 'scenario/1',
    name,
    place: room.place,
    room: room.climate,
    tent: tent.body,
    ...rest,
    tiers: tiers.map(({ targetRef, ...tier }) => ({
      ...tier,
      target: targetRef ? (wanted.get(targetKey(targetRef)) ?? null) : null,
    })),
    fixtures: offered.map(({ fixtureId, name: fixtureName, spec: { rating: _rating, ...spec }, photons }) => ({
      ...spec,
      id: fixtureId,
      name: fixtureName,
      ppfUmolS: photons.ppfUmolS,
    })),
    power: {
      supplyV: room.power.supplyV,
      circuits: circuitsOf(parts),
      tariff: room.power.tariff ?? referenceTariff.tariff,
      ...(room.power.co2GKwh !== undefined && { co2GKwh: room.power.co2GKwh }),
    },
    ...((app || assumptions.length > 0) && { app: { ...app, ...(assumptions.length > 0 && { assumptions }) } }),
  };
}
