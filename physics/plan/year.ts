import { hourState, type HourState } from '../heat/hour-state';
import { dewMargin } from '../heat/design-states';
import { pumpShare, tentModel, waterSource } from '../heat/tent-model';
import { roomSide, type TentModel } from '../heat/tent-state';
import type { TierLight } from '../light/tier-light';
import { priceAt, priceCuts } from '../power/bill';
import { hourlyValues } from '../room/series';
import { localYear, type LocalHour } from '../schedule/local-year';
import { lampSegments, type LampSegment } from './lamp-groups';
import type { ResolvedScenario } from './resolved-scenario';
import { YearTotals } from './year-totals';
import type { YearResult } from './evaluation-document';

export interface RoomYear {
  roomTempC: Float64Array;
  roomRelHumidityPct: Float64Array;
}

export function roomYear({ room, year }: ResolvedScenario): RoomYear {
  const humidity = hourlyValues(room.relHumidityPct, year);
  // Joining months by straight lines may overshoot a little past what air can hold.
  return {
    roomTempC: hourlyValues(room.airTempC, year),
    roomRelHumidityPct: humidity.map((pct) => Math.min(100, Math.max(0, pct))),
  };
}

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
  lights: readonly TierLight[];
  tent: TentModel;
  room: RoomYear;
}

/** Steady states by room, lamps and set-point: a room that stands still asks for each once. */
function createStates({ scenario, lights, tent, room }: Plant) {
  const memory = new Map<string, HourState>();
  const sources = new Map<string, ReturnType<typeof waterSource>>();
  const { climate, water } = scenario;
  const steadyW = climate.circulationW + water.pumpW * pumpShare(water);
  const slab = scenario.room.slabTempC;
  return (hour: number, segment: Segment): HourState => {
    const tempC = room.roomTempC[hour]!;
    const relHumidityPct = room.roomRelHumidityPct[hour]!;
    const key = `${tempC} ${relHumidityPct} ${segment.key}`;
    const known = memory.get(key);
    if (known) return known;
    const source = sources.get(segment.key) ?? waterSource(scenario, lights, segment.on);
    sources.set(segment.key, source);
    const slabTempC = slab.kind === 'offset' ? tempC + slab.value : slab.value;
    const state = hourState({
      tent,
      room: roomSide({ tempC, relHumidityPct, slabTempC }, tent.pressurePa),
      source,
      gainW: segment.lampInsideW + steadyW,
      setTempC: segment.isDay ? climate.dayTempC : climate.nightTempC,
      maxTempC: climate.maxTempC,
      heaterRatedW: climate.heater?.ratedPowerW ?? 0,
      exhaustMaxM3H: climate.exhaust?.maxAirflowM3H ?? 0,
    });
    memory.set(key, state);
    return state;
  };
}

/** Share of time in which the fan runs at its rated power to give this exchange. */
function fanShare(scenario: ResolvedScenario, tent: TentModel, airflowM3H: number): number {
  const fan = scenario.climate.exhaust;
  if (!fan || fan.maxAirflowM3H === 0) return 0;
  const flow = airflowM3H > tent.leakageM3H ? airflowM3H : fan.minAirflowM3H;
  return Math.min(1, flow / fan.maxAirflowM3H);
}

/** Highest five-minute mean of the pump. */
function pumpPeakW({ water }: ResolvedScenario): number {
  return water.pumpW * Math.min(1, water.flood.minutes / 5);
}

function addHour(
  totals: YearTotals,
  plant: Plant,
  hour: LocalHour,
  segments: readonly Segment[],
  stateOf: ReturnType<typeof createStates>,
): void {
  const { scenario, tent } = plant;
  const { climate, water, power } = scenario;
  for (const segment of segments) {
    const { state, heaterW, unmetK, overK } = stateOf(hour.index, segment);
    const exhaustW = (climate.exhaust?.inputPowerW ?? 0) * fanShare(scenario, tent, state.airflowM3H);
    totals.add(hour.month, segment.shareOfHour, {
      price: priceAt(power.tariff, {
        month: hour.month,
        weekday: hour.weekday,
        minute: (segment.fromMin + segment.toMin) / 2,
      }),
      powerW: {
        light: segment.lampW,
        heater: heaterW,
        exhaust: exhaustW,
        circulation: climate.circulationW,
        pump: water.pumpW * pumpShare(water),
      },
      peakW: segment.lampW + heaterW + exhaustW + climate.circulationW + pumpPeakW(scenario),
      state,
      unmetK,
      overK,
      sweats: dewMargin(scenario, state, plant.room.roomTempC[hour.index]!) < 0,
    });
  }
}

/**
 * A year as a steady balance of each of its hours, in the room's local time.
 *
 * What a heated tent stores from one hour to the next is left out: its air follows within minutes, its water within hours.
 *
 * @returns sums and means by month; `netLightEnergyKwh` and `heaterCyclesPerH` are filled in by the caller
 */
export function simulateYear(scenario: ResolvedScenario, lights: readonly TierLight[], room: RoomYear): YearResult {
  const plant: Plant = { scenario, lights, tent: tentModel(scenario), room };
  const segments = hourSegments(scenario);
  const stateOf = createStates(plant);
  const totals = new YearTotals(scenario.year, scenario.power);
  for (const hour of localYear(scenario.place.timeZone, scenario.year))
    addHour(totals, plant, hour, segments[hour.wallHour]!, stateOf);
  return totals.result();
}
