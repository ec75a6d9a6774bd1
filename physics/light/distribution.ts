import { DomainError, requireWithin } from '../domain-error';
import type { Distribution } from './light-documents';

/**
 * Relative intensity of a lamp by direction, 1/sr, so that its integral over the sphere is 1.
 *
 * @param cosGamma cosine of the angle from the optical axis, −1…1
 * @param x part of the direction along the fixture's axis (C = 0), of any scale
 * @param y part along its third direction (C = 90°), of the same scale
 */
export type Intensity = (cosGamma: number, x: number, y: number) => number;

const RAD = Math.PI / 180;

/**
 * Cosine power of a beam: I(γ) = I₀ cosᵐγ with m = ln 0.5 / ln cos(beam/2), the full angle at half intensity.
 *
 * @param beamAngleDeg 5…170
 * @source [CIE-terms] definition of the beam angle
 */
export function cosinePowerOf(beamAngleDeg: number): number {
  if (!(beamAngleDeg >= 5 && beamAngleDeg <= 170)) {
    throw new DomainError({ quantity: 'beam angle', value: beamAngleDeg, min: 5, max: 170, unit: '°' });
  }
  return Math.log(0.5) / Math.log(Math.cos((beamAngleDeg * RAD) / 2));
}

/** Where a rising list brackets a value: the lower place and the way to the next. */
function bracket(values: readonly number[], value: number): [index: number, part: number] {
  let low = 0;
  let high = values.length - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (values[middle]! <= value) low = middle;
    else high = middle;
  }
  const span = values[high]! - values[low]!;
  return [low, span > 0 ? (value - values[low]!) / span : 0];
}

/** ∫ I(γ) sin γ dγ of one plane, linear between its angles: exact for the straight pieces. */
function planeIntegral(gammaRad: readonly number[], intensity: readonly number[]): number {
  let sum = 0;
  for (let i = 1; i < gammaRad.length; i += 1) {
    const g0 = gammaRad[i - 1]!;
    const g1 = gammaRad[i]!;
    const slope = (intensity[i]! - intensity[i - 1]!) / (g1 - g0);
    const at = (g: number) => -(intensity[i - 1]! + slope * (g - g0)) * Math.cos(g) + slope * Math.sin(g);
    sum += at(g1) - at(g0);
  }
  return sum;
}

/** Folds an angle about the axis into the planes that the table holds: all round, half or a quarter mirrored. */
function foldC(cDeg: number, last: number): number {
  let c = ((cDeg % 360) + 360) % 360;
  if (last <= 180 && c > 180) c = 360 - c;
  if (last <= 90 && c > 90) c = 180 - c;
  return c;
}

type Table = Extract<Distribution, { type: 'table' }>;

const rowsOf = ({ intensity }: Table): number[][] =>
  Array.isArray(intensity[0]) ? (intensity as number[][]) : [intensity as number[]];

function requireRising(quantity: string, values: readonly number[], max: number): void {
  values.forEach((value, i) =>
    requireWithin({ quantity, value, min: i === 0 ? 0 : values[i - 1]! + 1e-9, max, unit: '°' }),
  );
}

function requireTable(table: Table): void {
  const { gammaDeg, cDeg } = table;
  const rows = rowsOf(table);
  requireWithin({ quantity: 'number of angles of a table', value: gammaDeg.length, min: 2, max: 721, unit: '' });
  requireRising('angle from the axis in a table', gammaDeg, 180);
  if (rows.length > 1) {
    const planes = cDeg?.length ?? 0;
    requireWithin({ quantity: 'number of C-planes', value: planes, min: rows.length, max: rows.length, unit: '' });
    requireRising('C-angle of a table', cDeg!, 360);
    const last = cDeg!.at(-1)!;
    if (![90, 180, 360].includes(last))
      throw new DomainError({
        quantity: 'last C-angle of a table',
        value: last,
        min: 90,
        max: 360,
        unit: '°: 90, 180 or 360',
      });
  }
  for (const row of rows) {
    const wanted = gammaDeg.length;
    requireWithin({
      quantity: 'number of intensities of a plane',
      value: row.length,
      min: wanted,
      max: wanted,
      unit: '',
    });
    for (const value of row) requireWithin({ quantity: 'intensity in a table', value, min: 0, max: 1e12, unit: '' });
  }
}

const angleOf = (cos: number) => Math.acos(cos > 1 ? 1 : cos < -1 ? -1 : cos);

function tableIntensity(table: Table): Intensity {
  requireTable(table);
  const gammaRad = table.gammaDeg.map((gamma) => gamma * RAD);
  const first = gammaRad[0]! - 1e-12;
  const beyond = gammaRad.at(-1)! + 1e-12;
  const rows = rowsOf(table);
  const integrals = rows.map((row) => planeIntegral(gammaRad, row));
  const cDeg = table.cDeg && rows.length > 1 ? table.cDeg : null;
  const last = cDeg?.at(-1) ?? 360;
  let mean = integrals[0]!;
  if (cDeg) {
    mean = 0;
    for (let i = 1; i < cDeg.length; i += 1)
      mean += ((integrals[i]! + integrals[i - 1]!) / 2) * ((cDeg[i]! - cDeg[i - 1]!) / last);
  }
  const total = 2 * Math.PI * mean;
  if (!(total > 0))
    throw new DomainError({
      quantity: 'sum of a table of intensities',
      value: total,
      min: 1e-12,
      max: Infinity,
      unit: '',
    });
  const scaled = rows.map((row) => row.map((value) => value / total));
  const along = (row: readonly number[], g: number, part: number) => row[g]! + part * (row[g + 1]! - row[g]!);
  return (cosGamma, x, y) => {
    const gamma = angleOf(cosGamma);
    if (gamma > beyond || gamma < first) return 0;
    const [g, gPart] = bracket(gammaRad, gamma);
    if (!cDeg) return along(scaled[0]!, g, gPart);
    const [c, cPart] = bracket(cDeg, foldC(Math.atan2(y, x) / RAD, last));
    return along(scaled[c]!, g, gPart) * (1 - cPart) + along(scaled[c + 1]!, g, gPart) * cPart;
  };
}

