import { MONTHS } from '@/app/_components/section/month-names';
import type { ScenarioPlate } from '@/app/_components/scenario-plates';
import { toldMonth } from '@/lib/scenarios/coldest-month';
import type { Evaluation } from '@/lib/evaluation/evaluate-scenario';
import type { EvaluatedScenario, Workbench } from '@/lib/scenarios/scenario.schema';

/** The told month's energy, and whether the tent runs by it. */
export function plateFact({ scenario, tent, room }: Workbench, evaluation: Evaluation): string {
  const { month } = toldMonth(room.climate.airTempC, evaluation);
  const kwh = evaluation.year.months.find((each) => each.month === month)?.energyKwh.total ?? 0;
  return `${kwh.toFixed(0)} kWh in ${MONTHS[month - 1]}${tent.currentScenarioId === scenario.scenarioId ? ', in use' : ''}`;
}

/** What stands on a scenario's plate: its name, its racks as lines, and the told month's energy. */
export function plateOf({ workbench, evaluation }: EvaluatedScenario): ScenarioPlate {
  const { scenario, tent } = workbench;
  return {
    scenarioId: scenario.scenarioId,
    name: scenario.name,
    fact: plateFact(workbench, evaluation),
    tierHeightsFrac: scenario.plan.tiers.map((tier) => tier.topHeightM / tent.body.heightM),
  };
}
