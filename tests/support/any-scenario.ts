import fc from 'fast-check';
import type { ScenarioDocument, Series, Tariff } from '@/physics/plan/scenario-document';

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true, noDefaultInfinity: true });
/** Ends of a range, where things break, and what lies between. */
const edgy = (min: number, max: number) =>
  fc.oneof({ weight: 2, arbitrary: fc.constantFrom(min, max) }, { weight: 5, arbitrary: number(min, max) });
const maybe = <T>(arbitrary: fc.Arbitrary<T>) => fc.option(arbitrary, { nil: undefined });
const share = () => edgy(0, 1);
const reflectance = () => edgy(0, 0.99);

const series = (min: number, max: number): fc.Arbitrary<Series> =>
  fc.oneof(
    fc.record({ kind: fc.constant('constant' as const), value: edgy(min, max) }),
    fc.record({
      kind: fc.constant('monthly' as const),
      values: fc.array(edgy(min, max), { minLength: 12, maxLength: 12 }),
      dailySwingK: maybe(edgy(0, 20)),
    }),
  );

const clock = fc
  .tuple(fc.integer({ min: 0, max: 23 }), fc.integer({ min: 0, max: 59 }))
  .map(([hour, minute]) => `${String(hour).padStart(2, '0')}:${String(minute).padStart(2, '0')}`);

const common = {
  currency: fc.constantFrom('EUR', 'USD', 'JPY'),
  fixedPerMonth: maybe(edgy(0, 1000)),
  taxPct: maybe(edgy(0, 100)),
  householdBaseKwhPerMonth: maybe(edgy(0, 2000)),
};
const price = () => edgy(-10, 1000);
const tariff: fc.Arbitrary<Tariff> = fc.oneof(
  fc.record({ ...common, kind: fc.constant('flat' as const), pricePerKwh: price() }),
  fc.record({
    ...common,
    kind: fc.constant('timeOfUse' as const),
    periods: fc.array(
      fc.record({
        price: price(),
        weekdays: maybe(fc.constantFrom('all' as const, 'weekday' as const, 'weekend' as const)),
        from: clock,
        to: fc.oneof(clock, fc.constant('24:00')),
        months: maybe(fc.uniqueArray(fc.integer({ min: 1, max: 12 }), { minLength: 1, maxLength: 12 })),
      }),
      { maxLength: 4 },
    ),
    otherwise: price(),
  }),
  fc.record({
    ...common,
    kind: fc.constant('tiered' as const),
    tiers: fc
      .tuple(edgy(1, 100), edgy(200, 1e6), price(), price())
      .map(([first, second, low, high]) => [
        { upToKwh: first, price: low },
        { upToKwh: second, price: high },
        { price: high },
      ]),
    prorateByDays: maybe(fc.boolean()),
  }),
);

const climate = fc
  .record({
    dayTempC: edgy(-40, 60),
    nightTempC: edgy(-40, 60),
    above: edgy(0, 20),
    maxRelHumidityPct: maybe(edgy(0, 100)),
    heater: fc.option(
      fc.record({
        ratedPowerW: edgy(0, 20_000),
        priceMinor: maybe(fc.integer({ min: 0, max: 1e9 })),
        owned: maybe(fc.boolean()),
        clearanceM: fc.option(edgy(0, 5)),
      }),
    ),
    fan: fc.option(fc.record({ maxAirflowM3H: edgy(0, 20_000), least: maybe(share()), inputPowerW: edgy(0, 2000) })),
    circulation: fc.option(fc.record({ inputPowerW: edgy(0, 2000) })),
  })
  .map(({ above, fan, ...rest }): ScenarioDocument['climate'] => ({
    ...rest,
    maxTempC: Math.max(rest.dayTempC, rest.nightTempC) + above,
    exhaust: fan && {
      maxAirflowM3H: fan.maxAirflowM3H,
      inputPowerW: fan.inputPowerW,
      ...(fan.least !== undefined && { minAirflowM3H: fan.least * fan.maxAirflowM3H }),
    },
  }));

const water = fc
  .record({
    reservoirL: maybe(edgy(0, 10_000)),
    coveredFrac: maybe(share()),
    transpiration: maybe(
      fc.oneof(
        fc.record({ kind: fc.constant('model' as const) }),
        fc.record({ kind: fc.constant('fixed' as const), lightKgH: edgy(0, 100), darkKgH: edgy(0, 100) }),
      ),
    ),
    pump: fc.option(fc.record({ inputPowerW: edgy(0, 2000) })),
    every: edgy(1, 10_080),
    long: share(),
  })
  .map(({ every, long, ...rest }) => ({
    ...rest,
    flood: { everyMinutes: every, minutes: Math.min(1440, every * long) },
  }));

const target = fc.record({
  crop: fc.constant('Any leaf'),
  stage: fc.constant('any'),
  dliLowMolM2D: maybe(edgy(0, 100)),
  dliTargetMolM2D: edgy(0, 100),
  dliHighMolM2D: maybe(edgy(0, 100)),
  photoperiodMinH: maybe(edgy(0, 24)),
  photoperiodMaxH: maybe(edgy(0, 24)),
});

