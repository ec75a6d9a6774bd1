import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { DomainError } from '@/physics/domain-error';
import { cosinePowerOf, gammaQuantiles, intensityOf } from '@/physics/light/distribution';
import type { Distribution } from '@/physics/light/light-documents';
import { readReference } from '../../support/light-truth';

const RAD = Math.PI / 180;
const at = (distribution: Distribution, gammaDeg: number, cDeg = 0) =>
  intensityOf(distribution)(Math.cos(gammaDeg * RAD), Math.cos(cDeg * RAD), Math.sin(cDeg * RAD));

/** ∫∫ I sin γ dγ dC by the midpoint rule, an independent sum. */
function photons(distribution: Distribution, steps = 720): number {
  let sum = 0;
  const step = Math.PI / steps;
  for (let i = 0; i < steps; i += 1)
    for (let j = 0; j < 72; j += 1)
      sum += at(distribution, ((i + 0.5) * 180) / steps, (j + 0.5) * 5) * Math.sin((i + 0.5) * step);
  return (sum * step * 2 * Math.PI) / 72;
}

const bar = readReference('p06_bars_under_shelves').scene.fixtures[1]!.distribution;

describe('intensity of a lamp by direction', () => {
  // m and I₀/PPF by the definition of the beam angle (CIE e-ILV 17-27-077: half the centre intensity).
  it.each([
    [15, 80.674, 12.999],
    [40, 11.143, 1.9327],
    [60, 4.819, 0.9261],
    [90, 2, 0.4775],
    [115, 1.116, 0.3367],
    [120, 1, 0.3183],
    [140, 0.646, 0.262],
  ])('a beam of %i° has the power %f and %f of its photons a steradian on the axis', (beamAngleDeg, power, axial) => {
    expect(cosinePowerOf(beamAngleDeg)).toBeCloseTo(power, 3);
    // The table this is taken from has four decimals, rounded.
    expect(Math.abs(at({ type: 'cosinePower', beamAngleDeg }, 0) - axial)).toBeLessThan(6e-4);
    expect(at({ type: 'cosinePower', beamAngleDeg }, beamAngleDeg / 2)).toBeCloseTo(
      at({ type: 'cosinePower', beamAngleDeg }, 0) / 2,
      12,
    );
  });

  it.each<[string, Distribution]>([
    ['Lambertian', { type: 'lambertian' }],
    ['isotropic', { type: 'isotropic' }],
    ['cosine power of 30°', { type: 'cosinePower', beamAngleDeg: 30 }],
    ['cosine power of 170°', { type: 'cosinePower', beamAngleDeg: 170 }],
    ['axial table', { type: 'table', gammaDeg: [0, 20, 45, 70], intensity: [3, 5, 4, 1] }],
    ['table mirrored in both planes', bar],
    [
      'table mirrored in one plane',
      {
        type: 'table',
        gammaDeg: [0, 40, 80],
        cDeg: [0, 90, 180],
        intensity: [
          [8, 4, 1],
          [8, 6, 0],
          [8, 9, 3],
        ],
      },
    ],
    [
      'full table up and down',
      {
        type: 'table',
        gammaDeg: [0, 60, 120, 180],
        cDeg: [0, 100, 250, 360],
        intensity: [
          [5, 4, 1, 2],
          [5, 9, 0, 2],
          [5, 1, 3, 2],
          [5, 4, 1, 2],
        ],
      },
    ],
  ])('%s: its photons add up to 1 over the sphere', (name, distribution) => {
    // The midpoint rule errs most at the grazing cliff of the widest beam.
    expect(photons(distribution)).toBeCloseTo(1, name.includes('170') ? 2 : 3);
  });

  it('a table that samples Lambert’s law each degree gives it to 4e-5 of the axis', () => {
    const gammaDeg = Array.from({ length: 91 }, (_, i) => i);
    const table: Distribution = { type: 'table', gammaDeg, intensity: gammaDeg.map((g) => 700 * Math.cos(g * RAD)) };
    // A chord of a cosine over one degree lies below it by at most (1°)²/8 = 3.8e-5.
    for (let gamma = 0; gamma <= 90; gamma += 0.37)
      expect(Math.abs(at(table, gamma) - at({ type: 'lambertian' }, gamma)) * Math.PI).toBeLessThan(8e-5);
  });

  it('is zero beyond the last angle of a table', () => {
    const table: Distribution = { type: 'table', gammaDeg: [0, 60], intensity: [2, 2] };
    expect(at(table, 59.9)).toBeGreaterThan(0);
    expect(at(table, 60.1)).toBe(0);
  });

  it('mirrors a table of 0 to 90 in both planes and of 0 to 180 in one', () => {
    const half: Distribution = {
      type: 'table',
      gammaDeg: [0, 90],
      cDeg: [0, 90, 180],
      intensity: [
        [1, 5],
        [1, 3],
        [1, 1],
      ],
    };
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 90 }), fc.integer({ min: 0, max: 359 }), (gamma, c) => {
        expect(at(bar, gamma, 180 - c)).toBeCloseTo(at(bar, gamma, c), 12);
        expect(at(bar, gamma, -c)).toBeCloseTo(at(bar, gamma, c), 12);
        expect(at(half, gamma, -c)).toBeCloseTo(at(half, gamma, c), 12);
      }),
    );
    expect(at(half, 60, 0)).toBeGreaterThan(at(half, 60, 180));
  });

  it('only the shape of a table counts, not its scale', () => {
    const table = (by: number): Distribution => ({
      type: 'table',
      gammaDeg: [0, 30, 90],
      intensity: [9 * by, 4 * by, 0],
    });
    expect(at(table(1000), 20)).toBeCloseTo(at(table(1), 20), 12);
  });

  it('the quantiles of the angle part the photons evenly: for Lambert’s law sin²γ', () => {
    const table: Distribution = {
      type: 'table',
      gammaDeg: Array.from({ length: 91 }, (_, i) => i),
      intensity: Array.from({ length: 91 }, (_, i) => Math.cos(i * RAD)),
    };
    const exact = gammaQuantiles({ type: 'lambertian' }, 50);
    gammaQuantiles(table, 50).forEach((gamma, i) => expect(gamma).toBeCloseTo(exact[i]!, 2));
    exact.forEach((gamma, i) => expect(Math.sin(gamma) ** 2).toBeCloseTo((i + 0.5) / 50, 12));
  });

  it('refuses beams below 5° and over 170°, and tables that are no table', () => {
    for (const beamAngleDeg of [4.9, 171, NaN]) expect(() => cosinePowerOf(beamAngleDeg)).toThrow(DomainError);
    const bad: Distribution[] = [
      { type: 'table', gammaDeg: [0, 90], intensity: [0, 0] },
      { type: 'table', gammaDeg: [0, 90], intensity: [1, -1] },
      { type: 'table', gammaDeg: [0, 90], intensity: [1, 1, 1] },
      { type: 'table', gammaDeg: [0, 60, 50], intensity: [1, 1, 1] },
      { type: 'table', gammaDeg: [0, 190], intensity: [1, 1] },
      {
        type: 'table',
        gammaDeg: [0, 90],
        cDeg: [0, 120],
        intensity: [
          [1, 0],
          [1, 1],
        ],
      },
      {
        type: 'table',
        gammaDeg: [0, 90],
        cDeg: [0],
        intensity: [
          [1, 0],
          [1, 1],
        ],
      },
    ];
    for (const distribution of bad) expect(() => intensityOf(distribution)).toThrow(DomainError);
  });
});
