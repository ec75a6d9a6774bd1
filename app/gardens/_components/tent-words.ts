/** What a tent wants from a person, in one sentence; the first thing that holds is said. */
import { possessive } from '@/lib/format/possessive';
import type { Evaluation, ScenarioDocument, Verdict } from '@/lib/evaluation/evaluate-scenario';
import {
  shortCrop,
  tierVerdict,
  verdictFigure,
  worstTier,
  type TierVerdict,
} from '../../_components/section/tier-verdict';
import { tierNameInside } from '../../_components/section/tier-names';

export type TentPageName = '' | '/light' | '/climate' | '/power';

export interface TentWords {
  /** 0: nothing wants a person; higher is more urgent. */
  urgency: number;
  mark: { verdict: Verdict; tone: 'lamp' | 'moss' | 'ember' | 'frost' | 'soft' };
  /** The figure that the sentence begins with, if it does. */
  figure: string | null;
  sentence: string;
  /** Inside the headline: "the lettuce in the boiler-house tent is short of light". */
  clause: string;
  link: { words: string; page: TentPageName } | null;
  /** The tier that it is about. */
  tierId: string | null;
  /** The whole caution, with what helps against it. */
  remedy: string | null;
}

type Case = { doc: ScenarioDocument; evaluation: Evaluation; tentName: string };
const plain = (value: number) => String(Number(value.toFixed(1)));

/** Short words for the cautions that a person must act on; the whole text stands on the page of the tent. */
const CAUTIONS: Record<
  string,
  {
    urgency: number;
    sentence: string;
    clause: string;
    page: TentPageName;
    side: Verdict;
    tone: TentWords['mark']['tone'];
  }
> = {
  'circuit.overRating': {
    urgency: 9,
    sentence: 'Its circuit carries more than its breaker is rated for.',
    clause: 'overloads its circuit',
    page: '/power',
    side: 'above',
    tone: 'ember',
  },
  'heater.short': {
    urgency: 6,
    sentence: 'Heat is missing in the coldest hours.',
    clause: 'gets too cold',
    page: '/climate',
    side: 'below',
    tone: 'frost',
  },
  'air.overheat': {
    urgency: 5,
    sentence: 'It gets too warm on the hot day.',
    clause: 'gets too warm',
    page: '/climate',
    side: 'above',
    tone: 'ember',
  },
  'air.condensation': {
    urgency: 4,
    sentence: 'Its wall sweats on the coldest night.',
    clause: 'sweats',
    page: '/climate',
    side: 'above',
    tone: 'frost',
  },
  'air.humidity': {
    urgency: 3,
    sentence: 'Its air gets damper than you allow.',
    clause: 'gets too damp',
    page: '/climate',
    side: 'above',
    tone: 'frost',
  },
};

function unfinished({ doc, tentName }: Case): TentWords | null {
  const soft = { verdict: 'none', tone: 'soft' } as const;
  const base = { urgency: 1, mark: soft, figure: null, tierId: null, remedy: null };
  if (doc.placements.length === 0)
    return {
      ...base,
      sentence: 'No lamp hangs in it yet.',
      clause: `the ${tentName} has no lamp yet`,
      link: { words: 'Hang the first lamp', page: '' },
    };
  if (doc.tiers.every((tier) => !tier.target))
    return {
      ...base,
      sentence: 'No crop is chosen for its tiers.',
      clause: `the ${tentName} has no crop yet`,
      link: { words: 'Choose what grows', page: '' },
    };
  return null;
}

