/** The ramp with its round values, and above it what each crop wants in its hours, as brackets. */
import { RAMP_TINTS, rampPosition, tintVar } from '../ppfd-ramp';
import { textWidthPx } from '../chart/label-stair';
import { px } from './section-frame';

export interface LegendBracket {
  name: string;
  lowPpfd: number;
  highPpfd: number;
}

interface LegendPartProps {
  x0: number;
  x1: number;
  y: number;
  brackets: readonly LegendBracket[];
  /** Said where something in the drawing is brighter than the ramp's end. */
  over: boolean;
}

const TICKS = [0, 25, 50, 100, 200, 400, 800];
const BAR_PX = 11;

export function LegendPart({ x0, x1, y, brackets, over }: LegendPartProps) {
  const width = x1 - x0;
  const at = (ppfd: number) => x0 + rampPosition(ppfd) * width;
  const shown = brackets.slice(0, 2);
  return (
    <g fontSize={12} aria-hidden="true">
      {Array.from({ length: RAMP_TINTS }, (_, tint) => (
        <rect
          key={tint}
          x={px(x0 + (tint * width) / RAMP_TINTS)}
          y={y}
          width={px(width / RAMP_TINTS + 0.4)}
          height={BAR_PX}
          fill={tintVar(tint)}
        />
      ))}
      <rect x={px(x0)} y={y} width={px(width)} height={BAR_PX} fill="none" stroke="var(--ink)" strokeWidth={0.75} />
      {TICKS.filter((tick) => width > 300 || tick !== 25).map((tick) => (
        <g key={tick}>
          <path d={`M${px(at(tick))} ${y + BAR_PX}v4`} stroke="var(--ink-soft)" strokeWidth={0.75} />
          <text
            x={px(at(tick))}
            y={y + BAR_PX + 17}
            textAnchor={tick === 0 ? 'start' : tick === 800 ? 'end' : 'middle'}
            fill="var(--ink-soft)"
          >
            {tick === 800 && over ? 'over 800' : tick}
          </text>
        </g>
      ))}
      {shown.map((bracket, i) => {
        const top = y - 8 - (shown.length - 1 - i) * 15;
        const from = at(bracket.lowPpfd);
        const to = at(bracket.highPpfd);
        const words = `${bracket.name} ${Math.round(bracket.lowPpfd)} to ${Math.round(bracket.highPpfd)}`;
        const fits = from - x0 > textWidthPx(words) - 60;
        return (
          <g key={bracket.name}>
            <path d={`M${px(from)} ${top + 4}v-5H${px(to)}v5`} fill="none" stroke="var(--moss)" strokeWidth={1.75} />
            <text
              x={px(fits ? from - 6 : to + 6)}
              y={top + 4}
              textAnchor={fits ? 'end' : 'start'}
              fill="var(--ink-soft)"
            >
              {words}
            </text>
          </g>
        );
      })}
    </g>
  );
}
