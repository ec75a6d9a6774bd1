import { formatQuantity, type UnitSystem } from '@/lib/format/quantity';
import {
  heaterNeedW,
  worstColdState,
  type Evaluation,
  type ScenarioDocument,
} from '@/lib/evaluation/evaluate-scenario';

interface Facts {
  document: ScenarioDocument;
  evaluation: Evaluation;
  units: UnitSystem;
}

/** The coldest hour a tent slips to, over the year; the set-point where it holds. */
const coldest = ({ year }: Evaluation) => Math.min(...year.months.map((month) => month.airTempC.min));

/** The answer: does it stay warm, and not too warm or too wet? */
export function climateHeadline({ document, evaluation, units }: Facts): string {
  const watt = (value: number) => formatQuantity(value, 'power', units).text;
  const degrees = (value: number) => formatQuantity(value, 'temperature', units).text;
  const need = heaterNeedW(evaluation.heat);
  const rated = document.climate.heater?.ratedPowerW ?? 0;
  if (need > rated + 0.5) {
    const slips = coldest(evaluation);
    return rated > 0
      ? `In the coldest hours the heater falls ${watt(need - rated)} short, and the tent slips to ${degrees(slips)}.`
      : `Without a heater the tent falls to ${degrees(slips)}. Holding ${degrees(evaluation.heat[worstColdState(evaluation.heat)].tentTempC)} takes ${watt(need)}.`;
  }
  const { hotLight } = evaluation.heat;
  const fan = document.climate.exhaust?.maxAirflowM3H ?? 0;
  if (hotLight.excessW > 0 && (hotLight.exhaustAirflowM3H === null || hotLight.exhaustAirflowM3H > fan)) {
    return `It stays warm in the coldest hours, but on the hot day it goes past ${degrees(document.climate.maxTempC)}.`;
  }
  if (evaluation.heat.wallDewMarginK < 0) return 'It stays warm in the coldest hours, but the wall sweats.';
  return need > 0
    ? `The ${watt(rated)} heater holds the coldest hours with ${watt(rated - need)} to spare.`
    : 'Lamps and fans alone keep it warm enough, even in the coldest hours.';
}

/** The remedy. */
export function climateLead({ document, evaluation, units }: Facts): string {
  const { heat } = evaluation;
  const need = heaterNeedW(evaluation.heat);
  const rated = document.climate.heater?.ratedPowerW ?? 0;
  if (need > rated + 0.5 && heat.recommendedHeaterW > 0) {
    return `${formatQuantity(heat.recommendedHeaterW, 'power', units).text} would hold it, with a quarter or more to spare. A quilt round the tent or a warmer room needs less.`;
  }
  if (
    heat.recommendedExhaustM3H !== null &&
    heat.recommendedExhaustM3H > (document.climate.exhaust?.maxAirflowM3H ?? 0)
  ) {
    return `A fan of ${formatQuantity(heat.recommendedExhaustM3H, 'airflow', units).text} would carry off the lamps’ heat and the plants’ moisture.`;
  }
  if (heat.wallDewMarginK < 0) {
    const lower = Math.max(50, Math.round(document.climate.maxRelHumidityPct ?? 75) - 8);
    return `Allow less humidity, say ${lower} %, so that the fan carries more of it off; or warm the wall with a quilt.`;
  }
  return 'Nothing to do. Hang a thermometer that keeps its lowest and highest, and see whether it agrees.';
}
