import { sources } from '../sources';
import { HEATER_MARGIN } from '../heat/recommended-size';
import type { Evaluation, HeatState } from './evaluation-document';
import { standingAt, type ExplainContext } from './explain';
import type { Explanation, ExplanationTerm } from './explanation';
import { rangeOf } from './uncertainty';

const computed = { standing: 'computed', source: 'Computed' } as const;
const METER =
  'Leave a plug-in power meter on the heater for one cold night: its kWh and two thermometers give the tent’s true loss.';
const SOURCES = [sources.ISO6946.citation, sources.ASHRAE2017.citation, sources.Graamans2017.citation];

const NAMES = {
  coldDark: 'on the coldest night',
  coldDawn: 'on the coldest morning',
  coldLight: 'on the coldest day',
} as const;

function stateTerms({ evaluation }: ExplainContext, state: HeatState): ExplanationTerm[] {
  const watt = (
    operator: ExplanationTerm['operator'],
    value: number,
    label: string,
    from: Pick<ExplanationTerm, 'standing' | 'source'> = computed,
  ): ExplanationTerm => ({ operator, value, unit: 'W', label, ...from });
  return [
    watt(
      '',
      state.fabricW,
      `through the fabric, ${(state.tentTempC - state.roomTempC).toFixed(1)} K warmer than the room`,
      standingAt(evaluation, 'tent.fabricUWM2K'),
    ),
    watt('+', state.floorW, 'into the floor', standingAt(evaluation, 'tent.floorUWM2K')),
    watt('+', state.leakageW, 'in air that leaks', standingAt(evaluation, 'tent.leakageAch')),
    watt('+', state.exhaustW, 'in air that the fan changes'),
    watt('+', state.latentW, `in ${state.evaporationKgH.toFixed(2)} kg of water vapour an hour`, {
      standing: 'secondary',
      source: sources.Graamans2017.citation,
    }),
    watt('−', state.lampsW, 'from the lamps'),
    watt('−', state.circulationW + state.pumpW, 'from fan and pump'),
  ];
}

/** Figures of the design states, by what follows `heat.`. */
export function explainHeat(context: ExplainContext, path: string, figure: string): Explanation | null {
  const { document, evaluation, scenario } = context;
  const { heat } = evaluation;
  const common = { path, sources: SOURCES, makesItSurer: METER };
  const range = (read: (each: Evaluation) => number | null) => rangeOf(document, evaluation, read, false);
  const cold = /^(coldDark|coldDawn|coldLight)\.heater$/.exec(figure)?.[1] as keyof typeof NAMES | undefined;
  if (cold) {
    return {
      ...common,
      title: `Heat needed ${NAMES[cold]}`,
      formula: 'heater = fabric + floor + air + vapour − lamps − fan and pump, at least 0',
      terms: stateTerms(context, heat[cold]),
      result: { value: heat[cold].heaterW, unit: 'W' },
      range: range((each) => each.heat[cold].heaterW),
    };
  }
  switch (figure) {
    case 'recommendedHeater': {
      const need = Math.max(heat.coldDark.heaterW, heat.coldDawn.heaterW, heat.coldLight.heaterW);
      return {
        ...common,
        title: 'Heater that holds the coldest hours',
        formula: `largest need × ${HEATER_MARGIN}, up to the next size sold`,
        terms: [
          {
            operator: '',
            value: need,
            unit: 'W',
            label: 'largest of night, morning and day',
            path: 'heat.coldDark.heater',
            ...computed,
          },
          {
            operator: '×',
            value: HEATER_MARGIN,
            unit: '',
            label: 'margin for colder nights and ageing',
            standing: 'judgement',
            source: sources.JUDGEMENT.citation,
          },
        ],
        result: { value: heat.recommendedHeaterW, unit: 'W' },
        range: range(
          (each) =>
            Math.max(each.heat.coldDark.heaterW, each.heat.coldDawn.heaterW, each.heat.coldLight.heaterW) *
            HEATER_MARGIN,
        ),
      };
    }
    case 'hotLight.exhaust': {
      const hot = heat.hotLight;
      if (hot.exhaustAirflowM3H === null) return null;
      return {
        ...common,
        title: `Air that holds ${scenario.climate.maxTempC} °C on the hot day`,
        formula: 'airflow = heat left over ÷ (heat capacity of a m³ of room air × warming)',
        terms: [
          {
            operator: '',
            value: hot.excessW,
            unit: 'W',
            label: 'left over after fabric, floor and the usual air',
            ...computed,
          },
          {
            operator: '÷',
            value: hot.tentTempC - hot.roomTempC,
            unit: 'K',
            label: 'from the room’s air to the tent’s',
            ...computed,
          },
        ],
        result: { value: hot.exhaustAirflowM3H, unit: 'm³/h' },
        range: range((each) => each.heat.hotLight.exhaustAirflowM3H),
        makesItSurer: 'Note the room’s highest temperature over one hot week.',
      };
    }
    case 'moistureAirflow.light':
    case 'moistureAirflow.dark': {
      const which = figure.endsWith('light') ? 'light' : 'dark';
      const value = heat.moistureAirflowM3H[which];
      if (value === null) return null;
      const state = which === 'light' ? heat.coldLight : heat.coldDark;
      return {
        ...common,
        title: `Air that holds ${scenario.climate.maxRelHumidityPct} % by ${which === 'light' ? 'day' : 'night'}`,
        formula: 'airflow = evaporation ÷ (humidity of the tent’s air − of the room’s)',
        terms: [
          {
            operator: '',
            value: state.evaporationKgH,
            unit: 'kg/h',
            label: 'leaves and wet trays give off',
            standing: 'secondary',
            source: sources.Graamans2017.citation,
          },
        ],
        result: { value, unit: 'm³/h' },
        range: range((each) => each.heat.moistureAirflowM3H[which]),
        makesItSurer: 'Weigh or measure what the reservoir loses in a day.',
      };
    }
    case 'wallDewMargin':
      return {
        ...common,
        title: 'How far the wall is from sweating',
        formula: 'temperature of the fabric’s inner face − dew point of the tent’s air',
        terms: [
          {
            operator: '',
            value: heat.wallDewMarginK,
            unit: 'K',
            label: 'worst of night, morning and day',
            ...computed,
          },
        ],
        result: { value: heat.wallDewMarginK, unit: 'K' },
        range: range((each) => each.heat.wallDewMarginK),
      };
    case 'freeFloat.light':
    case 'freeFloat.dark': {
      const which = figure.endsWith('light') ? 'light' : 'dark';
      return {
        ...common,
        title: `The tent unheated in the cold, lamps ${which === 'light' ? 'on' : 'off'}`,
        formula: 'room temperature + gains ÷ (fabric + floor + air, W/K)',
        terms: [
          { operator: '', value: heat.coldDark.roomTempC, unit: '°C', label: 'the room', ...computed },
          {
            operator: '+',
            value: heat.freeFloatTempC[which] - heat.coldDark.roomTempC,
            unit: 'K',
            label:
              which === 'light'
                ? 'from lamps, fan and pump, less the cold floor'
                : 'from fan and pump, less the cold floor',
            ...computed,
          },
        ],
        result: { value: heat.freeFloatTempC[which], unit: '°C' },
        range: range((each) => each.heat.freeFloatTempC[which]),
      };
    }
    default:
      return null;
  }
}
