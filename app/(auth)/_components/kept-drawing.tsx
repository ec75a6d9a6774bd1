'use client';

import { demoDocument } from '@/app/_components/demo-document';
import { useDraft } from '@/app/_components/draft';
import { TentMiniature } from '@/app/_components/tent-miniature';

const WIDTH = 300;
const FLOOR = 356;
const words = (count: number, one: string, many: string) => `${count} ${count === 1 ? one : many}`;

/** The visitor's own tent on the floor of the room, or an example that says it is one. */
export function KeptDrawing() {
  const draft = useDraft();
  const doc = draft ?? demoDocument;
  const pxPerM = Math.min(236 / doc.tent.widthM, 330 / doc.tent.heightM);
  return (
    <div className="w-75">
      <p className="pb-1 text-14 font-semibold">
        {draft ? 'Your drawing of today is kept.' : 'A tent, to begin with.'}
      </p>
      <p className="pb-2 text-12 text-ink-soft">
        {draft
          ? `One tent, ${words(doc.tiers.length, 'tier', 'tiers')}, ${words(doc.placements.length, 'lamp', 'lamps')}. It waits in this browser until you have signed up.`
          : 'An example. You draw your own after signing up, or before.'}
      </p>
      <svg viewBox={`0 0 ${WIDTH} ${FLOOR}`} className="block w-full" aria-hidden="true">
        <TentMiniature doc={doc} pxPerM={pxPerM} leftPx={42} floorPx={FLOOR} heater />
      </svg>
    </div>
  );
}
