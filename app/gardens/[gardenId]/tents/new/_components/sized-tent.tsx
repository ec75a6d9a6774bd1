'use client';

import type { CSSProperties } from 'react';
import { QuantityField } from '@/app/_components/quantity-field';
import { starterPlan } from '@/lib/scenarios/starter-plan';

export interface TentSizes {
  widthM: number;
  depthM: number;
  heightM: number;
}

interface SizedTentProps {
  sizes: TentSizes;
  tiers: number;
  onChange: (sizes: TentSizes) => void;
}

const BOX = { width: 340, height: 420 };
/** Depth goes back and up at 45°, half as long, as on a box's picture. */
const BACK = 0.35;
const FIELD_PX = 118;
const LEAST_M = 0.3;
const MOST_M = 6;

/** The tent in line, dashed until it stands, with its three sizes typed on the dimension lines themselves. */
export function SizedTent({ sizes, tiers, onChange }: SizedTentProps) {
  const { widthM, depthM, heightM } = sizes;
  const scale = Math.min(BOX.width / (widthM + depthM * BACK), BOX.height / (heightM + depthM * BACK));
  const back = depthM * BACK * scale;
  const wide = widthM * scale;
  const tall = heightM * scale;
  const left = 24;
  const top = 22 + back;
  const right = left + wide;
  const floor = top + tall;
  const rack = starterPlan(sizes, tiers).tiers;
  const set = (key: keyof TentSizes) => (value: number) => onChange({ ...sizes, [key]: value });
  const field = (key: keyof TentSizes, label: string, hint?: string) => (
    <QuantityField
      label={label}
      kind="tallLength"
      value={sizes[key]}
      min={LEAST_M}
      max={MOST_M}
      onCommit={set(key)}
      className="w-29.5 shrink-0"
      {...(hint && { hint })}
    />
  );
  return (
    <div className="grid grid-cols-[118px_minmax(0,520px)] gap-x-3 max-md:grid-cols-2 max-md:gap-y-4 lg:justify-start">
      <div
        className="col-start-2 flex gap-x-(--gap) pl-6 max-md:col-span-2 max-md:col-start-1 max-md:gap-x-4 max-md:pl-0"
        style={{ '--gap': `${Math.max(12, right + back + 12 - left - FIELD_PX)}px` } as CSSProperties}
      >
        {field('widthM', 'Width inside')}
        {field('depthM', 'Depth inside')}
      </div>
      <div className="col-start-1 self-center max-md:col-span-2 max-md:self-start">
        {field('heightM', 'Height inside', '6 ft, 72 in and 180 cm are read alike.')}
      </div>
      <svg
        viewBox={`0 0 ${BOX.width + 60} ${BOX.height + 40}`}
        className="w-full max-w-100 max-md:col-span-2"
        role="img"
        aria-label={`The tent with ${tiers} ${tiers === 1 ? 'tier' : 'tiers'}, to scale`}
        fill="none"
        stroke="var(--ink)"
      >
        <g stroke="var(--ink-soft)" strokeWidth={1}>
          <path d={`M${left} 10H${right}M${left - 3.5} 13.5l7-7M${right - 3.5} 13.5l7-7`} />
          <path d={`M10 ${top}V${floor}M6.5 ${top + 3.5}l7-7M6.5 ${floor + 3.5}l7-7`} />
          <path d={`M${right + 8} ${top - 2}l${back} ${-back}`} />
        </g>
        <path
          d={`M${left} ${top}l${back} ${-back}H${right + back}V${floor - back}L${right} ${floor}`}
          strokeDasharray="5 4"
          strokeWidth={1}
          stroke="var(--ink-soft)"
        />
        <path d={`M${right} ${top}l${back} ${-back}`} strokeDasharray="5 4" strokeWidth={1} stroke="var(--ink-soft)" />
        <rect x={left} y={top} width={wide} height={tall} fill="var(--ramp-0)" fillOpacity={0.25} strokeWidth={3} />
        {rack.map((tier) => (
          <g key={tier.id}>
            <rect
              x={left + tier.x0M * scale}
              y={floor - tier.topHeightM * scale}
              width={(tier.x1M - tier.x0M) * scale}
              height={5}
              fill="var(--sheet)"
              strokeWidth={1.25}
              strokeDasharray="5 3"
            />
            <text
              x={left + wide / 2}
              y={floor - tier.topHeightM * scale - 8}
              textAnchor="middle"
              className="text-12"
              fill="var(--ink-soft)"
              stroke="none"
            >
              {tiers === 1
                ? 'the tier'
                : tier.name?.toLowerCase().startsWith('tier')
                  ? tier.name.toLowerCase()
                  : `${tier.name?.toLowerCase()} tier`}
            </text>
          </g>
        ))}
        <path d={`M0 ${floor}H${BOX.width + 60}`} strokeWidth={1.5} />
      </svg>
    </div>
  );
}
