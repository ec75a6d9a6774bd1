import { dewPoint, saturationPressure } from '../air/psychrometrics';
import { roomAt, wallFaceC } from '../heat/design-states';
import { freeFloat } from '../heat/free-float';
import { tentModel } from '../heat/tent-model';
import { roomSide, tentAir, type RoomSide } from '../heat/tent-state';
import { roomYear } from '../room/room-year';
import { sources } from '../sources';
import type { Evaluation } from './evaluation-document';
import { standingAt, type ExplainContext } from './explain';
import type { Explanation, ExplanationTerm } from './explanation';
import { rangeOf } from './uncertainty';

const computed = { standing: 'computed', source: 'Computed' } as const;
const SOURCES = [sources.ASHRAE2017.citation, sources.Graamans2017.citation, sources.ISO6946.citation];

type Part = Omit<Explanation, 'path' | 'range' | 'sources'> & { read: (each: Evaluation) => number | null };

const term = (
  operator: ExplanationTerm['operator'],
  value: number,
  unit: string,
  label: string,
  from: Pick<ExplanationTerm, 'standing' | 'source'> = computed,
): ExplanationTerm => ({ operator, value, unit, label, ...from });

/** The room's air of a design day, as the states took it. */
function sideAt({ scenario }: ExplainContext, tempC: number): RoomSide {
  return roomSide(roomAt(scenario, roomYear(scenario), tempC), tentModel(scenario).pressurePa);
}

function hotExhaust(context: ExplainContext): Part | null {
  const { evaluation, scenario } = context;
  const hot = evaluation.heat.hotLight;
  if (hot.exhaustAirflowM3H === null) return null;
  const side = sideAt(context, hot.roomTempC);
  const whPerM3K = side.capacity / side.volumePerKg / 3600;
  const riseK = hot.tentTempC - hot.roomTempC;
  return {
    title: `Air that holds ${scenario.climate.maxTempC} °C on the hot day`,
    formula: 'airflow = heat that the air must carry ÷ warming ÷ heat that a m³ of room air takes up',
    terms: [
      term('', hot.exhaustAirflowM3H * whPerM3K * riseK, 'W', 'lamps, fan and pump, less fabric, floor and vapour'),
      term('÷', riseK, 'K', 'from the room’s air to the tent’s'),
      term('÷', whPerM3K, 'Wh/m³K', 'heat that a m³ of room air takes up', {
        standing: 'secondary',
        source: sources.ASHRAE2017.citation,
      }),
    ],
    result: { value: hot.exhaustAirflowM3H, unit: 'm³/h' },
    makesItSurer: 'Note the room’s highest temperature over one hot week.',
    read: (each) => each.heat.hotLight.exhaustAirflowM3H,
  };
}

function moistureAirflow(context: ExplainContext, which: 'light' | 'dark'): Part | null {
  const { evaluation, scenario } = context;
  const value = evaluation.heat.moistureAirflowM3H[which];
  if (value === null) return null;
  const state = which === 'light' ? evaluation.heat.coldLight : evaluation.heat.coldDark;
  const side = sideAt(context, state.roomTempC);
  const { allowedRatio } = tentAir(tentModel(scenario), { kind: 'fixed', kgH: 0 }, state.tentTempC);
  const gramPerM3 = ((allowedRatio - side.ratio) * 1000) / side.volumePerKg;
  const fixed = scenario.water.transpiration.kind === 'fixed';
  return {
    title: `Air that holds ${scenario.climate.maxRelHumidityPct} % by ${which === 'light' ? 'day' : 'night'}`,
    formula: 'airflow = evaporation at that humidity ÷ vapour that a m³ of room air can take up',
    terms: [
      term('', value * gramPerM3, 'g/h', 'leaves and wet trays give off', {
        ...(fixed
          ? { standing: 'given', source: 'Given in this scenario' }
          : { standing: 'secondary', source: sources.Graamans2017.citation }),
      }),
      term(
        '÷',
        gramPerM3,
        'g/m³',
        `taken up on the way from the room’s air to ${scenario.climate.maxRelHumidityPct} %`,
      ),
    ],
    result: { value, unit: 'm³/h' },
    makesItSurer: 'Weigh or measure what the reservoir loses in a day.',
    read: (each) => each.heat.moistureAirflowM3H[which],
  };
}

