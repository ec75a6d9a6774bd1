import type { DemoGarden, DemoScenario } from './demo-garden';
import { hung } from './demo-lamps';

/** A four-tier rack in a garage, in inches and degrees Fahrenheit. Invented. */
const inch = (value: number) => Math.round(value * 254) / 10000;
const celsius = (tempF: number) => Math.round(((tempF - 32) / 1.8) * 100) / 100;

const crops = [
  { crop: 'Vegetable seedlings, generic', stage: 'seedling' },
  { crop: 'Spinach, baby', stage: 'production' },
  { crop: 'Parsley', stage: 'production' },
  { crop: 'Lettuce, baby leaf', stage: 'production' },
];
const NAMES = ['Bottom', 'Second', 'Third', 'Top'];
const tops = [9.5, 27, 44.5, 62].map(inch);

const tiers = tops.map((topHeightM, at) => ({
  id: `t${at + 1}`,
  name: NAMES[at]!,
  topHeightM,
  x0M: inch(3),
  x1M: inch(50),
  y0M: inch(2.5),
  y1M: inch(23.5),
  canopyHeightM: inch([2.5, 3.5, 5, 3.5][at]!),
  leafAreaIndex: [0.5, 1.4, 1.7, 1.5][at]!,
  sites: { rows: 3, columns: 7 },
  targetRef: crops[at]!,
}));

const climate: DemoScenario['plan']['climate'] = {
  dayTempC: celsius(69),
  nightTempC: celsius(61),
  maxTempC: celsius(83),
  maxRelHumidityPct: 76,
  heater: { ratedPowerW: 750, priceMinor: 4900, owned: false, clearanceM: 0.91 },
  exhaust: { maxAirflowM3H: 250, inputPowerW: 24, priceMinor: 7400, owned: false },
  circulation: { inputPowerW: 11 },
};
const water: DemoScenario['plan']['water'] = {
  reservoirL: 68,
  pump: { inputPowerW: 21 },
  flood: { minutes: 9, everyMinutes: 150 },
};

const underShelf = (tier: number, back: number) =>
  [inch(26.5), inch(back), tier < 3 ? tops[tier + 1]! - inch(2.2) : inch(76)] as const;
const bars = (hoursOf: (tier: number) => string, dimFrac?: number) =>
  tops.flatMap((_, tier) =>
    [8.2, 17.8].map((back, at) =>
      hung({
        id: `bar-${tier + 1}${at === 0 ? 'a' : 'b'}`,
        fixture: 'bar',
        tier: `t${tier + 1}`,
        at: underShelf(tier, back),
        schedule: hoursOf(tier),
        ...(dimFrac !== undefined && { dimFrac }),
      }),
    ),
  );

const schedules = [
  { id: 'day', onAt: '06:45', hours: 15 },
  { id: 'spinach', onAt: '07:30', hours: 12.5 },
  { id: 'night', onAt: '21:15', hours: 15 },
  { id: 'spinach-night', onAt: '21:15', hours: 12.5 },
];

export const fenwickStreet: DemoGarden = {
  name: 'Fenwick Street',
  currency: 'USD',
  people: [
    {
      name: 'Odell Marsh',
      email: 'odell@fenwick-street.example',
      passphrase: 'maple ladder leans on the shed',
      unitSystem: 'us',
      role: 'owner',
    },
    {
      name: 'Ruth Vance',
      email: 'ruth@fenwick-street.example',
      passphrase: 'porch light left on for moths',
      unitSystem: 'us',
      role: 'planner',
    },
  ],
  fixtures: {
    bar: {
      name: 'Shelf bar',
      spec: {
        inputPowerW: 31,
        rating: { kind: 'ppf', ppfUmolS: 79 },
        shape: 'rect',
        lengthM: inch(43),
        widthM: inch(2),
        distribution: { type: 'cosinePower', beamAngleDeg: 112 },
        housingThicknessM: inch(1.1),
        powerFactor: 0.92,
        priceMinor: 4100,
        owned: 0,
      },
    },
    strong: {
      name: 'Strong panel',
      spec: {
        inputPowerW: 318,
        rating: { kind: 'ppf', ppfUmolS: 862 },
        shape: 'rect',
        lengthM: inch(38),
        widthM: inch(18),
        distribution: { type: 'lambertian' },
        powerFactor: 0.97,
        priceMinor: 38900,
        owned: 0,
      },
    },
  },
  room: {
    name: 'Two-car garage',
    place: { latitudeDeg: 42.98, longitudeDeg: -85.63, timeZone: 'America/Detroit', altitudeM: 199 },
    climate: {
      airTempC: {
        kind: 'monthly',
        values: [39, 40, 45, 53, 62, 71, 75, 74, 67, 57, 48, 42].map(celsius),
        dailySwingK: 3.4,
      },
      relHumidityPct: { kind: 'constant', value: 63 },
    },
    power: {
      supplyV: 120,
      circuits: [
        { id: 'north', name: 'North wall', ratingA: 20, otherLoadsW: 150 },
        { id: 'opener', name: 'Door opener', ratingA: 15 },
      ],
      tariff: {
        kind: 'tiered',
        currency: 'USD',
        tiers: [{ upToKwh: 510, price: 0.164 }, { price: 0.187 }],
        prorateByDays: true,
        fixedPerMonth: 8.5,
        taxPct: 4,
        householdBaseKwhPerMonth: 430,
      },
    },
    residualCurrentDevice: 'unknown',
  },
  tent: { name: 'Garage tent', body: { widthM: inch(53), depthM: inch(26), heightM: inch(80) } },
  scenarios: [
    {
      name: 'Two bars to a tier',
      note: 'A pair of bars under each shelf.',
      plan: { tiers, schedules, climate, water, placements: bars((tier) => (tier === 1 ? 'spinach' : 'day')) },
    },
    {
      name: 'One strong panel on top',
      note: 'All the light from above.',
      plan: {
        tiers,
        schedules,
        climate,
        water,
        placements: [
          hung({ id: 'top', fixture: 'strong', tier: 't4', at: [inch(26.5), inch(13), inch(77)], schedule: 'day' }),
        ],
      },
    },
    {
      name: 'Bars through the night, cooler',
      note: 'The same bars, lit while the garage is coldest, and a few degrees less all day.',
      plan: {
        tiers,
        schedules,
        climate: { ...climate, dayTempC: celsius(66), nightTempC: celsius(57) },
        water,
        placements: bars((tier) => (tier === 1 ? 'spinach-night' : 'night')),
      },
    },
  ],
};
