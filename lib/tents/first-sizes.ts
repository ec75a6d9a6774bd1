import { METRE_PER_FOOT } from '@/physics/units/conversions';

/** A tent's size to begin with, round in the reader's units: 120 × 120 × 180 cm, or 4 × 4 × 6 ft. */
export const firstSizes = {
  metric: { widthM: 1.2, depthM: 1.2, heightM: 1.8 },
  us: { widthM: 4 * METRE_PER_FOOT, depthM: 4 * METRE_PER_FOOT, heightM: 6 * METRE_PER_FOOT },
};
