import type { Caution, CircuitResult, HeatResult, TierResult, YearResult } from './evaluation-document';
import type { ResolvedScenario } from './resolved-scenario';
export interface CautionFacts {
  scenario: ResolvedScenario;
  tiers: TierResult[];
  heat: HeatResult;
  year: YearResult;
  circuits: CircuitResult[];
}
export function cautionsFor(_facts: CautionFacts): Caution[] {
  return [];
}
