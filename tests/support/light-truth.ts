import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import type { LightScene } from '@/physics/light/light-documents';

export interface ReferencePlane {
  id: string;
  nx: number;
  ny: number;
  ppfd: number[];
  direct: number[];
  indirect: number[];
  mean: number;
  min: number;
}

export interface LightReference {
  scene: LightScene;
  reference: { planes: ReferencePlane[] };
}

export function readTruth<T>(file: string): T {
  const path = fileURLToPath(new URL(`../truth/light/${file}`, import.meta.url));
  return JSON.parse(readFileSync(path, 'utf8')) as T;
}

export const REFERENCE_SCENES = [
  'p01_black_point',
  'p02_black_panel',
  'p03_white_box',
  'p04_three_tiers_top_only',
  'p05_three_tiers_clamps',
  'p06_bars_under_shelves',
  'p07_tilted_spot_pipes',
  'p08_low_hang',
] as const;

/** Those with something that reflects. */
export const REFLECTING_SCENES = REFERENCE_SCENES.slice(2);

export const readReference = (name: (typeof REFERENCE_SCENES)[number]): LightReference =>
  readTruth<LightReference>(`${name}.json`);

/** The same scene with every surface black: what is left is direct light. */
export function blackened(scene: LightScene): LightScene {
  const black = structuredClone(scene);
  for (const face of Object.keys(black.tent.reflectance) as (keyof typeof black.tent.reflectance)[])
    black.tent.reflectance[face] = 0;
  for (const slab of black.slabs) slab.reflectanceTop = slab.reflectanceBottom = slab.reflectanceEdge = 0;
  for (const box of black.boxes) box.reflectance = 0;
  for (const { housing } of black.fixtures) if (housing) housing.reflectance = 0;
  return black;
}

export const meanOf = (values: ArrayLike<number>): number =>
  Array.from(values).reduce((a, b) => a + b, 0) / values.length;

/** How far grids, one for each plane, are from a scene's reference; percent of the reference, rms of its mean. */
export function againstReference(
  name: (typeof REFERENCE_SCENES)[number],
  gridsOf: (scene: LightScene) => ArrayLike<number>[],
) {
  const { scene, reference } = readReference(name);
  const grids = gridsOf(scene);
  const emitted = scene.fixtures.reduce((sum, { ppf }) => sum + ppf, 0);
  return reference.planes.map(({ id, mean, min, ppfd, direct }, at) => {
    const grid = Array.from(grids[at]!);
    const { x0, x1, y0, y1 } = scene.planes[at]!;
    return {
      name: `${name.slice(0, 3)} ${id}`,
      meanPct: 100 * (meanOf(grid) / mean - 1),
      minPct: 100 * (Math.min(...grid) / min - 1),
      rmsPct: (100 * Math.sqrt(meanOf(grid.map((value, i) => (value - ppfd[i]!) ** 2)))) / mean,
      directShare: meanOf(direct) / mean,
      shareOfPhotons: (mean * (x1 - x0) * (y1 - y0)) / emitted,
    };
  });
}
