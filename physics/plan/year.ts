import { wallSweats } from '../heat/design-states';
import { hourState, type HourState } from '../heat/hour-state';
import { pumpShare, tentModel, waterSource } from '../heat/tent-model';
import {
  roomSide,
  tentAir,
  type RoomSide,
  type TentAir,
  type TentModel,
  type TentState,
  type WaterSource,
} from '../heat/tent-state';
import type { TierLight } from '../light/tier-light';
import { priceAt, priceCuts } from '../power/bill';
import type { RoomYear } from '../room/room-year';
import { DAY_MIN } from '../schedule/clock';
import { localYear, type LocalHour } from '../schedule/local-year';
import type { Device, YearResult } from './evaluation-document';
import { lampSegments, type LampSegment } from './lamp-groups';
import type { ResolvedScenario } from './resolved-scenario';
import { YearTotals } from './year-totals';

interface Segment extends LampSegment {
  /** Tells lamp sets apart, for states that recur. */
  key: string;
  shareOfHour: number;
}

/** The 24 hours of the wall clock, each cut where a lamp turns or a price changes. */
function hourSegments(scenario: ResolvedScenario): Segment[][] {
  const hours = Array.from({ length: 23 }, (_, hour) => (hour + 1) * 60);
  const hourly: Segment[][] = Array.from({ length: 24 }, () => []);
  for (const segment of lampSegments(scenario, [...hours, ...priceCuts(scenario.power.tariff)])) {
    const hour = Math.floor((segment.fromMin + segment.toMin) / 2 / 60);
    hourly[hour]!.push({ ...segment, key: segment.on.join(), shareOfHour: (segment.toMin - segment.fromMin) / 60 });
  }
  return hourly;
}

interface Plant {
  scenario: ResolvedScenario;
  /** Every how many days one is reckoned, and stands for those left out. */
  dayStep: number;
  lights: readonly TierLight[];
  tent: TentModel;
  rooms: readonly RoomSide[];
}

/** The room beside the tent in every hour; while it stands still it is the same object. */
export function roomSides(scenario: ResolvedScenario, { roomTempC, roomRelHumidityPct }: RoomYear): RoomSide[] {
  const slab = scenario.room.slabTempC;
  const { pressurePa } = tentModel(scenario);
  const rooms: RoomSide[] = [];
  let latest: RoomSide | null = null;
  for (let hour = 0; hour < roomTempC.length; hour += 1) {
    const tempC = roomTempC[hour]!;
    const relHumidityPct = roomRelHumidityPct[hour]!;
    if (latest === null || latest.tempC !== tempC || latest.relHumidityPct !== relHumidityPct) {
      const slabTempC = slab.kind === 'offset' ? tempC + slab.value : slab.value;
      latest = roomSide({ tempC, relHumidityPct, slabTempC }, pressurePa);
    }
    rooms.push(latest);
  }
  return rooms;
}

/** What one set of lamps keeps from hour to hour: its water and the tent's air at the set-points; and its latest state. */
interface LampSet {
  source: WaterSource;
  setAir: TentAir;
  maxAir: TentAir;
  room: RoomSide | null;
  latest: HourState | null;
}

/** Steady states by hour and lamps; a room that stands still asks for each once. */
function createStates({ scenario, lights, tent, rooms }: Plant): (hour: number, segment: Segment) => HourState {
  const { climate, water } = scenario;
  const sets = new Map<string, LampSet>();
  const steadyW = climate.circulationW + water.pumpW * pumpShare(water);
  const lampSet = (segment: Segment): LampSet => {
    const known = sets.get(segment.key);
    if (known) return known;
    const source = waterSource(scenario, lights, segment.on);
    const setTempC = segment.isDay ? climate.dayTempC : climate.nightTempC;
    const made: LampSet = {
      source,
      setAir: tentAir(tent, source, setTempC),
      maxAir: tentAir(tent, source, Math.max(setTempC, climate.maxTempC)),
      room: null,
      latest: null,
    };
    sets.set(segment.key, made);
    return made;
  };
  return (hour, segment) => {
    const set = lampSet(segment);
    const room = rooms[hour]!;
    if (set.latest && set.room === room) return set.latest;
    set.room = room;
    set.latest = hourState({
      tent,
      room,
      source: set.source,
      gainW: segment.lampInsideW + steadyW,
      setAir: set.setAir,
      maxAir: set.maxAir,
      heaterRatedW: climate.heater?.ratedPowerW ?? 0,
      exhaustMaxM3H: climate.exhaust?.maxAirflowM3H ?? 0,
    });
    return set.latest;
  };
}

