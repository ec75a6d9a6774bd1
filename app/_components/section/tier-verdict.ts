/** A tier's verdict as words, from its evaluation and its crop's band. */
import { possessive } from '@/lib/format/possessive';
import type { Evaluation, ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';

type Tier = ScenarioDocument['tiers'][number];
type TierResult = Evaluation['tiers'][number];

export interface TierVerdict {
  verdict: TierResult['verdict'];
  dli: number;
  low: number | null;
  high: number | null;
  /** Lower-case crop name as it stands inside a sentence. */
  crop: string | null;
  stage: string | null;
  /** How far outside the band, as a share of its nearer edge; 0 inside. */
  missFrac: number;
  /** The dimmest and the brightest spot. */
  minDli: number;
  maxDli: number;
  evenness: number;
  stray: number | null;
  hours: number;
}

export function shortCrop(name: string): string {
  const plain = name.split(/[,(/]/)[0]!.trim();
  return plain.charAt(0).toLowerCase() + plain.slice(1);
}

export function tierVerdict(tier: Tier, result: TierResult): TierVerdict {
  const target = tier.target;
  const low = target ? (target.dliLowMolM2D ?? 0.8 * target.dliTargetMolM2D) : null;
  const high = target ? (target.dliHighMolM2D ?? 1.2 * target.dliTargetMolM2D) : null;
  const dli = result.dliMolM2D.mean;
  const miss =
    low !== null && dli < low && low > 0
      ? (low - dli) / low
      : high !== null && dli > high && high > 0
        ? (dli - high) / high
        : 0;
  return {
    verdict: result.verdict,
    dli,
    low,
    high,
    crop: target ? shortCrop(target.crop) : null,
    stage: target?.stage ?? null,
    missFrac: result.verdict === 'inside' || result.verdict === 'none' ? 0 : miss,
    minDli: result.dliMolM2D.min,
    maxDli: result.dliMolM2D.max,
    evenness: result.ppfdUmolM2S.minOverMean,
    stray: result.strayPpfdUmolM2S,
    hours: result.photoperiodH,
  };
}

/** The tier that most wants a person: the one furthest outside its band; where all are inside, the least even one. */
export function worstTier(verdicts: ReadonlyMap<string, TierVerdict>): string | null {
  const all = [...verdicts].filter(([, verdict]) => verdict.verdict !== 'none');
  if (all.length === 0) return null;
  const [id] = all.reduce((worst, next) => {
    const more = next[1].missFrac - worst[1].missFrac;
    return more > 0 || (more === 0 && next[1].evenness < worst[1].evenness) ? next : worst;
  });
  return id;
}

/** The figure itself: one decimal, or two where one would hide that it misses its edge. */
export function verdictFigure({ verdict, dli, low, high }: TierVerdict): string {
  const edge = verdict === 'below' ? low : verdict === 'above' ? high : null;
  return edge !== null && dli.toFixed(1) === edge.toFixed(1) ? dli.toFixed(2) : dli.toFixed(1);
}

/** What follows the figure: ` of the 12 mol it needs`, ` mol a day, inside lettuce's 12 to 17`. */
export function verdictWords(verdict: TierVerdict): string {
  const { low, high, crop } = verdict;
  const figure = (value: number) => String(Number(value.toFixed(1)));
  if (low === null || high === null) return ' mol a day';
  if (verdict.verdict === 'below') return ` of the ${figure(low)} mol it needs`;
  if (verdict.verdict === 'above')
    return ` mol a day, above ${possessive(crop ?? 'its crop')} ${figure(low)} to ${figure(high)}`;
  return ` mol a day, inside ${possessive(crop ?? 'its crop')} ${figure(low)} to ${figure(high)}`;
}
