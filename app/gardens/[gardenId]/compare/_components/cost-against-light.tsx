'use client';

import { scaleLinear } from 'd3-scale';
import { textWidthPx } from '@/app/_components/chart/label-stair';
import { patternFill, Patterns } from '@/app/_components/chart/patterns';
import { useWidth } from '@/app/_components/chart/use-width';
import type { ComparisonColumn } from '@/lib/comparison/comparison';
import { formatMoney, minorPerMajor } from '@/lib/format/money';

/** Purchases are spread over three years, so that dear lamps and dear hours meet on one axis. */
const SPREAD_MONTHS = 36;
const HEIGHT = 280;

interface Point {
  id: string;
  name: string;
  cost: number;
  worst: number;
  best: number;
}

function pointsOf(columns: readonly ComparisonColumn[]): Point[] {
  return columns.flatMap((column) => {
    const shares = column.tiers.filter((tier) => tier.lowMolM2D).map((tier) => tier.dliMolM2D.mean / tier.lowMolM2D!);
    if (shares.length === 0) return [];
    const cost = column.costPerMonth + column.upFrontMinor / minorPerMajor(column.currency) / SPREAD_MONTHS;
    return [{ id: column.scenarioId, name: column.name, cost, worst: Math.min(...shares), best: Math.max(...shares) }];
  });
}

const ROW_PX = 15;

/** Names over their points, inside the drawing, each in the first row where it meets no other. */
function namesOf(points: readonly Point[], x: (cost: number) => number, widthPx: number) {
  const ends: number[] = [];
  const rows = new Map<string, { middlePx: number; row: number }>();
  for (const { id, name, cost } of [...points].sort((a, b) => a.cost - b.cost)) {
    const half = textWidthPx(name) / 2 + 4;
    const middlePx = Math.min(Math.max(x(cost), 52 + half), widthPx - 12 - half);
    const free = ends.findIndex((end) => end <= middlePx - half);
    const row = free < 0 ? ends.length : free;
    ends[row] = middlePx + half;
    rows.set(id, { middlePx, row });
  }
  return points.map(({ id }) => rows.get(id)!);
}

/** Better lies up and to the left: each scenario's tiers as a share of the least light they need, against its money a month. */
export function CostAgainstLight({ columns }: { columns: readonly ComparisonColumn[] }) {
  const [ref, widthPx] = useWidth<HTMLDivElement>(860);
  const points = pointsOf(columns);
  if (points.length < 2) return null;
  const { currency } = columns[0]!;
  const costs = points.map((point) => point.cost);
  const pad = Math.max(1, (Math.max(...costs) - Math.min(...costs)) * 0.25);
  const x = scaleLinear()
    .domain([Math.max(0, Math.min(...costs) - pad), Math.max(...costs) + pad])
    .nice()
    .range([52, widthPx - 12]);
  const names = namesOf(points, x, widthPx);
  const topPx = 4 + ROW_PX * Math.max(2, ...names.map(({ row }) => row + 1));
  const y = scaleLinear()
    .domain([0, Math.max(1.3, ...points.map((point) => point.best)) * 1.08])
    .range([HEIGHT - 44, topPx]);
  return (
    <section className="border-t border-line pt-8 mt-10">
      <h2 className="text-22">Cost against light</h2>
      <p className="max-w-[48rem] pt-1 text-12 text-ink-soft">
        Up: each tier’s day as a share of the low edge of its crop’s band; the round mark is the worst-lit tier. Right:
        money a month, purchases over {SPREAD_MONTHS} months. Better lies up and to the left.
      </p>
      <div ref={ref} className="overflow-hidden pt-4">
        <svg
          width={widthPx}
          height={HEIGHT}
          role="img"
          aria-label={points
            .map(
              (point) =>
                `${point.name}: worst tier ${Math.round(point.worst * 100)} % for ${formatMoney(point.cost, currency)} a month`,
            )
            .join('; ')}
          className="block"
        >
          <Patterns prefix="against" />
          <rect x={52} y={y(1)} width={widthPx - 64} height={y(0) - y(1)} fill={patternFill('against', 'short')} />
          {y.ticks(5).map((tick) => (
            <text key={tick} x={46} y={y(tick) + 4} fontSize="12" textAnchor="end" fill="var(--ink-soft)">
              {Math.round(tick * 100)}
              {tick === 0 ? ' %' : ''}
            </text>
          ))}
          <line x1={52} x2={widthPx - 12} y1={y(1)} y2={y(1)} stroke="var(--moss)" strokeWidth="2" />
          <text x={widthPx - 12} y={y(1) - 6} fontSize="12" textAnchor="end" fill="var(--moss)">
            enough
          </text>
          {points.map((point, at) => {
            const { middlePx, row } = names[at]!;
            return (
              <g key={point.id}>
                <line
                  x1={x(point.cost)}
                  x2={x(point.cost)}
                  y1={y(point.worst)}
                  y2={y(point.best)}
                  stroke="var(--lamp)"
                  strokeWidth="1.75"
                />
                <line
                  x1={x(point.cost) - 5}
                  x2={x(point.cost) + 5}
                  y1={y(point.best)}
                  y2={y(point.best)}
                  stroke="var(--lamp)"
                  strokeWidth="1.75"
                />
                <circle
                  cx={x(point.cost)}
                  cy={y(point.worst)}
                  r="5"
                  fill={point.worst >= 1 ? 'var(--lamp)' : 'var(--paper)'}
                  stroke="var(--lamp)"
                  strokeWidth="1.75"
                />
                <text
                  x={middlePx}
                  y={14 + row * ROW_PX}
                  fontSize="12"
                  fontWeight="600"
                  textAnchor="middle"
                  fill="var(--ink)"
                >
                  {point.name}
                </text>
                <line
                  x1={x(point.cost)}
                  x2={x(point.cost)}
                  y1={18 + row * ROW_PX}
                  y2={y(point.best)}
                  stroke="var(--line)"
                />
              </g>
            );
          })}
          {x.ticks(widthPx < 480 ? 3 : 6).map((tick) => (
            <text key={tick} x={x(tick)} y={HEIGHT - 24} fontSize="12" textAnchor="middle" fill="var(--ink-soft)">
              {tick}
            </text>
          ))}
          <line x1={52} x2={widthPx - 12} y1={HEIGHT - 40} y2={HEIGHT - 40} stroke="var(--ink)" />
          <text x={widthPx - 12} y={HEIGHT - 6} fontSize="12" textAnchor="end" fill="var(--ink-soft)">
            {currency} a month
          </text>
        </svg>
      </div>
    </section>
  );
}
