import type { ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import type { Fixture } from '@/lib/fixtures/fixture.schema';
import { apiSend } from '@/lib/http/api-client';
import type { Room } from '@/lib/rooms/room.schema';
import type { Scenario } from '@/lib/scenarios/scenario.schema';
import type { Plan } from '@/lib/scenarios/plan.schema';
import type { Tent } from '@/lib/tents/tent.schema';

type FixtureType = ScenarioDocument['fixtures'][number];

/** What a lamp of a drawing is as a row: its rating is given in photons, everything else goes over as it stands. */
function fixtureRow({ id: _id, name, inputPowerW, ppfUmolS, ...rest }: FixtureType) {
  return { name: name ?? 'Lamp', spec: { ...rest, inputPowerW, rating: { kind: 'ppf' as const, ppfUmolS } } };
}

function planOf(draft: ScenarioDocument, fixtureIds: ReadonlyMap<string, string>): Plan {
  const { calendar, tiers, placements, schedules, climate, water, boxes } = draft;
  return {
    ...(calendar && { calendar }),
    ...(water && { water }),
    ...(boxes && { boxes }),
    tiers: tiers.map(({ target, ...tier }) => ({
      ...tier,
      targetRef: target ? { crop: target.crop, stage: target.stage } : null,
    })),
    placements: placements.map((lamp) => ({ ...lamp, fixture: fixtureIds.get(lamp.fixture) ?? lamp.fixture })),
    schedules,
    climate,
  } as Plan;
}

/** Puts a drawing made without an account into a garden: its room, its lamps, its tent, its scenario. Says where it is. */
export async function keepDrawing(gardenId: string, draft: ScenarioDocument): Promise<string> {
  const at = `/api/v1/gardens/${gardenId}`;
  const room = await apiSend<Room>('POST', `${at}/rooms`, {
    name: 'Cellar',
    place: draft.place,
    climate: draft.room,
    power: {
      supplyV: draft.power.supplyV,
      circuits: draft.power.circuits.map(({ id, ratingA }) => ({ id, name: 'Cellar sockets', ratingA })),
      tariff: null,
    },
  });
  const fixtureIds = new Map<string, string>();
  for (const fixture of draft.fixtures) {
    const row = await apiSend<Fixture>('POST', `${at}/fixtures`, fixtureRow(fixture));
    fixtureIds.set(fixture.id, row.fixtureId);
  }
  const tent = await apiSend<Tent>('POST', `${at}/tents`, {
    roomId: room.roomId,
    name: 'Cellar tent',
    body: draft.tent,
    tierCount: Math.max(1, draft.tiers.length),
  });
  const scenario = await apiSend<Scenario>('POST', `${at}/tents/${tent.tentId}/scenarios`, {
    name: 'As I drew it',
    plan: planOf(draft, fixtureIds),
  });
  await apiSend('PATCH', `${at}/tents/${tent.tentId}`, {
    version: tent.version,
    currentScenarioId: scenario.scenarioId,
  });
  return `/gardens/${gardenId}/tents/${tent.tentId}/${scenario.scenarioId}`;
}
