'use client';

import { scaleLinear } from 'd3-scale';
import { useId } from 'react';
import { labelStair } from '@/app/_components/chart/label-stair';
import { patternFill, Patterns } from '@/app/_components/chart/patterns';
import { useWidth } from '@/app/_components/chart/use-width';
import { formatQuantity } from '@/lib/format/quantity';
import { useUnits } from '@/app/_components/units-context';
import type { BalancePiece, BalanceRow, PieceKind } from './balance-rows';

const BAR_PX = 22;
const LINE_PX = 15;

function fillOf(prefix: string, kind: PieceKind): { fill: string; stroke?: string } {
  switch (kind) {
    case 'fabric':
      return { fill: 'color-mix(in srgb, var(--ink-soft) 78%, var(--paper))' };
    case 'floor':
      return { fill: 'color-mix(in srgb, var(--ink-soft) 45%, var(--paper))' };
    case 'air':
      return { fill: patternFill(prefix, 'air') };
    case 'vapour':
      return { fill: patternFill(prefix, 'vapour'), stroke: 'var(--frost)' };
    case 'excess':
      return { fill: 'none', stroke: 'var(--ember)' };
    case 'fans':
      return { fill: 'var(--ink-soft)' };
    case 'lamps':
      return { fill: 'var(--lamp-fill)', stroke: 'var(--lamp)' };
    case 'heater':
      return { fill: patternFill(prefix, 'heater'), stroke: 'var(--ember)' };
    case 'short':
      return { fill: 'none', stroke: 'var(--ember)' };
  }
}

interface PlacedPiece extends BalancePiece {
  startPx: number;
  endPx: number;
  label: string;
}

function place(
  pieces: BalancePiece[],
  pxPerW: (watts: number) => number,
  units: ReturnType<typeof useUnits>,
): PlacedPiece[] {
  let sumW = 0;
  return pieces.map((each) => {
    const startPx = pxPerW(sumW);
    sumW += each.watts;
    return {
      ...each,
      startPx,
      endPx: pxPerW(sumW),
      label: `${formatQuantity(each.watts, 'power', units).figure} ${each.words}`,
    };
  });
}

function Bar({ pieces, yPx, prefix }: { pieces: PlacedPiece[]; yPx: number; prefix: string }) {
  return pieces.map((each) => (
    <rect
      key={each.kind}
      x={each.startPx + 0.5}
      y={yPx + 0.5}
      width={Math.max(1, each.endPx - each.startPx - 1)}
      height={BAR_PX - 1}
      strokeDasharray={each.kind === 'short' || each.kind === 'excess' ? '4 3' : undefined}
      {...fillOf(prefix, each.kind)}
    />
  ));
}

function Labels({
  pieces,
  yPx,
  widthPx,
  direction,
}: {
  pieces: PlacedPiece[];
  yPx: number;
  widthPx: number;
  direction: -1 | 1;
}) {
  const stairs = labelStair({ pieces, widthPx });
  return pieces.map((each, index) => {
    const { level, leaderPx, textPx, anchor } = stairs[index]!;
    const baselinePx = direction < 0 ? yPx - 6 - level * LINE_PX : yPx + 14 + level * LINE_PX;
    const [figure, ...words] = each.label.split(' ');
    return (
      <g key={each.kind}>
        {level > 0 && (
          <path
            d={`M${leaderPx} ${yPx}V${baselinePx - 4}h${anchor === 'start' ? 5 : -5}`}
            fill="none"
            stroke="var(--ink-soft)"
            strokeWidth="0.75"
          />
        )}
        <text
          x={textPx}
          textAnchor={anchor}
          y={baselinePx}
          fontSize="12"
          fill={each.kind === 'short' ? 'var(--ember-ink)' : 'var(--ink)'}
        >
          <tspan fontWeight="600">{figure}</tspan>
          <tspan> {words.join(' ')}</tspan>
        </text>
      </g>
    );
  });
}

function RowDrawing({
  row,
  topW,
  widthPx,
  prefix,
}: {
  row: BalanceRow;
  topW: number;
  widthPx: number;
  prefix: string;
}) {
  const units = useUnits();
  const x = scaleLinear().domain([0, topW]).range([0, widthPx]);
  const out = place(row.out, x, units);
  const into = place(row.in, x, units);
  const climb = (pieces: PlacedPiece[]) => Math.max(0, ...labelStair({ pieces, widthPx }).map((label) => label.level));
  const topPx = 18 + climb(out) * LINE_PX;
  const heightPx = topPx + BAR_PX * 2 + 22 + climb(into) * LINE_PX;
  return (
    <svg width={widthPx} height={heightPx} className="block" aria-hidden="true">
      {x.ticks(6).map((tick) => (
        <line key={tick} x1={x(tick)} x2={x(tick)} y1="0" y2={heightPx} stroke="var(--line)" />
      ))}
      <Labels pieces={out} yPx={topPx} widthPx={widthPx} direction={-1} />
      <Bar pieces={out} yPx={topPx} prefix={prefix} />
      <Bar pieces={into} yPx={topPx + BAR_PX + 1} prefix={prefix} />
      <Labels pieces={into} yPx={topPx + BAR_PX * 2 + 1} widthPx={widthPx} direction={1} />
    </svg>
  );
}

/** Watts out above, watts in below, on one scale; where the two bars do not end together the gap is named. */
export function WattBalance({ rows }: { rows: BalanceRow[] }) {
  const prefix = useId().replaceAll(':', '');
  const units = useUnits();
  const [ref, widthPx] = useWidth<HTMLDivElement>(860);
  const sum = (pieces: BalancePiece[]) => pieces.reduce((total, each) => total + each.watts, 0);
  const topW = Math.max(50, ...rows.map((row) => Math.max(sum(row.out), sum(row.in)))) * 1.02;
  const x = scaleLinear().domain([0, topW]).range([0, widthPx]);
  const ticks = x.ticks(widthPx < 480 ? 3 : 6);
  return (
    <div>
      <svg width="0" height="0" className="absolute" aria-hidden="true">
        <Patterns prefix={prefix} />
      </svg>
      <div className="lg:grid lg:grid-cols-[196px_1fr] lg:gap-x-6">
        <div />
        <div ref={ref} className="relative h-5 text-12 text-ink-soft" aria-hidden="true">
          {ticks.map((tick) => (
            <span
              key={tick}
              className={`absolute whitespace-nowrap ${tick === 0 ? '' : '-translate-x-1/2'}`}
              style={{ left: Math.min(x(tick), widthPx - 24) }}
            >
              {formatQuantity(tick, 'power', units).figure}
              {tick === 0 ? ' W' : ''}
            </span>
          ))}
        </div>
        {rows.map((row) => (
          <div key={row.id} className="contents">
            <div className="pt-4 text-12 text-ink-soft">
              <h3 className="text-14 font-semibold text-ink">{row.name}</h3>
              {row.facts.map((fact) => (
                <span key={fact} className="block">
                  {fact}
                </span>
              ))}
              {row.gap && (
                <p className={`mt-2 ${row.gap.tone === 'short' ? 'text-ember-ink' : 'text-ink'}`}>
                  <span className="block text-17 font-semibold">{row.gap.figure}</span>
                  <span className="block text-12">{row.gap.words}</span>
                </p>
              )}
            </div>
            <div className="overflow-hidden">
              <RowDrawing row={row} topW={topW} widthPx={widthPx} prefix={prefix} />
            </div>
          </div>
        ))}
      </div>
    </div>
  );
}
