import { sources } from '../sources';
import { HEATER_MARGIN } from '../heat/recommended-size';
import type { Evaluation, HeatState } from './evaluation-document';
import { standingAt, type ExplainContext } from './explain';
import { explainAir } from './explain-air';
import type { Explanation, ExplanationTerm } from './explanation';
import { rangeOf } from './uncertainty';
import { heaterNeedW, worstColdState } from './worst-cold-state';

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
  const { document, evaluation } = context;
  const { heat } = evaluation;
  const common = { path, sources: SOURCES, makesItSurer: METER };
  const range = (read: (each: Evaluation) => number | null) => rangeOf(document, evaluation, read, 'heat', 0);
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
      const need = heaterNeedW(heat);
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
            path: `heat.${worstColdState(heat)}.heater`,
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
        range: range((each) => heaterNeedW(each.heat) * HEATER_MARGIN),
      };
    }
    default:
      return explainAir(context, path, figure);
  }
}
