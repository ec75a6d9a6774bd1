import type { DemoGarden, DemoScenario } from './demo-garden';
import { clamped, hung } from './demo-lamps';

/** A school on a northern coast; its club grows salad and herbs in the boiler-house cellar. Invented. */
const tiers = [
  {
    id: 'lower',
    name: 'Lower',
    topHeightM: 0.44,
    x0M: 0.07,
    x1M: 1.03,
    y0M: 0.06,
    y1M: 0.64,
    canopyHeightM: 0.12,
    leafAreaIndex: 1.8,
    sites: { rows: 3, columns: 5 },
    targetRef: { crop: 'Lettuce, butterhead/leaf', stage: 'production' },
  },
  {
    id: 'upper',
    name: 'Upper',
    topHeightM: 1.11,
    x0M: 0.07,
    x1M: 1.03,
    y0M: 0.06,
    y1M: 0.64,
    canopyHeightM: 0.16,
    leafAreaIndex: 1.6,
    sites: { rows: 3, columns: 6 },
    targetRef: { crop: 'Basil, sweet', stage: 'production' },
  },
];

const climate: DemoScenario['plan']['climate'] = {
  dayTempC: 20.5,
  nightTempC: 17,
  maxTempC: 26.5,
  maxRelHumidityPct: 78,
  heater: { ratedPowerW: 400, priceMinor: 5400, owned: true, clearanceM: null },
  exhaust: { maxAirflowM3H: 180, inputPowerW: 17, priceMinor: 6900, owned: true },
  circulation: { inputPowerW: 7 },
};

const water: DemoScenario['plan']['water'] = {
  reservoirL: 45,
  pump: { inputPowerW: 16 },
  flood: { minutes: 12, everyMinutes: 195 },
};
const schedules = [
  { id: 'long', onAt: '05:20', hours: 15.5 },
  { id: 'short', onAt: '06:10', hours: 14 },
];

export const skerryPoint: DemoGarden = {
  name: 'Skerry Point School’s kitchen-garden club',
  currency: 'GBP',
  people: [
    {
      name: 'Una Fairley',
      email: 'una@skerry-point.example',
      passphrase: 'salt wind over nine lanterns',
      unitSystem: 'metric',
      role: 'owner',
    },
    {
      name: 'Piet Haldane',
      email: 'piet@skerry-point.example',
      passphrase: 'two brass kettles sing at dusk',
      unitSystem: 'metric',
      role: 'tender',
    },
    {
      name: 'The caretaker',
      email: 'caretaker@skerry-point.example',
      passphrase: 'every key has its own blue hook',
      unitSystem: 'metric',
      role: 'viewer',
    },
  ],
  fixtures: {
    panel: {
      name: 'Square panel',
      spec: {
        inputPowerW: 132,
        rating: { kind: 'ppf', ppfUmolS: 344 },
        shape: 'rect',
        lengthM: 0.52,
        widthM: 0.46,
        distribution: { type: 'lambertian' },
        powerFactor: 0.96,
        priceMinor: 15900,
        owned: 1,
        lifeH: 50000,
      },
    },
    bar: {
      name: 'Long bar',
      spec: {
        inputPowerW: 38,
        rating: { kind: 'ppf', ppfUmolS: 101 },
        shape: 'rect',
        lengthM: 0.87,
        widthM: 0.055,
        distribution: { type: 'lambertian' },
        housingThicknessM: 0.03,
        powerFactor: 0.93,
        priceMinor: 5200,
        owned: 0,
      },
    },
    bulb: {
      name: 'Household bulb in a clamp',
      spec: {
        inputPowerW: 13,
        rating: { kind: 'lumens', lumens: 1330, colour: 'neutral' },
        shape: 'point',
        distribution: { type: 'cosinePower', beamAngleDeg: 115 },
        powerFactor: 0.7,
        priceMinor: 640,
        owned: 2,
      },
    },
  },
  room: {
    name: 'Boiler-house cellar',
    place: { latitudeDeg: 58.61, longitudeDeg: -3.52, timeZone: 'Europe/London', altitudeM: 14 },
    climate: {
      airTempC: {
        kind: 'monthly',
        values: [11.4, 11.1, 11.9, 13.2, 14.8, 16.5, 17.9, 18.3, 17.1, 15.2, 13.1, 11.9],
        dailySwingK: 2.2,
      },
      relHumidityPct: { kind: 'constant', value: 66 },
    },
    power: {
      supplyV: 230,
      circuits: [
        { id: 'ring', name: 'Cellar sockets', ratingA: 16, otherLoadsW: 260 },
        { id: 'spare', name: 'Workbench', ratingA: 10 },
      ],
      tariff: {
        kind: 'timeOfUse',
        currency: 'GBP',
        periods: [
          { price: 0.381, weekdays: 'weekday', from: '16:00', to: '19:00' },
          { price: 0.176, from: '00:30', to: '05:00' },
        ],
        otherwise: 0.264,
        taxPct: 5,
        householdBaseKwhPerMonth: 1900,
      },
    },
    residualCurrentDevice: 'yes',
  },
  tent: { name: 'Boiler-house tent', body: { widthM: 1.1, depthM: 0.7, heightM: 1.78 } },
  scenarios: [
    {
      name: 'Panel and two bars',
      note: 'A lamp for each tier: the panel on top, two bars under the upper shelf.',
      plan: {
        tiers,
        schedules,
        climate,
        water,
        placements: [
          hung({
            id: 'top',
            fixture: 'panel',
            tier: 'upper',
            at: [0.55, 0.35, 1.64],
            schedule: 'short',
            dimFrac: 0.72,
          }),
          hung({ id: 'bar-front', fixture: 'bar', tier: 'lower', at: [0.55, 0.2, 1.0], schedule: 'long' }),
          hung({ id: 'bar-back', fixture: 'bar', tier: 'lower', at: [0.55, 0.5, 1.0], schedule: 'long' }),
        ],
      },
    },
    {
      name: 'One panel on top',
      note: 'The same panel alone, at full output, and what falls past the upper shelf.',
      plan: {
        tiers,
        schedules,
        climate,
        water,
        placements: [hung({ id: 'top', fixture: 'panel', tier: 'upper', at: [0.55, 0.35, 1.66], schedule: 'long' })],
      },
    },
    {
      name: 'Panel and clamped bulbs',
      note: 'What the club had at first: two household bulbs over the lettuce.',
      plan: {
        tiers,
        schedules,
        climate,
        water,
        placements: [
          hung({
            id: 'top',
            fixture: 'panel',
            tier: 'upper',
            at: [0.55, 0.35, 1.64],
            schedule: 'short',
            dimFrac: 0.72,
          }),
          clamped({
            id: 'left',
            fixture: 'bulb',
            tier: 'lower',
            at: [0.18, 0.35, 0.9],
            schedule: 'long',
            swingDeg: 22,
          }),
          clamped({
            id: 'right',
            fixture: 'bulb',
            tier: 'lower',
            at: [0.92, 0.35, 0.9],
            schedule: 'long',
            swingDeg: -22,
          }),
        ],
      },
    },
  ],
};
