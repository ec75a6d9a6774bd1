import { z } from 'zod';
import type { FaceReflectance, Vec3 } from '@/physics/light/light-documents';
import { clockEnd, clockTime, currencyCode, flag, idField, list, oneOf, quantity, timeZone, words } from './fields';
import {
  axisProblem,
  coordinate,
  direction,
  distributionSchema,
  emitterProblems,
  faceReflectanceSchema,
  reflectance,
  shapeField,
  share,
  size,
  vec3,
} from './geometry.schema';

/** The parts of scenario/1, each used by the document, by the rows that it is made of, and by their forms. */
const airTempC = () => quantity({ min: -40, max: 60, unit: '°C' });
const percent = () => quantity({ min: 0, max: 100, unit: '%' });
const priceMinor = () => quantity({ min: 0, max: 1e9, unit: 'minor units', integer: true });

export const placeSchema = z.strictObject({
  latitudeDeg: quantity({ min: -90, max: 90, unit: '°' }),
  longitudeDeg: quantity({ min: -180, max: 180, unit: '°' }),
  timeZone,
  altitudeM: quantity({ min: -430, max: 6000, unit: 'm' }),
});

export const seriesSchema = (value: () => z.ZodNumber, swing: () => z.ZodNumber) =>
  z.discriminatedUnion(
    'kind',
    [
      z.strictObject({ kind: z.literal('constant'), value: value() }),
      z.strictObject({
        kind: z.literal('monthly'),
        values: list(value(), { least: 12, most: 12 }),
        dailySwingK: swing().optional(),
      }),
      z.strictObject({ kind: z.literal('hourly'), values: list(value(), { least: 8760, most: 8784 }) }),
    ],
    { error: 'Give a series of kind constant, monthly or hourly.' },
  );

export const roomClimateSchema = z.strictObject({
  airTempC: seriesSchema(airTempC, () => quantity({ min: 0, max: 40, unit: 'K' })),
  relHumidityPct: seriesSchema(percent, () => quantity({ min: 0, max: 100, unit: '%' })).optional(),
  slabTempC: z
    .discriminatedUnion('kind', [
      z.strictObject({ kind: z.literal('offset'), value: quantity({ min: -30, max: 30, unit: 'K' }) }),
      z.strictObject({ kind: z.literal('constant'), value: airTempC() }),
    ])
    .optional(),
  designTempC: airTempC().optional(),
  hotDayTempC: airTempC().optional(),
});

export const portSchema = z.strictObject({
  kind: oneOf(['exhaust', 'intake', 'cable']),
  wall: oneOf(['xMin', 'xMax', 'yMin', 'yMax', 'ceiling']),
  atM: z.tuple([coordinate(), coordinate()], { error: 'Give two numbers: across and up.' }),
  diameterM: quantity({ min: 0.01, max: 1, unit: 'm' }),
});

export const tentBodySchema = z.strictObject({
  widthM: size(),
  depthM: size(),
  heightM: size(),
  liningReflectanceFrac: z.union([reflectance(), faceReflectanceSchema as z.ZodType<FaceReflectance>]).optional(),
  floorReflectanceFrac: reflectance().optional(),
  fabricUWM2K: quantity({ min: 0, max: 20, unit: 'W/m²K' }).optional(),
  floorUWM2K: quantity({ min: 0, max: 20, unit: 'W/m²K' }).optional(),
  leakageAch: quantity({ min: 0, max: 100, unit: 'an hour' }).optional(),
  liningEmittanceFrac: quantity({ min: 0.01, max: 1, unit: 'of 1' }).optional(),
  ports: list(portSchema, { most: 16 }).optional(),
});

export const boxSchema = z.strictObject({
  id: idField,
  min: vec3(coordinate),
  max: vec3(coordinate),
  reflectanceFrac: reflectance(),
});

const dli = () => quantity({ min: 0, max: 100, unit: 'mol/m²/d' });
const hours = () => quantity({ min: 0, max: 24, unit: 'h' });
const vpd = () => quantity({ min: 0, max: 6, unit: 'kPa' });

/** What a crop wants in a stage, without its name. */
export const targetFiguresSchema = z.strictObject({
  dliLowMolM2D: dli().optional(),
  dliTargetMolM2D: dli(),
  dliHighMolM2D: dli().optional(),
  photoperiodMinH: hours().optional(),
  photoperiodMaxH: hours().optional(),
  dayTempC: airTempC().optional(),
  nightTempC: airTempC().optional(),
  vpdLowKpa: vpd().optional(),
  vpdHighKpa: vpd().optional(),
});

export const targetSchema = targetFiguresSchema.extend({ crop: words({ most: 120 }), stage: words({ most: 60 }) });

