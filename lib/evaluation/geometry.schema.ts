import { z } from 'zod';
import type { Distribution, FaceReflectance } from '@/physics/light/light-documents';
import { expecting, list, misfit, oneOf, quantity, type Misfit } from './fields';

/** Lengths, places and patterns that both documents share. */
export const reflectance = () => quantity({ min: 0, max: 0.99, unit: 'of 1' });
export const share = () => quantity({ min: 0, max: 1, unit: 'of 1' });
/** A size of a tent: small enough for a shelf, large enough for a hall. */
export const size = () => quantity({ min: 0.1, max: 20, unit: 'm' });
export const coordinate = () => quantity({ min: -20, max: 20, unit: 'm' });

const threeNumbers = expecting('Give three numbers: x, y and z.', { range: 'three numbers', unit: '' });
export const vec3 = (of: () => z.ZodType<number>) => z.tuple([of(), of(), of()], { error: threeNumbers });
export const direction = z
  .tuple(
    [
      quantity({ min: -1e6, max: 1e6, unit: '' }),
      quantity({ min: -1e6, max: 1e6, unit: '' }),
      quantity({ min: -1e6, max: 1e6, unit: '' }),
    ],
    { error: expecting('Give a direction of three numbers.', { range: 'three numbers', unit: '' }) },
  )
  .refine(([x, y, z]) => Math.hypot(x, y, z) > 1e-9, {
    error: expecting('A direction needs a length: not all three numbers may be 0.', {
      range: 'not 0 0 0',
      unit: '',
    }),
  });

export const faceReflectanceSchema: z.ZodType<FaceReflectance> = z.strictObject({
  xMin: reflectance(),
  xMax: reflectance(),
  yMin: reflectance(),
  yMax: reflectance(),
  ceiling: reflectance(),
  floor: reflectance(),
});

const angle = (max: number) => quantity({ min: 0, max, unit: 'degrees' });
const relative = () => quantity({ min: 0, max: 1e9, unit: 'relative' });

const rising = (values: readonly number[]) => values.every((value, index) => index === 0 || value > values[index - 1]!);

const tableSchema = z
  .strictObject({
    type: z.literal('table'),
    gammaDeg: list(angle(180), { least: 2, most: 721 }),
    cDeg: list(angle(360), { least: 1, most: 361 }).optional(),
    intensity: z.union(
      [
        list(relative(), { least: 2, most: 721 }),
        list(list(relative(), { least: 2, most: 721 }), { least: 1, most: 361 }),
      ],
      {
        error: expecting('Give the intensities as one list, or as one list for each C-plane.', {
          range: 'one list, or one for each C-plane',
          unit: '',
        }),
      },
    ),
  })
  .superRefine((table, context) => {
    const say = (path: string, message: string, range: string, unit = '') =>
      context.addIssue(misfit({ path: [path], message, range, unit }));
    const angles = table.gammaDeg.length;
    if (!rising(table.gammaDeg) || table.gammaDeg[0] !== 0)
      say('gammaDeg', 'Angles must rise, beginning with 0.', '0 to 180, rising from 0', 'degrees');
    const planes = table.intensity.map((each) => (Array.isArray(each) ? each : null));
    if (planes.every((plane) => plane === null)) {
      if (table.cDeg && table.cDeg.length > 1)
        say('intensity', 'Several C-planes need one list of intensities each.', `${table.cDeg.length}`, 'lists');
      if (table.intensity.length !== angles)
        say('intensity', 'Give one intensity for each angle.', `${angles}`, 'entries');
    } else {
      const last = table.cDeg?.at(-1);
      if (!table.cDeg || table.cDeg.length !== planes.length)
        say('cDeg', 'Give one C-angle for each list of intensities.', `${planes.length}`, 'entries');
      else if (!rising(table.cDeg) || table.cDeg[0] !== 0 || (planes.length > 1 && ![90, 180, 360].includes(last!)))
        say('cDeg', 'C-angles must rise from 0 to 90, 180 or 360.', '0 to 90, 180 or 360, rising', 'degrees');
      if (planes.some((plane) => plane?.length !== angles))
        say('intensity', 'Each list needs one intensity for each angle.', `${angles} in each list`, 'entries');
    }
    if (!table.intensity.flat().some((value) => value > 0))
      say('intensity', 'At least one intensity must be above 0.', 'above 0 somewhere', 'relative');
  });

export const distributionSchema: z.ZodType<Distribution> = z.discriminatedUnion(
  'type',
  [
    z.strictObject({ type: z.literal('lambertian') }),
    z.strictObject({ type: z.literal('cosinePower'), beamAngleDeg: quantity({ min: 5, max: 170, unit: 'degrees' }) }),
    z.strictObject({ type: z.literal('isotropic') }),
    tableSchema,
  ],
  {
    error: expecting('Give a distribution of type lambertian, cosinePower, isotropic or table.', {
      range: 'type lambertian, cosinePower, isotropic or table',
      unit: '',
    }),
  },
);

export const shapeField = oneOf(['rect', 'point']);

interface Emitter {
  shape: 'rect' | 'point';
  length: number | undefined;
  width: number | undefined;
  distribution: Distribution;
}

/** What goes together for an emitter: a rectangle has two sides, a point none; only a point shines all round. */
export function emitterProblems(
  { shape, length, width, distribution }: Emitter,
  names: { length: string; width: string },
): Misfit[] {
  const side = (name: string, message: string, range: string): Misfit => ({ path: [name], message, range, unit: 'm' });
  if (shape === 'point')
    return [
      ...(length === undefined ? [] : [side(names.length, 'A point has no length.', 'left out')]),
      ...(width === undefined ? [] : [side(names.width, 'A point has no width.', 'left out')]),
    ];
  return [
    ...(length === undefined ? [side(names.length, 'A rectangle needs a length.', '0.001 to 10')] : []),
    ...(width === undefined ? [side(names.width, 'A rectangle needs a width.', '0.001 to 10')] : []),
    ...(distribution.type === 'isotropic'
      ? [
          {
            path: ['distribution'],
            message: 'Only a point shines all round.',
            range: 'type lambertian, cosinePower or table',
            unit: '',
          },
        ]
      : []),
  ];
}

/** An axis along the aim gives a face no way to be turned. */
export function axisProblems({ aim, axis }: { aim: readonly number[]; axis: readonly number[] }): Misfit[] {
  const [ax, ay, az] = aim as [number, number, number];
  const [bx, by, bz] = axis as [number, number, number];
  const cross = Math.hypot(ay * bz - az * by, az * bx - ax * bz, ax * by - ay * bx);
  if (cross > 1e-6 * Math.hypot(ax, ay, az) * Math.hypot(bx, by, bz)) return [];
  const message = 'The axis must not be parallel to the aim.';
  return [{ path: ['axis'], message, range: `not along ${aim.join(' ')}`, unit: '' }];
}
