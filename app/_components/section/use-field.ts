'use client';

import { useDeferredValue, useMemo, useState } from 'react';
import { createLightCache, verticalSlice, type ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import { paintField, type FieldGrid, type PaintedField } from './field-contours';
import type { SectionFrame } from './section-frame';

/** Cells of the painted cut: coarse while something is held, fine when it is let go. */
const HELD_CELL_M = 0.05;
const FINE_CELL_M = 0.02;
const MOST_CELLS = 9000;

function slice(
  doc: ScenarioDocument,
  frame: SectionFrame,
  cellM: number,
  cache: ReturnType<typeof createLightCache>,
): FieldGrid | null {
  const most = Math.sqrt((frame.acrossM * frame.heightM) / MOST_CELLS);
  const cell = Math.max(cellM, most);
  const request = {
    cut: frame.view,
    atM: (frame.view === 'front' ? doc.tent.depthM : doc.tent.widthM) / 2,
    nx: Math.max(8, Math.round(frame.acrossM / cell)),
    nz: Math.max(8, Math.round(frame.heightM / cell)),
  };
  try {
    return verticalSlice(doc, request, cache);
  } catch {
    // A plan that the physics refuses has no field; the page says why elsewhere.
    return null;
  }
}

/** The light in the cut. It may lag a frame behind a held lamp: figures come first. */
export function useField(doc: ScenarioDocument, frame: SectionFrame, held: boolean): PaintedField | null {
  const [cache] = useState(createLightCache);
  const shown = useDeferredValue(doc);
  const coarse = useDeferredValue(held);
  const grid = useMemo(
    () => slice(shown, frame, coarse ? HELD_CELL_M : FINE_CELL_M, cache),
    // Only the view and the tent's size of the frame matter to the light.
    // eslint-disable-next-line react-hooks/exhaustive-deps
    [shown, coarse, cache, frame.view, frame.acrossM, frame.heightM],
  );
  return useMemo(() => (grid ? paintField(grid, frame) : null), [grid, frame]);
}
