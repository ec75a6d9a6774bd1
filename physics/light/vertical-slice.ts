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

/** The rows of the cut between one tier's top and the next: a lamp that moves among them leaves the others as they are. */
function bands(rows: readonly number[], tops: readonly number[]): number[][] {
  const edges = [...new Set(tops)].sort((a, b) => a - b);
  const found: number[][] = Array.from({ length: edges.length + 1 }, () => []);
  rows.forEach((z, row) => found[edges.filter((top) => top <= z).length]!.push(row));
  return found.filter((band) => band.length > 0);
}

/**
 * The light in a vertical cut through the tent, every lamp on at its dimming: what the section paints.
 *
 * @returns µmol/m²/s on a level leaf that faces up, at cell centres
 * @accuracy as tier-light.ts
 */
export function verticalSlice(
  document: ScenarioDocument,
  { cut, atM, nx, nz }: SliceRequest,
  cache?: LightCache,
): VerticalSlice {
  const { scenario } = resolveScenario(document);
  const { widthM, depthM, heightM } = scenario.tent;
  const front = cut === 'front';
  const across = front ? widthM : depthM;
  const field = createLightField(scenario, cache);
  const ppfdUmolM2S = new Float32Array(nx * nz);
  const heights = Array.from({ length: nz }, (_, row) => ((row + 0.5) / nz) * heightM);
  const tops = scenario.tiers.map((tier) => tier.topHeightM);
  for (const rows of bands(heights, tops)) {
    const points = rows.flatMap((row) =>
      Array.from({ length: nx }, (_, i): Vec3 => {
        const u = ((i + 0.5) / nx) * across;
        return front ? [u, atM, heights[row]!] : [atM, u, heights[row]!];
      }),
    );
    const first = rows[0]! * nx;
    const maps = field.lampsAt(pointSet(`slice ${cut},${atM},${nx},${nz},${rows[0]},${rows.length}`, points));
    scenario.placements.forEach(({ dimFrac }, index) => {
      const own = maps[index]!;
      for (let at = 0; at < own.length; at += 1) ppfdUmolM2S[first + at]! += own[at]! * dimFrac;
    });
    points.forEach((point, at) => {
      if (scenario.tiers.some((tier) => inside(point, tier))) ppfdUmolM2S[first + at] = NaN;
    });
  }
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
