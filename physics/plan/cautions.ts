import { CONTINUOUS_SHARE } from '../power/circuit-load';
import type { Caution, CircuitResult, HeatResult, TierResult, YearResult } from './evaluation-document';
import type { ResolvedScenario } from './resolved-scenario';
import { electricalCautions } from './cautions-electrical';
import { heaterCautions } from './cautions-heater';
import { lightCautions } from './cautions-light';

export interface CautionFacts {
  scenario: ResolvedScenario;
  tiers: TierResult[];
  heat: HeatResult;
  /** Without months while a lamp is being dragged. */
  year: YearResult;
  circuits: CircuitResult[];
  /** What the tent slips to in the coldest hours with the heater that is planned; null where it holds. */
  slipTempC: number | null;
}

export const rounded = (value: number, digits = 0): string => value.toFixed(digits).replace('-', '−');

/** Humidity and warmth that the plants or the room would suffer from. */
function airCautions({ scenario, heat, year }: CautionFacts): Caution[] {
  const cautions: Caution[] = [];
  if (heat.wallDewMarginK < 0) {
    cautions.push({
      code: 'air.condensation',
      severity: 'warning',
      where: 'climate',
      text: `On the coldest night the wall is ${rounded(-heat.wallDewMarginK, 1)} K below the dew point of the tent's air: it sweats. More air, fewer wet trays or a warmer room keeps it dry.`,
      source: 'Computed from the fabric and the humidity; mould gains ground on wet surfaces',
    });
  }
  const moist = [heat.coldDark, heat.coldDawn, heat.coldLight].map((state) => state.tentRelHumidityPct);
  const allowed = scenario.climate.maxRelHumidityPct;
  if (Math.max(...moist) > allowed + 0.5) {
    cautions.push({
      code: 'air.humidity',
      severity: 'warning',
      where: 'climate.exhaust',
      text: `In the cold months humidity reaches ${rounded(Math.max(...moist))} %, above the ${rounded(allowed)} % that you allow. ${scenario.climate.exhaust ? 'The fan is too small or the room too moist.' : 'No fan is planned that could carry the moisture off.'}`,
      source: 'Computed; above 80 % for hours leaf disease gains ground (judged from extension advice)',
    });
  }
  const { hotLight } = heat;
  const capacity = scenario.climate.exhaust?.maxAirflowM3H ?? 0;
  if (hotLight.excessW > 0 && (hotLight.exhaustAirflowM3H === null || hotLight.exhaustAirflowM3H > capacity)) {
    cautions.push({
      code: 'air.overheat',
      severity: 'warning',
      where: 'climate.exhaust',
      text:
        hotLight.exhaustAirflowM3H === null
          ? `On the hot day the room is as warm as the ${rounded(scenario.climate.maxTempC)} °C that you allow; no fan can hold it. Burn the lamps at night or dim them.`
          : `On the hot day it takes ${rounded(hotLight.exhaustAirflowM3H)} m³/h of air to hold ${rounded(scenario.climate.maxTempC)} °C; ${capacity > 0 ? `the fan gives ${rounded(capacity)} m³/h` : 'no fan is planned'}.`,
      source: 'Computed',
    });
  }
  const waterL = year.months.reduce((most, month) => Math.max(most, month.waterL / 30), 0);
  if (waterL > 3) {
    cautions.push({
      code: 'air.roomMoisture',
      severity: 'note',
      where: 'room',
      text: `Up to ${rounded(waterL, 1)} L of water a day leave the tent as vapour. Unless they leave the house too, they end on its cold walls.`,
      source: 'Computed; the room is better kept below 60 % (US EPA, mold course, chapter 2, read where it is quoted)',
    });
  }
  return cautions;
}

const ORDER = { danger: 0, warning: 1, note: 2 } as const;

/**
 * What a careful friend would say before anything is plugged in, worst first. Only what applies; each with its source. None of
 * it decides: makers' instructions, local code and a licensed electrician do.
 */
export function cautionsFor(facts: CautionFacts): Caution[] {
  return [...heaterCautions(facts), ...electricalCautions(facts), ...airCautions(facts), ...lightCautions(facts)].sort(
    (a, b) => ORDER[a.severity] - ORDER[b.severity],
  );
}

export const limitShareText = `${Math.round(CONTINUOUS_SHARE * 100)} %`;