/** Tiers and lamps by shares of the tent, so that all lie within it. */
const rack = fc.record({
  size: fc.tuple(edgy(0.1, 5), edgy(0.1, 5), edgy(0.1, 20)),
  tiers: fc.array(
    fc.record({
      top: share(),
      left: number(0, 0.4),
      front: number(0, 0.4),
      openFrac: maybe(share()),
      topReflectanceFrac: maybe(reflectance()),
      leafAreaIndex: maybe(edgy(0, 12)),
      canopyCoverFrac: maybe(share()),
      target: fc.option(target),
    }),
    { maxLength: 3 },
  ),
  fixture: fc.record({
    inputPowerW: edgy(0, 20_000),
    ppfUmolS: edgy(0, 1e5),
    driverOutsideFrac: maybe(share()),
    powerFactor: maybe(edgy(0.1, 1)),
    priceMinor: maybe(fc.integer({ min: 0, max: 1e9 })),
  }),
  lamps: fc.array(
    fc.record({
      at: fc.tuple(share(), share(), share()),
      aim: fc.tuple(number(-1, 1), number(-1, 1), fc.constantFrom(-1, 1)),
      dimFrac: maybe(share()),
      late: fc.boolean(),
      named: fc.boolean(),
    }),
    { maxLength: 3 },
  ),
});

const place = fc.record({
  latitudeDeg: edgy(-90, 90),
  longitudeDeg: edgy(-180, 180),
  timeZone: fc.constantFrom(
    'Europe/Oslo',
    'UTC',
    'Asia/Kathmandu',
    'Australia/Lord_Howe',
    'Pacific/Apia',
    'America/St_Johns',
  ),
  altitudeM: edgy(-430, 6000),
});

/** Any scenario that the schema takes, weird ones before all: its ends, zeros, sealed tents, rooms at −40 °C, free or negative prices. */
export const anyScenario: fc.Arbitrary<ScenarioDocument> = fc
  .record({
    year: fc.constantFrom(1900, 2026, 2028, 2200),
    place,
    air: series(-40, 60),
    humidity: maybe(series(0, 100)),
    slab: maybe(
      fc.oneof(
        fc.record({ kind: fc.constant('offset' as const), value: edgy(-30, 30) }),
        fc.record({ kind: fc.constant('constant' as const), value: edgy(-40, 60) }),
      ),
    ),
    designTempC: maybe(edgy(-40, 60)),
    hotDayTempC: maybe(edgy(-40, 60)),
    envelope: fc.record({
      liningReflectanceFrac: maybe(reflectance()),
      floorReflectanceFrac: maybe(reflectance()),
      fabricUWM2K: maybe(edgy(0, 20)),
      floorUWM2K: maybe(edgy(0, 20)),
      leakageAch: maybe(edgy(0, 100)),
      liningEmittanceFrac: maybe(edgy(0.01, 1)),
    }),
    rack,
    schedules: fc.tuple(fc.record({ onAt: clock, hours: edgy(0, 24) }), fc.record({ onAt: clock, hours: edgy(0, 24) })),
    climate,
    water: maybe(water),
    supplyV: edgy(90, 420),
    ratingA: edgy(1, 200),
    tariff,
    co2GKwh: maybe(edgy(0, 3000)),
  })
  .map((any) => {
    const [widthM, depthM, heightM] = any.rack.size;
    const { tiers, lamps, fixture } = any.rack;
    return {
      schema: 'scenario/1',
      name: 'Any',
      calendar: { year: any.year },
      place: any.place,
      room: {
        airTempC: any.air,
        relHumidityPct: any.humidity,
        slabTempC: any.slab,
        designTempC: any.designTempC,
        hotDayTempC: any.hotDayTempC,
      },
      tent: { widthM, depthM, heightM, ...any.envelope },
      tiers: tiers.map(({ top, left, front, ...rest }, index) => ({
        id: `t${index}`,
        topHeightM: top * heightM,
        x0M: left * widthM,
        x1M: (left + 0.6) * widthM,
        y0M: front * depthM,
        y1M: (front + 0.6) * depthM,
        ...rest,
      })),
      fixtures: [{ id: 'lamp', shape: 'point', distribution: { type: 'lambertian' }, ...fixture }],
      placements: lamps.map(({ at, aim, dimFrac, late, named }, index) => ({
        id: `p${index}`,
        fixture: 'lamp',
        tier: named && tiers.length > 0 ? 't0' : null,
        positionM: [at[0] * widthM, at[1] * depthM, at[2] * heightM] as const,
        aim,
        axis: [1, 0.001, 0.002] as const,
        dimFrac,
        schedule: late ? 'late' : 'early',
      })),
      schedules: [
        { id: 'early', ...any.schedules[0] },
        { id: 'late', ...any.schedules[1] },
      ],
      climate: any.climate,
      water: any.water,
      power: {
        supplyV: any.supplyV,
        circuits: [{ id: 'c1', ratingA: any.ratingA, carries: ['light', 'heater', 'exhaust', 'circulation', 'pump'] }],
        tariff: any.tariff,
        co2GKwh: any.co2GKwh,
      },
    } satisfies ScenarioDocument;
  });
