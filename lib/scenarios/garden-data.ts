import 'server-only';

import { requireAllowed } from '../auth/require-allowed';
import { allowedActions } from '../auth/permissions';
import type { GardenActor } from '../auth/session';
import { resolveTarget, type OwnTarget } from '../crops/reference-target';
import { targetKey, type ResolvedTarget } from '../crops/crop.schema';
import { inGarden, type GardenTransaction } from '../db/transactions';
import { toScenarioDocument } from '../evaluation/scenario-document';
import type { ScenarioDocument } from '../evaluation/evaluate-scenario';
import { gardenById } from '../gardens/garden.queries';
import type { Garden } from '../gardens/garden.schema';
import { fixturesOf } from '../fixtures/fixture.queries';
import type { Fixture } from '../fixtures/fixture.schema';
import { notFoundHere } from '../http/app-error';
import { referenceData } from '../reference-data/reference-data';
import { roomsOf } from '../rooms/room.queries';
import type { Room } from '../rooms/room.schema';
import { defaultTariff } from '../tariffs/default-tariff';
import { targetsOf } from '../targets/target.queries';
import { tentsOf } from '../tents/tent.queries';
import type { Tent } from '../tents/tent.schema';
import { carriedBy } from './circuit-loads';
import { scenariosOf } from './scenario.queries';
import type { Scenario, Workbench } from './scenario.schema';

/** A garden's rows, read once in one transaction. A garden is a household's or a school's: some rooms, some tents. */
export interface GardenData {
  garden: Garden;
  rooms: Room[];
  tents: Tent[];
  scenarios: Scenario[];
  fixtures: Fixture[];
  ownTargets: OwnTarget[];
}

export async function readGardenData(trx: GardenTransaction, actor: GardenActor): Promise<GardenData> {
  const { gardenId, role } = actor;
  const garden = await gardenById(trx, gardenId);
  if (!garden) throw notFoundHere('garden');
  return {
    garden: { ...garden, role },
    rooms: await roomsOf(trx, gardenId),
    tents: await tentsOf(trx, gardenId),
    scenarios: await scenariosOf(trx, gardenId),
    fixtures: await fixturesOf(trx, gardenId),
    ownTargets: await targetsOf(trx, gardenId),
  };
}

/** Rated watts that a tent's scenario in use puts on each circuit of its room. */
function loadsOnCircuits(room: Room, { plan }: Scenario, fixtures: readonly Fixture[]): Map<string, number> {
  const lamps = plan.placements.map((placement) => ({
    id: placement.id,
    watts: fixtures.find((fixture) => fixture.fixtureId === placement.fixture)?.spec.inputPowerW ?? 0,
  }));
  const devices = new Map([
    ['heater', plan.climate.heater?.ratedPowerW ?? 0],
    ['exhaust', plan.climate.exhaust?.inputPowerW ?? 0],
    ['circulation', plan.climate.circulation?.inputPowerW ?? 0],
    ['pump', plan.water?.pump?.inputPowerW ?? 0],
  ]);
  const circuits = carriedBy(plan, room.power.circuits);
  const named = new Set(circuits.flatMap(({ carries }) => carries));
  return new Map(
    circuits.map(({ id, carries }) => {
      const light = lamps
        .filter((lamp) => carries.includes(named.has(lamp.id) ? lamp.id : 'light'))
        .reduce((sum, lamp) => sum + lamp.watts, 0);
      return [id, light + carries.reduce((sum, load) => sum + (devices.get(load) ?? 0), 0)];
    }),
  );
}

function otherLoadsFor({ tents, scenarios, fixtures }: GardenData, room: Room, tentId: string): Record<string, number> {
  const sums = new Map<string, number>();
  for (const tent of tents) {
    if (tent.tentId === tentId || tent.roomId !== room.roomId) continue;
    const current = scenarios.find((scenario) => scenario.scenarioId === tent.currentScenarioId);
    if (!current) continue;
    for (const [circuit, watts] of loadsOnCircuits(room, current, fixtures))
      sums.set(circuit, (sums.get(circuit) ?? 0) + watts);
  }
  return Object.fromEntries(sums);
}

function targetsFor({ ownTargets }: GardenData, { plan }: Scenario): ResolvedTarget[] {
  const found = new Map<string, ResolvedTarget>();
  for (const { targetRef } of plan.tiers) {
    const target = targetRef ? resolveTarget(targetRef, ownTargets, referenceData().crops) : null;
    if (target) found.set(targetKey(target), target);
  }
  return [...found.values()];
}

/** All that a scenario's pages need, from a garden's rows. */
export function workbenchOf(data: GardenData, actor: GardenActor, scenario: Scenario): Workbench {
  const tent = data.tents.find((each) => each.tentId === scenario.tentId)!;
  const room = data.rooms.find((each) => each.roomId === tent.roomId)!;
  const siblings = data.scenarios.filter((each) => each.tentId === tent.tentId);
  return {
    scenario,
    tent,
    room,
    garden: data.garden,
    fixtures: data.fixtures,
    targets: targetsFor(data, scenario),
    referenceTariff: defaultTariff(data.garden.currency, referenceData().prices),
    siblings: siblings.map(({ scenarioId, name, updatedAt, plan }) => ({
      scenarioId,
      name,
      updatedAt,
      tierTopsM: plan.tiers.map((tier) => tier.topHeightM),
    })),
    otherLoads: otherLoadsFor(data, room, tent.tentId),
    can: allowedActions(actor.role),
  };
}

export function documentOf(workbench: Workbench): ScenarioDocument {
  const { scenario, ...rest } = workbench;
  return toScenarioDocument({ name: scenario.name, plan: scenario.plan, ...rest });
}

export async function getWorkbench(actor: GardenActor, scenarioId: string): Promise<Workbench> {
  requireAllowed(actor, 'scenario.read');
  return inGarden(actor.gardenId, async (trx) => {
    const data = await readGardenData(trx, actor);
    const scenario = data.scenarios.find((each) => each.scenarioId === scenarioId);
    if (!scenario) throw notFoundHere('scenario');
    return workbenchOf(data, actor, scenario);
  });
}
