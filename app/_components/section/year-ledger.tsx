/** Twelve months as stacked bars: heater hatched on top, lamps plain, fan and pump at the foot. */
import { patternFill, Patterns } from '../chart/patterns';
import type { Evaluation } from '@/lib/evaluation/evaluate-scenario';
import { MONTHS } from './month-names';
import { px } from './section-frame';

interface YearLedgerProps {
  months: Evaluation['year']['months'];
  widthPx: number;
  heightPx: number;
  toldMonth: number;
  id: string;
  /** Nothing is plugged in yet: dashed outlines as an example. */
  empty?: boolean;
}

const LETTERS = ['J', 'F', 'M', 'A', 'M', 'J', 'J', 'A', 'S', 'O', 'N', 'D'];

export function YearLedger({ months, widthPx, heightPx, toldMonth, id, empty }: YearLedgerProps) {
  const bar = Math.max(10, (widthPx / 12) * 0.57);
  const gap = (widthPx - bar * 12) / 11;
  const most = Math.max(1e-9, ...months.map((month) => month.energyKwh.total));
  const base = heightPx - 20;
  const scale = (base - 4) / most;
  const words = months.map((month) => `${MONTHS[month.month - 1]} ${Math.round(month.energyKwh.total)} kWh`).join(', ');
  return (
    <svg
      width={widthPx}
      height={heightPx}
      role="img"
      aria-label={empty ? 'No energy yet' : `Energy by month: ${words}`}
    >
      <Patterns prefix={id} />
      {LETTERS.map((letter, i) => {
        const month = months[i];
        const x = i * (bar + gap);
        const energy = month?.energyKwh;
        const foot = energy ? (energy.exhaust + energy.circulation + energy.pump) * scale : 0;
        const lamps = energy ? energy.light * scale : 0;
        const heater = energy ? energy.heater * scale : 0;
        const told = i + 1 === toldMonth && !empty;
        return (
          <g key={i}>
            {empty && (
              <rect
                x={px(x)}
                y={px(base * (0.45 + 0.3 * Math.abs(Math.sin(((i + 0.5) * Math.PI) / 12))))}
                width={px(bar)}
                height={px(base - base * (0.45 + 0.3 * Math.abs(Math.sin(((i + 0.5) * Math.PI) / 12))))}
                fill="none"
                stroke="var(--ink-soft)"
                strokeDasharray="4 3"
              />
            )}
            {!empty && (
              <>
                <rect x={px(x)} y={px(base - foot)} width={px(bar)} height={px(foot)} fill="var(--slate)" />
                <rect
                  x={px(x)}
                  y={px(base - foot - lamps)}
                  width={px(bar)}
                  height={px(lamps)}
                  fill="var(--lamp-fill)"
                  stroke="var(--lamp)"
                  strokeWidth={lamps > 0 ? 1 : 0}
                />
                <rect
                  x={px(x)}
                  y={px(base - foot - lamps - heater)}
                  width={px(bar)}
                  height={px(heater)}
                  fill={patternFill(id, 'heater')}
                  stroke="var(--ember)"
                  strokeWidth={heater > 0 ? 1 : 0}
                />
              </>
            )}
            <text
              x={px(x + bar / 2)}
              y={heightPx - 4}
              textAnchor="middle"
              fontSize={12}
              fontWeight={told ? 600 : 400}
              fill={told ? 'var(--ink)' : 'var(--ink-soft)'}
            >
              {letter}
            </text>
          </g>
        );
      })}
      <path d={`M0 ${base}H${widthPx}`} stroke="var(--ink)" strokeWidth={1} />
    </svg>
  );
}
