import type { ScenarioDocument, Tariff } from '@/lib/evaluation/evaluate-scenario';
import type { Fixture } from '@/lib/fixtures/fixture.schema';
import { apiGet, apiSend } from '@/lib/http/api-client';
import type { Room } from '@/lib/rooms/room.schema';
import type { Workbench } from '@/lib/scenarios/scenario.schema';
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

/** The price that somebody typed into a drawing; null while the stand-in is as it was, which then goes on being marked as one. */
export function typedTariff(draft: ScenarioDocument, standIn: Tariff): Tariff | null {
  const { tariff } = draft.power;
  const same = tariff.kind === 'flat' && standIn.kind === 'flat' && tariff.pricePerKwh === standIn.pricePerKwh;
  return same ? null : tariff;
}

interface Keeping {
  gardenId: string;
  draft: ScenarioDocument;
  tariff: Tariff | null;
  /** The same id for the same key each time, so that trying again after a lost answer doubles nothing. */
  idOf: (key: string) => string;
}

/** Puts a drawing made without an account into a garden: room, lamps, tent and the tent's first scenario. Says where it is. */
export async function keepDrawing({ gardenId, draft, tariff, idOf }: Keeping): Promise<string> {
  const at = `/api/v1/gardens/${gardenId}`;
  const room = await apiSend<Room>('POST', `${at}/rooms`, {
    roomId: idOf('room'),
    name: 'Cellar',
    place: draft.place,
    climate: draft.room,
    power: {
      supplyV: draft.power.supplyV,
      circuits: draft.power.circuits.map(({ id, ratingA }) => ({ id, name: 'Cellar sockets', ratingA })),
      tariff,
    },
  });
  const fixtureIds = new Map<string, string>();
  for (const fixture of draft.fixtures) {
    const row = await apiSend<Fixture>('POST', `${at}/fixtures`, {
      fixtureId: idOf(`fixture ${fixture.id}`),
      ...fixtureRow(fixture),
    });
    fixtureIds.set(fixture.id, row.fixtureId);
  }
  const tent = await apiSend<Tent>('POST', `${at}/tents`, {
    tentId: idOf('tent'),
    roomId: room.roomId,
    name: 'Cellar tent',
    body: draft.tent,
    tierCount: Math.max(1, draft.tiers.length),
  });
  const scenarioId = tent.currentScenarioId!;
  const { scenario } = await apiGet<Workbench>(`${at}/scenarios/${scenarioId}`);
  await apiSend('PATCH', `${at}/scenarios/${scenarioId}`, {
    version: scenario.version,
    name: 'As I drew it',
    plan: planOf(draft, fixtureIds),
  });
  return `/gardens/${gardenId}/tents/${tent.tentId}/${scenarioId}`;
}
