import { z } from 'zod';
import type { FaceReflectance, Vec3 } from '@/physics/light/light-documents';
import { clockTime, expecting, flag, idField, list, misfit, oneOf, quantity, timeZone, words } from './fields';
import {
  axisProblems,
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
import { tariffSchema } from './tariff.schema';

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
    {
      error: expecting('Give a series of kind constant, monthly or hourly.', {
        range: 'kind constant, monthly or hourly',
        unit: '',
      }),
    },
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
  atM: z.tuple([coordinate(), coordinate()], {
    error: expecting('Give two numbers: across and up.', { range: 'two numbers', unit: 'm' }),
  }),
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
  for (const problem of problems) context.addIssue(misfit(problem));
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
  .superRefine((placement, context) => {
    for (const problem of axisProblems(placement)) context.addIssue(misfit(problem));
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
      context.addIssue(
        misfit({
          path: ['maxTempC'],
          message: `The highest temperature must be at least the ${warmest} °C that is to be kept.`,
          range: `${warmest} to 80`,
          unit: '°C',
        }),
      );
    const fan = climate.exhaust;
    if (fan && (fan.minAirflowM3H ?? 0) > fan.maxAirflowM3H)
      context.addIssue(
        misfit({
          path: ['exhaust', 'minAirflowM3H'],
          message: `The least airflow must not exceed the most, ${fan.maxAirflowM3H} m³/h.`,
          range: `0 to ${fan.maxAirflowM3H}`,
          unit: 'm³/h',
        }),
      );
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
      context.addIssue(
        misfit({
          path: ['flood', 'minutes'],
          message: `A flood cannot last longer than its ${flood.everyMinutes} minutes.`,
          range: `0 to ${flood.everyMinutes}`,
          unit: 'min',
        }),
      );
  });

export const circuitSchema = z.strictObject({
  id: idField,
  ratingA: quantity({ min: 1, max: 200, unit: 'A' }),
  otherLoadsW: quantity({ min: 0, max: 50_000, unit: 'W' }).optional(),
  carries: list(idField, { most: 80 }),
});

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
const pathMessage = expecting('Name the uncertain figure by its path, such as tent.fabricUWM2K.', {
  range: '1 to 120 of a-z A-Z 0-9 . _ -',
  unit: '',
});
export const rangeSchema = z
  .record(
    z.string().regex(/^[A-Za-z0-9_.\-]{1,120}$/, { error: pathMessage }),
    z.tuple([bound(), bound()], {
      error: expecting('Give two numbers: low and high.', { range: 'two numbers', unit: '' }),
    }),
  )
  .refine((ranges) => Object.values(ranges).every(([low, high]) => low <= high), {
    error: expecting('The low end must not exceed the high one.', { range: 'low to high', unit: '' }),
  })
  .refine((ranges) => Object.keys(ranges).length <= 64, {
    error: expecting('At most 64 ranges.', { range: '0 to 64', unit: 'entries' }),
  });

export const appSchema = z.record(z.string(), z.unknown());
