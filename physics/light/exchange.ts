import { choleskyFactor, choleskySolve } from './cholesky';
import { unitPpfd } from './direct';
import type { Emitter } from './emitter';
import type { Vec3 } from './light-documents';
import type { Occluder } from './occluder';
import type { Patch } from './patches';
import { add, scale } from './vector';
import { viewFactor } from './view-factor';

/**
 * Surfaces that exchange diffuse light, patch by patch.
 *
 *   (Aᵢ/ρᵢ − Sᵢᵢ)·Bᵢ − Σⱼ Sᵢⱼ·Bⱼ = Aᵢ·Eᵢ⁰, Sᵢⱼ = Aᵢ·Fᵢⱼ = Sⱼᵢ, Sᵢᵢ = Aᵢ − Σⱼ Sᵢⱼ
 *
 * B is what a patch throws back, E⁰ the direct light on it. Each pair is reckoned once, so reciprocity holds to the bit; the
 * diagonal closes every row, so no photon is lost. Patches that throw nothing back are no unknowns.
 *
 * @source radiosity: Goral, Torrance, Greenberg and Battaile 1984; Cohen and Wallace 1993 (both recalled)
 */
export interface Exchange {
  patches: readonly Patch[];
  /** Sᵢⱼ, m², row after row; symmetric, rows sum to the patch's area. */
  exchange: Float64Array;
  /** Patches that throw light back. */
  bright: Int32Array;
  factor: Float64Array;
}

/** Closer than this many diagonals two patches are sampled at four points from either side. */
const NEAR_DIAGONALS = 1.6;
/** Gauss's two points on 0…1. */
const GAUSS = [0.5 - Math.sqrt(1 / 12), 0.5 + Math.sqrt(1 / 12)] as const;

const dotAt = (n: Vec3, a: Vec3, b: Vec3) => n[0] * (a[0] - b[0]) + n[1] * (a[1] - b[1]) + n[2] * (a[2] - b[2]);

/** True where no point of one lies before the other. */
function backToBack(a: Patch, b: Patch): boolean {
  let before = false;
  for (let i = 0; i < 12 && !before; i += 3) {
    const { polygon: p } = b;
    before =
      a.normal[0] * (p[i]! - a.centre[0]) +
        a.normal[1] * (p[i + 1]! - a.centre[1]) +
        a.normal[2] * (p[i + 2]! - a.centre[2]) >
      1e-9;
  }
  return !before;
}

function seen(point: Vec3, from: Patch, of: Patch, occluders: readonly Occluder[]): number {
  return dotAt(of.normal, point, of.centre) <= 1e-9 ? 0 : viewFactor(point, from.normal, of.polygon, occluders);
}

/** The mean of something over a rectangle, by Gauss's four points. */
function meanOverFour({ polygon, u, v }: Pick<Patch, 'polygon' | 'u' | 'v'>, value: (point: Vec3) => number): number {
  const corner: Vec3 = [polygon[0]!, polygon[1]!, polygon[2]!];
  let sum = 0;
  for (const s of GAUSS) for (const t of GAUSS) sum += value(add(corner, add(scale(u, s), scale(v, t))));
  return sum / 4;
}

/** Aᵢ·Fᵢⱼ of two patches, m². */
function pairExchange(a: Patch, b: Patch, occluders: readonly Occluder[]): number {
  if (backToBack(a, b) || backToBack(b, a)) return 0;
  const x = a.centre[0] - b.centre[0];
  const y = a.centre[1] - b.centre[1];
  const z = a.centre[2] - b.centre[2];
  const widest = Math.max(a.diagonalM, b.diagonalM);
  if (x * x + y * y + z * z > (NEAR_DIAGONALS * widest) ** 2) {
    const [small, large] = a.diagonalM <= b.diagonalM ? [a, b] : [b, a];
    return small.areaM2 * large.solidShare * seen(small.centre, small, large, occluders);
  }
  const fromA = meanOverFour(a, (point) => seen(point, a, b, occluders));
  const fromB = meanOverFour(b, (point) => seen(point, b, a, occluders));
  return 0.5 * (a.areaM2 * b.solidShare * fromA + b.areaM2 * a.solidShare * fromB);
}

/**
 * What the patches exchange, ready to be solved for any light on them.
 *
 * @param patches all that bounds the air, without holes; areas in m², reflectances 0…0.99
 * @param occluders everything that hides
 * @throws RangeError when the patches leave so large a hole that the system is not positive definite
 * @accuracy Fᵢⱼ is exact from each point that it is taken at; of far pairs one point, of near ones four from either side
 */