function aboutLight(each: Case, verdicts: ReadonlyMap<string, TierVerdict>): TentWords | null {
  const { doc, tentName } = each;
  const tierId = worstTier(verdicts);
  const worst = tierId ? verdicts.get(tierId) : undefined;
  if (!tierId || !worst || worst.low === null || worst.high === null) return null;
  if (worst.verdict !== 'below' && worst.verdict !== 'above') return null;
  const below = worst.verdict === 'below';
  const figure = verdictFigure(worst);
  return {
    urgency: 7 + Math.min(1, worst.missFrac),
    mark: { verdict: worst.verdict, tone: below ? 'lamp' : 'ember' },
    figure,
    sentence: below
      ? ` of the ${plain(worst.low)} mol its ${worst.crop} needs.`
      : ` mol a day, above ${possessive(worst.crop ?? 'its crop')} ${plain(worst.low)} to ${plain(worst.high)}.`,
    clause: `the ${worst.crop} in the ${tentName} ${below ? 'is short of light' : 'gets too much light'}`,
    link: { words: `Look at ${tierNameInside(doc.tiers, tierId)}`, page: '' },
    tierId,
    remedy: null,
  };
}

function aboutCautions({ evaluation, tentName }: Case): TentWords | null {
  const [found] = evaluation.cautions
    .flatMap(({ code, text }) => (CAUTIONS[code] ? [{ ...CAUTIONS[code], text }] : []))
    .sort((a, b) => b.urgency - a.urgency);
  if (!found) return null;
  return {
    urgency: found.urgency,
    mark: { verdict: found.side, tone: found.tone },
    figure: null,
    sentence: found.sentence,
    clause: `the ${tentName} ${found.clause}`,
    link: { words: found.page === '/power' ? 'Look at its circuit' : 'Look at its climate', page: found.page },
    tierId: null,
    remedy: found.text,
  };
}

function well({ doc, tentName }: Case): TentWords {
  const crops = [...new Set(doc.tiers.flatMap((tier) => (tier.target ? [shortCrop(tier.target.crop)] : [])))];
  const sentence =
    doc.tiers.length === 1
      ? `Its ${crops[0] ?? 'crop'} gets what it needs.`
      : 'Every tier with a crop is inside its band.';
  return {
    urgency: 0,
    mark: { verdict: 'inside', tone: 'moss' },
    figure: null,
    sentence,
    clause: `the ${tentName} is well`,
    link: null,
    tierId: null,
    remedy: null,
  };
}

/** In the middle of a sentence a name of common words loses its capital: "the boiler-house tent". */
function insideSentence(name: string): string {
  const inside = /^[A-Z][a-z-]+( [a-z]|$)/.test(name) ? name[0]!.toLowerCase() + name.slice(1) : name;
  return /tent|box|rack/i.test(inside) ? inside : `tent “${name}”`;
}

export function tentWords(doc: ScenarioDocument, evaluation: Evaluation, name: string): TentWords {
  const each: Case = { doc, evaluation, tentName: insideSentence(name) };
  const verdicts = new Map(
    doc.tiers.flatMap((tier) => {
      const result = evaluation.tiers.find((one) => one.id === tier.id);
      return result ? [[tier.id, tierVerdict(tier, result)] as const] : [];
    }),
  );
  // Heat and damp of a tent that is not furnished yet say nothing.
  const open = unfinished(each);
  if (open) return open;
  const found = [aboutLight(each, verdicts), aboutCautions(each)].filter((one) => one !== null);
  return found.sort((a, b) => b.urgency - a.urgency)[0] ?? well(each);
}

export function countWords(count: number, one: string, many: string): string {
  if (count === 0) return `no ${one}`;
  return `${(COUNTS[count] ?? String(count)).toLowerCase()} ${count === 1 ? one : many}`;
}

const COUNTS = ['No', 'One', 'Two', 'Three', 'Four', 'Five', 'Six', 'Seven', 'Eight', 'Nine'];

/** The page's headline: how many things want a person, and the first two of them. */
export function headlineOf(all: readonly TentWords[]): string {
  const wanting = all.filter((words) => words.urgency > 0).sort((a, b) => b.urgency - a.urgency);
  const [first, second] = wanting;
  if (!first) return all.length === 1 ? 'All is well in the tent.' : `All is well in ${all.length} tents.`;
  const capital = (text: string) => text[0]!.toUpperCase() + text.slice(1);
  if (!second) return `One thing wants you. ${capital(first.clause)}.`;
  const count = COUNTS[wanting.length] ?? String(wanting.length);
  return `${count} things want you. ${capital(first.clause)}, and ${second.clause}.`;
}
