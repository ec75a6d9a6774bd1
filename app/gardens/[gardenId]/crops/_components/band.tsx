import { scaleLinear } from 'd3-scale';

interface BandProps {
  low: number | null;
  high: number | null;
  aim: number | null;
  most: number;
  widthPx: number;
  tone?: 'moss' | 'ink' | 'lamp' | 'ember' | 'frost';
  dashed?: boolean;
  /** Ends written outside the bracket. */
  figures?: boolean;
}

const round = (value: number) => String(Math.round(value * 10) / 10);

/** A band as a bracket on one scale for the whole column; what has one end only is open on the other side. */
export function Band({ low, high, aim, most, widthPx, tone = 'moss', dashed, figures = true }: BandProps) {
  const x = scaleLinear().domain([0, most]).range([0, widthPx]).clamp(true);
  const from = low ?? aim ?? high;
  const to = high ?? aim ?? low;
  if (from === null || to === null) return <span className="text-ink-soft">–</span>;
  const colour = `var(--${tone})`;
  const a = x(from);
  const b = Math.max(a + 2, x(to));
  return (
    <svg
      width={widthPx}
      height="24"
      role="img"
      aria-label={from === to ? round(from) : `${round(from)} to ${round(to)}`}
      className="block overflow-visible"
    >
      <line x1={a} x2={b} y1="12" y2="12" stroke={colour} strokeDasharray={dashed ? '3 3' : undefined} />
      {low !== null && <path d={`M${a + 4} 6H${a}V18H${a + 4}`} fill="none" stroke={colour} strokeWidth="2" />}
      {high !== null && <path d={`M${b - 4} 6H${b}V18H${b - 4}`} fill="none" stroke={colour} strokeWidth="2" />}
      {aim !== null && <circle cx={x(aim)} cy="12" r="3" fill={colour} />}
      {figures && (
        <>
          {from !== to && (
            <text
              x={a - 5}
              y="16"
              fontSize="12"
              textAnchor="end"
              fill="var(--ink)"
              stroke="var(--paper)"
              strokeWidth="4"
              paintOrder="stroke"
            >
              {round(from)}
            </text>
          )}
          <text
            x={b + 5}
            y="16"
            fontSize="12"
            fill="var(--ink)"
            stroke="var(--paper)"
            strokeWidth="4"
            paintOrder="stroke"
          >
            {round(to)}
          </text>
        </>
      )}
    </svg>
  );
}
