import { minorPerMajor } from '../format/money';
import {
  heaterNeedW,
  type Device,
  type Evaluation,
  type ScenarioDocument,
  type Verdict,
} from '../evaluation/evaluate-scenario';

/** One scenario as a column of a comparison. */
export interface ComparisonColumn {
  scenarioId: string;
  tentId: string;
  tentName: string;
  name: string;
  tiers: {
    name: string;
    dliMolM2D: { mean: number; min: number; max: number };
    lowMolM2D: number | null;
    highMolM2D: number | null;
    verdict: Verdict;
  }[];
  /** Of the least even tier; null without tiers. */
  evenness: number | null;
  heaterNeedW: number;
  heaterRatedW: number;
  designTempC: number;
  upFrontMinor: number;
  costPerMonth: number;
  costPerYear: number;
  energyKwhPerYear: number;
  months: { cost: number; costByDevice: Record<Device, number> }[];
  currency: string;
  dangers: number;
  warnings: number;
}

export interface ComparisonSource {
  scenarioId: string;
  tentId: string;
  tentName: string;
  name: string;
  document: ScenarioDocument;
  evaluation: Evaluation;
}

export function comparisonColumn({ document, evaluation, ...names }: ComparisonSource): ComparisonColumn {
  const { heat, year } = evaluation;
  return {
    ...names,
    tiers: evaluation.tiers.map((tier, index) => {
      const { name, id, target } = document.tiers[index]!;
      return {
        name: name ?? id,
        dliMolM2D: tier.dliMolM2D,
        lowMolM2D: target ? (target.dliLowMolM2D ?? 0.8 * target.dliTargetMolM2D) : null,
        highMolM2D: target ? (target.dliHighMolM2D ?? 1.2 * target.dliTargetMolM2D) : null,
        verdict: tier.verdict,
      };
    }),
    evenness:
      evaluation.tiers.length > 0 ? Math.min(...evaluation.tiers.map((tier) => tier.ppfdUmolM2S.minOverMean)) : null,
    heaterNeedW: heaterNeedW(heat),
    heaterRatedW: document.climate.heater?.ratedPowerW ?? 0,
    designTempC: heat.coldDark.roomTempC,
    upFrontMinor: evaluation.upFront.costMinor,
    costPerMonth: year.cost / 12,
    costPerYear: year.cost,
    energyKwhPerYear: year.energyKwh.total,
    months: year.months.map(({ cost, costByDevice }) => ({ cost, costByDevice })),
    currency: document.power.tariff.currency,
    dangers: evaluation.cautions.filter((caution) => caution.severity === 'danger').length,
    warnings: evaluation.cautions.filter((caution) => caution.severity === 'warning').length,
  };
}

export type Payback = { kind: 'none' } | { kind: 'atOnce' } | { kind: 'never' } | { kind: 'months'; months: number };

/**
 * When what a scenario costs more at first than the baseline comes back by what it saves each month.
 *
 * Dearer and saving: months. Not dearer and not dearer to run: at once. Dearer to run: never, whatever the light. Alike in both,
 * or reckoned in another currency: none.
 */
export function payback(
  column: Pick<ComparisonColumn, 'upFrontMinor' | 'costPerMonth' | 'currency'>,
  base: Pick<ComparisonColumn, 'upFrontMinor' | 'costPerMonth' | 'currency'>,
): Payback {
  if (column.currency !== base.currency) return { kind: 'none' };
  const more = (column.upFrontMinor - base.upFrontMinor) / minorPerMajor(column.currency);
  const saves = base.costPerMonth - column.costPerMonth;
  if (Math.abs(more) < 0.005 && Math.abs(saves) < 0.005) return { kind: 'none' };
  if (more <= 0) return saves >= -0.005 ? { kind: 'atOnce' } : { kind: 'never' };
  return saves > 0.005 ? { kind: 'months', months: more / saves } : { kind: 'never' };
}
