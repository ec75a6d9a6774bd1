/** What blows, burns and drinks: heater, fan, reservoir, pump and pipe, and the rack's uprights. */
import { heatArrow } from './heat-arrow';
import { px } from './section-frame';
import type { SectionModel } from './section-model';

export function UprightsPart({ uprights, floorPx }: { uprights: SectionModel['uprights']; floorPx: number }) {
  if (!uprights) return null;
  const { leftPx, rightPx, topPx, widthPx } = uprights;
  return (
    <g aria-hidden="true" fill="var(--sheet)" stroke="var(--ink)" strokeWidth={1.1}>
      {[leftPx - widthPx, rightPx].map((x) => (
        <rect key={x} x={px(x)} y={px(topPx)} width={px(widthPx)} height={px(floorPx - topPx)} />
      ))}
    </g>
  );
}

export function WaterPart({ model }: { model: SectionModel }) {
  const { reservoir, pipe } = model;
  if (!reservoir) return null;
  const { box, waterY, pump } = reservoir;
  return (
    <g aria-hidden="true">
      <rect
        x={px(box.x0 + 2)}
        y={px(waterY)}
        width={px(box.x1 - box.x0 - 4)}
        height={px(box.y1 - waterY)}
        fill="var(--water)"
      />
      <path d={`M${px(box.x0 + 2)} ${px(waterY)}H${px(box.x1 - 2)}`} stroke="var(--frost)" strokeWidth={1.25} />
      {pipe && pump && (
        <g fill="none" stroke="var(--frost)" strokeWidth={2.25} strokeLinejoin="round">
          <path
            d={`M${px((pump.x0 + pump.x1) / 2)} ${px(pump.y0)}V${px(pipe.fromY)}H${px(pipe.x)}V${px(Math.min(...pipe.toYs))}`}
          />
          {pipe.toYs.map((y) => (
            <path key={y} d={`M${px(pipe.x)} ${px(y)}h${px(-Math.max(8, model.frame.pxPerM * 0.06))}`} />
          ))}
        </g>
      )}
      <path
        d={`M${px(box.x0)} ${px(box.y0)}V${px(box.y1)}H${px(box.x1)}V${px(box.y0)}`}
        fill="none"
        stroke="var(--ink)"
        strokeWidth={2.25}
      />
      <path d={`M${px(box.x0 - 4)} ${px(box.y0)}H${px(box.x1 + 4)}`} stroke="var(--ink)" strokeWidth={2.25} />
      {pump && (
        <g fill="var(--sheet)" stroke="var(--ink)" strokeWidth={1.1}>
          <rect x={px(pump.x0)} y={px(pump.y0)} width={px(pump.x1 - pump.x0)} height={px(pump.y1 - pump.y0)} />
          <circle
            cx={px((pump.x0 + pump.x1) / 2 - 3)}
            cy={px((pump.y0 + pump.y1) / 2)}
            r={Math.min(4.5, (pump.y1 - pump.y0) / 3)}
          />
        </g>
      )}
    </g>
  );
}

export function HeaterPart({ model, watts, selected }: { model: SectionModel; watts: number; selected: boolean }) {
  const { heater, tent } = model;
  if (!heater) return null;
  const { box, portY, inside } = heater;
  const width = box.x1 - box.x0;
  const bodyBottom = box.y1 - (box.y1 - box.y0) * 0.26;
  const fins = [0.25, 0.45, 0.65].map((share) => box.x0 + width * share);
  return (
    <g aria-hidden="true">
      <path
        d={`M${px(box.x0 + 5)} ${px(bodyBottom)}V${px(box.y1)}M${px(box.x1 - 5)} ${px(bodyBottom)}V${px(box.y1)}`}
        stroke="var(--ink)"
        strokeWidth={1.1}
      />
      <rect
        x={px(box.x0)}
        y={px(box.y0)}
        width={px(width)}
        height={px(bodyBottom - box.y0)}
        fill="var(--sheet)"
        stroke={selected ? 'var(--lamp)' : 'var(--ink)'}
        strokeWidth={selected ? 2 : 1.1}
      />
      {fins.map((x) => (
        <path
          key={x}
          d={`M${px(x)} ${px(box.y0 + (bodyBottom - box.y0) * 0.2)}V${px(bodyBottom - (bodyBottom - box.y0) * 0.2)}`}
          stroke="var(--ember)"
          strokeWidth={2}
        />
      ))}
      {watts > 0.5 && (
        <polygon
          points={heatArrow({
            x: inside ? box.x1 + 2 : box.x1,
            y: inside ? (box.y0 + bodyBottom) / 2 : portY,
            lengthPx: inside ? 44 : tent.x0 - box.x1 + 34,
            watts,
          })}
          fill="var(--ember)"
        />
      )}
    </g>
  );
}

export function FanPart({ model, watts, selected }: { model: SectionModel; watts: number; selected: boolean }) {
  const { fan, frame } = model;
  if (!fan) return null;
  const { x, y, r } = fan;
  const edge = selected ? 'var(--lamp)' : 'var(--ink)';
  if (frame.view === 'side')
    return (
      <circle aria-hidden="true" cx={px(x)} cy={px(y)} r={r * 0.65} fill="none" stroke={edge} strokeDasharray="4 3" />
    );
  return (
    <g aria-hidden="true">
      <circle cx={px(x)} cy={px(y)} r={r} fill="var(--sheet)" stroke={edge} strokeWidth={selected ? 2 : 1.3} />
      {[-90, 30, 150].map((angle) => (
        <ellipse
          key={angle}
          cx={px(x)}
          cy={px(y - r * 0.42)}
          rx={r * 0.24}
          ry={r * 0.4}
          transform={`rotate(${angle + 90} ${px(x)} ${px(y)})`}
          fill="var(--ink)"
        />
      ))}
      {watts > 0.5 && (
        <polygon
          points={heatArrow({ x: x + r + 2, y, lengthPx: Math.min(44, frame.pxPerM * 0.13), watts })}
          fill="var(--paper)"
          stroke="var(--ember)"
          strokeWidth={1.5}
        />
      )}
    </g>
  );
}
