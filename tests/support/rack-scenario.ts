import type { Distribution } from '@/physics/light/light-documents';
import type { ScenarioDocument } from '@/physics/plan/scenario-document';

interface Rack {
  lamps: number;
  tiers: number;
  distribution?: Distribution;
}

/** A tent of 2.4 × 1.2 × 2.2 m with tiers half a metre apart and bars shared out over them. */
export function rackScenario({ lamps, tiers, distribution = { type: 'lambertian' } }: Rack): ScenarioDocument {
  const perTier = Math.ceil(lamps / tiers);
  return {
    schema: 'scenario/1',
    name: 'Rack',
    place: { latitudeDeg: 55, longitudeDeg: 10, timeZone: 'Europe/Copenhagen', altitudeM: 0 },
    room: { airTempC: { kind: 'constant', value: 12 } },
    tent: { widthM: 2.4, depthM: 1.2, heightM: 2.2, liningReflectanceFrac: 0.85 },
    tiers: Array.from({ length: tiers }, (_, i) => ({
      id: `t${i}`,
      topHeightM: 0.1 + i * 0.5,
      thicknessM: 0.02,
      x0M: 0.1,
      x1M: 2.3,
      y0M: 0.1,
      y1M: 1.1,
      canopyHeightM: 0.1,
    })),
    fixtures: [
      {
        id: 'bar',
        inputPowerW: 60,
        ppfUmolS: 160,
        shape: 'rect',
        lengthM: 0.6,
        widthM: 0.1,
        distribution,
        housingThicknessM: 0.03,
        housingReflectanceFrac: 0.4,
      },
    ],
    placements: Array.from({ length: lamps }, (_, i) => ({
      id: `p${i}`,
      fixture: 'bar',
      tier: `t${i % tiers}`,
      positionM: [0.1 + (2.2 * (Math.floor(i / tiers) + 0.5)) / perTier, 0.6, 0.52 + (i % tiers) * 0.5],
      aim: [0, 0, -1],
      axis: [1, 0, 0],
      dimFrac: 1,
      schedule: 'day',
    })),
    schedules: [{ id: 'day', onAt: '06:00', hours: 16 }],
    climate: { dayTempC: 22, nightTempC: 18, maxTempC: 28, heater: null, exhaust: null },
    power: { supplyV: 230, circuits: [], tariff: { currency: 'EUR', kind: 'flat', pricePerKwh: 0.3 } },
  };
}
