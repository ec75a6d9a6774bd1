/** Lamps that work as one: the same fixture at the same height, output and hours over the same tier. */
import type { ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import { isMirrorPair } from '@/lib/scenarios/edit-plan';
import { aboveLeavesM, servedTier } from '@/lib/scenarios/lamp-pose';

type Placement = ScenarioDocument['placements'][number];
type Tier = ScenarioDocument['tiers'][number];
type Fixture = ScenarioDocument['fixtures'][number];

export interface LampGroup {
  /** The first lamp's id stands for the group. */
  id: string;
  lamps: Placement[];
  fixture: Fixture;
  tier: Tier | null;
  aboveLeavesM: number;
  onAt: string;
  hours: number;
  /** The two lamps are mirror images about the tent's middle. */
  mirrored: boolean;
}

/** Groups from the top of the tent down, left to right; `parted` lamps stand alone. */
export function lampGroups(doc: ScenarioDocument, parted: ReadonlySet<string> = new Set()): LampGroup[] {
  const groups: LampGroup[] = [];
  const ordered = [...doc.placements].sort(
    (a, b) => b.positionM[2] - a.positionM[2] || a.positionM[0] - b.positionM[0] || a.id.localeCompare(b.id),
  );
  for (const lamp of ordered) {
    const fixture = doc.fixtures.find((candidate) => candidate.id === lamp.fixture);
    const timer = doc.schedules.find((schedule) => schedule.id === lamp.schedule);
    if (!fixture) continue;
    const tier = servedTier(lamp, doc.tiers);
    const home = groups.find((group) => {
      const first = group.lamps[0]!;
      return (
        !parted.has(lamp.id) &&
        !parted.has(first.id) &&
        first.fixture === lamp.fixture &&
        group.tier?.id === tier?.id &&
        first.schedule === lamp.schedule &&
        (first.dimFrac ?? 1) === (lamp.dimFrac ?? 1) &&
        Math.abs(first.positionM[2] - lamp.positionM[2]) < 0.006
      );
    });
    if (home) home.lamps.push(lamp);
    else
      groups.push({
        id: lamp.id,
        lamps: [lamp],
        fixture,
        tier,
        aboveLeavesM: aboveLeavesM(lamp, tier),
        onAt: timer?.onAt ?? '06:00',
        hours: timer?.hours ?? 0,
        mirrored: false,
      });
  }
  for (const group of groups) {
    const [one, other] = group.lamps;
    group.mirrored = group.lamps.length === 2 && isMirrorPair(one!, other!, 'front', doc.tent.widthM / 2);
  }
  return groups;
}

export function groupOf(groups: readonly LampGroup[], lampId: string): LampGroup | undefined {
  return groups.find((group) => group.lamps.some((lamp) => lamp.id === lampId));
}
