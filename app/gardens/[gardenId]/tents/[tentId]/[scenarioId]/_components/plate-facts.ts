import { MONTHS } from '@/app/_components/section/month-names';
import type { ScenarioPlate } from '@/app/_components/scenario-plates';
import { toldMonth } from '@/lib/scenarios/coldest-month';
import type { EvaluatedScenario } from '@/lib/scenarios/scenario.schema';

/** What stands on a scenario's plate: its name, its racks as lines, and the told month's energy. */
export function plateOf({ workbench, evaluation }: EvaluatedScenario): ScenarioPlate {
  const { scenario, tent, room } = workbench;
  const { month } = toldMonth(room.climate.airTempC, evaluation);
  const kwh = evaluation.year.months.find((each) => each.month === month)?.energyKwh.total ?? 0;
  return {
    scenarioId: scenario.scenarioId,
    name: scenario.name,
    fact: `${kwh.toFixed(0)} kWh in ${MONTHS[month - 1]}${tent.currentScenarioId === scenario.scenarioId ? ', in use' : ''}`,
    tierHeightsFrac: scenario.plan.tiers.map((tier) => tier.topHeightM / tent.body.heightM),
  };
}
