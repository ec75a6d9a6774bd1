import type { Plan } from '../scenarios/plan.schema';

type Placement = Plan['placements'][number];

const DOWN = [0, 0, -1] as const;
const ALONG_X = [1, 0, 0] as const;

interface Place {
  id: string;
  fixture: string;
  tier: string;
  at: readonly [number, number, number];
  schedule: string;
  dimFrac?: number;
}

/** A lamp hung level, shining straight down. */
export const hung = ({ id, fixture, tier, at, schedule, dimFrac }: Place): Placement => ({
  id,
  fixture,
  tier,
  mount: 'hanging',
  positionM: at,
  aim: DOWN,
  axis: ALONG_X,
  schedule,
  ...(dimFrac !== undefined && { dimFrac }),
});

/** A lamp clamped to an upright at the side, swung towards the middle by so many degrees. */
export const clamped = ({ swingDeg, ...place }: Place & { swingDeg: number }): Placement => {
  const swing = (swingDeg * Math.PI) / 180;
  return { ...hung(place), mount: 'clamped', aim: [Math.sin(swing), 0, -Math.cos(swing)], axis: [0, 1, 0] };
};
