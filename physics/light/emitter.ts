import { DomainError, requireWithin } from '../domain-error';
import { beamShapeOf, intensityOf, type BeamShape, type Intensity } from './distribution';
import type { Distribution, SceneFixture, Vec3 } from './light-documents';
import { createOccluder, type Occluder } from './occluder';
import { add, cross, dot, length, scale, subtract, unit } from './vector';

/** A lamp made ready: its frame, its face and its body. */
export interface Emitter {
  id: string;
  position: Vec3;
  /** Optical axis, direction of C = 0, and the third: axis × aim, so that aimed down with axis +x it is +y. */
  aim: Vec3;
  axis: Vec3;
  side: Vec3;
  ppf: number;
  distribution: Distribution;
  intensity: Intensity;
  lambertian: boolean;
  beam: BeamShape;
  /** null for a point. */
  face: LampFace | null;
  /** What it hides of other lamps; null for a point. */
  body: Occluder | null;
  bodyReflectance: number;
  bodyThicknessM: number;
}

export interface LampFace {
  lengthM: number;
  widthM: number;
  areaM2: number;
  /** Four corners in order, three numbers each. */
  polygon: Float64Array;
}

function frameOf(aimGiven: Vec3, axisGiven: Vec3): Pick<Emitter, 'aim' | 'axis' | 'side'> {
  if (!(length(aimGiven) > 0))
    throw new DomainError({
      quantity: 'length of the aim',
      value: length(aimGiven),
      min: 1e-9,
      max: Infinity,
      unit: '',
    });
  const aim = unit(aimGiven);
  const flat = subtract(axisGiven, scale(aim, dot(axisGiven, aim)));
  if (!(length(flat) > 1e-9)) {
    throw new DomainError({
      quantity: 'part of the axis square to the aim',
      value: length(flat),
      min: 1e-9,
      max: Infinity,
      unit: '',
    });
  }
  const axis = unit(flat);
  return { aim, axis, side: cross(axis, aim) };
}

export function createEmitter(fixture: SceneFixture): Emitter {
  const frame = frameOf(fixture.aim, fixture.axis);
  requireWithin({ quantity: 'photon flux of a lamp', value: fixture.ppf, min: 0, max: 1e6, unit: 'µmol/s' });
  const common = {
    id: fixture.id,
    position: fixture.position,
    ...frame,
    ppf: fixture.ppf,
    intensity: intensityOf(fixture.distribution),
    beam: beamShapeOf(fixture.distribution),
    distribution: fixture.distribution,
    lambertian: fixture.distribution.type === 'lambertian',
  };
  if (fixture.shape === 'point') return { ...common, face: null, body: null, bodyReflectance: 0, bodyThicknessM: 0 };
  if (fixture.distribution.type === 'isotropic')
    throw new DomainError({
      quantity: 'length of a lamp that shines alike to all sides',
      value: fixture.length,
      min: 0,
      max: 0,
      unit: 'm; such a lamp is a point',
    });
  const lengthM = fixture.length ?? 0;
  const widthM = fixture.width ?? 0;
  if (!(lengthM > 0))
    throw new DomainError({ quantity: 'length of the face', value: lengthM, min: 0.001, max: 10, unit: 'm' });
  if (!(widthM > 0))
    throw new DomainError({ quantity: 'width of the face', value: widthM, min: 0.001, max: 10, unit: 'm' });
  const u = scale(frame.axis, lengthM / 2);
  const v = scale(frame.side, widthM / 2);
  const corner = (a: number, b: number) => add(fixture.position, add(scale(u, a), scale(v, b)));
  const bodyThicknessM = fixture.housing?.thickness ?? 0;
  return {
    ...common,
    face: {
      lengthM,
      widthM,
      areaM2: lengthM * widthM,
      polygon: Float64Array.from([corner(-1, -1), corner(1, -1), corner(1, 1), corner(-1, 1)].flat()),
    },
    body: createOccluder({
      centre: subtract(fixture.position, scale(frame.aim, bodyThicknessM / 2)),
      axes: [frame.axis, frame.side, frame.aim],
      half: [lengthM / 2, widthM / 2, bodyThicknessM / 2],
      stops: 1,
    }),
    bodyReflectance: fixture.housing?.reflectance ?? 0,
    bodyThicknessM,
  };
}
