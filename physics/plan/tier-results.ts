import { dliOf } from '../crops/dli';
import { statistics } from '../light/evaluate-light-scene';
import type { TierLight } from '../light/tier-light';
import { daySegments, isOn, unionHours, type Span } from '../schedule/clock';
import type { TierResult, Verdict } from './evaluation-document';
import { placementSpans } from './lamp-groups';
import type { ResolvedScenario, ResolvedTarget } from './resolved-scenario';

/** A lamp that names no tier lights one when it gives it at least this share of its daily light. */
const LIGHTS_SHARE = 0.05;

const hoursOf = (spans: readonly Span[]) => spans.reduce((sum, { fromMin, toMin }) => sum + toMin - fromMin, 0) / 60;

export function verdictOf(
  dliMolM2D: number,
  target: Pick<ResolvedTarget, 'dliLowMolM2D' | 'dliHighMolM2D'> | null,
): Verdict {
  if (!target) return 'none';
  if (dliMolM2D < target.dliLowMolM2D) return 'below';
  return dliMolM2D > target.dliHighMolM2D ? 'above' : 'inside';
}

/** The brightest dark minute of a tier; null when it has none. */
function strayLight(light: TierLight, own: readonly Span[][], all: readonly Span[][]): number | null {
  let stray: number | null = null;
  for (const { fromMin, toMin } of daySegments(all)) {
    const middle = (fromMin + toMin) / 2;
    if (own.some((spans) => isOn(spans, middle))) continue;
    const mean = all.reduce(
      (sum, spans, index) => sum + (isOn(spans, middle) ? light.byPlacement[index]!.meanPpfdUmolM2S : 0),
      0,
    );
    stray = Math.max(stray ?? 0, mean);
  }
  return stray;
}

/** Daily light, photoperiod, stray light and verdict of each tier, from its maps by placement and the timers. */
export function tierResults(scenario: ResolvedScenario, lights: readonly TierLight[]): TierResult[] {
  const spans = placementSpans(scenario);
  const hours = spans.map(hoursOf);
  return scenario.tiers.map((tier, at) => {
    const light = lights[at]!;
    const daily = new Float64Array(light.grid.length);
    const shares = light.byPlacement.map((own, index) => {
      own.grid.forEach((ppfdUmolM2S, cell) => (daily[cell]! += dliOf({ ppfdUmolM2S, hours: hours[index]! })));
      return dliOf({ ppfdUmolM2S: own.meanPpfdUmolM2S, hours: hours[index]! });
    });
    const { mean, min, max } = statistics(daily);
    const named = scenario.placements.flatMap((placement, index) => (placement.tier === tier.id ? [index] : []));
    const lighting =
      named.length > 0
        ? named
        : shares.flatMap((share, index) => (mean > 0 && share >= LIGHTS_SHARE * mean ? [index] : []));
    const own = lighting.map((index) => spans[index]!);
    return {
      id: tier.id,
      ppfdUmolM2S: light.ppfdUmolM2S,
      dliMolM2D: { mean, min, max },
      photoperiodH: unionHours(own),
      strayPpfdUmolM2S: strayLight(light, own, spans),
      verdict: verdictOf(mean, tier.target),
      incidentFrac: light.incidentFrac,
      grid: { nx: light.nx, ny: light.ny, ppfdUmolM2S: Array.from(light.grid) },
      byPlacement: light.byPlacement.map(({ id, meanPpfdUmolM2S }) => ({ id, meanPpfdUmolM2S })),
    };
  });
}
