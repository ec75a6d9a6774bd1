/** The fabric, cut: a heavy inner line, a hairline outside, and the ports left open. */
import type { SectionModel } from './section-model';
import { px } from './section-frame';

const OUT = 4.5;

export function TentShell({ model }: { model: SectionModel }) {
  const { tent, frame, heater, fan } = model;
  const front = frame.view === 'front';
  const gap = Math.min(20, frame.pxPerM * 0.06);
  const intake = front && heater && !heater.inside ? { y0: heater.portY - gap, y1: heater.portY + gap } : null;
  const exhaust = front && fan ? { y0: fan.y - gap, y1: fan.y + gap } : null;
  return (
    <g fill="none" stroke="var(--ink)">
      <path strokeWidth={3} d={wallPath(tent, 0, intake, exhaust)} />
      <path strokeWidth={0.75} d={wallPath(tent, OUT, intake, exhaust)} />
      {[intake && tent.x0, exhaust && tent.x1].map((x, i) => {
        const port = i === 0 ? intake : exhaust;
        if (!port || x === null) return null;
        const ends = [px(Math.min(x, x + (i === 0 ? -OUT : OUT))), px(Math.max(x, x + (i === 0 ? -OUT : OUT)))];
        return (
          <path
            key={i}
            strokeWidth={1.5}
            d={`M${ends[0]} ${px(port.y0)}H${ends[1]}M${ends[0]} ${px(port.y1)}H${ends[1]}`}
          />
        );
      })}
    </g>
  );
}

interface Gap {
  y0: number;
  y1: number;
}

function wallPath(tent: SectionModel['tent'], out: number, left: Gap | null, right: Gap | null): string {
  const x0 = px(tent.x0 - out);
  const x1 = px(tent.x1 + out);
  const y0 = px(tent.y0 - out);
  const y1 = px(tent.y1);
  const up = left ? `M${x0} ${y1}V${px(left.y1)}M${x0} ${px(left.y0)}V${y0}` : `M${x0} ${y1}V${y0}`;
  const down = right ? `V${px(right.y0)}M${x1} ${px(right.y1)}V${y1}` : `V${y1}`;
  return `${up}H${x1}${down}`;
}
