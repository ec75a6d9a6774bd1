import { z } from 'zod';
import type { ScenarioDocument } from '@/physics/plan/scenario-document';
import { expecting, list, misfit, words, type Misfit } from './fields';
import {
  insideTent,
  MOST_BOXES,
  MOST_FIXTURES,
  MOST_SENSORS,
  MOST_SLABS,
  outside,
  repeated,
  usedTwice,
} from './light-scene.schema';
import {
  appSchema,
  boxSchema,
  calendarSchema,
  climateSchema,
  fixtureTypeSchema,
  placementSchema,
  placeSchema,
  powerSchema,
  rangeSchema,
  roomClimateSchema,
  scheduleSchema,
  tentBodySchema,
  tierSchema,
  waterSchema,
} from './scenario-fields';

const scenarioShape = z.strictObject({
  schema: z.literal('scenario/1', {
    error: expecting('Give the schema scenario/1.', { range: 'scenario/1', unit: '' }),
  }),
  name: words({ most: 200 }),
  calendar: calendarSchema.optional(),
  place: placeSchema,
  room: roomClimateSchema,
  tent: tentBodySchema,
  boxes: list(boxSchema, { most: MOST_BOXES }).optional(),
  tiers: list(tierSchema, { most: MOST_SLABS }),
  fixtures: list(fixtureTypeSchema, { most: 64 }),
  placements: list(placementSchema, { most: MOST_FIXTURES }),
  schedules: list(scheduleSchema, { most: 64 }),
  climate: climateSchema,
  water: waterSchema.optional(),
  power: powerSchema,
  range: rangeSchema.optional(),
  app: appSchema.optional(),
});

type Say = (problem: Misfit) => void;
type Rack = Pick<ScenarioDocument, 'tent' | 'tiers' | 'placements' | 'schedules' | 'boxes'>;

/** Sensor cells are at most this wide; see physics/light/tier-light.ts. */
const CELL_M = 0.1;

/** What must hold between the parts of a rack: everything inside the tent, every name used once, every reference met. */
export function checkRack(rack: Rack, fixtureIds: ReadonlySet<string>, say: Say): void {
  const { widthM, depthM, heightM } = rack.tent;
  checkTiers(rack, say);
  rack.boxes?.forEach((box, index) => {
    const most = [widthM, depthM, heightM];
    const bad = box.min.some(
      (value, axis) => box.max[axis]! < value || outside(value, most[axis]!) || outside(box.max[axis]!, most[axis]!),
    );
    if (bad)
      say({
        path: ['boxes', index],
        message: 'The box must lie within the tent, with each figure of max at least that of min.',
        range: `0 0 0 to ${most.join(' ')}`,
        unit: 'm',
      });
  });
  const tierIds = new Set(rack.tiers.map((tier) => tier.id));
  const scheduleIds = new Set(rack.schedules.map((schedule) => schedule.id));
  rack.placements.forEach((placement, index) => {
    const path = ['placements', index];
    [widthM, depthM, heightM].forEach((most, axis) => {
      if (outside(placement.positionM[axis]!, most)) say(insideTent([...path, 'positionM', axis], most));
    });
    if (!fixtureIds.has(placement.fixture)) say(unknownId([...path, 'fixture'], 'fixture'));
    if (placement.tier && !tierIds.has(placement.tier)) say(unknownId([...path, 'tier'], 'tier'));
    if (!scheduleIds.has(placement.schedule)) say(unknownId([...path, 'schedule'], 'schedule'));
  });
  for (const key of ['tiers', 'placements', 'schedules'] as const)
    repeated(rack[key]).forEach((index) => say(usedTwice([key, index, 'id'])));
  if (rack.boxes) repeated(rack.boxes).forEach((index) => say(usedTwice(['boxes', index, 'id'])));
}

const unknownId = (path: PropertyKey[], what: string): Misfit => ({
  path,
  message: `There is no ${what} of this id.`,
  range: `the id of a ${what}`,
  unit: '',
});

