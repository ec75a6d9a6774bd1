import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { viewFactor } from '@/physics/light/view-factor';
import { createOccluder, uprightBox, type Occluder } from '@/physics/light/occluder';
import type { Vec3 } from '@/physics/light/light-documents';
import { lightScene, panel } from '../../support/black-box';
import { bruteForcePpfd } from '../../support/brute-force-light';
import { readTruth } from '../../support/light-truth';

const truth = readTruth<Record<string, number>>('view-factors.json');
const UP: Vec3 = [0, 0, 1];
const level = (x0: number, x1: number, y0: number, y1: number, z: number) =>
  Float64Array.from([x0, y0, z, x1, y0, z, x1, y1, z, x0, y1, z]);

/** Howell C-13: element parallel to an a × b rectangle at distance c, below its corner. */
function cornerFactor(a: number, b: number, c: number): number {
  const x = a / c;
  const y = b / c;
  return (
    (1 / (2 * Math.PI)) *
    ((x / Math.sqrt(1 + x * x)) * Math.atan(y / Math.sqrt(1 + x * x)) +
      (y / Math.sqrt(1 + y * y)) * Math.atan(x / Math.sqrt(1 + y * y)))
  );
}

/** Howell C-14's kin: element perpendicular to an a × b rectangle at distance c, b outwards. */
const perpendicularFactor = (a: number, b: number, c: number) =>
  (1 / (2 * Math.PI)) * (Math.atan(a / c) - (c / Math.hypot(b, c)) * Math.atan(a / Math.hypot(b, c)));

const GAUSS = [
  [0.5 - Math.sqrt(0.15), 5 / 18],
  [0.5, 8 / 18],
  [0.5 + Math.sqrt(0.15), 5 / 18],
] as const;

/** Mean over the unit square by Gauss points in nu × nv parts. */
function meanOverUnitSquare(nu: number, nv: number, value: (u: number, v: number) => number): number {
  let sum = 0;
  for (let i = 0; i < nu; i += 1)
    for (let j = 0; j < nv; j += 1)
      for (const [gu, wu] of GAUSS) for (const [gv, wv] of GAUSS) sum += wu * wv * value((i + gu) / nu, (j + gv) / nv);
  return sum / (nu * nv);
}

describe('view factor from a point to a polygon', () => {
  it.each([
    ['corner of a unit square', level(0, 1, 0, 1, 1), 'elementParallelCornerUnitSquareAtUnitDistance'],
    ['centre of a square of side 2', level(-1, 1, -1, 1, 1), 'elementParallelCentredSideTwoAtUnitDistance'],
    ['centre of a unit square', level(-0.5, 0.5, -0.5, 0.5, 1), 'elementParallelCentredSideOneAtUnitDistance'],
  ])('%s: Howell C-13 to the digits of the table', (_, polygon, key) => {
    expect(viewFactor([0, 0, 0], UP, polygon, [])).toBeCloseTo(truth[key]!, 6);
  });

  it('equals Howell C-13 for any size and distance, to 1e-12', () => {
    const side = fc.double({ min: 0.01, max: 5, noNaN: true });
    fc.assert(
      fc.property(side, side, fc.double({ min: 0.01, max: 5, noNaN: true }), (a, b, c) => {
        expect(viewFactor([0, 0, 0], UP, level(0, a, 0, b, c), [])).toBeCloseTo(cornerFactor(a, b, c), 12);
      }),
    );
  });

  it('equals the closed form of an element perpendicular to a rectangle, to 1e-12', () => {
    const side = fc.double({ min: 0.05, max: 5, noNaN: true });
    fc.assert(
      fc.property(side, side, side, (a, b, c) => {
        // The element looks along +x; the rectangle lies overhead at height c, reaching b outwards and a along y.
        expect(viewFactor([0, 0, 0], [1, 0, 0], level(0, b, 0, a, c), [])).toBeCloseTo(
          perpendicularFactor(a, b, c),
          12,
        );
      }),
    );
  });

  it('gives 0.199825 between unit squares parallel at unit distance (Howell C-11)', () => {
    const mean = meanOverUnitSquare(4, 4, (u, v) => viewFactor([u, v, 0], UP, level(0, 1, 0, 1, 1), []));
    expect(mean).toBeCloseTo(truth.unitSquaresParallelAtUnitDistance!, 6);
  });

  it('gives 0.200044 between unit squares that share an edge at a right angle (Howell C-14)', () => {
    const wall = Float64Array.from([0, 0, 0, 1, 0, 0, 1, 0, 1, 0, 0, 1]);
    // Parts get smaller towards the shared edge, where the factor rises steeply to one half.
    let mean = 0;
    for (let k = 0; k < 40; k += 1) {
      const [from, to] = [k === 39 ? 0 : 0.75 ** (k + 1), 0.75 ** k];
      mean +=
        (to - from) * meanOverUnitSquare(40, 4, (u, v) => viewFactor([u, from + v * (to - from), 0], UP, wall, []));
    }
    expect(mean).toBeCloseTo(truth.unitSquaresPerpendicularSharingAnEdge!, 5);
  });

  it('sees nothing below its horizon, and only the part above of what crosses it', () => {
    expect(viewFactor([0, 0, 1], UP, level(-1, 1, -1, 1, 0), [])).toBe(0);
    const crossing = Float64Array.from([1, -1, -1, 1, 1, -1, 1, 1, 1, 1, -1, 1]);
    const upper = Float64Array.from([1, -1, 0, 1, 1, 0, 1, 1, 1, 1, -1, 1]);
    expect(viewFactor([0, 0, 0], UP, crossing, [])).toBeCloseTo(viewFactor([0, 0, 0], UP, upper, []), 14);
  });
});