export const tierShape = {
  id: idField,
  name: words({ most: 80 }).optional(),
  topHeightM: quantity({ min: 0, max: 20, unit: 'm' }),
  thicknessM: quantity({ min: 0, max: 1, unit: 'm' }).optional(),
  x0M: coordinate(),
  x1M: coordinate(),
  y0M: coordinate(),
  y1M: coordinate(),
  openFrac: share().optional(),
  topReflectanceFrac: reflectance().optional(),
  bottomReflectanceFrac: reflectance().optional(),
  edgeReflectanceFrac: reflectance().optional(),
  canopyHeightM: quantity({ min: 0, max: 5, unit: 'm' }).optional(),
  leafAreaIndex: quantity({ min: 0, max: 12, unit: 'm²/m²' }).optional(),
  canopyCoverFrac: share().optional(),
  sites: z
    .strictObject({
      rows: quantity({ min: 1, max: 100, unit: 'rows', integer: true }),
      columns: quantity({ min: 1, max: 100, unit: 'columns', integer: true }),
    })
    .optional(),
};

export const tierSchema = z.strictObject({ ...tierShape, target: targetSchema.nullish() });

export const fixtureShape = {
  inputPowerW: quantity({ min: 0, max: 20_000, unit: 'W' }),
  shape: shapeField,
  lengthM: quantity({ min: 0.001, max: 10, unit: 'm' }).optional(),
  widthM: quantity({ min: 0.001, max: 10, unit: 'm' }).optional(),
  distribution: distributionSchema,
  housingThicknessM: quantity({ min: 0, max: 1, unit: 'm' }).optional(),
  housingReflectanceFrac: reflectance().optional(),
  driverOutsideFrac: share().optional(),
  powerFactor: quantity({ min: 0.1, max: 1, unit: 'of 1' }).optional(),
  priceMinor: priceMinor().optional(),
  owned: quantity({ min: 0, max: 1000, unit: 'lamps', integer: true }).optional(),
  lifeH: quantity({ min: 0, max: 1e6, unit: 'h' }).optional(),
};

export const ppfField = () => quantity({ min: 0, max: 1e5, unit: 'µmol/s' });

/** What goes together in a lamp, as zod issues. */
export function checkEmitter(
  fixture: {
    shape: 'rect' | 'point';
    lengthM?: number | undefined;
    widthM?: number | undefined;
    distribution: z.infer<typeof distributionSchema>;
  },
  context: z.RefinementCtx,
) {
  const problems = emitterProblems(
    { ...fixture, length: fixture.lengthM, width: fixture.widthM },
    { length: 'lengthM', width: 'widthM' },
  );
  for (const { path, message } of problems) context.addIssue({ code: 'custom', path: [path], message });
}

export const fixtureTypeSchema = z
  .strictObject({ id: idField, name: words({ most: 120 }).optional(), ppfUmolS: ppfField(), ...fixtureShape })
  .superRefine(checkEmitter);

export const placementSchema = z
  .strictObject({
    id: idField,
    fixture: idField,
    tier: idField.nullish(),
    mount: oneOf(['hanging', 'clamped']).optional(),
    positionM: vec3(coordinate) as z.ZodType<Vec3>,
    aim: direction as z.ZodType<Vec3>,
    axis: direction as z.ZodType<Vec3>,
    dimFrac: share().optional(),
    schedule: idField,
  })
  .superRefine(({ aim, axis }, context) => {
    const parallel = axisProblem(aim, axis);
    if (parallel) context.addIssue({ code: 'custom', path: ['axis'], message: parallel });
  });

export const scheduleSchema = z.strictObject({ id: idField, onAt: clockTime, hours: hours() });

export const heaterSchema = z.strictObject({
  ratedPowerW: quantity({ min: 0, max: 20_000, unit: 'W' }),
  priceMinor: priceMinor().optional(),
  owned: flag().optional(),
  placeM: (vec3(coordinate) as z.ZodType<Vec3>).optional(),
  clearanceM: quantity({ min: 0, max: 5, unit: 'm' }).nullish(),
});

export const exhaustSchema = z.strictObject({
  maxAirflowM3H: quantity({ min: 0, max: 20_000, unit: 'm³/h' }),
  minAirflowM3H: quantity({ min: 0, max: 20_000, unit: 'm³/h' }).optional(),
  inputPowerW: quantity({ min: 0, max: 2000, unit: 'W' }),
  priceMinor: priceMinor().optional(),
  owned: flag().optional(),
});

export const climateSchema = z
  .strictObject({
    dayTempC: airTempC(),
    nightTempC: airTempC(),
    maxTempC: quantity({ min: -40, max: 80, unit: '°C' }),
    maxRelHumidityPct: percent().optional(),
    heater: heaterSchema.nullish(),
    exhaust: exhaustSchema.nullish(),
    circulation: z.strictObject({ inputPowerW: quantity({ min: 0, max: 2000, unit: 'W' }) }).nullish(),
  })
  .superRefine((climate, context) => {
    const warmest = Math.max(climate.dayTempC, climate.nightTempC);
    if (climate.maxTempC < warmest)
      context.addIssue({
        code: 'custom',
        path: ['maxTempC'],
        message: `The highest temperature must be at least the ${warmest} °C that is to be kept.`,
      });
    const fan = climate.exhaust;
    if (fan && (fan.minAirflowM3H ?? 0) > fan.maxAirflowM3H)
      context.addIssue({
        code: 'custom',
        path: ['exhaust', 'minAirflowM3H'],
        message: `The least airflow must not exceed the most, ${fan.maxAirflowM3H} m³/h.`,
      });
  });

