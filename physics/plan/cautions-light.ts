import { sources } from '../sources';
import type { Caution } from './evaluation-document';
import { rounded, type CautionFacts } from './cautions';

/** Greens without added CO₂ bleach or burn at the tips above this, µmol/m²/s. Judged from trials of tip burn. */
const BRIGHT_FOR_GREENS = 600;
/** Enough in the dark hours to confuse a plant that counts them, µmol/m²/s. */
const STRAY_LIMIT = 0.1;
/** A lamp that gives less than this share of the lower edge will not get there by hours. */
const HOPELESS_SHARE = 0.5;

function tierCautions({ scenario, tiers }: CautionFacts): Caution[] {
  return tiers.flatMap((tier, index): Caution[] => {
    const { target, name } = scenario.tiers[index]!;
    if (!target) return [];
    const cautions: Caution[] = [];
    const where = `tiers.${tier.id}`;
    if (tier.ppfdUmolM2S.max > BRIGHT_FOR_GREENS && target.dliHighMolM2D < 25) {
      cautions.push({
        code: 'light.bright',
        severity: 'warning',
        where,
        text: `${name}: the brightest spot gets ${rounded(tier.ppfdUmolM2S.max)} µmol/m²/s. Greens without added CO₂ bleach and burn at the tips above about ${BRIGHT_FOR_GREENS}; raise or dim the lamp, or move air over the growing points.`,
        source: 'Judged from published trials of tip burn between 150 and 1000 µmol/m²/s',
      });
    }
    const { photoperiodMinH, photoperiodMaxH } = target;
    if (tier.photoperiodH > 0 && photoperiodMaxH !== undefined && tier.photoperiodH > photoperiodMaxH + 1e-9) {
      cautions.push({
        code: 'light.longDay',
        severity: 'warning',
        where,
        text: `${name}: ${rounded(tier.photoperiodH, 1)} h of light; ${target.crop} wants ${rounded(photoperiodMaxH, 1)} h at most. Longer days bring some crops to bolt and yellow others.`,
        source: 'The crop’s reference, see its row',
      });
    }
    if (tier.photoperiodH > 0 && photoperiodMinH !== undefined && tier.photoperiodH < photoperiodMinH - 1e-9) {
      cautions.push({
        code: 'light.shortDay',
        severity: 'note',
        where,
        text: `${name}: ${rounded(tier.photoperiodH, 1)} h of light; ${target.crop} is usually given ${rounded(photoperiodMinH, 1)} h or more.`,
        source: 'The crop’s reference, see its row',
      });
    }
    // Only a crop whose day has a longest length is known to mind light at night.
    if ((tier.strayPpfdUmolM2S ?? 0) > STRAY_LIMIT && photoperiodMaxH !== undefined && photoperiodMaxH < 24) {
      cautions.push({
        code: 'light.stray',
        severity: 'note',
        where,
        text: `${name}: other lamps put ${rounded(tier.strayPpfdUmolM2S!, 1)} µmol/m²/s into its dark hours. Crops that count the night take that for day; set the timers alike or shade the tier.`,
        source: 'Runkle, long-day lighting: 1 to 2 µmol/m²/s is enough; lower limit judged',
      });
    }
    if (tier.verdict === 'above') {
      cautions.push({
        code: 'light.above',
        severity: 'note',
        where,
        text: `${name}: ${rounded(tier.dliMolM2D.mean, 1)} mol a day; ${target.crop} wants ${rounded(target.dliHighMolM2D, 1)} at most. Fewer hours, dimming or more height saves power and spares the leaves.`,
        source: 'The crop’s reference, see its row',
      });
    }
    if (tier.verdict === 'below' && tier.dliMolM2D.mean < HOPELESS_SHARE * target.dliLowMolM2D) {
      cautions.push({
        code: 'light.hopeless',
        severity: 'note',
        where,
        text: `${name}: ${rounded(tier.dliMolM2D.mean, 1)} of at least ${rounded(target.dliLowMolM2D, 1)} mol a day. Longer hours alone will not do; it takes another lamp or a lamp much closer.`,
        source: 'Computed',
      });
    }
    return cautions;
  });
}

/** Light that harms plants or eyes. */
export function lightCautions(facts: CautionFacts): Caution[] {
  if (facts.scenario.placements.length === 0) return [];
  return [
    ...tierCautions(facts),
    {
      code: 'light.eyes',
      severity: 'note',
      where: 'placements',
      text: 'Do not look into lit lamps; work under white light or turn them down first. Lamps with UV need glasses and gloves as their maker says.',
      source: sources.IEC62471.citation,
    },
  ];
}
