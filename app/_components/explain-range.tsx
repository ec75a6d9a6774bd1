'use client';

import type { Explanation } from '@/lib/evaluation/evaluate-scenario';
import type { Band } from './explain-context';
import { explainedFigure } from './explain-figures';
import { useUnits } from './units-context';

const WIDTH = 380;
const LEFT = 8;

/** Round ends and four or five steps for an axis that holds all of these. */
export function roundAxis(values: readonly number[]): { low: number; high: number; step: number } {
  const least = Math.min(0, ...values);
  const most = Math.max(0, ...values);
  const span = most - least || 1;
  const rough = span / 4;
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = power * ([1, 2, 2.5, 5, 10].find((each) => each * power >= rough) ?? 10);
  return { low: Math.floor(least / step) * step, high: Math.ceil(most / step) * step, step };
}

interface ExplainRangeProps {
  explanation: Explanation;
  range: NonNullable<Explanation['range']>;
  wanted: Band | null;
}

/** How sure: the range as a bracket with the figure as its dot, and what is wanted above it on the same scale. */
export function ExplainRange({ explanation, range, wanted }: ExplainRangeProps) {
  const units = useUnits();
  const { value, unit } = explanation.result;
  const axis = roundAxis([value, range.low, range.high, ...(wanted ? [wanted.low, wanted.high] : [])]);
  const at = (each: number) => LEFT + ((each - axis.low) / (axis.high - axis.low)) * (WIDTH - 2 * LEFT - 40);
  const say = (each: number) => explainedFigure(each, unit, units).figure;
  const ticks = Array.from(
    { length: Math.round((axis.high - axis.low) / axis.step) + 1 },
    (_, i) => axis.low + i * axis.step,
  );
  const words = `${say(range.low)} to ${say(range.high)}`;
  return (
    <>
      <h3 className="pt-3 text-14 font-semibold">How sure</h3>
      <svg viewBox={`0 0 ${WIDTH} 62`} className="w-full text-12" role="img" aria-label={`Between ${words} ${unit}`}>
        {wanted && (
          <g stroke="var(--moss)" strokeWidth={1.75} fill="none">
            <path d={`M${at(wanted.low)} 4v9M${at(wanted.low)} 8.5H${at(wanted.high)}M${at(wanted.high)} 4v9`} />
            <text x={at(wanted.high) + 5} y={12.5} stroke="none" fill="var(--moss)">
              wanted
            </text>
          </g>
        )}
        <text x={(at(range.low) + at(range.high)) / 2} y={29} textAnchor="middle" fill="var(--ink)">
          {words}
        </text>
        <path d={`M${at(axis.low)} 42H${at(axis.high)}`} stroke="var(--ink-soft)" />
        {ticks.map((tick, i) => (
          <g key={tick}>
            <path d={`M${at(tick)} 42v4`} stroke="var(--ink-soft)" />
            <text x={at(tick)} y={59} textAnchor="middle" fill="var(--ink-soft)">
              {say(tick)}
              {i === ticks.length - 1 ? ` ${explainedFigure(tick, unit, units).unit}` : ''}
            </text>
          </g>
        ))}
        <g fill="none" stroke="var(--ink)" strokeWidth={2}>
          <path d={`M${at(range.low) + 4} 35h-4v14h4M${at(range.high) - 4} 35h4v14h-4`} />
        </g>
        <circle cx={at(value)} cy={42} r={4.5} fill="var(--lamp-fill)" stroke="var(--ink)" />
      </svg>
      <p className="text-12">What widens it most: {range.widestBy}.</p>
    </>
  );
}
