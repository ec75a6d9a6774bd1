/** Dimension chains with oblique ticks: the tent's width above it, the heights of its shelves beside it. */
import { px, type SectionFrame } from './section-frame';
import type { SectionModel } from './section-model';

interface DimensionPartProps {
  model: SectionModel;
  text: (metres: number) => string;
  widthNote: string;
  /** No room for the heights beside the tent. */
  widthOnly?: boolean;
}

const tick = (x: number, y: number) => `M${px(x - 3.5)} ${px(y + 3.5)}l7 -7`;

export function DimensionPart({ model, text, widthNote, widthOnly }: DimensionPartProps) {
  const { tent, frame, tiers } = model;
  const y = tent.y0 - 12;
  const middle = (tent.x0 + tent.x1) / 2;
  const gap = widthNote.length * 3.6 + 8;
  return (
    <g aria-hidden="true" stroke="var(--ink-soft)" strokeWidth={0.75} fontSize={12}>
      <path
        d={`M${px(tent.x0)} ${px(y)}H${px(middle - gap)}M${px(middle + gap)} ${px(y)}H${px(tent.x1)}${tick(tent.x0, y)}${tick(tent.x1, y)}`}
      />
      <text x={px(middle)} y={px(y + 4)} textAnchor="middle" fill="var(--ink)" stroke="none">
        {widthNote}
      </text>
      {!widthOnly && (
        <HeightChain
          frame={frame}
          below={model.heater && !model.heater.inside ? model.heater.box.y0 - 6 : Infinity}
          tops={tiers.map(({ tier }) => tier.topHeightM)}
          x={tent.x0 - 19}
          text={text}
        />
      )}
    </g>
  );
}

interface HeightChainProps {
  frame: SectionFrame;
  tops: readonly number[];
  x: number;
  /** Figures stand above this; the heater has the place below. */
  below: number;
  text: (metres: number) => string;
}

function HeightChain({ frame, tops, x, below, text }: HeightChainProps) {
  const levels = [...new Set([0, ...tops, frame.heightM])].sort((a, b) => a - b);
  const at = (metres: number) => frame.floorPx - metres * frame.pxPerM;
  return (
    <>
      <path
        d={`M${px(x)} ${px(at(0))}V${px(at(frame.heightM))}${levels.map((level) => tick(x, at(level))).join('')}`}
      />
      {tops.map((top) => (
        <path key={top} d={`M${px(x)} ${px(at(top))}H${px(frame.leftPx - 6)}`} strokeDasharray="1.5 2.5" />
      ))}
      {levels.slice(1).map((level, i) => {
        const from = levels[i]!;
        const top = at(level);
        const bottom = Math.min(at(from), below);
        if (bottom - top < 44) return null;
        const y = (top + bottom) / 2;
        return (
          <text
            key={level}
            transform={`translate(${px(x - 4)} ${px(y)}) rotate(-90)`}
            textAnchor="middle"
            fill="var(--ink)"
            stroke="none"
          >
            {text(level - from)}
          </text>
        );
      })}
    </>
  );
}
