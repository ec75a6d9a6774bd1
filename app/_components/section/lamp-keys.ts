/** The keyboard twin of every drag: arrows move by 1 cm, with Shift by 10; [ and ] swing by 1 degree. */
import { setLampAboveLeaves, setLampAcross, setLampSwing } from '@/lib/scenarios/edit-plan';
import { slideTier, tierRange } from '@/lib/scenarios/edit-rack';
import { lampAcrossRange, lampRange } from '@/lib/scenarios/lamp-range';
import { swingDeg, TILT_LIMIT_DEG } from '@/lib/scenarios/lamp-pose';
import type { ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import type { LampGroup } from './lamp-groups';
import type { PlanChange } from './plan-edit';
import type { SectionFrame, View } from './section-frame';

export interface KeyPress {
  key: string;
  shiftKey: boolean;
}

const clamp = (value: number, low: number, high: number) => Math.min(high, Math.max(low, value));
const tidy = (metres: number) => Math.round(metres * 1e4) / 1e4;

/** The lamp's height on the floor's scale one step further, on whole centimetres from where it is. */
export function lampKeyChange(
  press: KeyPress,
  doc: ScenarioDocument,
  lampId: string,
  group: LampGroup,
  frame: Pick<SectionFrame, 'view' | 'acrossM'>,
): PlanChange | null {
  const lamp = group.lamps.find((each) => each.id === lampId) ?? group.lamps[0]!;
  const ids = group.lamps.map((each) => each.id);
  const step = press.shiftKey ? 0.1 : 0.01;
  const lead = { lead: lamp.id, ids, view: frame.view, middleM: frame.acrossM / 2 };
  switch (press.key) {
    case 'ArrowUp':
    case 'ArrowDown': {
      const range = lampRange(doc, ids);
      const by = press.key === 'ArrowUp' ? step : -step;
      const to = tidy(clamp(group.aboveLeavesM + by, range.lowM, range.highM));
      return (plan) => setLampAboveLeaves(plan, ids, to);
    }
    case 'ArrowLeft':
    case 'ArrowRight': {
      const range = lampAcrossRange(doc, lamp.id, frame.view);
      const by = press.key === 'ArrowRight' ? step : -step;
      const to = tidy(clamp(lamp.positionM[frame.view === 'front' ? 0 : 1] + by, range.lowM, range.highM));
      return (plan) => setLampAcross(plan, lead, to);
    }
    case '[':
    case ']': {
      const deg = swingOf(lamp, frame.view) + (press.key === ']' ? 1 : -1) * (press.shiftKey ? 10 : 1);
      return (plan) => setLampSwing(plan, lead, clamp(deg, -TILT_LIMIT_DEG, TILT_LIMIT_DEG));
    }
    default:
      return null;
  }
}

function swingOf(lamp: LampGroup['lamps'][number], view: View): number {
  return Math.round(swingDeg(lamp, view) * 10) / 10;
}

export function tierKeyChange(press: KeyPress, doc: ScenarioDocument, tierId: string): PlanChange | null {
  const tier = doc.tiers.find((candidate) => candidate.id === tierId);
  if (!tier || (press.key !== 'ArrowUp' && press.key !== 'ArrowDown')) return null;
  const range = tierRange(doc, tierId, doc.tent);
  const by = (press.key === 'ArrowUp' ? 1 : -1) * (press.shiftKey ? 0.1 : 0.01);
  const to = clamp(tier.topHeightM + by, range.lowM, range.highM);
  return (plan) => slideTier(plan, tierId, to);
}
