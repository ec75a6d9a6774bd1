import type { LightScene, SceneFixture, ScenePlane, SceneSlab } from '@/physics/light/light-documents';

export const faces = (value: number) => ({
  xMin: value,
  xMax: value,
  yMin: value,
  yMax: value,
  ceiling: value,
  floor: value,
});

/** A tent of 2 × 1.2 × 2 m, black unless said otherwise. */
export function lightScene(parts: Partial<LightScene> & { reflectance?: number } = {}): LightScene {
  const { reflectance = 0, ...rest } = parts;
  return {
    schema: 'light-scene/1',
    tent: { width: 2, depth: 1.2, height: 2, reflectance: faces(reflectance) },
    slabs: [],
    boxes: [],
    fixtures: [],
    planes: [],
    ...rest,
  };
}

export const pointLamp = (parts: Partial<SceneFixture> = {}): SceneFixture => ({
  id: 'point',
  shape: 'point',
  position: [1, 0.6, 1.5],
  aim: [0, 0, -1],
  axis: [1, 0, 0],
  ppf: 100,
  distribution: { type: 'lambertian' },
  ...parts,
});

export const panel = (parts: Partial<SceneFixture> = {}): SceneFixture => ({
  id: 'panel',
  shape: 'rect',
  position: [1, 0.6, 1.5],
  aim: [0, 0, -1],
  axis: [1, 0, 0],
  length: 0.6,
  width: 0.3,
  ppf: 100,
  distribution: { type: 'lambertian' },
  housing: { thickness: 0.04, reflectance: 0 },
  ...parts,
});

export const shelf = (parts: Partial<SceneSlab> = {}): SceneSlab => ({
  id: 'shelf',
  zTop: 1,
  thickness: 0.02,
  x0: 0.4,
  x1: 1.6,
  y0: 0.2,
  y1: 1,
  reflectanceTop: 0,
  reflectanceBottom: 0,
  reflectanceEdge: 0,
  openFraction: 0,
  ...parts,
});

export const plane = (parts: Partial<ScenePlane> = {}): ScenePlane => ({
  id: 'plane',
  z: 0.3,
  x0: 0,
  x1: 2,
  y0: 0,
  y1: 1.2,
  nx: 10,
  ny: 6,
  ...parts,
});
