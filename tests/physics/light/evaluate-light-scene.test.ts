import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { DomainError } from '@/physics/domain-error';
import { cellCentres, evaluateLightScene, statistics } from '@/physics/light/evaluate-light-scene';
import type { Distribution, LightScene, SceneFixture } from '@/physics/light/light-documents';
import { lightScene, panel, plane, pointLamp, shelf } from '../../support/black-box';

const rack = (fixtures: SceneFixture[]): LightScene =>
  lightScene({
    reflectance: 0.85,
    slabs: [shelf({ zTop: 0.2, reflectanceTop: 0.1 }), shelf({ reflectanceTop: 0.1, reflectanceBottom: 0.5 })],
    fixtures,
    planes: [plane({ id: 'low', z: 0.3 }), plane({ id: 'high', z: 1.1 })],
  });
const grids = (scene: LightScene) => evaluateLightScene(scene).planes.map(({ grid }) => grid);

const lampAnywhere = fc.record({
  x: fc.double({ min: 0.4, max: 1.6, noNaN: true }),
  y: fc.double({ min: 0.3, max: 0.9, noNaN: true }),
  tiltX: fc.double({ min: -1, max: 1, noNaN: true }),
  tiltY: fc.double({ min: -1, max: 1, noNaN: true }),
  beamAngleDeg: fc.double({ min: 20, max: 140, noNaN: true }),
});

describe('a light scene', () => {
  it('is linear in the photon flux: twice the lamp, twice the light, reflected light too', () => {
    fc.assert(
      fc.property(lampAnywhere, fc.double({ min: 0.01, max: 20, noNaN: true }), ({ x, y, tiltX, tiltY }, by) => {
        const lamp = panel({ position: [x, y, 1.6], aim: [tiltX, tiltY, -1] });
        const [one, more] = [grids(rack([lamp])), grids(rack([{ ...lamp, ppf: 100 * by }]))];
        one.forEach((grid, k) => grid.forEach((value, i) => expect(more[k]![i]).toBeCloseTo(by * value, 8)));
      }),
      { numRuns: 20 },
    );
  });

  it('adds up: two lamps together give the sum of each with the other dark', () => {
    const [a, b] = [panel({ id: 'a', position: [0.8, 0.6, 1.7] }), panel({ id: 'b', position: [1.2, 0.5, 0.85] })];
    const dark = (lamp: SceneFixture) => ({ ...lamp, ppf: 0 });
    const both = grids(rack([a, b]));
    const [first, second] = [grids(rack([a, dark(b)])), grids(rack([dark(a), b]))];
    both.forEach((grid, k) => grid.forEach((value, i) => expect(value).toBeCloseTo(first[k]![i]! + second[k]![i]!, 9)));
  });

  // Lambertian light is exact; a beam is summed over points, of which the mirror image takes others within its 2e-4.
  it.each([
    ['Lambertian', 1e-8],
    ['cosinePower', 2e-4],
  ] as const)('is its own mirror image: a mirrored %s lamp gives the mirrored grid, to %f', (type, within) => {
    fc.assert(
      fc.property(lampAnywhere, ({ x, y, tiltX, tiltY, beamAngleDeg }) => {
        const distribution = type === 'Lambertian' ? ({ type: 'lambertian' } as const) : { type, beamAngleDeg };
        const lamp = (position: number, tilt: number) =>
          panel({ position: [position, y, 1.6], aim: [tilt, tiltY, -1], distribution });
        const [one, mirrored] = [grids(rack([lamp(x, tiltX)])), grids(rack([lamp(2 - x, -tiltX)]))];
        one.forEach((grid, k) => {
          const { mean } = statistics(grid);
          grid.forEach((value, i) => {
            const across = i - (i % 10) + 9 - (i % 10);
            expect(Math.abs(mirrored[k]![across]! - value)).toBeLessThan(within * Math.max(mean, value));
          });
        });
      }),
      { numRuns: 15 },
    );
  });

  it('says how many of the photons cross a plane: all of them under a black box’s lamp with a plane over the whole floor', () => {
    const scene = lightScene({
      fixtures: [pointLamp({ position: [1, 0.6, 0.06], distribution: { type: 'cosinePower', beamAngleDeg: 30 } })],
      planes: [plane({ z: 0.0005, nx: 400, ny: 240 })],
    });
    const [result] = evaluateLightScene(scene).planes;
    expect(result!.incidentFrac).toBeCloseTo(1, 3);
  });

  it('states the plane’s figures over its cell centres, x inner and y outer', () => {
    expect(cellCentres(plane({ nx: 2, ny: 2, z: 0.4 }))).toEqual([
      [0.5, 0.3, 0.4],
      [1.5, 0.3, 0.4],
      [0.5, 0.8999999999999999, 0.4],
      [1.5, 0.8999999999999999, 0.4],
    ]);
    expect(statistics([2, 4, 9])).toEqual({ mean: 5, min: 2, max: 9, minOverMean: 0.4 });
    expect(statistics([0, 0])).toEqual({ mean: 0, min: 0, max: 0, minOverMean: 0 });
  });

  it('an empty tent is dark, without a lamp and with a lamp of nothing', () => {
    for (const fixtures of [[], [panel({ ppf: 0 })]]) {
      const result = evaluateLightScene(rack(fixtures));
      expect(result.planes.every(({ grid, incidentFrac }) => incidentFrac === 0 && grid.every((e) => e === 0))).toBe(
        true,
      );
      expect(result.energyBalance).toEqual({ emittedUmolS: 0, absorbedUmolS: 0 });
    }
  });

  it('warns where a table shines behind a face', () => {
    const distribution: Distribution = { type: 'table', gammaDeg: [0, 120], intensity: [1, 1] };
    const scene = lightScene({
      fixtures: [panel({ distribution })],
    });
    expect(evaluateLightScene(scene).warnings.join()).toContain('beyond 90°');
  });

  const bad: [string, LightScene][] = [
    ['an aim of no length', rack([panel({ aim: [0, 0, 0] })])],
    ['an axis along the aim', rack([panel({ axis: [0, 0, 2] })])],
    ['a face without width', rack([panel({ width: 0 })])],
    ['a negative photon flux', rack([panel({ ppf: -1 })])],
    ['a photon flux that is no number', rack([panel({ ppf: NaN })])],
    ['a lamp outside the tent', rack([panel({ position: [1, 0.6, 2.5] })])],
    ['a face that shines alike to all sides', rack([panel({ distribution: { type: 'isotropic' } })])],
    ['a beam of 200°', rack([panel({ distribution: { type: 'cosinePower', beamAngleDeg: 200 } })])],
    ['a wall that reflects all', lightScene({ reflectance: 1 })],
    ['a shelf more open than all', lightScene({ slabs: [shelf({ openFraction: 1.1 })] })],
    ['a plane without cells', lightScene({ planes: [plane({ nx: 0 })] })],
  ];
  it.each(bad)('refuses %s with the quantity and its range', (_, scene) => {
    expect(() => evaluateLightScene(scene)).toThrow(DomainError);
  });
});
