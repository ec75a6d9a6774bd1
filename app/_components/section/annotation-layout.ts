/** Keeps the sentences beside the drawing apart, each as near to its thing as its neighbours allow. */

export interface AnnotationBlock {
  id: string;
  /** Where the first line would stand if it were alone. */
  wantedTopPx: number;
  heightPx: number;
}

export interface PlacedBlock extends AnnotationBlock {
  topPx: number;
}

export interface Column {
  topPx: number;
  bottomPx: number;
  gapPx: number;
}

/**
 * Blocks in the order of their wanted places, pushed down until none meets the one above, then lifted from
 * the bottom as far as there is room. What does not fit runs on below `bottomPx`; the caller makes room.
 */
export function placeBlocks(blocks: readonly AnnotationBlock[], column: Column): PlacedBlock[] {
  const placed = blocks
    .map((block, order) => ({ block, order }))
    .sort((a, b) => a.block.wantedTopPx - b.block.wantedTopPx || a.order - b.order)
    .map(({ block }): PlacedBlock => ({ ...block, topPx: Math.max(block.wantedTopPx, column.topPx) }));
  let floor = column.topPx;
  for (const block of placed) {
    block.topPx = Math.max(block.topPx, floor);
    floor = block.topPx + block.heightPx + column.gapPx;
  }
  let ceiling = column.bottomPx;
  for (const block of [...placed].reverse()) {
    block.topPx = Math.min(block.topPx, ceiling - block.heightPx);
    ceiling = block.topPx - column.gapPx;
  }
  let top = column.topPx;
  for (const block of placed) {
    block.topPx = Math.max(block.topPx, top);
    top = block.topPx + block.heightPx + column.gapPx;
  }
  return placed;
}

/** How far down the last block ends. */
export function blocksEndPx(placed: readonly PlacedBlock[]): number {
  return placed.reduce((end, block) => Math.max(end, block.topPx + block.heightPx), 0);
}

export interface Leader {
  /** Horizontal from the words, one bend, and on to the thing. */
  points: readonly (readonly [number, number])[];
  dot: readonly [number, number];
}

export interface LeaderRequest {
  side: 'left' | 'right';
  /** Edge of the words and the height of their first line. */
  fromPx: readonly [number, number];
  toPx: readonly [number, number];
  /** x of the bend; leaders of one column bend on one line so that they cannot cross. */
  bendPx: number;
}

export function leader({ side, fromPx, toPx, bendPx }: LeaderRequest): Leader {
  const between = side === 'left' ? Math.min(bendPx, toPx[0] - 10) : Math.max(bendPx, toPx[0] + 10);
  return { points: [fromPx, [between, fromPx[1]], toPx], dot: toPx };
}