function checkTiers({ tent, tiers }: Rack, say: Say): void {
  let sensors = 0;
  tiers.forEach((tier, index) => {
    const path = ['tiers', index];
    const extents = [
      ['x0M', 'x1M', tent.widthM],
      ['y0M', 'y1M', tent.depthM],
    ] as const;
    for (const [from, to, most] of extents) {
      if (tier[to] - tier[from] < 0.01)
        say({
          path: [...path, to],
          message: `${to} must be at least 1 cm more than ${from}.`,
          range: `${metres(tier[from] + 0.01)} to ${most}`,
          unit: 'm',
        });
      for (const key of [from, to]) if (outside(tier[key], most)) say(insideTent([...path, key], most));
    }
    if (outside(tier.topHeightM, tent.heightM)) say(insideTent([...path, 'topHeightM'], tent.heightM));
    if ((tier.thicknessM ?? 0) > tier.topHeightM + 1e-9)
      say({
        path: [...path, 'thicknessM'],
        message: 'The tier would reach below the floor.',
        range: `0 to ${tier.topHeightM}`,
        unit: 'm',
      });
    if (outside(tier.topHeightM + (tier.canopyHeightM ?? 0), tent.heightM))
      say({
        path: [...path, 'canopyHeightM'],
        message: 'The leaves would stand above the tent.',
        range: `0 to ${metres(Math.max(0, tent.heightM - tier.topHeightM))}`,
        unit: 'm',
      });
    sensors += Math.ceil((tier.x1M - tier.x0M) / CELL_M) * Math.ceil((tier.y1M - tier.y0M) / CELL_M);
  });
  if (sensors > MOST_SENSORS)
    say({
      path: ['tiers'],
      message: `These tiers need ${sensors} sensor cells; at most ${MOST_SENSORS} are reckoned.`,
      range: `0 to ${MOST_SENSORS}`,
      unit: 'cells',
    });
}

/** To the millimetre, as it is printed. */
const metres = (value: number) => Math.round(value * 1000) / 1000;

function checkHours(document: ScenarioDocument, say: Say): void {
  const year = document.calendar?.year ?? 2026;
  const leap = (year % 4 === 0 && year % 100 !== 0) || year % 400 === 0;
  const wanted = leap ? 8784 : 8760;
  for (const key of ['airTempC', 'relHumidityPct'] as const) {
    const series = document.room[key];
    if (series?.kind === 'hourly' && series.values.length !== wanted)
      say({
        path: ['room', key, 'values'],
        message: `The year ${year} has ${wanted} hours; these are ${series.values.length}.`,
        range: String(wanted),
        unit: 'entries',
      });
  }
}

const LOAD_KINDS = ['light', 'heater', 'exhaust', 'circulation', 'pump'];

function checkCircuits({ power, placements }: ScenarioDocument, say: Say): void {
  const known = new Set([...LOAD_KINDS, ...placements.map((placement) => placement.id)]);
  const carried = new Set<string>();
  repeated(power.circuits).forEach((index) => say(usedTwice(['power', 'circuits', index, 'id'])));
  power.circuits.forEach((circuit, index) =>
    circuit.carries.forEach((load, at) => {
      const path = ['power', 'circuits', index, 'carries', at];
      const range = `${LOAD_KINDS.join(', ')} or the id of a placement, each on one circuit`;
      if (!known.has(load))
        say({ path, message: `Name a kind of load (${LOAD_KINDS.join(', ')}) or a placement.`, range, unit: '' });
      else if (carried.has(load))
        say({ path, message: 'This load hangs on another circuit already.', range, unit: '' });
      carried.add(load);
    }),
  );
}

export const scenarioSchema: z.ZodType<ScenarioDocument> = scenarioShape.superRefine((document, context) => {
  const say: Say = (problem) => context.addIssue(misfit(problem));
  checkRack(document, new Set(document.fixtures.map((fixture) => fixture.id)), say);
  repeated(document.fixtures).forEach((index) => say(usedTwice(['fixtures', index, 'id'])));
  checkHours(document, say);
  checkCircuits(document, say);
});
