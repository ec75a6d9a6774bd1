import type { TentBody } from '../evaluation/evaluate-scenario';
import type { Plan } from './plan.schema';

const round = (metres: number) => Math.round(metres * 100) / 100;
const WORDS = ['Only', 'Lower', 'Middle', 'Upper'];

function tierName(index: number, count: number): string {
  if (count === 1) return WORDS[0]!;
  if (index === 0) return 'Lower';
  if (index === count - 1) return 'Upper';
  return count === 3 ? 'Middle' : `Tier ${index + 1}`;
}

/** Room under the lowest tier for a reservoir, as a share of the tent's height. */
const UNDER_SHARE = 0.2;
const MARGIN_M = 0.06;

/**
 * A rack to begin with: tiers evenly spaced over a reservoir, no lamps, no devices, set-points to be changed.
 * What is not known is left out, and then counts as its default and is marked as one.
 */
export function starterPlan(body: Pick<TentBody, 'widthM' | 'depthM' | 'heightM'>, tierCount: number): Plan {
  const margin = Math.min(MARGIN_M, body.widthM / 8, body.depthM / 8);
  const first = Math.max(0.05, body.heightM * UNDER_SHARE);
  const step = (body.heightM - first) / tierCount;
  return {
    tiers: Array.from({ length: tierCount }, (_, index) => ({
      id: `tier-${index + 1}`,
      name: tierName(index, tierCount),
      topHeightM: round(first + index * step),
      x0M: round(margin),
      x1M: round(body.widthM - margin),
      y0M: round(margin),
      y1M: round(body.depthM - margin),
      targetRef: null,
    })),
    placements: [],
    schedules: [{ id: 'day', onAt: '06:00', hours: 14 }],
    climate: { dayTempC: 20, nightTempC: 16, maxTempC: 27 },
  };
}
