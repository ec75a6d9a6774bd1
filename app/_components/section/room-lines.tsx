/** The room, cut: two hatched slabs and two walls. */
export const SLAB_PX = 10;
const WALL_PX = 12;

export function RoomLines({
  widthPx,
  floorPx,
  hatchId,
  walls,
}: {
  widthPx: number;
  floorPx: number;
  hatchId: string;
  walls: boolean;
}) {
  const wall = walls ? WALL_PX : 0;
  return (
    <g aria-hidden="true">
      <defs>
        <pattern id={hatchId} width="7" height="7" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
          <rect width="0.75" height="7" fill="var(--hatch)" />
        </pattern>
      </defs>
      <rect width={widthPx} height={SLAB_PX} fill={`url(#${hatchId})`} />
      <rect y={floorPx} width={widthPx} height={SLAB_PX} fill={`url(#${hatchId})`} />
      {walls && (
        <>
          <rect y={SLAB_PX} width={wall} height={floorPx - SLAB_PX} fill={`url(#${hatchId})`} />
          <rect x={widthPx - wall} y={SLAB_PX} width={wall} height={floorPx - SLAB_PX} fill={`url(#${hatchId})`} />
        </>
      )}
      <path d={`M0 0.5H${widthPx}M0 ${floorPx + SLAB_PX - 0.5}H${widthPx}`} stroke="var(--hatch)" strokeWidth={1} />
      {walls ? (
        <rect
          x={wall}
          y={SLAB_PX}
          width={widthPx - 2 * wall}
          height={floorPx - SLAB_PX}
          fill="none"
          stroke="var(--ink)"
          strokeWidth={1.5}
        />
      ) : (
        <path d={`M0 ${SLAB_PX}H${widthPx}M0 ${floorPx}H${widthPx}`} stroke="var(--ink)" strokeWidth={1.5} />
      )}
    </g>
  );
}
