'use client';

import { scaleLinear } from 'd3-scale';
import { useId } from 'react';
import { labelStair } from './label-stair';
import { patternFill, Patterns } from './patterns';
import { useWidth } from './use-width';

export interface AmperePiece {
  key: string;
  words: string;
  amps: number;
  look: 'lamps' | 'heater' | 'fans' | 'other';
}

interface AmpereBarProps {
  pieces: readonly AmperePiece[];
  ratingA: number;
  limitA: number;
  /** Read out in place of the drawing. */
  label: string;
}

const BAR_PX = 22;
const LINE_PX = 15;

/** A circuit's amperes end to end, against the mark for long loads and the breaker. */
export function AmpereBar({ pieces, ratingA, limitA, label }: AmpereBarProps) {
  const prefix = useId().replaceAll(':', '');
  const [ref, widthPx] = useWidth<HTMLDivElement>(560);
  const sum = pieces.reduce((total, piece) => total + piece.amps, 0);
  const x = scaleLinear()
    .domain([0, Math.max(ratingA, sum) * 1.12])
    .range([0, widthPx]);
  const starts = pieces.map((_, at) => pieces.slice(0, at).reduce((total, piece) => total + piece.amps, 0));
  const placed = [
    ...pieces.map((piece, at) => ({
      ...piece,
      startPx: x(starts[at]!),
      endPx: x(starts[at]! + piece.amps),
      label: `${piece.amps.toFixed(1)} ${piece.words}`,
    })),
    { key: 'limit', startPx: x(limitA), endPx: x(ratingA), label: `${limitA.toFixed(1)} for 3 h or more` },
  ].sort((a, b) => a.startPx - b.startPx);
  const stairs = labelStair({ pieces: placed, widthPx });
  const topPx = 20 + Math.max(...stairs.map((stair) => stair.level)) * LINE_PX;
  const fill = {
    lamps: 'var(--lamp-fill)',
    heater: patternFill(prefix, 'heater'),
    fans: 'var(--ink-soft)',
    other: patternFill(prefix, 'air'),
  };
  return (
    <div ref={ref} className="overflow-hidden">
      <svg width={widthPx} height={topPx + BAR_PX + 24} role="img" aria-label={label} className="block">
        <Patterns prefix={prefix} />
        {placed.map((piece, at) => {
          const { level, leaderPx, textPx, anchor } = stairs[at]!;
          const baselinePx = topPx - 6 - level * LINE_PX;
          return (
            <g key={piece.key}>
              {level > 0 && (
                <path
                  d={`M${leaderPx} ${topPx}V${baselinePx - 4}h${anchor === 'start' ? 5 : -5}`}
                  fill="none"
                  stroke="var(--ink-soft)"
                  strokeWidth="0.75"
                />
              )}
              <text x={textPx} y={baselinePx} textAnchor={anchor} fontSize="12" fill="var(--ink)">
                {piece.label}
              </text>
            </g>
          );
        })}
        {pieces.map((piece, at) => (
          <rect
            key={piece.key}
            x={x(starts[at]!) + 0.5}
            y={topPx + 0.5}
            width={Math.max(1, x(piece.amps) - 1)}
            height={BAR_PX - 1}
            fill={fill[piece.look]}
            stroke={
              piece.look === 'heater' ? 'var(--ember)' : piece.look === 'lamps' ? 'var(--lamp)' : 'var(--ink-soft)'
            }
          />
        ))}
        {sum < limitA && (
          <rect
            x={x(sum)}
            y={topPx + 0.5}
            width={Math.max(0, x(limitA) - x(sum))}
            height={BAR_PX - 1}
            fill="none"
            stroke="var(--ink-soft)"
            strokeDasharray="3 3"
          />
        )}
        <line
          x1={x(limitA)}
          x2={x(limitA)}
          y1={topPx - 4}
          y2={topPx + BAR_PX + 4}
          stroke="var(--ink)"
          strokeWidth="2"
        />
        <line
          x1={x(ratingA)}
          x2={x(ratingA)}
          y1={topPx}
          y2={topPx + BAR_PX + 4}
          stroke="var(--ember)"
          strokeWidth="3"
        />
        <line x1="0" x2={widthPx} y1={topPx + BAR_PX + 4.5} y2={topPx + BAR_PX + 4.5} stroke="var(--ink-soft)" />
        {x.ticks(widthPx < 420 ? 4 : 8).map((tick) => (
          <text
            key={tick}
            x={x(tick)}
            y={topPx + BAR_PX + 19}
            fontSize="12"
            fill="var(--ink-soft)"
            textAnchor={tick === 0 ? 'start' : 'middle'}
          >
            {tick === 0 ? '0 A' : tick}
          </text>
        ))}
      </svg>
    </div>
  );
}
