import { z } from 'zod';
import type { ScenarioDocument } from '@/physics/plan/scenario-document';
import { list, words } from './fields';
import { MOST_BOXES, MOST_FIXTURES, MOST_SENSORS, MOST_SLABS, outside, repeated } from './light-scene.schema';
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
  schema: z.literal('scenario/1', { error: 'Give the schema scenario/1.' }),
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

type Say = (path: PropertyKey[], message: string) => void;
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
    if (bad) say(['boxes', index], 'The box must lie within the tent, with each figure of max at least that of min.');
  });
  const tierIds = new Set(rack.tiers.map((tier) => tier.id));
  const scheduleIds = new Set(rack.schedules.map((schedule) => schedule.id));
  rack.placements.forEach((placement, index) => {
    const path = ['placements', index];
    [widthM, depthM, heightM].forEach((most, axis) => {
      if (outside(placement.positionM[axis]!, most))
        say([...path, 'positionM', axis], `Stay within the tent: 0 to ${most} m.`);
    });
    if (!fixtureIds.has(placement.fixture)) say([...path, 'fixture'], 'There is no fixture of this id.');
    if (placement.tier && !tierIds.has(placement.tier)) say([...path, 'tier'], 'There is no tier of this id.');
    if (!scheduleIds.has(placement.schedule)) say([...path, 'schedule'], 'There is no schedule of this id.');
  });
  for (const key of ['tiers', 'placements', 'schedules'] as const)
    repeated(rack[key]).forEach((index) => say([key, index, 'id'], 'This id is used twice.'));
  if (rack.boxes) repeated(rack.boxes).forEach((index) => say(['boxes', index, 'id'], 'This id is used twice.'));
}

function checkTiers({ tent, tiers }: Rack, say: Say): void {
  let sensors = 0;
  tiers.forEach((tier, index) => {
    const path = ['tiers', index];
    const extents = [
      ['x0M', 'x1M', tent.widthM],
      ['y0M', 'y1M', tent.depthM],
    ] as const;
    for (const [from, to, most] of extents) {
      if (tier[to] - tier[from] < 0.01) say([...path, to], `${to} must be at least 1 cm more than ${from}.`);
      for (const key of [from, to])
        if (outside(tier[key], most)) say([...path, key], `Stay within the tent: 0 to ${most} m.`);
    }
    if (outside(tier.topHeightM, tent.heightM))
      say([...path, 'topHeightM'], `Stay within the tent: 0 to ${tent.heightM} m.`);
    if ((tier.thicknessM ?? 0) > tier.topHeightM + 1e-9)
      say([...path, 'thicknessM'], 'The tier would reach below the floor.');
    if (outside(tier.topHeightM + (tier.canopyHeightM ?? 0), tent.heightM))
      say([...path, 'canopyHeightM'], 'The leaves would stand above the tent.');
    sensors += Math.ceil((tier.x1M - tier.x0M) / CELL_M) * Math.ceil((tier.y1M - tier.y0M) / CELL_M);
  });
  if (sensors > MOST_SENSORS)
    say(['tiers'], `These tiers need ${sensors} sensor cells; at most ${MOST_SENSORS} are reckoned.`);
}

function checkHours(document: ScenarioDocument, say: Say): void {
  const year = document.calendar?.year ?? 2026;
  const leap = (year % 4 === 0 && year % 100 !== 0) || year % 400 === 0;
  const wanted = leap ? 8784 : 8760;
  for (const key of ['airTempC', 'relHumidityPct'] as const) {
    const series = document.room[key];
    if (series?.kind === 'hourly' && series.values.length !== wanted)
      say(['room', key, 'values'], `The year ${year} has ${wanted} hours; these are ${series.values.length}.`);
  }
}

function checkCircuits({ power, placements }: ScenarioDocument, say: Say): void {
  const known = new Set([
    'light',
    'heater',
    'exhaust',
    'circulation',
    'pump',
    ...placements.map((placement) => placement.id),
  ]);
  const carried = new Set<string>();
  repeated(power.circuits).forEach((index) => say(['power', 'circuits', index, 'id'], 'This id is used twice.'));
  power.circuits.forEach((circuit, index) =>
    circuit.carries.forEach((load, at) => {
      const path = ['power', 'circuits', index, 'carries', at];
      if (!known.has(load))
        say(path, 'Name a kind of load (light, heater, exhaust, circulation, pump) or a placement.');
      else if (carried.has(load)) say(path, 'This load hangs on another circuit already.');
      carried.add(load);
    }),
  );
}

export const scenarioSchema: z.ZodType<ScenarioDocument> = scenarioShape.superRefine((document, context) => {
  const say: Say = (path, message) => context.addIssue({ code: 'custom', path, message });
  checkRack(document, new Set(document.fixtures.map((fixture) => fixture.id)), say);
  repeated(document.fixtures).forEach((index) => say(['fixtures', index, 'id'], 'This id is used twice.'));
  checkHours(document, say);
  checkCircuits(document, say);
});
