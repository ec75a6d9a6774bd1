import { describe, expect, it } from 'vitest';
import { evaluateLightScene, REFLECTED_IS_AN_ESTIMATE } from '@/physics/light/evaluate-light-scene';
import { firstBounce } from '@/physics/light/first-bounce';
import type { LightScene, SceneFixture } from '@/physics/light/light-documents';
import { prepareScene } from '@/physics/light/scene-geometry';
import { createZoneModel, solveZones } from '@/physics/light/zones';
import { faces, lightScene, panel, plane, pointLamp, shelf } from '../../support/black-box';
import { againstReference, readReference, readTruth, REFLECTING_SCENES } from '../../support/light-truth';

function levelsOf(scene: LightScene): Float64Array {
  const { emitters, solids } = prepareScene(scene);
  const model = createZoneModel(scene, emitters);
  const sum = new Float64Array(model.zones.length);
  for (const lamp of emitters)
    firstBounce({ scene, model, solids }, lamp).reflected.forEach((flux, zone) => (sum[zone]! += flux * lamp.ppf));
  return solveZones(model, sum);
}

describe('reflected light in one chamber', () => {
  it('gives the face means of CIE 171’s cube at every reflectance (energy balance Φ/(S(1 − ρ)))', () => {
    const { fluxLm, edgeM, reflectanceFrac, meanIlluminanceLx } = readTruth<{
      fluxLm: number;
      edgeM: number;
      reflectanceFrac: number[];
      meanIlluminanceLx: number[];
    }>('cube.json');
    reflectanceFrac.forEach((reflectance, i) => {
      const lamp = pointLamp({ position: [2, 2, 2], ppf: fluxLm, distribution: { type: 'isotropic' } });
      const scene = lightScene({
        tent: { width: edgeM, depth: edgeM, height: edgeM, reflectance: faces(reflectance) },
        fixtures: [lamp],
      });
      const directMean = fluxLm / (6 * edgeM * edgeM);
      // The table has two decimals.
      expect(directMean + levelsOf(scene)[0]!).toBeCloseTo(meanIlluminanceLx[i]!, 1.5);
    });
  });

  it('gives a mean of 200 µmol/m²/s over all faces of the white box p03, 200/(10 m²·0.1), to 1e-9', () => {
    const { scene } = readReference('p03_white_box');
    expect(200 / 10 + levelsOf(scene)[0]!).toBeCloseTo(200, 9);
  });
});

describe('reflected light in a stack of tiers', () => {
  /** Error of our tier means against the simulations, percent; printed in the name, so that a change shows. */
  const rows = REFLECTING_SCENES.flatMap((name) =>
    againstReference(name, (scene) => evaluateLightScene(scene).planes.map(({ grid }) => grid)),
  );

  // An estimate, not a solver: it takes each zone as evenly lit. These limits are what the product's warning says of it; they
  // are to shrink when surfaces exchange light one by one.
  it.each(
    rows.map((row) => [row.name, row.meanPct.toFixed(1), row.minPct.toFixed(1), row.rmsPct.toFixed(1), row] as const),
  )(
    '%s (Radiance 6.1): mean off by %s percent, darkest sensor by %s, rms %s; a lit tier within 7, spill alone within 11',
    (_name, _mean, _min, _rms, { meanPct, minPct, directShare }) => {
      expect(Math.abs(meanPct)).toBeLessThan(directShare > 0.1 ? 7 : 11);
      expect(minPct).toBeLessThan(40);
    },
  );

  it('does not light a shaded tier as a single integrating box would', () => {
    const { scene, reference } = readReference('p04_three_tiers_top_only');
    const single = levelsOf({ ...scene, slabs: [] })[0]!;
    const [lowest] = evaluateLightScene(scene).planes;
    expect(single).toBeGreaterThan(4 * reference.planes[0]!.mean);
    expect(lowest!.ppfdUmolM2S.mean).toBeLessThan(1.2 * reference.planes[0]!.mean);
  });

  it('loses no photon: absorbed equals emitted to 1e-9, whatever is in the tent', () => {
    const lamps: SceneFixture[] = [
      panel({ aim: [0.3, 0.2, -0.9], position: [1, 0.6, 1.8] }),
      panel({ id: 'low', position: [0.5, 0.5, 0.8], distribution: { type: 'cosinePower', beamAngleDeg: 6 } }),
      pointLamp({ distribution: { type: 'isotropic' } }),
      panel({
        id: 'bar',
        position: [1.5, 0.6, 0.85],
        housing: null,
        distribution: { type: 'table', gammaDeg: [0, 60, 110], intensity: [2, 3, 1] },
      }),
    ];
    const scene = lightScene({
      reflectance: 0.9,
      slabs: [
        shelf({ zTop: 0.3, reflectanceTop: 0.1, reflectanceBottom: 0.6, reflectanceEdge: 0.4 }),
        shelf({ id: 'mesh', zTop: 1.2, reflectanceTop: 0.5, openFraction: 0.4 }),
        shelf({ id: 'mesh2', zTop: 1.22, x0: 1.7, x1: 2, reflectanceTop: 0.5, openFraction: 0.4 }),
      ],
      boxes: [{ id: 'pipe', min: [0, 0.3, 0.6], max: [2, 0.35, 0.65], reflectance: 0.4 }],
      fixtures: lamps,
    });
    const { emittedUmolS, absorbedUmolS } = evaluateLightScene(scene).energyBalance;
    expect(absorbedUmolS / emittedUmolS).toBeCloseTo(1, 9);
  });

  it('says in plain words that it is an estimate, and only where something reflects', () => {
    const scene = (reflectance: number) =>
      lightScene({ reflectance, fixtures: [panel({ housing: null })], planes: [plane()] });
    expect(evaluateLightScene(scene(0.8)).warnings).toEqual([REFLECTED_IS_AN_ESTIMATE]);
    expect(evaluateLightScene(scene(0)).warnings).toEqual([]);
  });

  it('a lamp’s black face takes its share of a leaf’s sky: right below a large panel less is thrown back than beside it', () => {
    const scene = lightScene({
      reflectance: 0.9,
      fixtures: [
        pointLamp({ position: [0.2, 0.6, 1] }),
        panel({ ppf: 0, position: [1.4, 0.6, 1], length: 0.8, width: 0.8 }),
      ],
    });
    const grid = evaluateLightScene({
      ...scene,
      tent: { ...scene.tent, reflectance: { ...faces(0.9), floor: 0.9 } },
      planes: [plane({ z: 0.95, x0: 1.35, x1: 1.45, y0: 0.55, y1: 0.65, nx: 1, ny: 1 })],
    }).planes[0]!.grid;
    expect(grid[0]).toBeLessThan(0.1 * levelsOf(scene)[0]!);
  });
});
