import type { ResolvedFixture, ResolvedPlacement, ResolvedScenario } from '../plan/resolved-scenario';
import type { LightScene, SceneFixture } from './light-documents';

export function sceneFixture(placement: ResolvedPlacement, fixture: ResolvedFixture): SceneFixture {
  const rect = fixture.shape === 'rect';
  return {
    id: placement.id,
    shape: fixture.shape,
    position: placement.positionM,
    aim: placement.aim,
    axis: placement.axis,
    ...(rect && {
      length: fixture.lengthM,
      width: fixture.widthM,
      housing: { thickness: fixture.housingThicknessM, reflectance: fixture.housingReflectanceFrac },
    }),
    ppf: fixture.ppfUmolS,
    distribution: fixture.distribution,
  };
}

/** The optics of a scenario: every lamp at full output; planes are made where they are wanted. */
export function sceneFromScenario(scenario: ResolvedScenario): LightScene {
  const fixtures = new Map(scenario.fixtures.map((fixture) => [fixture.id, fixture]));
  return {
    schema: 'light-scene/1',
    tent: {
      width: scenario.tent.widthM,
      depth: scenario.tent.depthM,
      height: scenario.tent.heightM,
      reflectance: scenario.tent.reflectance,
    },
    slabs: scenario.tiers.map((tier) => ({
      id: tier.id,
      zTop: tier.topHeightM,
      thickness: tier.thicknessM,
      x0: tier.x0M,
      x1: tier.x1M,
      y0: tier.y0M,
      y1: tier.y1M,
      reflectanceTop: tier.topReflectanceFrac,
      reflectanceBottom: tier.bottomReflectanceFrac,
      reflectanceEdge: tier.edgeReflectanceFrac,
      openFraction: tier.openFrac,
    })),
    boxes: scenario.boxes.map(({ id, min, max, reflectanceFrac }) => ({ id, min, max, reflectance: reflectanceFrac })),
    fixtures: scenario.placements.flatMap((placement) => {
      const fixture = fixtures.get(placement.fixture);
      return fixture ? [sceneFixture(placement, fixture)] : [];
    }),
    planes: [],
  };
}
