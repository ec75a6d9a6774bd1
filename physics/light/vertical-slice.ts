import type { ScenarioDocument } from '../plan/scenario-document';
import { resolveScenario } from '../plan/resolve-scenario';
import type { Vec3 } from './light-documents';
import { createLightField, pointSet, type LightCache } from './light-field';

export interface SliceRequest {
  /** front: the plane y = atM, x across; side: the plane x = atM, y across. */
  cut: 'front' | 'side';
  atM: number;
  nx: number;
  nz: number;
}

export interface VerticalSlice {
  nx: number;
  nz: number;
  /** PPFD on a level leaf at cell centres, across inner and height outer from the floor; NaN inside a tier. */
  ppfdUmolM2S: Float32Array;
}

/** The light in a vertical cut through the tent, every lamp on at its dimming: what the section paints. */
export function verticalSlice(
  document: ScenarioDocument,
  { cut, atM, nx, nz }: SliceRequest,
  cache?: LightCache,
): VerticalSlice {
  const { scenario } = resolveScenario(document);
  const { widthM, depthM, heightM } = scenario.tent;
  const front = cut === 'front';
  const across = front ? widthM : depthM;
  const points: Vec3[] = [];
  const solid = new Uint8Array(nx * nz);
  for (let k = 0; k < nz; k += 1) {
    for (let i = 0; i < nx; i += 1) {
      const u = ((i + 0.5) / nx) * across;
      const point: Vec3 = front ? [u, atM, ((k + 0.5) / nz) * heightM] : [atM, u, ((k + 0.5) / nz) * heightM];
      points.push(point);
      if (scenario.tiers.some((tier) => inside(point, tier))) solid[k * nx + i] = 1;
    }
  }
  const field = createLightField(scenario, cache);
  const set = pointSet(`slice ${cut},${atM},${nx},${nz}`, points);
  const ppfdUmolM2S = new Float32Array(points.length);
  const maps = field.lampsAt(set);
  scenario.placements.forEach((placement, index) => {
    if (placement.dimFrac === 0) return;
    const own = maps[index]!;
    for (let at = 0; at < own.length; at += 1) ppfdUmolM2S[at]! += own[at]! * placement.dimFrac;
  });
  solid.forEach((is, at) => {
    if (is) ppfdUmolM2S[at] = NaN;
  });
  return { nx, nz, ppfdUmolM2S };
}

function inside(
  point: Vec3,
  tier: { x0M: number; x1M: number; y0M: number; y1M: number; topHeightM: number; thicknessM: number },
): boolean {
  return (
    point[0] > tier.x0M &&
    point[0] < tier.x1M &&
    point[1] > tier.y0M &&
    point[1] < tier.y1M &&
    point[2] < tier.topHeightM &&
    point[2] > tier.topHeightM - tier.thicknessM
  );
}
