/** The light in the tent: 23 tints, isolines, and their values where they are calmest. */
import { rampTint, tintInkVar, tintVar } from '../ppfd-ramp';
import type { PaintedField } from './field-contours';
import type { LineLabel } from './isoline-labels';
import type { Box } from './section-model';
import { px } from './section-frame';

interface FieldPartProps {
  field: PaintedField | null;
  labels: readonly LineLabel[];
  tent: Box;
  clipId: string;
  /** A true field shown pale, as an example. */
  pale?: boolean;
  labelPx?: number;
}

export function FieldPart({ field, labels, tent, clipId, pale, labelPx = 12 }: FieldPartProps) {
  return (
    <g aria-hidden="true" opacity={pale ? 0.42 : undefined}>
      <clipPath id={clipId}>
        <rect x={px(tent.x0)} y={px(tent.y0)} width={px(tent.x1 - tent.x0)} height={px(tent.y1 - tent.y0)} />
      </clipPath>
      <g clipPath={`url(#${clipId})`}>
        <rect
          x={px(tent.x0)}
          y={px(tent.y0)}
          width={px(tent.x1 - tent.x0)}
          height={px(tent.y1 - tent.y0)}
          fill={tintVar(0)}
        />
        {field?.tints.map(({ tint, d }) => (
          <path key={tint} d={d} fill={tintVar(tint)} fillRule="evenodd" />
        ))}
        {field?.lines.map(({ value, heavy, d }) => (
          <path
            key={value}
            d={d}
            fill="none"
            stroke="var(--ink)"
            strokeWidth={heavy ? 0.8 : 0.6}
            strokeOpacity={heavy ? 0.6 : 0.42}
          />
        ))}
        {labels.map(({ value, x, y }) => (
          <text
            key={`${value}-${Math.round(x)}-${Math.round(y)}`}
            x={px(x)}
            y={px(y + labelPx * 0.36)}
            textAnchor="middle"
            fontSize={labelPx}
            fill={tintInkVar(rampTint(value))}
            stroke={tintVar(rampTint(value))}
            strokeWidth={4}
            paintOrder="stroke"
          >
            {value}
          </text>
        ))}
      </g>
    </g>
  );
}
