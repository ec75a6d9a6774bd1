import { z } from 'zod';
import type { LightScene } from '@/physics/light/light-documents';
import { expecting, idField, list, misfit, quantity, words, type Misfit } from './fields';
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
  schema: z.literal('light-scene/1', {
    error: expecting('Give the schema light-scene/1.', { range: 'light-scene/1', unit: '' }),
  }),
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

/** Beyond a tent's side, edges included. A side that is no length is wrong itself, and that is told once, where it stands. */
export function outside(value: number, most: number): boolean {
  return most > 0 && (value < -TOUCH || value > most + TOUCH);
}

export const insideTent = (path: PropertyKey[], most: number): Misfit => ({
  path,
  message: `Stay within the tent: 0 to ${most} m.`,
  range: `0 to ${most}`,
  unit: 'm',
});

export const usedTwice = (path: PropertyKey[]): Misfit => ({
  path,
  message: 'This id is used twice.',
  range: 'an id of its own',
  unit: '',
});

export const lightSceneSchema: z.ZodType<LightScene> = sceneShape.superRefine((scene, context) => {
  const say = (problem: Misfit) => context.addIssue(misfit(problem));
  const { width, depth, height } = scene.tent;
  const within = (path: PropertyKey[], extent: { x0: number; x1: number; y0: number; y1: number }) => {
    const sides = [
      ['x0', 'x1', width],
      ['y0', 'y1', depth],
    ] as const;
    for (const [from, to, most] of sides) {
      if (extent[to] <= extent[from])
        say({
          path: [...path, to],
          message: `${to} must be greater than ${from}.`,
          range: `more than ${extent[from]}, to ${most}`,
          unit: 'm',
        });
      for (const key of [from, to]) if (outside(extent[key], most)) say(insideTent([...path, key], most));
    }
  };
  scene.slabs.forEach((slab, index) => {
    within(['slabs', index], slab);
    if (outside(slab.zTop, height)) say(insideTent(['slabs', index, 'zTop'], height));
    if (slab.openFraction === 0 && slab.thickness > slab.zTop + TOUCH)
      say({
        path: ['slabs', index, 'thickness'],
        message: 'The slab would reach below the floor.',
        range: `0 to ${slab.zTop}`,
        unit: 'm',
      });
  });
  scene.boxes.forEach((box, index) => {
    const most = [width, depth, height];
    if (box.min.some((value, axis) => box.max[axis]! < value))
      say({
        path: ['boxes', index, 'max'],
        message: 'Every figure of max must be at least that of min.',
        range: `from ${box.min.join(' ')}`,
        unit: 'm',
      });
    if (most.some((side, axis) => outside(box.min[axis]!, side) || outside(box.max[axis]!, side)))
      say({
        path: ['boxes', index],
        message: 'The box must lie within the tent.',
        range: `0 0 0 to ${most.join(' ')}`,
        unit: 'm',
      });
  });
  scene.fixtures.forEach((fixture, index) => {
    const path = ['fixtures', index];
    [width, depth, height].forEach((most, axis) => {
      if (outside(fixture.position[axis]!, most)) say(insideTent([...path, 'position', axis], most));
    });
    for (const problem of [
      ...axisProblems(fixture),
      ...emitterProblems(
        { ...fixture, length: fixture.length, width: fixture.width },
        { length: 'length', width: 'width' },
      ),
    ])
      say({ ...problem, path: [...path, ...problem.path] });
  });
  let sensors = 0;
  scene.planes.forEach((plane, index) => {
    within(['planes', index], plane);
    if (outside(plane.z, height)) say(insideTent(['planes', index, 'z'], height));
    sensors += plane.nx * plane.ny;
  });
  if (sensors > MOST_SENSORS)
    say({
      path: ['planes'],
      message: `At most ${MOST_SENSORS} sensor cells in all; these are ${sensors}.`,
      range: `0 to ${MOST_SENSORS}`,
      unit: 'cells',
    });
  for (const key of ['slabs', 'boxes', 'fixtures', 'planes'] as const)
    repeated(scene[key]).forEach((index) => say(usedTwice([key, index, 'id'])));
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