function wallDewMargin({ evaluation, scenario }: ExplainContext): Part {
  const { heat } = evaluation;
  const margins = [heat.coldDark, heat.coldDawn, heat.coldLight].map((state) => {
    const vapourPa = (state.tentRelHumidityPct / 100) * saturationPressure(state.tentTempC);
    const faceC = wallFaceC(scenario, state.tentTempC, state.roomTempC);
    return { state, faceC, dewC: vapourPa < 0.01 ? -100 : dewPoint(vapourPa) };
  });
  const worst = margins.reduce((a, b) => (b.faceC - b.dewC < a.faceC - a.dewC ? b : a));
  return {
    title: 'How far the wall is from sweating',
    formula: 'temperature of the fabric’s inner face − dew point of the tent’s air',
    terms: [
      term('', worst.faceC, '°C', `inner face, between ${worst.state.tentTempC} °C and the cold room`),
      term('−', worst.dewC, '°C', `dew point of the tent’s air at ${worst.state.tentRelHumidityPct.toFixed(0)} %`),
    ],
    result: { value: heat.wallDewMarginK, unit: 'K' },
    makesItSurer: 'Touch the wall at the end of a cold night, or hang a hygrometer beside it.',
    read: (each) => each.heat.wallDewMarginK,
  };
}

function float({ evaluation, scenario }: ExplainContext, which: 'light' | 'dark'): Part | null {
  const { heat } = evaluation;
  const value = heat.freeFloatTempC[which];
  if (value === null) return null;
  const room = roomAt(scenario, roomYear(scenario), heat.coldDark.roomTempC);
  const tent = tentModel(scenario);
  const { conductanceWK } = freeFloat({ tent, room, gainW: 0 });
  const colderK = conductanceWK > 0 ? (tent.floorWK * (room.tempC - room.slabTempC)) / conductanceWK : 0;
  return {
    title: `The tent unheated in the cold, lamps ${which === 'light' ? 'on' : 'off'}`,
    formula: `room + (watts inside − floor’s pull) ÷ ${conductanceWK.toFixed(1)} W/K of fabric, floor and air`,
    terms: [
      term('', room.tempC, '°C', 'the room'),
      term(
        '+',
        value - room.tempC + colderK,
        'K',
        which === 'light' ? 'from lamps, fan and pump' : 'from fan and pump',
      ),
      term('−', colderK, 'K', 'for the colder floor', standingAt(evaluation, 'room.slabTempC')),
    ],
    result: { value, unit: '°C' },
    makesItSurer: 'Leave the heater off for one night and read a thermometer at dawn.',
    read: (each) => each.heat.freeFloatTempC[which],
  };
}

function partOf(context: ExplainContext, figure: string): Part | null {
  switch (figure) {
    case 'hotLight.exhaust':
      return hotExhaust(context);
    case 'moistureAirflow.light':
      return moistureAirflow(context, 'light');
    case 'moistureAirflow.dark':
      return moistureAirflow(context, 'dark');
    case 'wallDewMargin':
      return wallDewMargin(context);
    case 'freeFloat.light':
      return float(context, 'light');
    case 'freeFloat.dark':
      return float(context, 'dark');
    default:
      return null;
  }
}

/** Figures of air, moisture and the unheated tent, by what follows `heat.`. */
export function explainAir(context: ExplainContext, path: string, figure: string): Explanation | null {
  const part = partOf(context, figure);
  if (!part) return null;
  const { read, ...rest } = part;
  const { document, evaluation } = context;
  return { path, ...rest, range: rangeOf(document, evaluation, read, 'heat'), sources: SOURCES };
}
