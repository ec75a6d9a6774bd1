import { describe, expect, it } from 'vitest';
import { directPpfd } from '@/physics/light/direct';
import { cellCentres } from '@/physics/light/evaluate-light-scene';
import { exchangeOf } from '@/physics/light/exchange';
import type { LightScene } from '@/physics/light/light-documents';
import { meshOf } from '@/physics/light/patches';
import { reflectedByExchange } from '@/physics/light/reflected';
import { prepareScene } from '@/physics/light/scene-geometry';
import { surfacesOf } from '@/physics/light/surfaces';
import { lightScene, panel, shelf } from '../../support/black-box';
import { meanOf, readReference } from '../../support/light-truth';

function patchesOf(scene: LightScene, cellM: number) {
  const geometry = prepareScene(scene);
  const { emitters, occluders, solids } = geometry;
  const cutting = solids.map(({ occluder }) => occluder);
  const patches = meshOf(surfacesOf(scene, solids, emitters), scene, occluders, cutting, { cellM, mostPatches: 2000 })!;
  return { patches, occluders };
}

describe('light exchanged between surfaces', () => {
  /** Radiance 6.1 (tests/truth/light/SOURCE.md): its sensors are sure to 0.2 to 0.4 % of the tier's mean, 1 % in the dimmest. */
  const rows = (
    [
      'p03_white_box',
      'p04_three_tiers_top_only',
      'p05_three_tiers_clamps',
      'p06_bars_under_shelves',
      'p07_tilted_spot_pipes',
      'p08_low_hang',
    ] as const
  ).flatMap((name) => {
    const { scene, reference } = readReference(name);
    const geometry = prepareScene(scene);
    const reflected = reflectedByExchange(scene, geometry)!;
    const emitted = geometry.emitters.reduce((sum, lamp) => sum + lamp.ppf, 0);
    return reference.planes.map(({ id, mean, min, ppfd }, at) => {
      const plane = scene.planes[at]!;
      const back = reflected.on(plane);
      const grid = cellCentres(plane).map((point, i) =>
        geometry.emitters.reduce((sum, lamp) => sum + directPpfd(point, [0, 0, 1], lamp, geometry.occluders), back[i]!),
      );
      return {
        name: `${name.slice(0, 3)} ${id}`,
        meanPct: 100 * (meanOf(grid) / mean - 1),
        minPct: 100 * (Math.min(...grid) / min - 1),
        rmsPct: (100 * Math.sqrt(meanOf(grid.map((value, i) => (value - ppfd[i]!) ** 2)))) / mean,
        // A tier that gets under a twentieth of the photons: what finds its way down there is a small rest of much.
        dim: (mean * (plane.x1 - plane.x0) * (plane.y1 - plane.y0)) / emitted < 0.05,
        balance: reflected.absorbedUmolS / emitted,
      };
    });
  });

  it.each(
    rows.map((row) => [row.name, row.meanPct.toFixed(2), row.rmsPct.toFixed(2), row.minPct.toFixed(2), row] as const),
  )(
    '%s (Radiance 6.1): mean off by %s percent, single sensors by %s rms, the darkest by %s',
    (_name, _mean, _rms, _min, { meanPct, rmsPct, minPct, dim }) => {
      expect(Math.abs(meanPct)).toBeLessThan(dim ? 2 : 1);
      expect(rmsPct).toBeLessThan(dim ? 3 : 1.5);
      expect(Math.abs(minPct)).toBeLessThan(dim ? 6 : 3);
    },
  );

  it('loses no photon: what is absorbed equals what is emitted to 1e-9, in every one of these tents', () => {
    for (const { balance } of rows) expect(balance).toBeCloseTo(1, 9);
  });

  it('is mutual to the bit, and every row closes on its patch’s area', () => {
    const { patches, occluders } = patchesOf(
      lightScene({
        reflectance: 0.9,
        slabs: [
          shelf({ zTop: 0.3, reflectanceTop: 0.1, reflectanceBottom: 0.6, reflectanceEdge: 0.4 }),
          shelf({ id: 'mesh', zTop: 1.2, reflectanceTop: 0.5, openFraction: 0.4 }),
        ],
        boxes: [{ id: 'pipe', min: [0, 0.3, 0.6], max: [2, 0.35, 0.65], reflectance: 0.4 }],
        fixtures: [panel({ aim: [0.3, 0.2, -0.9], position: [1, 0.6, 1.8] })],
      }),
      0.6,
    );
    const { exchange } = exchangeOf(patches, occluders);
    const n = patches.length;
    for (let i = 0; i < n; i += 1) {
      let sum = 0;
      for (let j = 0; j < n; j += 1) {
        expect(exchange[i * n + j]).toBe(exchange[j * n + i]);
        sum += exchange[i * n + j]!;
      }
      expect(sum / patches[i]!.areaM2).toBeCloseTo(1, 12);
    }
  });

  it('lights a white box evenly: 200 µmol/m²/s on the mean of all faces, Φ/(A(1 − ρ)), to 1e-9', () => {
    const { scene } = readReference('p03_white_box');
    // Absorbed is (1 − ρ)·A·Ē with one reflectance all over: the integrating enclosure.
    const reflected = reflectedByExchange(scene, prepareScene(scene))!;
    expect(reflected.absorbedUmolS / (0.1 * 10)).toBeCloseTo(200, 9);
  });

  it('leaves out what stands on a surface: the floor under a box is no floor', () => {
    const box = { id: 'reservoir', min: [0.2, 0.2, 0] as const, max: [0.8, 0.7, 0.3] as const, reflectance: 0.3 };
    const area = (scene: LightScene) =>
      patchesOf(scene, 0.4)
        .patches.filter(({ normal, centre }) => normal[2] === 1 && centre[2] === 0)
        .reduce((sum, patch) => sum + patch.areaM2, 0);
    const bare = lightScene({ reflectance: 0.5 });
    expect(area(bare) - area({ ...bare, boxes: [box] })).toBeCloseTo(0.6 * 0.5, 9);
  });
});
