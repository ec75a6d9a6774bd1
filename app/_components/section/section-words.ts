/** The section's words: names, distances and powers in the person's units. */
import { formatQuantity, type QuantityKind, type UnitSystem } from '@/lib/format/quantity';
import { swingDeg } from '@/lib/scenarios/lamp-pose';
import type { WayOut } from '@/lib/scenarios/ways-out';
import { differenceText } from '@/lib/format/figure';
import type { LampGroup } from './lamp-groups';
import type { TierVerdict } from './tier-verdict';
import { verdictWords } from './tier-verdict';
import type { LampModel, SectionModel, TierModel } from './section-model';
import { tierName, tierNameInside } from './tier-names';

type Tiers = Parameters<typeof tierName>[0];

export interface SectionWords {
  units: UnitSystem;
  say: (value: number, kind: QuantityKind, digits?: number) => string;
  /** Without a decimal that says nothing: 21 °C, 21.5 °C. */
  neat: (value: number, kind: QuantityKind) => string;
  group: (group: LampGroup) => string;
  groupFacts: (group: LampGroup) => string;
  lamp: (model: LampModel) => string;
  lampValue: (model: LampModel, verdict: TierVerdict | undefined) => string;
  tier: (id: string) => string;
  tierValue: (model: TierModel, verdict: TierVerdict | undefined) => string;
  way: (way: WayOut) => string;
  wayPrice: (way: WayOut) => string;
}

const SPELLED: Record<string, string> = { cm: 'centimetres', in: 'inches', m: 'metres', ft: 'feet' };

export function sectionWords(tiers: Tiers, units: UnitSystem): SectionWords {
  const say: SectionWords['say'] = (value, kind, digits) =>
    formatQuantity(value, kind, units, digits === undefined ? {} : { digits }).text;
  const over = (group: LampGroup) => (group.tier ? ` over ${tierNameInside(tiers, group.tier.id)}` : '');
  const called = (group: LampGroup) => group.fixture.name ?? (group.fixture.shape === 'point' ? 'Bulb' : 'Lamp');
  const group: SectionWords['group'] = (each) => {
    const count = each.lamps.length;
    const name = called(each);
    return count === 1 ? `${name}${over(each)}` : `${name} × ${count}${over(each)}`;
  };
  const groupFacts: SectionWords['groupFacts'] = (each) => {
    const dim = each.lamps[0]!.dimFrac ?? 1;
    const count = each.lamps.length > 1 ? `${each.lamps.length} × ` : '';
    const where = each.tier
      ? `${say(each.aboveLeavesM, 'length')} above the leaves`
      : `${say(each.aboveLeavesM, 'length')} above the floor`;
    return `${count}${say(each.fixture.inputPowerW, 'power')} at ${say(dim, 'fraction')}, on ${each.onAt} for ${say(each.hours, 'hours', each.hours % 1 ? 1 : 0)}, ${where}`;
  };
  const lamp: SectionWords['lamp'] = (model) => {
    if (model.group.lamps.length < 2) return group(model.group);
    const order = [...model.group.lamps]
      .sort((a, b) => a.positionM[0] - b.positionM[0])
      .findIndex((each) => each.id === model.lamp.id);
    const side = model.group.lamps.length === 2 ? ['Left', 'Right'][order] : `Number ${order + 1}`;
    return `${side} ${called(model.group).toLowerCase()}${over(model.group)}`;
  };
  const tierGets = (verdict: TierVerdict | undefined, id: string | undefined) =>
    verdict && id ? `; ${tierName(tiers, id)} ${verdict.dli.toFixed(1)}${verdictWords(verdict)}` : '';
  const spelled = (metres: number) => {
    const { figure, unit } = formatQuantity(metres, 'length', units);
    return `${figure} ${SPELLED[unit] ?? unit}`;
  };
  return {
    units,
    say,
    neat: (value, kind) => say(value, kind).replace(/\.0(?=\s|$)/, ''),
    group,
    groupFacts,
    lamp,
    lampValue: (model, verdict) => {
      const tilt = Math.round(swingDeg(model.lamp, 'front'));
      const swung = tilt === 0 ? '' : `, swung ${Math.abs(tilt)} degrees to the ${tilt > 0 ? 'right' : 'left'}`;
      return `${spelled(model.group.aboveLeavesM)} above the ${model.group.tier ? 'leaves' : 'floor'}${swung}${tierGets(verdict, model.group.tier?.id)}`;
    },
    tier: (id) => tierName(tiers, id),
    tierValue: (model, verdict) =>
      `${spelled(model.tier.topHeightM)} above the floor${tierGets(verdict, model.tier.id)}`,
    way: (each) => wayWords(each, say),
    wayPrice: ({ monthKwh }) => {
      if (monthKwh === null) return '';
      const text = differenceText(monthKwh, 0);
      return text === 'same' ? 'same kWh a month' : `${text.replace(/^([+−])/, '$1 ')} kWh a month`;
    },
  };
}

function wayWords(way: WayOut, say: SectionWords['say']): string {
  const parts: string[] = [];
  if (way.output) parts.push(way.output.to === 1 ? 'full output' : `${say(way.output.to, 'fraction')} output`);
  if (way.hours) {
    const by = way.hours.to - way.hours.from;
    parts.push(`${say(Math.abs(by), 'hours', Math.abs(by) % 1 ? 1 : 0)} ${by > 0 ? 'more' : 'less'}`);
  }
  if (way.aboveLeavesM) {
    const by = way.aboveLeavesM.to - way.aboveLeavesM.from;
    parts.push(`${say(Math.abs(by), 'length')} ${by > 0 ? 'higher' : 'lower'}`);
  }
  if (parts.length === 1 && way.output) parts[0] = `${parts[0]}, same place`;
  const text = parts.join(' and ');
  return text.charAt(0).toUpperCase() + text.slice(1);
}

/** Crops' bands as PPFD in the hours of their tier, each once, for the legend. */
export function legendBrackets(model: SectionModel, verdicts: ReadonlyMap<string, TierVerdict>) {
  const seen = new Map<string, { name: string; lowPpfd: number; highPpfd: number }>();
  for (const { tier } of model.tiers) {
    const verdict = verdicts.get(tier.id);
    if (!verdict?.crop || verdict.low === null || verdict.high === null || verdict.hours <= 0) continue;
    const name = verdict.crop.length > 18 ? `${verdict.crop.slice(0, 17)}…` : verdict.crop;
    const seconds = verdict.hours * 0.0036;
    seen.set(name, { name, lowPpfd: verdict.low / seconds, highPpfd: verdict.high / seconds });
  }
  return [...seen.values()];
}