/** The six faces of a box that look at the eye. */
function facesTowards(box: Occluder, eye: Vec3): Float64Array[] {
  const found: Float64Array[] = [];
  for (let i = 0; i < 3; i += 1) {
    for (const sign of [-1, 1]) {
      const out = box.axes[i]!;
      const distance =
        [0, 1, 2].reduce((sum, k) => sum + (eye[k]! - box.centre[k]!) * out[k]!, 0) * sign - box.half[i]!;
      if (distance <= 0) continue;
      const [j, l] = [(i + 1) % 3, (i + 2) % 3];
      const corners = [
        [-1, -1],
        [1, -1],
        [1, 1],
        [-1, 1],
      ].flatMap(([a, b]) =>
        [0, 1, 2].map(
          (k) =>
            box.centre[k]! +
            sign * box.half[i]! * out[k]! +
            a! * box.half[j]! * box.axes[j]![k]! +
            b! * box.half[l]! * box.axes[l]![k]!,
        ),
      );
      found.push(Float64Array.from(corners));
    }
  }
  return found;
}

const [W, D, H] = [2.4, 1.2, 2];
const walls = [
  level(0, W, 0, D, 0),
  level(0, W, 0, D, H),
  Float64Array.from([0, 0, 0, 0, D, 0, 0, D, H, 0, 0, H]),
  Float64Array.from([W, 0, 0, W, D, 0, W, D, H, W, 0, H]),
  Float64Array.from([0, 0, 0, W, 0, 0, W, 0, H, 0, 0, H]),
  Float64Array.from([0, D, 0, W, D, 0, W, D, H, 0, D, H]),
];
const tilt = Math.PI / 5;
const solids = [
  uprightBox({ low: [0.1, 0.2, 0.13], high: [2.3, 1, 0.15] }),
  uprightBox({ low: [0.1, 0.2, 0.73], high: [1.4, 1, 0.75] }),
  uprightBox({ low: [0.9, 0.1, 1.3], high: [2.3, 1.1, 1.35] }),
  uprightBox({ low: [0, 0.3, 0.9], high: [2.4, 0.35, 0.95] }),
  createOccluder({
    centre: [1.2, 0.6, 1.7],
    axes: [
      [Math.cos(tilt), 0, Math.sin(tilt)],
      [0, 1, 0],
      [-Math.sin(tilt), 0, Math.cos(tilt)],
    ],
    half: [0.4, 0.2, 0.03],
    stops: 1,
  }),
];
const mesh = uprightBox({ low: [0.3, 0.1, 1.05], high: [2.1, 1.1, 1.05], stops: 0.65 });

describe('what a point sees of a closed box with tiers, a pipe, a tilted lamp and a mesh', () => {
  it('adds up to 1 within 1e-12, wherever it is and wherever it looks', () => {
    const at = fc.tuple(
      fc.double({ min: 0.01, max: W - 0.01, noNaN: true }),
      fc.double({ min: 0.01, max: D - 0.01, noNaN: true }),
      fc.double({ min: 0.01, max: H - 0.01, noNaN: true }),
    );
    const direction = fc.tuple(
      fc.double({ min: 0, max: 2 * Math.PI, noNaN: true }),
      fc.double({ min: -1, max: 1, noNaN: true }),
    );
    const insideSolid = (p: Vec3) =>
      solids.some((box) =>
        box.axes.every((axis, i) => {
          const along = [0, 1, 2].reduce((sum, k) => sum + (p[k]! - box.centre[k]!) * axis[k]!, 0);
          return Math.abs(along) < box.half[i]! + 1e-3;
        }),
      ) || Math.abs(p[2] - 1.05) < 1e-3;
    fc.assert(
      fc.property(at, direction, (point, [angle, height]) => {
        fc.pre(!insideSolid(point));
        const flat = Math.sqrt(1 - height * height);
        const normal: Vec3 = [flat * Math.cos(angle), flat * Math.sin(angle), height];
        const boxes = [...solids, mesh];
        let sum = 0;
        for (const wall of walls) sum += viewFactor(point, normal, wall, boxes);
        for (const box of solids)
          for (const face of facesTowards(box, point)) sum += viewFactor(point, normal, face, boxes);
        sum += mesh.stops * viewFactor(point, normal, level(0.3, 2.1, 0.1, 1.1, 1.05), boxes, mesh);
        expect(Math.abs(sum - 1)).toBeLessThan(1e-12);
      }),
      { numRuns: 400 },
    );
  });

  it('stays quick and exact behind twenty boxes in a row, whose shadows all overlap', () => {
    const row = Array.from({ length: 20 }, (_, k) =>
      uprightBox({ low: [0.9, 0.5, 0.1 + k * 0.08], high: [1.1, 0.6, 0.14 + k * 0.08] }),
    );
    const scene = lightScene({
      boxes: row.map(({ low, high }, k) => ({ id: `${k}`, min: low, max: high, reflectance: 0 })),
    });
    const ceiling = panel({ position: [1, 0.6, 1.9], length: 2, width: 1.2, ppf: 2.4, housing: null });
    const seen = viewFactor([1, 0.2, 0], UP, level(0, 2, 0, 1.2, 1.9), row);
    expect(seen / bruteForcePpfd(scene, ceiling, [1, 0.2, 0], UP, 100)).toBeCloseTo(1, 2.5);
  });
});
