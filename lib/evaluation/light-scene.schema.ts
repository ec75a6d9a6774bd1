import { z } from 'zod';
import type { LightScene } from '@/physics/light/light-documents';
import { idField, list, quantity, words } from './fields';
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

export const MOST_SLABS = 8;
export const MOST_FIXTURES = 64;
export const MOST_BOXES = 32;
export const MOST_SENSORS = 20_000;

const slabSchema = z.strictObject({
  id: idField,
  zTop: quantity({ min: 0, max: 20, unit: 'm' }),
  thickness: quantity({ min: 0, max: 2, unit: 'm' }),
  x0: coordinate(),
  x1: coordinate(),
  y0: coordinate(),
  y1: coordinate(),
  reflectanceTop: reflectance(),
  reflectanceBottom: reflectance(),
  reflectanceEdge: reflectance(),
  openFraction: share(),
});

const boxSchema = z.strictObject({
  id: idField,
  min: vec3(coordinate),
  max: vec3(coordinate),
  reflectance: reflectance(),
});

const fixtureSchema = z.strictObject({
  id: idField,
  shape: shapeField,
  position: vec3(coordinate),
  aim: direction,
  axis: direction,
  length: quantity({ min: 0.001, max: 10, unit: 'm' }).optional(),
  width: quantity({ min: 0.001, max: 10, unit: 'm' }).optional(),
  ppf: quantity({ min: 0, max: 1e6, unit: 'µmol/s' }),
  distribution: distributionSchema,
  housing: z.strictObject({ thickness: quantity({ min: 0, max: 1, unit: 'm' }), reflectance: reflectance() }).nullish(),
});

const planeSchema = z.strictObject({
  id: idField,
  slab: idField.nullish(),
  z: quantity({ min: 0, max: 20, unit: 'm' }),
  x0: coordinate(),
  x1: coordinate(),
  y0: coordinate(),
  y1: coordinate(),
  nx: quantity({ min: 1, max: MOST_SENSORS, unit: 'cells', integer: true }),
  ny: quantity({ min: 1, max: MOST_SENSORS, unit: 'cells', integer: true }),
});

const sceneShape = z.strictObject({
  schema: z.literal('light-scene/1', { error: 'Give the schema light-scene/1.' }),
  id: words({ most: 200 }).optional(),
  title: z.unknown().optional(),
  covers: z.unknown().optional(),
  units: words({ most: 200, least: 0 }).optional(),
  tent: z.strictObject({ width: size(), depth: size(), height: size(), reflectance: faceReflectanceSchema }),
  slabs: list(slabSchema, { most: MOST_SLABS }),
  boxes: list(boxSchema, { most: MOST_BOXES }),
  fixtures: list(fixtureSchema, { most: MOST_FIXTURES }),
  planes: list(planeSchema, { most: 64 }),
});

const TOUCH = 1e-9;

/** Within the tent, edges included. */
export function outside(value: number, most: number): boolean {
  return value < -TOUCH || value > most + TOUCH;
}

export const lightSceneSchema: z.ZodType<LightScene> = sceneShape.superRefine((scene, context) => {
  const say = (path: PropertyKey[], message: string) => context.addIssue({ code: 'custom', path, message });
  const { width, depth, height } = scene.tent;
  const within = (path: PropertyKey[], extent: { x0: number; x1: number; y0: number; y1: number }, flat: boolean) => {
    if (flat ? extent.x1 <= extent.x0 : extent.x1 < extent.x0) say([...path, 'x1'], 'x1 must be greater than x0.');
    if (flat ? extent.y1 <= extent.y0 : extent.y1 < extent.y0) say([...path, 'y1'], 'y1 must be greater than y0.');
    for (const key of ['x0', 'x1'] as const)
      if (outside(extent[key], width)) say([...path, key], `Stay within the tent: 0 to ${width} m.`);
    for (const key of ['y0', 'y1'] as const)
      if (outside(extent[key], depth)) say([...path, key], `Stay within the tent: 0 to ${depth} m.`);
  };
  scene.slabs.forEach((slab, index) => {
    within(['slabs', index], slab, true);
    if (outside(slab.zTop, height)) say(['slabs', index, 'zTop'], `Stay within the tent: 0 to ${height} m.`);
    if (slab.openFraction === 0 && slab.thickness > slab.zTop + TOUCH)
      say(['slabs', index, 'thickness'], 'The slab would reach below the floor.');
  });
  scene.boxes.forEach((box, index) => {
    const most = [width, depth, height];
    box.min.forEach((value, axis) => {
      if (box.max[axis]! < value) say(['boxes', index, 'max'], 'Every figure of max must be at least that of min.');
      if (outside(value, most[axis]!) || outside(box.max[axis]!, most[axis]!))
        say(['boxes', index], 'The box must lie within the tent.');
    });
  });
  scene.fixtures.forEach((fixture, index) => {
    const path = ['fixtures', index];
    [width, depth, height].forEach((most, axis) => {
      if (outside(fixture.position[axis]!, most))
        say([...path, 'position', axis], `Stay within the tent: 0 to ${most} m.`);
    });
    const parallel = axisProblem(fixture.aim, fixture.axis);
    if (parallel) say([...path, 'axis'], parallel);
    for (const problem of emitterProblems(
      { ...fixture, length: fixture.length, width: fixture.width },
      { length: 'length', width: 'width' },
    ))
      say([...path, problem.path], problem.message);
  });
  let sensors = 0;
  scene.planes.forEach((plane, index) => {
    within(['planes', index], plane, true);
    if (outside(plane.z, height)) say(['planes', index, 'z'], `Stay within the tent: 0 to ${height} m.`);
    sensors += plane.nx * plane.ny;
  });
  if (sensors > MOST_SENSORS) say(['planes'], `At most ${MOST_SENSORS} sensor cells in all; these are ${sensors}.`);
  for (const key of ['slabs', 'boxes', 'fixtures', 'planes'] as const)
    repeated(scene[key]).forEach((index) => say([key, index, 'id'], 'This id is used twice.'));
});

/** The places of ids that an earlier entry has already. */
export function repeated(entries: readonly { id: string }[]): number[] {
  const seen = new Set<string>();
  return entries.flatMap(({ id }, index) => {
    if (seen.has(id)) return [index];
    seen.add(id);
    return [];
  });
}
