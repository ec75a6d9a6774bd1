import type { Circuit, ScenarioDocument, Target } from '@/physics/plan/scenario-document';
import type { ResolvedTarget } from '../crops/crop.schema';
import { targetKey } from '../crops/crop.schema';
import type { Fixture } from '../fixtures/fixture.schema';
import type { Room } from '../rooms/room.schema';
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

const EVERYTHING = ['light', 'heater', 'exhaust', 'circulation', 'pump'];

/** The room's circuits with what this scenario hangs on them; where it does not say, the first carries all. */
function circuitsOf({ plan, room, otherLoads }: Parts): Circuit[] {
  const loads = plan.circuitLoads;
  return room.power.circuits.map(({ id, ratingA, otherLoadsW }, index) => {
    const others = otherLoads[id] ?? 0;
    return {
      id,
      ratingA,
      carries: loads ? (loads[id] ?? []) : index === 0 ? EVERYTHING : [],
      ...((otherLoadsW !== undefined || others > 0) && { otherLoadsW: (otherLoadsW ?? 0) + others }),
    };
  });
}

/** A scenario of the app as the document that the physics reads: the one mapper, in the browser and on the server. */
export function toScenarioDocument(parts: Parts): ScenarioDocument {
  const { name, plan, tent, room, fixtures, targets, referenceTariff } = parts;
  const wanted = new Map<string, Target>(targets.map(({ target, ...ref }) => [targetKey(ref), target]));
  const used = new Set(plan.placements.map((placement) => placement.fixture));
  const { circuitLoads: _loads, tiers, ...rest } = plan;
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
    // Every lamp of the garden, placed ones first: the section offers them; the document holds 64 at most.
    fixtures: [...fixtures]
      .sort((a, b) => Number(used.has(b.fixtureId)) - Number(used.has(a.fixtureId)))
      .slice(0, 64)
      .map(({ fixtureId, name: fixtureName, spec: { rating: _rating, ...spec }, photons }) => ({
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
  };
}
