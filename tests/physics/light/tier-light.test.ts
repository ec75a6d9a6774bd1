import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evaluateLightScene } from '@/physics/light/evaluate-light-scene';
import { createLightCache } from '@/physics/light/light-cache';
import { sceneFromScenario } from '@/physics/light/scene-from-scenario';
import { percentile, solveTierLight } from '@/physics/light/tier-light';
import { verticalSlice } from '@/physics/light/vertical-slice';
import type { ScenePlane } from '@/physics/light/light-documents';
import { resolveScenario } from '@/physics/plan/resolve-scenario';
import type { ScenarioDocument } from '@/physics/plan/scenario-document';
import { rackScenario } from '../../support/rack-scenario';

const tiersOf = (doc: ScenarioDocument, cache?: ReturnType<typeof createLightCache>) =>
  solveTierLight(resolveScenario(doc).scenario, cache);

function closeTo(actual: ArrayLike<number>, expected: ArrayLike<number>): void {
  expect(actual.length).toBe(expected.length);
  for (let i = 0; i < expected.length; i += 1)
    expect(Math.abs(actual[i]! - expected[i]!)).toBeLessThan(1e-9 * (1 + Math.abs(expected[i]!)));
}

/** The same rack as a light scene, where every lamp's body is met by every line: nothing is left out, nothing kept. */
function sceneOf(doc: ScenarioDocument, lights: ReturnType<typeof tiersOf>) {
  const { scenario } = resolveScenario(doc);
  const planes = lights.map(({ id, nx, ny }, i): ScenePlane => {
    const { topHeightM, canopyHeightM, x0M, x1M, y0M, y1M } = scenario.tiers[i]!;
    return { id, z: topHeightM + canopyHeightM, x0: x0M, x1: x1M, y0: y0M, y1: y1M, nx, ny };
  });
  return evaluateLightScene({ ...sceneFromScenario(scenario), planes });
}

describe('light on every tier', () => {
  it('equals the light scene of the same rack at canopy height, to 1e-9', () => {
    const doc = rackScenario({ lamps: 6, tiers: 3 });
    doc.placements[1]!.aim = [0.4, 0.3, -0.8];
    doc.placements[4]!.positionM = [1.1, 0.55, 0.7];
    const lights = tiersOf(doc);
    const { planes } = sceneOf(doc, lights);
    lights.forEach(({ grid, incidentFrac }, i) => {
      closeTo(grid, planes[i]!.grid);
      expect(incidentFrac).toBeCloseTo(planes[i]!.incidentFrac, 9);
    });
  });

  it('has cells at most 10 cm wide over the tier’s extent', () => {
    const doc = rackScenario({ lamps: 1, tiers: 2 });
    doc.tiers[0]!.x1M = 1.15;
    expect(tiersOf(doc).map(({ nx, ny }) => [nx, ny])).toEqual([
      [11, 10],
      [22, 10],
    ]);
  });

  it('is the sum of its placements, each in proportion to its dimming', () => {
    const doc = rackScenario({ lamps: 4, tiers: 2 });
    const full = tiersOf(doc);
    doc.placements[2]!.dimFrac = 0.3;
    doc.placements[3]!.dimFrac = 0;
    tiersOf(doc).forEach((tier, t) => {
      const [a, b, c, d] = tier.byPlacement;
      closeTo(
        tier.grid,
        a!.grid.map((value, i) => value + b!.grid[i]! + c!.grid[i]! + d!.grid[i]!),
      );
      closeTo(
        c!.grid,
        full[t]!.byPlacement[2]!.grid.map((value) => 0.3 * value),
      );
      expect(d!.meanPpfdUmolM2S).toBe(0);
    });
  });

  it('takes the tenth percentile over cell centres, linear between neighbours', () => {
    expect(percentile([5, 1, 3, 2, 4], 0.1)).toBeCloseTo(1.4, 12);
    expect(percentile([7], 0.1)).toBe(7);
    const [tier] = tiersOf(rackScenario({ lamps: 2, tiers: 1 }));
    const { min, p10, mean, max } = tier!.ppfdUmolM2S;
    expect(min <= p10 && p10 <= mean && mean <= max).toBe(true);
    const below = Array.from(tier!.grid).filter((value) => value < p10).length;
    expect(below / tier!.grid.length).toBeCloseTo(0.1, 1.5);
  });

  it('keeps nothing stale and leaves out no body that hides: after any drag, tilt or change of the rack it equals the light scene', () => {
    const move = fc.record({
      lamp: fc.integer({ min: 0, max: 3 }),
      x: fc.double({ min: 0.1, max: 2.3, noNaN: true }),
      y: fc.double({ min: 0.1, max: 1.1, noNaN: true }),
      z: fc.double({ min: 0.05, max: 2.15, noNaN: true }),
      tilt: fc.double({ min: -1, max: 1, noNaN: true }),
      shelfM: fc.constantFrom(0, 0, 0, 0.03),
    });
    fc.assert(
      fc.property(fc.array(move, { minLength: 1, maxLength: 5 }), (moves) => {
        const doc = rackScenario({ lamps: 4, tiers: 3 });
        const bulb = { shape: 'point', distribution: { type: 'isotropic' } } as const;
        doc.fixtures.push({ ...doc.fixtures[0]!, ...bulb, id: 'bulb' });
        doc.placements[3]!.fixture = 'bulb';
        const cache = createLightCache();
        tiersOf(doc, cache);
        for (const { lamp, x, y, z, tilt, shelfM } of moves) {
          doc.placements[lamp]!.positionM = [x, y, z];
          doc.placements[lamp]!.aim = [tilt, 0.2, -1];
          doc.tiers[1]!.topHeightM += shelfM;
          const cached = tiersOf(doc, cache);
          const { planes } = sceneOf(doc, cached);
          cached.forEach((tier, t) => closeTo(tier.grid, planes[t]!.grid));
        }
      }),
      { numRuns: 12 },
    );
  });

  it('reckons one lamp alone when one lamp moves over its own tier', () => {
    const doc = rackScenario({ lamps: 8, tiers: 4 });
    const cache = createLightCache();
    tiersOf(doc, cache);
    const before = new Map(cache.entries);
    doc.placements[3]!.positionM = [0.7, 0.6, 2.02];
    tiersOf(doc, cache);
    const added = [...cache.entries.keys()].filter((key) => !before.has(key));
    // Of the top lamp: its first bounce, and for each of four tiers its light and its face. No other lamp is below its body.
    expect(added).toHaveLength(9);
  });
});

