import { DomainError } from '../domain-error';
import type { Distribution } from './light-documents';

/**
 * Relative intensity of a lamp by direction, 1/sr, so that its integral over the sphere is 1.
 *
 * @param gammaRad angle from the optical axis, 0…π
 * @param cRad angle about it from the fixture's axis, −π…π
 */
export type Intensity = (gammaRad: number, cRad: number) => number;

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

function tableIntensity(table: Extract<Distribution, { type: 'table' }>): Intensity {
  const gammaRad = table.gammaDeg.map((gamma) => gamma * RAD);
  const beyond = gammaRad.at(-1)! + 1e-12;
  const rows = Array.isArray(table.intensity[0]) ? (table.intensity as number[][]) : [table.intensity as number[]];
  const integrals = rows.map((row) => planeIntegral(gammaRad, row));
  const cDeg = table.cDeg && rows.length > 1 ? table.cDeg : null;
  if (!cDeg) {
    const row = rows[0]!;
    const total = 2 * Math.PI * integrals[0]!;
    return (gamma) => {
      if (gamma > beyond) return 0;
      const [i, part] = bracket(gammaRad, gamma);
      return (row[i]! + part * (row[i + 1]! - row[i]!)) / total;
    };
  }
  const last = cDeg.at(-1)!;
  let mean = 0;
  for (let i = 1; i < cDeg.length; i += 1)
    mean += ((integrals[i]! + integrals[i - 1]!) / 2) * (cDeg[i]! - cDeg[i - 1]!);
  const total = (2 * Math.PI * mean) / last;
  return (gamma, cRad) => {
    if (gamma > beyond) return 0;
    const [g, gPart] = bracket(gammaRad, gamma);
    const [c, cPart] = bracket(cDeg, foldC(cRad / RAD, last));
    const along = (row: readonly number[]) => row[g]! + gPart * (row[g + 1]! - row[g]!);
    return (along(rows[c]!) * (1 - cPart) + along(rows[c + 1]!) * cPart) / total;
  };
}

/** The intensity of one unit of photon flux by direction. Tables are scaled so that their photons add up. */
export function intensityOf(distribution: Distribution): Intensity {
  switch (distribution.type) {
    case 'lambertian':
      return (gamma) => (gamma < Math.PI / 2 ? Math.cos(gamma) / Math.PI : 0);
    case 'isotropic':
      return () => 1 / (4 * Math.PI);
    case 'cosinePower': {
      const m = cosinePowerOf(distribution.beamAngleDeg);
      const i0 = (m + 1) / (2 * Math.PI);
      return (gamma) => (gamma < Math.PI / 2 ? i0 * Math.cos(gamma) ** m : 0);
    }
    case 'table':
      return tableIntensity(distribution);
  }
}
