import { createFixture } from '@/lib/fixtures/fixture.service';
import { fixtureInputSchema } from '@/lib/fixtures/fixture.schema';
import { createRoom } from '@/lib/rooms/room.service';
import { createTarget } from '@/lib/targets/target.service';
import { createTent } from '@/lib/tents/tent.service';
import { evaluateScenarios } from '@/lib/scenarios/evaluation.service';
import { listScenarios, updateScenario } from '@/lib/scenarios/scenario.service';
import { createJoinCode } from '@/lib/gardens/join-code.service';
import { newGarden, type TestGarden } from './people';

export interface PlannedGarden extends TestGarden {
  roomId: string;
  tentId: string;
  fixtureId: string;
  targetId: string;
  scenarioId: string;
  joinCodeId: string;
}

export const roomInput = {
  name: 'Cellar',
  place: { latitudeDeg: 55, longitudeDeg: 10, timeZone: 'Europe/Copenhagen', altitudeM: 20 },
  climate: { airTempC: { kind: 'constant' as const, value: 13 } },
  power: {
    supplyV: 230,
    circuits: [{ id: 'c1', name: 'Sockets', ratingA: 16 }],
    tariff: { kind: 'flat' as const, currency: 'EUR', pricePerKwh: 0.3 },
  },
};

export const fixtureInput = fixtureInputSchema.parse({
  name: 'Bar',
  spec: {
    inputPowerW: 40,
    rating: { kind: 'ppf', ppfUmolS: 100 },
    shape: 'rect',
    lengthM: 0.8,
    widthM: 0.05,
    distribution: { type: 'lambertian' },
  },
});

/** A garden in which each tenant table holds at least one row, all made through the services. */
export async function newPlannedGarden(name?: string): Promise<PlannedGarden> {
  const garden = await newGarden(name);
  const { owner } = garden;
  const { roomId } = await createRoom(owner, roomInput);
  const { fixtureId } = await createFixture(owner, fixtureInput);
  const { targetId } = await createTarget(owner, {
    crop: `Crop of ${owner.gardenId}`,
    stage: 'production',
    figures: { dliTargetMolM2D: 12 },
  });
  const { tentId } = await createTent(owner, {
    roomId,
    name: 'Tent',
    body: { widthM: 1.2, depthM: 0.6, heightM: 1.8 },
    tierCount: 2,
  });
  const [scenario] = await listScenarios(owner, tentId);
  const plan = scenario!.plan;
  await updateScenario(owner, scenario!.scenarioId, {
    version: scenario!.version,
    plan: {
      ...plan,
      placements: [
        {
          id: 'lamp',
          fixture: fixtureId,
          tier: plan.tiers[0]!.id,
          positionM: [0.6, 0.3, 0.8],
          aim: [0, 0, -1],
          axis: [1, 0, 0],
          schedule: 'day',
        },
      ],
    },
  });
  await evaluateScenarios(owner, () => [scenario!.scenarioId]);
  const { joinCodeId } = await createJoinCode(owner, 'viewer');
  return { ...garden, roomId, tentId, fixtureId, targetId, scenarioId: scenario!.scenarioId, joinCodeId };
}