describe('a vertical cut', () => {
  const request = { cut: 'front', atM: 0.6, nx: 24, nz: 44 } as const;

  it('agrees with the tiers’ own cells where the two meet, to single precision', () => {
    const doc = rackScenario({ lamps: 4, tiers: 2 });
    // A canopy at the height of a row of the cut, and a cut through a row of cells.
    const row = 6;
    doc.tiers[0]!.canopyHeightM = ((row + 0.5) / 44) * 2.2 - 0.1;
    const [tier] = tiersOf(doc);
    const { ppfdUmolM2S } = verticalSlice(doc, { ...request, atM: 0.65 });
    for (let i = 0; i < 22; i += 1) expect(ppfdUmolM2S[row * 24 + i + 1]! / tier!.grid[5 * 22 + i]!).toBeCloseTo(1, 6);
  });

  it('is not a number inside a tier, and a number everywhere else', () => {
    const doc = rackScenario({ lamps: 2, tiers: 1 });
    doc.tiers[0]!.thicknessM = 0.1;
    doc.tiers[0]!.topHeightM = 0.5;
    const { ppfdUmolM2S } = verticalSlice(doc, request);
    ppfdUmolM2S.forEach((value, at) => {
      const z = ((Math.floor(at / 24) + 0.5) / 44) * 2.2;
      const x = ((at % 24) + 0.5) * 0.1;
      expect(Number.isNaN(value)).toBe(z > 0.4 && z < 0.5 && x > 0.1 && x < 2.3);
    });
  });

  it('looks along the other axis for the side cut', () => {
    const doc = rackScenario({ lamps: 1, tiers: 1 });
    doc.placements[0]!.positionM = [0.5, 0.3, 1.5];
    const { ppfdUmolM2S } = verticalSlice(doc, { cut: 'side', atM: 0.5, nx: 12, nz: 20 });
    // A leaf right under the lamp, y = 0.35, gets more than one at y = 0.95.
    expect(ppfdUmolM2S[10 * 12 + 3]).toBeGreaterThan(2 * ppfdUmolM2S[10 * 12 + 9]!);
  });

  it('gives the same with a cache as without', () => {
    const doc = rackScenario({ lamps: 4, tiers: 2, distribution: { type: 'cosinePower', beamAngleDeg: 80 } });
    const cache = createLightCache();
    verticalSlice(doc, request, cache);
    doc.placements[0]!.positionM = [1.3, 0.4, 0.3];
    expect(verticalSlice(doc, request, cache)).toEqual(verticalSlice(doc, request));
  });
});