export function exchangeOf(patches: readonly Patch[], occluders: readonly Occluder[]): Exchange {
  const n = patches.length;
  const exchange = new Float64Array(n * n);
  for (let i = 0; i < n; i += 1)
    for (let j = 0; j < i; j += 1) {
      const shared = pairExchange(patches[i]!, patches[j]!, occluders);
      exchange[i * n + j] = shared;
      exchange[j * n + i] = shared;
    }
  for (let i = 0; i < n; i += 1) {
    let sum = 0;
    for (let j = 0; j < n; j += 1) sum += exchange[i * n + j]!;
    exchange[i * n + i] = patches[i]!.areaM2 - sum;
  }
  const bright = Int32Array.from(patches.flatMap(({ reflectance }, i) => (reflectance > 0 ? [i] : [])));
  const m = bright.length;
  const system = new Float64Array(m * m);
  for (let p = 0; p < m; p += 1) {
    const i = bright[p]!;
    for (let q = 0; q < m; q += 1) system[p * m + q] = -exchange[i * n + bright[q]!]!;
    system[p * m + p]! += patches[i]!.areaM2 / patches[i]!.reflectance;
  }
  return { patches, exchange, bright, factor: choleskyFactor(system, m) };
}

/** Direct light of one lamp on every child for 1 µmol/s that leaves it, scaled so that all of it lands; null where it lights nothing. */
export function landedLight(
  patches: readonly Patch[],
  lamp: Emitter,
  occluders: readonly Occluder[],
): Float64Array[] | null {
  let landed = 0;
  const maps = patches.map(({ children, normal }) =>
    Float64Array.from(children, (child) => {
      // One point would do in the open; at the edge of a shadow it puts a tier below off by 2 %.
      const unit = meanOverFour(child, (point) => unitPpfd(point, normal, lamp, occluders));
      landed += unit * child.areaM2;
      return unit;
    }),
  );
  if (landed <= 0) return null;
  for (const map of maps) for (let i = 0; i < map.length; i += 1) map[i]! /= landed;
  return maps;
}

export interface Exitance {
  whole: Float64Array;
  parts: readonly Float64Array[];
  /** Patches whose children differ little. */
  even: readonly boolean[];
}

const meanOver = ({ children, areaM2 }: Patch, values: Float64Array): number =>
  children.reduce((sum, child, k) => sum + child.areaM2 * values[k]!, 0) / areaM2;

/** Children that differ by less than this share of the brightest make an even patch: seen through a gap, others would not do as one. */
const UNEVEN_SHARE = 0.1;

/** What every patch throws back, µmol/m²/s, for direct light on its children. */
export function exitanceOf({ patches, bright, factor }: Exchange, direct: readonly Float64Array[]): Exitance {
  const mean = patches.map((patch, i) => meanOver(patch, direct[i]!));
  const b = Float64Array.from(bright, (i) => patches[i]!.areaM2 * mean[i]!);
  choleskySolve(factor, bright.length, b);
  const whole = new Float64Array(patches.length);
  bright.forEach((i, p) => (whole[i] = b[p]!));
  // A child differs from its patch by its direct light.
  const parts = patches.map(({ reflectance }, i) =>
    direct[i]!.map((own) => whole[i]! + reflectance * (own - mean[i]!)),
  );
  const even = parts.map((own) => Math.max(...own) - Math.min(...own) < UNEVEN_SHARE * Math.max(...own));
  return { whole, parts, even };
}

/** All that the patches take in, µmol/s: (1 − ρ)·E·A of each. Equals what is emitted, to rounding. */
export function absorbedBy(
  { patches, exchange }: Exchange,
  direct: readonly Float64Array[],
  { whole }: Exitance,
): number {
  const n = patches.length;
  return patches.reduce((total, patch, i) => {
    let incident = patch.areaM2 * meanOver(patch, direct[i]!);
    for (let j = 0; j < n; j += 1) incident += exchange[i * n + j]! * whole[j]!;
    return total + (1 - patch.reflectance) * incident;
  }, 0);
}

/** Beyond this many diagonals an even patch lights a leaf as one. */
const WHOLE_DIAGONALS = 2.5;

/**
 * Reflected light on a leaf, µmol/m²/s.
 *
 * @param whole what each patch throws back on the mean
 * @param parts the same of its children
 */
export function gathered(
  point: Vec3,
  normal: Vec3,
  { patches }: Exchange,
  { whole, parts, even }: Exitance,
  occluders: readonly Occluder[],
): number {
  let sum = 0;
  for (let i = 0; i < patches.length; i += 1) {
    const patch = patches[i]!;
    if (whole[i] === 0 || dotAt(patch.normal, point, patch.centre) <= 1e-9) continue;
    const far = Math.hypot(point[0] - patch.centre[0], point[1] - patch.centre[1], point[2] - patch.centre[2]);
    if (even[i] && far > WHOLE_DIAGONALS * patch.diagonalM) {
      sum += whole[i]! * patch.solidShare * viewFactor(point, normal, patch.polygon, occluders);
      continue;
    }
    const own = parts[i]!;
    for (let k = 0; k < own.length; k += 1)
      sum += own[k]! * patch.solidShare * viewFactor(point, normal, patch.children[k]!.polygon, occluders);
  }
  return sum;
}
