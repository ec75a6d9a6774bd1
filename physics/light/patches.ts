import type { LightScene, Vec3 } from './light-documents';
import type { Occluder } from './occluder';
import { area, type Surface } from './surfaces';
import { add, dot, length, scale, subtract } from './vector';

/** A piece of a surface, of one exitance as the surfaces exchange light. */
export interface Patch {
  polygon: Float64Array;
  centre: Vec3;
  normal: Vec3;
  u: Vec3;
  v: Vec3;
  /** What is there of it, m²: of a mesh the solid share. */
  areaM2: number;
  solidShare: number;
  diagonalM: number;
  reflectance: number;
  /** Finer pieces, on which direct light is taken and from which leaves are lit. */
  children: Child[];
}

export interface Child {
  polygon: Float64Array;
  centre: Vec3;
  u: Vec3;
  v: Vec3;
  areaM2: number;
}

const EDGE_M = 1e-6;

function rectangle(corner: Vec3, u: Vec3, v: Vec3): { polygon: Float64Array; centre: Vec3 } {
  const across = add(corner, u);
  return {
    polygon: Float64Array.from([corner, across, add(across, v), add(corner, v)].flat()),
    centre: add(corner, scale(add(u, v), 0.5)),
  };
}

interface Breaks {
  /** Where a solid that touches the surface begins and ends: what it covers is cut out cleanly. */
  hard: number[];
  /** Where a solid close by leaves its print. */
  soft: number[];
}

/** Soft breaks are no closer to another than this share of a cell. */
const SOFT_SHARE = 0.08;

/** Cuts 0…length where light may jump, and each part evenly into cells no longer than `most`. */
function cutsOf(length: number, most: number, { hard, soft }: Breaks): number[] {
  const edges = [0, length];
  const add = (at: number, apart: number) => {
    if (at > 0 && at < length && edges.every((edge) => Math.abs(edge - at) > apart)) edges.push(at);
  };
  for (const at of hard) add(at, EDGE_M);
  for (const at of soft) add(at, SOFT_SHARE * most);
  edges.sort((a, b) => a - b);
  return edges.flatMap((from, i) => {
    const to = edges[i + 1];
    if (to === undefined) return [from];
    const cells = Math.max(1, Math.ceil((to - from) / most - 1e-6));
    return Array.from({ length: cells }, (_, k) => from + ((to - from) * k) / cells);
  });
}

/** How close before a surface a solid's edges still leave their print on it, m. */
const PRINT_M = 0.35;

/** Where solids that stand square to a surface begin and end along one of its sides. */
function breaksAlong(surface: Surface, side: Vec3, solids: readonly Occluder[]): Breaks {
  const way = scale(side, 1 / length(side));
  const from = dot(surface.corner, way);
  const here = dot(surface.corner, surface.normal);
  const breaks: Breaks = { hard: [], soft: [] };
  for (const box of solids) {
    if (!box.axes.some((axis) => Math.abs(dot(axis, way)) > 1 - 1e-9)) continue;
    const depths = [dot(box.low, surface.normal) - here, dot(box.high, surface.normal) - here];
    const before = Math.min(...depths);
    if (before > PRINT_M || Math.max(...depths) < -EDGE_M) continue;
    const touches = before < EDGE_M && box.stops === 1;
    (touches ? breaks.hard : breaks.soft).push(dot(box.low, way) - from, dot(box.high, way) - from);
  }
  return breaks;
}

/** True where another solid lies on the patch, so that no air is before it. */
function covered(centre: Vec3, normal: Vec3, solids: readonly Occluder[]): boolean {
  const before = add(centre, scale(normal, EDGE_M));
  return solids.some(({ centre: middle, axes, half, stops }) => {
    if (stops < 1) return false;
    const from = subtract(before, middle);
    return axes.every((axis, i) => Math.abs(dot(from, axis)) < half[i]! - EDGE_M / 10);
  });
}

export interface MeshLimits {
  /** Cells are at most this wide, times the surface's grain, m. */
  cellM: number;
  mostPatches: number;
}

/** A patch has this many children along each side; a long one more along it. */
const CHILDREN = 2;

/**
 * The scene's surfaces as patches; what lies behind a solid or outside the tent is left out. null where there are too many.
 *
 * @param cutting tiers and boxes, whose edges cut the mesh
 */
export function meshOf(
  surfaces: readonly Surface[],
  { tent }: LightScene,
  solids: readonly Occluder[],
  cutting: readonly Occluder[],
  { cellM, mostPatches }: MeshLimits,
): Patch[] | null {
  const ends: Vec3 = [tent.width, tent.depth, tent.height];
  const inTent = (at: Vec3) => at.every((value, k) => value > -EDGE_M && value < ends[k]! + EDGE_M);
  const patches: Omit<Patch, 'children'>[] = [];
  for (const surface of surfaces) {
    const { corner, u, v, normal, reflectance, solidShare, grain } = surface;
    const [longU, longV] = [length(u), length(v)];
    const cutsU = cutsOf(longU, cellM * grain[0], breaksAlong(surface, u, cutting));
    const cutsV = cutsOf(longV, cellM * grain[1], breaksAlong(surface, v, cutting));
    for (let i = 0; i + 1 < cutsU.length; i += 1) {
      for (let j = 0; j + 1 < cutsV.length; j += 1) {
        const at = add(corner, add(scale(u, cutsU[i]! / longU), scale(v, cutsV[j]! / longV)));
        const [pu, pv] = [scale(u, (cutsU[i + 1]! - cutsU[i]!) / longU), scale(v, (cutsV[j + 1]! - cutsV[j]!) / longV)];
        const shape = rectangle(at, pu, pv);
        if (!inTent(shape.centre) || covered(shape.centre, normal, solids)) continue;
        patches.push({
          ...shape,
          normal,
          u: pu,
          v: pv,
          areaM2: area(pu, pv) * solidShare,
          solidShare,
          diagonalM: Math.hypot(length(pu), length(pv)),
          reflectance,
        });
        if (patches.length > mostPatches) return null;
      }
    }
  }
  return patches.map((patch) => ({ ...patch, children: childrenOf(patch) }));
}

function childrenOf({ polygon, u, v, solidShare }: Omit<Patch, 'children'>): Child[] {
  const corner: Vec3 = [polygon[0]!, polygon[1]!, polygon[2]!];
  const [longU, longV] = [length(u), length(v)];
  // Long strips are cut along, not across.
  const nu = Math.max(1, Math.min(3 * CHILDREN, Math.round(CHILDREN * Math.sqrt(longU / longV))));
  const nv = Math.max(1, Math.min(3 * CHILDREN, Math.round(CHILDREN * Math.sqrt(longV / longU))));
  const [cu, cv] = [scale(u, 1 / nu), scale(v, 1 / nv)];
  return Array.from({ length: nu * nv }, (_, k): Child => {
    const at = add(corner, add(scale(cu, k % nu), scale(cv, Math.floor(k / nu))));
    return { ...rectangle(at, cu, cv), u: cu, v: cv, areaM2: area(cu, cv) * solidShare };
  });
}
