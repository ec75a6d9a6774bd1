import { sources } from '../sources';
import { placementSpans } from './lamp-groups';
import type { ExplainContext } from './explain';
import type { Explanation, ExplanationTerm } from './explanation';
import { rangeOf } from './uncertainty';

const computed = { standing: 'computed', source: 'Computed from the section' } as const;
const READING = 'Measure PPFD at a few sites under each lamp: one row of readings is worth more than any default.';

const hours = (spans: readonly { fromMin: number; toMin: number }[]) =>
  spans.reduce((sum, span) => sum + span.toMin - span.fromMin, 0) / 60;

/** Each lamp's share of a tier's day: mean PPFD × hours × 0.0036. */
function lampTerms({ scenario, evaluation }: ExplainContext, tierId: string): ExplanationTerm[] {
  const tier = evaluation.tiers.find((each) => each.id === tierId)!;
  const spans = placementSpans(scenario);
  const fixtures = new Map(scenario.fixtures.map((fixture) => [fixture.id, fixture]));
  return tier.byPlacement.flatMap((own, index): ExplanationTerm[] => {
    const onH = hours(spans[index]!);
    const share = own.meanPpfdUmolM2S * onH * 0.0036;
    if (share < 0.005) return [];
    const name = fixtures.get(scenario.placements[index]!.fixture)?.name ?? own.id;
    return [
      {
        operator: '+',
        value: share,
        unit: 'mol/m²',
        label: `${name}: ${own.meanPpfdUmolM2S.toFixed(0)} µmol/m²/s for ${onH.toFixed(1)} h`,
        ...computed,
      },
    ];
  });
}

/** Figures of a tier's light. */
export function explainTier(context: ExplainContext, path: string, tierId: string, figure: string): Explanation | null {
  const { document, evaluation, scenario } = context;
  const tier = evaluation.tiers.find((each) => each.id === tierId);
  const name = scenario.tiers.find((each) => each.id === tierId)?.name ?? tierId;
  if (!tier) return null;
  const common = {
    path,
    sources: [
      sources.S640.citation,
      sources.Howell.citation,
      ...evaluation.warnings.filter((text) => text.startsWith('Reflected')),
    ],
    makesItSurer: READING,
  };
  const own = (of: (each: NonNullable<typeof tier>) => number | null) =>
    rangeOf(
      document,
      evaluation,
      (changed) => {
        const found = changed.tiers.find((each) => each.id === tierId);
        return found ? of(found) : null;
      },
      'light',
      0,
    );
  const { mean, min, max, minOverMean } = tier.ppfdUmolM2S;
  switch (figure) {
    case 'dli':
      return {
        ...common,
        title: `${name}: light in a day`,
        formula: 'DLI = Σ PPFD × hours × 0.0036',
        terms: lampTerms(context, tierId),
        result: { value: tier.dliMolM2D.mean, unit: 'mol/m²/d' },
        range: own((each) => each.dliMolM2D.mean),
      };
    case 'ppfd':
      return {
        ...common,
        title: `${name}: mean PPFD, all lamps on`,
        formula: 'PPFD = Σ lamps, direct through every gap and thrown back by the lining',
        terms: tier.byPlacement
          .filter((each) => each.meanPpfdUmolM2S >= 0.5)
          .map((each) => ({
            operator: '+',
            value: each.meanPpfdUmolM2S,
            unit: 'µmol/m²/s',
            label: each.id,
            ...computed,
          })),
        result: { value: mean, unit: 'µmol/m²/s' },
        range: own((each) => each.ppfdUmolM2S.mean),
      };
    case 'evenness':
      return {
        ...common,
        title: `${name}: evenness`,
        formula: 'lowest ÷ mean PPFD over the tier',
        terms: [
          { operator: '', value: min, unit: 'µmol/m²/s', label: 'lowest cell', ...computed },
          {
            operator: '÷',
            value: mean,
            unit: 'µmol/m²/s',
            label: `mean; the brightest has ${max.toFixed(0)}`,
            ...computed,
          },
        ],
        result: { value: minOverMean, unit: '' },
        range: own((each) => each.ppfdUmolM2S.minOverMean),
      };
    case 'stray':
      if (tier.strayPpfdUmolM2S === null) return null;
      return {
        ...common,
        title: `${name}: stray light in its dark hours`,
        formula: 'largest mean PPFD in any minute outside the tier’s own light',
        terms: [
          {
            operator: '',
            value: tier.strayPpfdUmolM2S,
            unit: 'µmol/m²/s',
            label: 'from other tiers’ lamps',
            ...computed,
          },
        ],
        result: { value: tier.strayPpfdUmolM2S, unit: 'µmol/m²/s' },
        range: null,
      };
    default:
      return null;
  }
}
