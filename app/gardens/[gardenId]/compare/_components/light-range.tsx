import { scaleLinear } from 'd3-scale';
import type { ComparisonColumn } from '@/lib/comparison/comparison';

interface LightRangeProps {
  tier: ComparisonColumn['tiers'][number];
  most: number;
}

const WIDTH = 120;

/** A tier's day on one scale: lowest to highest as a line, mean as a dot, the crop's band as a bracket. */
export function LightRange({ tier, most }: LightRangeProps) {
  const x = scaleLinear()
    .domain([0, most])
    .range([3, WIDTH - 3]);
  const { mean, min, max } = tier.dliMolM2D;
  const { lowMolM2D: low, highMolM2D: high } = tier;
  return (
    <svg width={WIDTH} height="18" aria-hidden="true" className="block shrink-0">
      <line x1="0" x2={WIDTH} y1="9" y2="9" stroke="var(--line)" />
      <line x1={x(min)} x2={x(max)} y1="9" y2="9" stroke="var(--lamp)" strokeWidth="2" />
      {low !== null && high !== null && (
        <path
          d={`M${x(low) + 4} 2H${x(low)}V16H${x(low) + 4}M${x(high) - 4} 2H${x(high)}V16H${x(high) - 4}`}
          fill="none"
          stroke="var(--moss)"
          strokeWidth="2"
        />
      )}
      <circle
        cx={x(mean)}
        cy="9"
        r="4"
        fill={tier.verdict === 'inside' ? 'var(--lamp)' : 'var(--paper)'}
        stroke="var(--lamp)"
        strokeWidth="1.75"
      />
    </svg>
  );
}
