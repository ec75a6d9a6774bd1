import type { TentOverview } from '@/lib/scenarios/overview.service';
import { TentMiniature } from '@/app/_components/tent-miniature';

/** One scale for all tents of the page; on a phone a smaller one. Set as --m on the page. */
const PX_PER_M = 84;
/** The tent's left wall stands this far into its place; a heater fits before it. */
export const TENT_LEFT_PX = 30;

/** A tent in its room, standing on the floor. */
export function TentPlace({ overview, heightPx }: { overview: TentOverview; heightPx: number }) {
  const { document: doc } = overview;
  const widthPx = TENT_LEFT_PX + doc.tent.widthM * PX_PER_M + 4;
  const tallPx = Math.min(heightPx, doc.tent.heightM * PX_PER_M + 6);
  return (
    <svg
      viewBox={`0 0 ${widthPx} ${tallPx}`}
      className="block"
      style={{ width: `calc(var(--m) * ${widthPx / PX_PER_M})`, height: `calc(var(--m) * ${tallPx / PX_PER_M})` }}
      aria-hidden="true"
    >
      <TentMiniature doc={doc} pxPerM={PX_PER_M} leftPx={TENT_LEFT_PX} floorPx={tallPx} heater />
    </svg>
  );
}

/** Height of every room of the page: the tallest tent and some air. */
export function roomHeightPx(tents: readonly TentOverview[]): number {
  return Math.max(206, ...tents.map(({ document: doc }) => doc.tent.heightM * PX_PER_M + 44));
}
