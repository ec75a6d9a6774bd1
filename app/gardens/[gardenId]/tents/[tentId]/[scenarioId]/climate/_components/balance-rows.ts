import { formatQuantity } from '@/lib/format/quantity';
import type { UnitSystem } from '@/lib/format/quantity-kinds';
import type { Evaluation, ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';

export type PieceKind = 'fabric' | 'floor' | 'air' | 'vapour' | 'excess' | 'fans' | 'lamps' | 'heater' | 'short';

export interface BalancePiece {
  kind: PieceKind;
  watts: number;
  words: string;
}

export interface BalanceRow {
  id: 'coldDark' | 'coldDawn' | 'coldLight' | 'hotLight';
  name: string;
  facts: string[];
  /** What leaves the tent, drawn as the upper bar. */
  out: BalancePiece[];
  /** What comes in, drawn as the lower bar. */
  in: BalancePiece[];
  /** What is left over or missing, in words; null where the two bars end together. */
  gap: { tone: 'short' | 'over'; figure: string; words: string } | null;
}

interface Context {
  document: ScenarioDocument;
  evaluation: Evaluation;
  units: UnitSystem;
}

const piece = (kind: PieceKind, watts: number, words: string): BalancePiece => ({ kind, watts, words });
const present = (pieces: BalancePiece[]) => pieces.filter((each) => each.watts >= 0.5);

type ColdId = 'coldDark' | 'coldDawn' | 'coldLight';

function coldRow(id: ColdId, name: string, lamps: string, { document, evaluation, units }: Context): BalanceRow {
  const state = evaluation.heat[id];
  const ratedW = document.climate.heater?.ratedPowerW ?? 0;
  const deliveredW = Math.min(state.heaterW, ratedW);
  const shortW = state.heaterW - deliveredW;
  const overW = state.gainW - state.lossW;
  const room = formatQuantity(state.roomTempC, 'temperature', units).text;
  const kept = formatQuantity(state.tentTempC, 'temperature', units).text;
  const row: BalanceRow = {
    id,
    name,
    facts: [`${lamps}, room ${room},`, `${kept} to be kept`],
    out: present([
      piece('fabric', state.fabricW, 'through the fabric'),
      piece('floor', state.floorW, 'into the floor'),
      piece('air', state.airW, 'in changed air'),
      piece('vapour', state.latentW, 'in water vapour'),
    ]),
    in: present([
      piece('fans', state.circulationW + state.pumpW, 'fans, pump'),
      piece('lamps', state.lampsW, 'from the lamps'),
      piece(
        'heater',
        deliveredW,
        deliveredW >= ratedW && shortW > 0 ? 'from the heater, all it can give' : 'from the heater',
      ),
      piece('short', shortW, 'missing'),
    ]),
    gap: null,
  };
  if (shortW >= 0.5) {
    row.gap = {
      tone: 'short',
      figure: `${formatQuantity(shortW, 'power', units).text} short`,
      words:
        ratedW > 0
          ? 'the heater gives all it can and the tent slips below'
          : 'no heater is planned, so the tent slips below',
    };
  } else if (overW >= 0.5) {
    row.gap = {
      tone: 'over',
      figure: `${formatQuantity(overW, 'power', units).text} to spare`,
      words: 'no heater needed; the tent runs warmer or the fan carries it off',
    };
  }
  return row;
}

function hotRow({ document, evaluation, units }: Context): BalanceRow {
  const hot = evaluation.heat.hotLight;
  const fan = document.climate.exhaust;
  const needed = hot.exhaustAirflowM3H;
  const row: BalanceRow = {
    id: 'hotLight',
    name: 'Hottest day',
    facts: [
      `lamps on, room ${formatQuantity(hot.roomTempC, 'temperature', units).text},`,
      `${formatQuantity(document.climate.maxTempC, 'temperature', units).text} at most`,
    ],
    out: present([
      piece('fabric', hot.fabricW, 'through the fabric'),
      piece('floor', hot.floorW, 'into the floor'),
      piece('air', hot.airW, 'in changed air'),
      piece('vapour', hot.latentW, 'in water vapour'),
      piece('excess', hot.excessW, 'for the exhaust to carry'),
    ]),
    in: present([
      piece('fans', hot.circulationW + hot.pumpW, 'fans, pump'),
      piece('lamps', hot.lampsW, 'from the lamps'),
    ]),
    gap: null,
  };
  if (hot.excessW <= 0) {
    row.gap = {
      tone: 'over',
      figure: 'Stays cooler',
      words: 'more leaves than comes in: no air is needed against heat',
    };
  } else if (needed === null) {
    row.gap = { tone: 'short', figure: 'No fan can hold it', words: 'the room is as warm as the tent may be' };
  } else {
    const airflow = formatQuantity(needed, 'airflow', units).text;
    const has = fan ? formatQuantity(fan.maxAirflowM3H, 'airflow', units).text : 'none planned';
    const enough = fan !== null && fan !== undefined && fan.maxAirflowM3H >= needed;
    row.gap = {
      tone: enough ? 'over' : 'short',
      figure: `${airflow} of air`,
      words: enough ? `holds it; the fan gives up to ${has}` : `would hold it; the fan gives ${has}`,
    };
  }
  return row;
}

/** The tent's three cold states and its hot one as bars of watts. */
export function balanceRows(context: Context): BalanceRow[] {
  const { coldDawn, coldLight } = context.evaluation.heat;
  const rows = [coldRow('coldDark', 'Coldest night', 'lamps off', context)];
  const oneGroup = Math.abs(coldDawn.lampsW - coldLight.lampsW) < 0.5;
  if (!oneGroup) rows.push(coldRow('coldDawn', 'First lamps on', 'the fewest lamps on', context));
  rows.push(coldRow('coldLight', 'Coldest day', 'all lamps on', context));
  rows.push(hotRow(context));
  return rows;
}
