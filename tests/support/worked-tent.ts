import type { ScenarioDocument } from '@/physics/plan/scenario-document';

/** A tent of 2.4 × 1.2 × 2.0 m, sealed, with one black tier: simple enough to reckon by hand. UA is 69.12 + 2.88·floorU W/K. */
export function workedTent({ lampsW = 400 }: { lampsW?: number } = {}): ScenarioDocument {
  return {
    schema: 'scenario/1',
    name: 'Worked by hand',
    calendar: { year: 2026 },
    place: { latitudeDeg: 40, longitudeDeg: -105, timeZone: 'America/Phoenix', altitudeM: 0 },
    room: {
      airTempC: { kind: 'constant', value: 15.6 },
      relHumidityPct: { kind: 'constant', value: 60 },
      slabTempC: { kind: 'offset', value: 0 },
    },
    tent: {
      widthM: 2.4,
      depthM: 1.2,
      heightM: 2,
      liningReflectanceFrac: 0,
      floorReflectanceFrac: 0,
      fabricUWM2K: 4,
      floorUWM2K: 5.28576 / 2.88,
      leakageAch: 0,
    },
    tiers: [{ id: 't1', topHeightM: 0.4, x0M: 0.2, x1M: 2.2, y0M: 0.2, y1M: 1 }],
    fixtures: [
      {
        id: 'lamp',
        inputPowerW: lampsW,
        ppfUmolS: 2.5 * lampsW,
        shape: 'rect',
        lengthM: 0.5,
        widthM: 0.5,
        distribution: { type: 'lambertian' },
      },
    ],
    placements: [
      {
        id: 'p1',
        fixture: 'lamp',
        tier: 't1',
        positionM: [1.2, 0.6, 1.5],
        aim: [0, 0, -1],
        axis: [1, 0, 0],
        schedule: 'day',
      },
    ],
    schedules: [{ id: 'day', onAt: '06:00', hours: 16 }],
    climate: { dayTempC: 24, nightTempC: 24, maxTempC: 60, heater: { ratedPowerW: 3000 } },
    water: { transpiration: { kind: 'fixed', lightKgH: 0, darkKgH: 0 } },
    power: { supplyV: 230, circuits: [], tariff: { currency: 'EUR', kind: 'flat', pricePerKwh: 0.3 } },
  };
}
