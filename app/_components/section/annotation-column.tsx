'use client';

/** One column of sentences with its leaders; the drawing lies under it. */
import type { ReactNode } from 'react';
import { leader, placeBlocks } from './annotation-layout';
import type { BlockHeights } from './use-block-heights';
import { points } from './section-frame';

export interface NoteBlock {
  id: string;
  node: ReactNode;
  /** Height until it is measured. */
  estimatePx: number;
  wantedTopPx: number;
  /** Middle of its first line, from its top. */
  firstLinePx?: number;
  /** Where its leader ends; null: none. */
  toPx: readonly [number, number] | null;
  /** Ends without a dot (at a bracket). */
  plainEnd?: boolean;
  selected?: boolean;
  /** x where the leader leaves the words, if not at the column's edge. */
  leaderFromPx?: number;
}

export interface ColumnBox {
  side: 'left' | 'right';
  xPx: number;
  widthPx: number;
  topPx: number;
  bottomPx: number;
  bendPx: number;
}

export const BLOCK_GAP_PX = 12;
/** Shifted further than this, a leader would be a long slant: it is left out. */
const LONGEST_SHIFT_PX = 190;

const LEFT_BLOCK = /^(lamp-|inspector|heater|clash)/;

/** How tall the fuller of the two columns is, as measured. */
export function columnsNeedPx(heights: BlockHeights): number {
  const need = (left: boolean) =>
    Object.entries(heights)
      .filter(([id]) => LEFT_BLOCK.test(id) === left)
      .reduce((sum, [, height]) => sum + height + BLOCK_GAP_PX, 0);
  return Math.max(need(true), need(false));
}

interface AnnotationColumnProps {
  blocks: readonly NoteBlock[];
  heights: BlockHeights;
  column: ColumnBox;
}

export function AnnotationColumn({ blocks, heights, column }: AnnotationColumnProps) {
  const placed = placeBlocks(
    blocks.map((block) => ({
      id: block.id,
      wantedTopPx: block.wantedTopPx,
      heightPx: heights[block.id] ?? block.estimatePx,
    })),
    { topPx: column.topPx, bottomPx: column.bottomPx, gapPx: BLOCK_GAP_PX },
  );
  const topOf = new Map(placed.map((block) => [block.id, block.topPx]));
  const edge = column.side === 'left' ? column.xPx + column.widthPx - 18 : column.xPx - 8;
  return (
    <>
      <svg className="pointer-events-none absolute inset-0 h-full w-full overflow-visible" aria-hidden="true">
        {blocks.map((block) => {
          const top = topOf.get(block.id)!;
          if (!block.toPx) return null;
          const y = top + (block.firstLinePx ?? 9);
          if (Math.abs(y - block.toPx[1]) > LONGEST_SHIFT_PX && !block.selected) return null;
          const line = leader({
            side: column.side,
            fromPx: [block.leaderFromPx ?? edge, y],
            toPx: block.toPx,
            bendPx: column.bendPx,
          });
          const stroke = block.selected ? 'var(--lamp)' : 'var(--ink-soft)';
          return (
            <g key={block.id}>
              <polyline
                points={points(line.points)}
                fill="none"
                stroke={stroke}
                strokeWidth={block.selected ? 1 : 0.75}
              />
              {!block.plainEnd && (
                <circle
                  cx={line.dot[0]}
                  cy={line.dot[1]}
                  r={2.2}
                  fill={block.selected ? 'var(--lamp)' : 'var(--ink)'}
                />
              )}
            </g>
          );
        })}
      </svg>
      {blocks.map((block) => (
        <div
          key={block.id}
          data-block={block.id}
          className="absolute"
          style={{ left: column.xPx, width: column.widthPx, top: topOf.get(block.id)! }}
        >
          {block.node}
        </div>
      ))}
    </>
  );
}