/** The intensity of one unit of photon flux by direction. Tables are scaled so that their photons add up. */
export function intensityOf(distribution: Distribution): Intensity {
  switch (distribution.type) {
    case 'lambertian':
      return (cos) => (cos > 0 ? cos / Math.PI : 0);
    case 'isotropic':
      return () => 1 / (4 * Math.PI);
    case 'cosinePower': {
      const m = cosinePowerOf(distribution.beamAngleDeg);
      const i0 = (m + 1) / (2 * Math.PI);
      return (cos) => (cos > 0 ? i0 * cos ** m : 0);
    }
    case 'table':
      return tableIntensity(distribution);
  }
}

/** How far a pattern reaches and how fast it changes. */
export interface BeamShape {
  /** The angle over which the intensity changes by as much as its peak, rad: 1 for Lambert's law. */
  scaleRad: number;
  /** Beyond this angle from the axis less than a millionth of the peak is left, rad. */
  reachRad: number;
}

export function beamShapeOf(distribution: Distribution): BeamShape {
  switch (distribution.type) {
    case 'lambertian':
      return { scaleRad: 1, reachRad: Math.PI / 2 };
    case 'isotropic':
      return { scaleRad: Math.PI, reachRad: Math.PI };
    case 'cosinePower': {
      const m = cosinePowerOf(distribution.beamAngleDeg);
      const steepest = m > 1 ? Math.sqrt(m) * ((m - 1) / m) ** ((m - 1) / 2) : 1;
      return { scaleRad: 1 / steepest, reachRad: Math.acos(1e-6 ** (1 / m)) };
    }
    case 'table': {
      const rows = rowsOf(distribution);
      const peak = Math.max(...rows.flat());
      const gammaDeg = distribution.gammaDeg;
      let steepest = 0;
      for (const row of rows)
        for (let i = 1; i < row.length; i += 1)
          steepest = Math.max(steepest, Math.abs(row[i]! - row[i - 1]!) / ((gammaDeg[i]! - gammaDeg[i - 1]!) * RAD));
      return { scaleRad: steepest > 0 ? peak / steepest : Math.PI, reachRad: gammaDeg.at(-1)! * RAD };
    }
  }
}

const CDF_STEPS = 512;

/**
 * The angles from the axis that part a lamp's photons into `count` equal shares, at the middle of each; axial mean of a table.
 */
export function gammaQuantiles(distribution: Distribution, count: number): Float64Array {
  const shares = Float64Array.from({ length: count }, (_, i) => (i + 0.5) / count);
  switch (distribution.type) {
    case 'lambertian':
      return shares.map((share) => Math.acos(Math.sqrt(1 - share)));
    case 'isotropic':
      return shares.map((share) => Math.acos(1 - 2 * share));
    case 'cosinePower': {
      const m = cosinePowerOf(distribution.beamAngleDeg);
      return shares.map((share) => Math.acos((1 - share) ** (1 / (m + 1))));
    }
    case 'table': {
      const rows = rowsOf(distribution);
      const gammaRad = distribution.gammaDeg.map((gamma) => gamma * RAD);
      const mean = gammaRad.map((_, i) => rows.reduce((sum, row) => sum + row[i]!, 0));
      const from = gammaRad[0]!;
      const step = (gammaRad.at(-1)! - from) / CDF_STEPS;
      const sums = new Float64Array(CDF_STEPS + 1);
      for (let k = 0; k < CDF_STEPS; k += 1) {
        const gamma = from + (k + 0.5) * step;
        const [i, part] = bracket(gammaRad, gamma);
        sums[k + 1] = sums[k]! + (mean[i]! + part * (mean[i + 1]! - mean[i]!)) * Math.sin(gamma);
      }
      let k = 0;
      return shares.map((share) => {
        const sought = share * sums[CDF_STEPS]!;
        while (k < CDF_STEPS - 1 && sums[k + 1]! < sought) k += 1;
        return from + (k + (sought - sums[k]!) / (sums[k + 1]! - sums[k]!)) * step;
      });
    }
  }
}

/** Finer than any table that is read. */
const FORWARD_QUANTILES = 4000;

/** The share of a face's photons that leave it forwards; a table may send some into its own body. 1 for all else. */
export function forwardShare(distribution: Distribution, hasFace: boolean): number {
  if (!hasFace || distribution.type !== 'table' || distribution.gammaDeg.at(-1)! <= 90) return 1;
  const gammas = gammaQuantiles(distribution, FORWARD_QUANTILES);
  return gammas.filter((gamma) => gamma <= Math.PI / 2).length / FORWARD_QUANTILES;
}
