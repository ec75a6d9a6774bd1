import { createEmitter, type Emitter } from './emitter';
import type { LightScene } from './light-documents';
import { uprightBox, type Occluder } from './occluder';

/** A scene made ready: lamps and everything that hides. */
export interface SceneGeometry {
  emitters: Emitter[];
  occluders: Occluder[];
}

export function prepareScene(scene: LightScene): SceneGeometry {
  const emitters = scene.fixtures.map(createEmitter);
  const occluders = [
    ...scene.slabs.map((slab) =>
      uprightBox({
        // A mesh is a sheet at its top: the share that it lets through goes straight on at every angle.
        low: [slab.x0, slab.y0, slab.zTop - (slab.openFraction > 0 ? 0 : slab.thickness)],
        high: [slab.x1, slab.y1, slab.zTop],
        stops: 1 - slab.openFraction,
      }),
    ),
    ...scene.boxes.map((box) => uprightBox({ low: box.min, high: box.max })),
    ...emitters.flatMap((lamp) => (lamp.body ? [lamp.body] : [])),
  ].filter((box) => box.stops > 0);
  return { emitters, occluders };
}
