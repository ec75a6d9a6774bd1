/** How high a lamp can hang: clear of the leaves below it and of whatever is above it. */
import type { FixtureType, Placement } from '@/physics/plan/scenario-document';
import { lampExtent, leafHeightM, servedTier, tierBottomM, type RackTier } from './lamp-pose';

/** A lamp nearer to the leaves than this touches them at the next leaf. */
export const LEAF_CLEARANCE_M = 0.05;

interface Rack {
  tiers: RackTier[];
  placements: Placement[];
  fixtures: FixtureType[];
  tent: { widthM: number; depthM: number; heightM: number };
}

export interface LampRange {
  /** Heights of the face above the leaves, or above the floor where no tier is below. */
  lowM: number;
  highM: number;
}

export function lampRange(rack: Rack, ids: readonly string[]): LampRange {
  let range: LampRange = { lowM: LEAF_CLEARANCE_M, highM: Infinity };
  for (const lamp of rack.placements.filter((candidate) => ids.includes(candidate.id))) {
    const body = rack.fixtures.find((fixture) => fixture.id === lamp.fixture);
    if (!body) continue;
    const tier = servedTier(lamp, rack.tiers);
    const extent = lampExtent(lamp, body);
    const upM = extent.max[2] - lamp.positionM[2];
    const downM = lamp.positionM[2] - extent.min[2];
    const leafM = tier ? leafHeightM(tier) : 0;
    const over = rack.tiers
      .filter((other) => other.x0M < extent.max[0] && other.x1M > extent.min[0] && tierBottomM(other) > leafM)
      .map(tierBottomM);
    const highM = Math.min(rack.tent.heightM, ...over) - upM - 0.005 - leafM;
    range = { lowM: Math.max(range.lowM, LEAF_CLEARANCE_M + downM), highM: Math.min(range.highM, highM) };
  }
  return { lowM: range.lowM, highM: Math.max(range.lowM, range.highM) };
}

/** How far the lamps can go to either side before one meets a wall; metres across the view from the left (or front). */
export function lampAcrossRange(rack: Rack, lampId: string, view: 'front' | 'side'): LampRange {
  const lamp = rack.placements.find((candidate) => candidate.id === lampId);
  const body = lamp && rack.fixtures.find((fixture) => fixture.id === lamp.fixture);
  const wideM = view === 'front' ? rack.tent.widthM : rack.tent.depthM;
  if (!lamp || !body) return { lowM: 0, highM: wideM };
  const i = view === 'front' ? 0 : 1;
  const extent = lampExtent(lamp, body);
  const before = lamp.positionM[i] - extent.min[i];
  const after = extent.max[i] - lamp.positionM[i];
  return { lowM: before, highM: Math.max(before, wideM - after) };
}

/** Where in the tent a new lamp goes: over the middle of its tier, a forearm above the leaves or under what is above. */
export function placeForLamp(rack: Rack, tierId: string): readonly [number, number, number] {
  const tier = rack.tiers.find((candidate) => candidate.id === tierId);
  if (!tier) return [rack.tent.widthM / 2, rack.tent.depthM / 2, rack.tent.heightM * 0.85];
  const over = rack.tiers.map(tierBottomM).filter((bottom) => bottom > leafHeightM(tier));
  const freeM = Math.min(rack.tent.heightM, ...over) - leafHeightM(tier);
  const z = leafHeightM(tier) + Math.min(0.35, Math.max(0.05, freeM - 0.1));
  return [(tier.x0M + tier.x1M) / 2, (tier.y0M + tier.y1M) / 2, z];
}