/** Prices by month, weekday and stretch of the day, each looked up once. */
function createPrices({ power }: ResolvedScenario): (hour: LocalHour, segment: Segment) => number {
  const { tariff } = power;
  if (tariff.kind === 'flat') return () => tariff.pricePerKwh;
  if (tariff.kind === 'tiered') return () => 0;
  const known = new Map<number, number>();
  return ({ month, weekday }, { fromMin, toMin }) => {
    const key = (month * 7 + weekday) * 2 * DAY_MIN + fromMin;
    let price = known.get(key);
    if (price === undefined) {
      price = priceAt(tariff, { month, weekday, minute: (fromMin + toMin) / 2 });
      known.set(key, price);
    }
    return price;
  };
}

/** Share of time in which the fan runs at its rated power to give this exchange. */
function fanShare(scenario: ResolvedScenario, tent: TentModel, airflowM3H: number): number {
  const fan = scenario.climate.exhaust;
  if (!fan || fan.maxAirflowM3H === 0) return 0;
  const flow = airflowM3H > tent.leakageM3H ? airflowM3H : fan.minAirflowM3H;
  return Math.min(1, flow / fan.maxAirflowM3H);
}

/** Highest five-minute mean of the pump: as many whole floods as fit five minutes, and what begins of the next. */
export function pumpPeakW({ pumpW, flood }: ResolvedScenario['water']): number {
  const whole = Math.floor(5 / flood.everyMinutes);
  const onMin = whole * flood.minutes + Math.min(flood.minutes, 5 - whole * flood.everyMinutes);
  return (pumpW * Math.min(5, onMin)) / 5;
}

type Watts = Record<Device, number>;

/** Every stretch of the year in turn, with its steady state and its power by device; the record of powers is used again. */
function walkYear(
  plant: Plant,
  visit: (hour: LocalHour, segment: Segment, reckoned: HourState, powerW: Watts) => void,
): void {
  const { scenario, tent, dayStep } = plant;
  const { climate, water } = scenario;
  const segments = hourSegments(scenario);
  const stateOf = createStates(plant);
  const fanW = climate.exhaust?.inputPowerW ?? 0;
  const pumpW = water.pumpW * pumpShare(water);
  const powerW: Watts = { light: 0, heater: 0, exhaust: 0, circulation: climate.circulationW, pump: pumpW };
  for (const hour of localYear(scenario.place.timeZone, scenario.year)) {
    if (dayStep > 1 && Math.floor(hour.index / 24) % dayStep !== 0) continue;
    for (const segment of segments[hour.wallHour]!) {
      const reckoned = stateOf(hour.index, segment);
      powerW.light = segment.lampW;
      powerW.heater = reckoned.heaterW;
      powerW.exhaust = fanW * fanShare(scenario, tent, reckoned.state.airflowM3H);
      visit(hour, segment, reckoned, powerW);
    }
  }
}

interface YearOf {
  scenario: ResolvedScenario;
  lights: readonly TierLight[];
  /** From `roomSides`. */
  rooms: readonly RoomSide[];
  dayStep?: number;
}

const plantOf = ({ dayStep = 1, ...year }: YearOf): Plant => ({ ...year, dayStep, tent: tentModel(year.scenario) });

/** All that the tent takes in a year, kWh. */
export function yearEnergyKwh(year: YearOf): number {
  let sumWh = 0;
  walkYear(plantOf(year), (_hour, { shareOfHour }, _reckoned, powerW) => {
    sumWh += (powerW.light + powerW.heater + powerW.exhaust + powerW.circulation + powerW.pump) * shareOfHour;
  });
  return sumWh / 1000;
}

/**
 * A year as a steady balance of each of its hours, in the room's local time.
 *
 * What a heated tent stores from one hour to the next is left out: its air follows within minutes, its water within hours.
 *
 * @returns sums and means by month; `netLightEnergyKwh` and `heaterCyclesPerH` are filled in by the caller
 */
export function simulateYear(year: YearOf): YearResult {
  const { scenario, rooms, dayStep = 1 } = year;
  const { climate, water } = scenario;
  const priceOf = createPrices(scenario);
  const totals = new YearTotals(scenario.year, scenario.power);
  const besidesW = climate.circulationW + pumpPeakW(water);
  let latest: TentState | null = null;
  let sweats = false;
  walkYear(plantOf(year), (hour, segment, { state, unmetK, overK }, powerW) => {
    if (state !== latest) sweats = wallSweats(scenario, state, rooms[hour.index]!.tempC);
    latest = state;
    const peakW = powerW.light + powerW.heater + powerW.exhaust + besidesW;
    const price = priceOf(hour, segment);
    totals.add(hour.month, segment.shareOfHour * dayStep, { price, powerW, peakW, state, unmetK, overK, sweats });
  });
  return totals.result();
}
