import type { Emitter } from './emitter';
import type { LightScene, Vec3 } from './light-documents';
import type { Occluder } from './occluder';
import type { Solid } from './scene-geometry';
import { add, scale, subtract } from './vector';
import { lowerReflectance } from './zones';

/** A rectangle that light meets: a wall, a tier's top, a pipe's side, a lamp's face. */
export interface Surface {
  /** First corner, and the two sides from it, metres. */
  corner: Vec3;
  u: Vec3;
  v: Vec3;
  /** Unit vector into the air before it. */
  normal: Vec3;
  reflectance: number;
  /** The share of its area that is there: less than 1 for a mesh. */
  solidShare: number;
  /** The largest cell wanted along u and v, as a share of the mesh's cell. */
  grain: readonly [number, number];
}

const X: Vec3 = [1, 0, 0];
const Y: Vec3 = [0, 1, 0];
const Z: Vec3 = [0, 0, 1];

/** Walls take the light through the gaps beside tiers and pass it down: half a cell there, which the lowest tiers need. */
const WALL_GRAIN = [0.5, 0.5] as const;
const PLAN_GRAIN = [1.2, 1.2] as const;
/** Thin sides of tiers, pipes and lamps matter little each: long cells. */
const SIDE_GRAIN = [2, 2] as const;

function tentSurfaces({ tent }: LightScene): Surface[] {
  const { width, depth, height, reflectance } = tent;
  const [x, y, z] = [scale(X, width), scale(Y, depth), scale(Z, height)];
  const wall = (corner: Vec3, u: Vec3, normal: Vec3, rho: number): Surface => ({
    corner,
    u,
    v: z,
    normal,
    reflectance: rho,
    solidShare: 1,
    grain: WALL_GRAIN,
  });
  const plan = (corner: Vec3, normal: Vec3, rho: number): Surface => ({
    corner,
    u: x,
    v: y,
    normal,
    reflectance: rho,
    solidShare: 1,
    grain: PLAN_GRAIN,
  });
  return [
    wall([0, 0, 0], y, X, reflectance.xMin),
    wall([width, 0, 0], y, [-1, 0, 0], reflectance.xMax),
    wall([0, 0, 0], x, Y, reflectance.yMin),
    wall([0, depth, 0], x, [0, -1, 0], reflectance.yMax),
    plan([0, 0, 0], Z, reflectance.floor),
    plan([0, 0, height], [0, 0, -1], reflectance.ceiling),
  ];
}

/** One face of a box: the axis that it is square to, and which of the two. */
function faceOf(box: Occluder, axis: 0 | 1 | 2, side: 1 | -1): Pick<Surface, 'corner' | 'u' | 'v' | 'normal'> {
  const { centre, axes, half } = box;
  const [a, b] = [axes[(axis + 1) % 3]!, axes[(axis + 2) % 3]!];
  const [ha, hb] = [half[(axis + 1) % 3]!, half[(axis + 2) % 3]!];
  const middle = add(centre, scale(axes[axis], side * half[axis]));
  return {
    corner: subtract(subtract(middle, scale(a, ha)), scale(b, hb)),
    u: scale(a, 2 * ha),
    v: scale(b, 2 * hb),
    normal: scale(axes[axis], side),
  };
}

const SIDES = [1, -1] as const;

function sidesOf(box: Occluder, axes: readonly (0 | 1 | 2)[], reflectance: number): Surface[] {
  return axes.flatMap((axis) =>
    SIDES.map((side) => ({ ...faceOf(box, axis, side), reflectance, solidShare: 1, grain: SIDE_GRAIN })),
  );
}

function solidSurfaces(solid: Solid): Surface[] {
  const { occluder } = solid;
  if (solid.kind === 'box') return sidesOf(occluder, [0, 1, 2], solid.box.reflectance);
  const { slab } = solid;
  const flat = (side: 1 | -1, reflectance: number): Surface => ({
    ...faceOf(occluder, 2, side),
    reflectance,
    solidShare: occluder.stops,
    grain: PLAN_GRAIN,
  });
  const planes = [flat(1, slab.reflectanceTop), flat(-1, lowerReflectance(slab))];
  return occluder.half[2] > 0 ? [...planes, ...sidesOf(occluder, [0, 1], slab.reflectanceEdge)] : planes;
}

/** A lamp's lit face takes in what falls on it; its body reflects a share. Its third axis is its aim. */
function lampSurfaces({ body, bodyReflectance, bodyThicknessM }: Emitter): Surface[] {
  if (!body) return [];
  const end = (side: 1 | -1, reflectance: number): Surface => ({
    ...faceOf(body, 2, side),
    reflectance,
    solidShare: 1,
    grain: PLAN_GRAIN,
  });
  return [end(1, 0), end(-1, bodyReflectance), ...(bodyThicknessM > 0 ? sidesOf(body, [0, 1], bodyReflectance) : [])];
}

/** All that light can meet in a scene. What another solid covers is among it; the mesh leaves that out. */
export const surfacesOf = (scene: LightScene, solids: readonly Solid[], emitters: readonly Emitter[]): Surface[] =>
  [...tentSurfaces(scene), ...solids.flatMap(solidSurfaces), ...emitters.flatMap(lampSurfaces)].filter(
    ({ u, v }) => area(u, v) > 0,
  );

export const area = (u: Vec3, v: Vec3): number =>
  Math.hypot(u[1] * v[2] - u[2] * v[1], u[2] * v[0] - u[0] * v[2], u[0] * v[1] - u[1] * v[0]);
