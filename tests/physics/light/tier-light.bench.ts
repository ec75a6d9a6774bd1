import { bench, describe } from 'vitest';
import { createLightCache } from '@/physics/light/light-cache';
import { solveTierLight } from '@/physics/light/tier-light';
import { verticalSlice } from '@/physics/light/vertical-slice';
import { resolveScenario } from '@/physics/plan/resolve-scenario';
import { rackScenario } from '../../support/rack-scenario';

// What a person waits for while a lamp is held: well under a frame of 16 ms.
describe.each(['lambertian', 'cosinePower'] as const)('four tiers, twelve %s bars', (type) => {
  const distribution = type === 'lambertian' ? { type } : { type, beamAngleDeg: 90 };
  const doc = rackScenario({ lamps: 12, tiers: 4, distribution });
  const cache = createLightCache();
  let turn = 0;

  bench('every tier, nothing kept', () => {
    solveTierLight(resolveScenario(doc).scenario);
  });
  bench('every tier, one lamp moved', () => {
    turn += 1;
    doc.placements[7]!.positionM = [1 + 0.3 * Math.sin(turn), 0.6, 2.02];
    solveTierLight(resolveScenario(doc).scenario, cache);
  });
  bench('every tier, one lamp dimmed', () => {
    turn += 1;
    doc.placements[3]!.dimFrac = 0.5 + 0.4 * Math.sin(turn);
    solveTierLight(resolveScenario(doc).scenario, cache);
  });
});

describe.each(['lambertian', 'cosinePower'] as const)('a cut of 60 × 90 cells, four %s bars', (type) => {
  const distribution = type === 'lambertian' ? { type } : { type, beamAngleDeg: 90 };
  const doc = rackScenario({ lamps: 4, tiers: 4, distribution });
  const cache = createLightCache();
  let turn = 0;

  bench('nothing kept', () => {
    verticalSlice(doc, { cut: 'front', atM: 0.6, nx: 60, nz: 90 });
  });
  bench('one lamp moved', () => {
    turn += 1;
    doc.placements[1]!.positionM = [1.2 + 0.3 * Math.sin(turn), 0.6, 1.02];
    verticalSlice(doc, { cut: 'front', atM: 0.6, nx: 60, nz: 90 }, cache);
  });
});
