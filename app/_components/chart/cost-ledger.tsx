'use client';

import { scaleLinear } from 'd3-scale';
import { stack } from 'd3-shape';
import { useId } from 'react';
import type { Device } from '@/lib/evaluation/evaluate-scenario';
import { formatMoney } from '@/lib/format/money';
import { patternFill, Patterns } from './patterns';

export interface LedgerMonth {
  cost: number;
  costByDevice: Record<Device, number>;
}

interface CostLedgerProps {
  months: readonly LedgerMonth[];
  currency: string;
  widthPx: number;
  heightPx: number;
  /** One scale for several ledgers side by side. */
  most?: number;
  /** The baseline's months, as short ink lines. */
  base?: readonly LedgerMonth[] | undefined;
  /** A figure over each column. */
  figures?: boolean;
}

const LETTERS = ['J', 'F', 'M', 'A', 'M', 'J', 'J', 'A', 'S', 'O', 'N', 'D'];
const SHARES = ['lamps', 'heater', 'fans'] as const;

const shareOf = ({ costByDevice }: LedgerMonth) => ({
  lamps: costByDevice.light,
  heater: costByDevice.heater,
  fans: costByDevice.exhaust + costByDevice.circulation + costByDevice.pump,
});

/** Twelve months of money: lamps plain, heater hatched, fans and pump on top. Bars start at nothing. */
export function CostLedger({ months, currency, widthPx, heightPx, most, base, figures }: CostLedgerProps) {
  const prefix = useId().replaceAll(':', '');
  const column = widthPx / 12;
  const barPx = Math.max(6, column * 0.56);
  const top = most ?? Math.max(1e-9, ...months.map((month) => month.cost));
  const y = scaleLinear()
    .domain([0, top])
    .range([heightPx - 20, figures ? 18 : 6]);
  const layers = stack<ReturnType<typeof shareOf>, (typeof SHARES)[number]>().keys(SHARES)(months.map(shareOf));
  const fill = { lamps: 'var(--lamp-fill)', heater: patternFill(prefix, 'heater'), fans: 'var(--ink-soft)' };
  const edge = { lamps: 'var(--lamp)', heater: 'var(--ember)', fans: 'var(--ink-soft)' };
  const label = months.map((month, at) => `${LETTERS[at]} ${formatMoney(month.cost, currency)}`).join(', ');
  return (
    <svg width={widthPx} height={heightPx} role="img" aria-label={`Cost by month: ${label}`} className="block">
      <Patterns prefix={prefix} />
      {layers.map((layer) =>
        layer.map(([low, high], at) =>
          high - low > 1e-9 ? (
            <rect
              key={`${layer.key}${at}`}
              x={at * column + (column - barPx) / 2}
              y={y(high)}
              width={barPx}
              height={Math.max(0.5, y(low) - y(high))}
              fill={fill[layer.key]}
              stroke={edge[layer.key]}
            />
          ) : null,
        ),
      )}
      {base?.map((month, at) => (
        <line
          key={at}
          x1={at * column + 2}
          x2={(at + 1) * column - 2}
          y1={y(month.cost)}
          y2={y(month.cost)}
          stroke="var(--ink)"
          strokeWidth="1.5"
        />
      ))}
      <line x1="0" x2={widthPx} y1={y(0) + 0.5} y2={y(0) + 0.5} stroke="var(--ink)" />
      {LETTERS.map((letter, at) => (
        <text
          key={at}
          x={(at + 0.5) * column}
          y={heightPx - 5}
          fontSize="12"
          textAnchor="middle"
          fill="var(--ink-soft)"
        >
          {letter}
        </text>
      ))}
      {figures &&
        column > 34 &&
        months.map((month, at) => (
          <text
            key={at}
            x={(at + 0.5) * column}
            y={y(month.cost) - 5}
            fontSize="12"
            fontWeight="600"
            textAnchor="middle"
            fill="var(--ink)"
          >
            {formatMoney(month.cost, currency, { digits: month.cost >= 100 ? 0 : 1 }).replace(/^[^\d−]*/, '')}
          </text>
        ))}
    </svg>
  );
}
