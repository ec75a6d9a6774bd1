/** Edits of a plan's tiers. As in `edit-plan.ts`, each gives a new plan. */
import { freshId, put, removeLamps, type EditablePlan } from './edit-plan';
import { leafHeightM, servedTier, tierBottomM, type RackTier } from './lamp-pose';

type TierOf<P extends EditablePlan> = P['tiers'][number];
const tidy = (metres: number) => Math.round(metres * 1e4) / 1e4;

function eachTier<P extends EditablePlan>(plan: P, id: string, change: (tier: TierOf<P>) => TierOf<P>): P {
  return { ...plan, tiers: plan.tiers.map((tier) => (tier.id === id ? change(tier) : tier)) };
}

export function setTier<P extends EditablePlan>(plan: P, id: string, patch: Partial<TierOf<P>>): P {
  return eachTier(plan, id, (tier) => put(tier as TierOf<P> & object, patch as Partial<TierOf<P> & object>));
}

/** Slides a shelf; its lamps stay where they hang, as they do in a real rack. */
export function slideTier<P extends EditablePlan>(plan: P, id: string, topHeightM: number): P {
  return eachTier(plan, id, (tier) => ({ ...tier, topHeightM: tidy(topHeightM) }));
}

export interface TentInside {
  widthM: number;
  depthM: number;
  heightM: number;
}

const byHeight = (tiers: readonly RackTier[]) => [...tiers].sort((a, b) => a.topHeightM - b.topHeightM);

/** How far a shelf can slide without meeting leaves, lamps, another shelf, the floor or the top. */
export function tierRange(plan: EditablePlan, id: string, tent: TentInside): { lowM: number; highM: number } {
  const tier = plan.tiers.find((candidate) => candidate.id === id);
  if (!tier) return { lowM: 0, highM: tent.heightM };
  const thick = tier.topHeightM - tierBottomM(tier);
  const canopy = leafHeightM(tier) - tier.topHeightM;
  const lower = byHeight(plan.tiers)
    .filter((other) => other.topHeightM < tier.topHeightM)
    .at(-1);
  const upper = byHeight(plan.tiers).find((other) => other.topHeightM > tier.topHeightM);
  const lampsBelow = plan.placements.filter((lamp) => lower && servedTier(lamp, plan.tiers)?.id === lower.id);
  const lampsAbove = plan.placements.filter((lamp) => servedTier(lamp, plan.tiers)?.id === id);
  const lowM =
    Math.max(0.01, lower ? leafHeightM(lower) : 0, ...lampsBelow.map((lamp) => lamp.positionM[2] + 0.04)) + thick;
  const highM =
    Math.min(upper ? tierBottomM(upper) : tent.heightM, ...lampsAbove.map((lamp) => lamp.positionM[2] - 0.02)) - canopy;
  return { lowM: tidy(Math.min(lowM, tier.topHeightM)), highM: tidy(Math.max(highM, tier.topHeightM)) };
}

/** Where one more shelf fits best: in the middle of the tallest free stretch. */
export function roomForTier(plan: EditablePlan, tent: TentInside): number {
  const tiers = byHeight(plan.tiers);
  const free = [
    { from: 0.2, to: tiers[0] ? tierBottomM(tiers[0]) : tent.heightM },
    ...tiers.map((tier, i) => ({
      from: tier.topHeightM,
      to: tiers[i + 1] ? tierBottomM(tiers[i + 1]!) : tent.heightM,
    })),
  ];
  const tallest = free.reduce((best, gap) => (gap.to - gap.from > best.to - best.from ? gap : best));
  return tidy(tallest.from + (tallest.to - tallest.from) * (tiers.length === 0 ? 0.25 : 0.5));
}

/** Puts in a shelf as wide and deep as the others (10 cm off the walls where there is none). */
export function addTier<P extends EditablePlan>(
  plan: P,
  tent: TentInside,
  topHeightM?: number,
): { plan: P; id: string } {
  const id = freshId('tier', plan.tiers);
  const peer = plan.tiers[0];
  const margin = Math.min(0.1, tent.widthM / 8, tent.depthM / 8);
  const tier: RackTier = {
    id,
    topHeightM: topHeightM ?? roomForTier(plan, tent),
    x0M: peer?.x0M ?? tidy(margin),
    x1M: peer?.x1M ?? tidy(tent.widthM - margin),
    y0M: peer?.y0M ?? tidy(margin),
    y1M: peer?.y1M ?? tidy(tent.depthM - margin),
    sites: peer?.sites ?? { rows: 4, columns: 6 },
  };
  return { plan: { ...plan, tiers: [...plan.tiers, tier as TierOf<P>] }, id };
}

/** The same shelf with the same lamps once more, in the tallest free stretch. */
export function duplicateTier<P extends EditablePlan>(plan: P, id: string, tent: TentInside): { plan: P; id: string } {
  const tier = plan.tiers.find((candidate) => candidate.id === id) as TierOf<P> | undefined;
  if (!tier) return { plan, id };
  const newId = freshId('tier', plan.tiers);
  const topHeightM = roomForTier(plan, tent);
  const by = topHeightM - tier.topHeightM;
  const copy = { ...tier, id: newId, topHeightM };
  delete copy.name;
  let placements = plan.placements;
  for (const lamp of plan.placements.filter((candidate) => candidate.tier === id)) {
    const [x, y, z] = lamp.positionM;
    const up = Math.min(tidy(z + by), tent.heightM - 0.05);
    placements = [...placements, { ...lamp, id: freshId('lamp', placements), tier: newId, positionM: [x, y, up] }];
  }
  return { plan: { ...plan, tiers: [...plan.tiers, copy], placements }, id: newId };
}

/** Takes a shelf out; the lamps that serve it by name go with it or stay where they hang. */
export function removeTier<P extends EditablePlan>(plan: P, id: string, lamps: 'remove' | 'keep'): P {
  const own = plan.placements.filter((lamp) => lamp.tier === id).map((lamp) => lamp.id);
  const without = { ...plan, tiers: plan.tiers.filter((tier) => tier.id !== id) };
  if (lamps === 'remove') return removeLamps(without, own);
  return { ...without, placements: plan.placements.map((lamp) => (lamp.tier === id ? { ...lamp, tier: null } : lamp)) };
}
