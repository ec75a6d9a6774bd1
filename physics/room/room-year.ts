import { percentile } from '../light/tier-light';
import type { ResolvedScenario } from '../plan/resolved-scenario';
import type { Series } from '../plan/scenario-document';
import { drawIn, hourlyValues } from './series';

/** The room over a year, one value for each hour of local standard time; read only. */
export interface RoomYear {
  roomTempC: Float64Array;
  roomRelHumidityPct: Float64Array;
  /** 1st and 99th percentile of the hours' temperature. */
  coldTempC: number;
  hotTempC: number;
  /** Some month could not be joined to its neighbours as steeply as it should be. */
  drawnIn: boolean;
}

/** What a room's air may be; joined months and swings are kept within. */
const TEMPERATURE = { least: -60, most: 70 };
const HUMIDITY = { least: 0, most: 100 };

function make({ airTempC, relHumidityPct }: ResolvedScenario['room'], year: number): RoomYear {
  const roomTempC = hourlyValues(airTempC, year);
  const roomRelHumidityPct = hourlyValues(relHumidityPct, year);
  const drawn = [drawIn(roomTempC, year, TEMPERATURE), drawIn(roomRelHumidityPct, year, HUMIDITY)];
  const still = airTempC.kind === 'constant';
  return {
    roomTempC,
    roomRelHumidityPct,
    coldTempC: still ? airTempC.value : percentile(roomTempC, 0.01),
    hotTempC: still ? airTempC.value : percentile(roomTempC, 0.99),
    drawnIn: drawn.includes(true),
  };
}

function sameSeries(a: Series, b: Series): boolean {
  if (a.kind !== b.kind) return false;
  if (a.kind === 'constant' || b.kind === 'constant')
    return a.kind === 'constant' && b.kind === 'constant' && a.value === b.value;
  if (a.kind === 'monthly' && b.kind === 'monthly' && a.dailySwingK !== b.dailySwingK) return false;
  return a.values.length === b.values.length && a.values.every((value, index) => value === b.values[index]);
}

const copyOf = (series: Series): Series =>
  series.kind === 'constant' ? { ...series } : { ...series, values: [...series.values] };

const MOST_KEPT = 8;
const kept: { year: number; airTempC: Series; relHumidityPct: Series; made: RoomYear }[] = [];

/** The room of a scenario. The latest few are kept by their contents: a lamp that is dragged asks for the same room each frame. */
export function roomYear({ room, year }: ResolvedScenario): RoomYear {
  const { airTempC, relHumidityPct } = room;
  const known = kept.find(
    (each) =>
      each.year === year && sameSeries(each.airTempC, airTempC) && sameSeries(each.relHumidityPct, relHumidityPct),
  );
  if (known) return known.made;
  const made = make(room, year);
  if (kept.length >= MOST_KEPT) kept.shift();
  kept.push({ year, airTempC: copyOf(airTempC), relHumidityPct: copyOf(relHumidityPct), made });
  return made;
}
