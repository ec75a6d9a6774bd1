import { requireWithin } from '../domain-error';
import { createEmitter, type Emitter } from './emitter';
import type { LightScene, SceneBox, SceneSlab } from './light-documents';
import { uprightBox, type Occluder } from './occluder';

/** A scene made ready: lamps and everything that hides. */
export interface SceneGeometry {
  emitters: Emitter[];
  /** Tiers, boxes and lamps' bodies; large ones first, since they most often hide everything. */
  occluders: Occluder[];
  /** The tiers and boxes among them, with what they are made of. */
  solids: Solid[];
}

export type Solid = { occluder: Occluder } & ({ kind: 'slab'; slab: SceneSlab } | { kind: 'box'; box: SceneBox });

/** A mesh is a sheet at its top: the share that it lets through goes straight on at every angle. */
export const undersideOf = (slab: SceneSlab): number => slab.zTop - (slab.openFraction > 0 ? 0 : slab.thickness);

function requireTent({ tent }: LightScene): void {
  for (const quantity of ['width', 'depth', 'height'] as const)
    requireWithin({ quantity: `${quantity} of the tent`, value: tent[quantity], min: 0.1, max: 20, unit: 'm' });
  for (const [face, value] of Object.entries(tent.reflectance))
    requireWithin({ quantity: `reflectance of ${face}`, value, min: 0, max: 0.99, unit: '' });
}

/** What sums of decimals leave over is no distance. */
const ROUNDING_M = 1e-9;

function requireInside({ position, id }: Emitter, { tent }: LightScene): void {
  [tent.width, tent.depth, tent.height].forEach((max, i) => {
    const value = position[i]!;
    const snapped = Math.abs(value) < ROUNDING_M ? 0 : Math.abs(value - max) < ROUNDING_M ? max : value;
    requireWithin({ quantity: `${'xyz'[i]} of lamp ${id}`, value: snapped, min: 0, max, unit: 'm' });
  });
}

export function prepareScene(scene: LightScene): SceneGeometry {
  requireTent(scene);
  const emitters = scene.fixtures.map(createEmitter);
  for (const lamp of emitters) requireInside(lamp, scene);
  const slabs = scene.slabs.map((slab): Solid => {
    requireWithin({ quantity: `open share of tier ${slab.id}`, value: slab.openFraction, min: 0, max: 1, unit: '' });
    const occluder = uprightBox({
      low: [slab.x0, slab.y0, undersideOf(slab)],
      high: [slab.x1, slab.y1, slab.zTop],
      stops: 1 - slab.openFraction,
    });
    return { kind: 'slab', slab, occluder };
  });
  const boxes = scene.boxes.map((box): Solid => ({
    kind: 'box',
    box,
    occluder: uprightBox({ low: box.min, high: box.max }),
  }));
  const solids = [...slabs, ...boxes].filter(({ occluder }) => occluder.stops > 0);
  return {
    emitters,
    solids,
    occluders: [
      ...solids.map(({ occluder }) => occluder),
      ...emitters.flatMap((lamp) => (lamp.body ? [lamp.body] : [])),
    ],
  };
}
