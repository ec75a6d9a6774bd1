/**
 * The optics alone: `light-scene/1` in, `light-result/1` out.
 *
 * Metres, µmol/s, µmol/m²/s and degrees throughout. The origin is the tent's inner front-left floor
 * corner: x to the right, y to the back, z up.
 */

export type Vec3 = readonly [x: number, y: number, z: number];

export type Distribution =
  | { type: 'lambertian' }
  | { type: 'cosinePower'; beamAngleDeg: number }
  | { type: 'isotropic' }
  | { type: 'table'; gammaDeg: number[]; cDeg?: number[] | undefined; intensity: number[] | number[][] };

/** Diffuse reflectance of the six inner faces of the box, 0..0.99. */
export interface FaceReflectance {
  xMin: number;
  xMax: number;
  yMin: number;
  yMax: number;
  ceiling: number;
  floor: number;
}

export interface SceneTent {
  width: number;
  depth: number;
  height: number;
  reflectance: FaceReflectance;
}

export interface SceneSlab {
  id: string;
  zTop: number;
  thickness: number;
  x0: number;
  x1: number;
  y0: number;
  y1: number;
  reflectanceTop: number;
  reflectanceBottom: number;
  reflectanceEdge: number;
  openFraction: number;
}

export interface SceneBox {
  id: string;
  min: Vec3;
  max: Vec3;
  reflectance: number;
}

export interface SceneFixture {
  id: string;
  shape: 'rect' | 'point';
  position: Vec3;
  aim: Vec3;
  axis: Vec3;
  length?: number | undefined;
  width?: number | undefined;
  ppf: number;
  distribution: Distribution;
  housing?: { thickness: number; reflectance: number } | null | undefined;
}

export interface ScenePlane {
  id: string;
  slab?: string | null | undefined;
  z: number;
  x0: number;
  x1: number;
  y0: number;
  y1: number;
  nx: number;
  ny: number;
}

export interface LightScene {
  schema: 'light-scene/1';
  id?: string | undefined;
  title?: unknown;
  covers?: unknown;
  units?: string | undefined;
  tent: SceneTent;
  slabs: SceneSlab[];
  boxes: SceneBox[];
  fixtures: SceneFixture[];
  planes: ScenePlane[];
}

export interface PpfdStatistics {
  mean: number;
  min: number;
  max: number;
  minOverMean: number;
}

export interface PlaneResult {
  id: string;
  ppfdUmolM2S: PpfdStatistics;
  incidentFrac: number;
  nx: number;
  ny: number;
  /** PPFD at cell centres, row-major, y outer from y0, x inner from x0. */
  grid: number[];
}

export interface LightResult {
  schema: 'light-result/1';
  planes: PlaneResult[];
  energyBalance: { emittedUmolS: number; absorbedUmolS: number };
  warnings: string[];
  elapsedMs: number;
}