const kgPerHour = () => quantity({ min: 0, max: 100, unit: 'kg/h' });

export const waterSchema = z
  .strictObject({
    reservoirL: quantity({ min: 0, max: 10_000, unit: 'L' }).optional(),
    coveredFrac: share().optional(),
    transpiration: z
      .discriminatedUnion('kind', [
        z.strictObject({ kind: z.literal('model') }),
        z.strictObject({ kind: z.literal('fixed'), lightKgH: kgPerHour(), darkKgH: kgPerHour() }),
      ])
      .optional(),
    pump: z.strictObject({ inputPowerW: quantity({ min: 0, max: 2000, unit: 'W' }) }).nullish(),
    flood: z
      .strictObject({
        minutes: quantity({ min: 0, max: 1440, unit: 'min' }),
        everyMinutes: quantity({ min: 1, max: 10_080, unit: 'min' }),
      })
      .optional(),
  })
  .superRefine(({ flood }, context) => {
    if (flood && flood.minutes > flood.everyMinutes)
      context.addIssue({
        code: 'custom',
        path: ['flood', 'minutes'],
        message: `A flood cannot last longer than its ${flood.everyMinutes} minutes.`,
      });
  });

export const circuitSchema = z.strictObject({
  id: idField,
  ratingA: quantity({ min: 1, max: 200, unit: 'A' }),
  otherLoadsW: quantity({ min: 0, max: 50_000, unit: 'W' }).optional(),
  carries: list(idField, { most: 80 }),
});

const price = () => quantity({ min: -10, max: 1000, unit: 'a kWh' });
const tariffCommon = {
  currency: currencyCode,
  fixedPerMonth: quantity({ min: 0, max: 1e6, unit: 'a month' }).optional(),
  taxPct: percent().optional(),
  householdBaseKwhPerMonth: quantity({ min: 0, max: 1e6, unit: 'kWh' }).optional(),
};

export const tariffPeriodSchema = z.strictObject({
  price: price(),
  weekdays: oneOf(['all', 'weekday', 'weekend']).optional(),
  from: clockTime,
  to: clockEnd,
  months: list(quantity({ min: 1, max: 12, unit: '', integer: true }), { least: 1, most: 12 }).optional(),
});

export const tariffSchema = z.discriminatedUnion(
  'kind',
  [
    z.strictObject({ ...tariffCommon, kind: z.literal('flat'), pricePerKwh: price() }),
    z.strictObject({
      ...tariffCommon,
      kind: z.literal('timeOfUse'),
      periods: list(tariffPeriodSchema, { most: 48 }),
      otherwise: price(),
    }),
    z
      .strictObject({
        ...tariffCommon,
        kind: z.literal('tiered'),
        tiers: list(
          z.strictObject({ upToKwh: quantity({ min: 0, max: 1e6, unit: 'kWh' }).optional(), price: price() }),
          { least: 1, most: 12 },
        ),
        prorateByDays: flag().optional(),
      })
      .superRefine(({ tiers }, context) => {
        tiers.forEach((tier, index) => {
          const last = index === tiers.length - 1;
          const before = tiers[index - 1]?.upToKwh ?? 0;
          if (last && tier.upToKwh !== undefined)
            context.addIssue({
              code: 'custom',
              path: ['tiers', index, 'upToKwh'],
              message: 'The last step has no end: leave upToKwh out.',
            });
          if (!last && (tier.upToKwh === undefined || tier.upToKwh <= before))
            context.addIssue({
              code: 'custom',
              path: ['tiers', index, 'upToKwh'],
              message: `This step must end above ${before} kWh.`,
            });
        });
      }),
  ],
  { error: 'Give a tariff of kind flat, timeOfUse or tiered.' },
);

export const supplyVoltage = () => quantity({ min: 90, max: 420, unit: 'V' });
export const co2Field = () => quantity({ min: 0, max: 3000, unit: 'g/kWh' });

export const powerSchema = z.strictObject({
  supplyV: supplyVoltage(),
  circuits: list(circuitSchema, { most: 32 }),
  tariff: tariffSchema,
  co2GKwh: co2Field().optional(),
});

export const calendarSchema = z.strictObject({ year: quantity({ min: 1900, max: 2200, unit: '', integer: true }) });

const bound = () => quantity({ min: -1e6, max: 1e6, unit: '' });
const pathMessage = 'Name the uncertain figure by its path, such as tent.fabricUWM2K.';
export const rangeSchema = z
  .record(
    z.string().regex(/^[A-Za-z0-9_.\-]{1,120}$/, { error: pathMessage }),
    z.tuple([bound(), bound()], { error: 'Give two numbers: low and high.' }),
  )
  .refine((ranges) => Object.values(ranges).every(([low, high]) => low <= high), {
    error: 'The low end must not exceed the high one.',
  })
  .refine((ranges) => Object.keys(ranges).length <= 64, { error: 'At most 64 ranges.' });

export const appSchema = z.record(z.string(), z.unknown());
