import {
  airflowFor,
  temperatureFor,
  tentState,
  type RoomSide,
  type TentModel,
  type TentState,
  type WaterSource,
} from './tent-state';

interface HourInput {
  tent: TentModel;
  room: RoomSide;
  source: WaterSource;
  gainW: number;
  setTempC: number;
  maxTempC: number;
  /** 0 where there is none. */
  heaterRatedW: number;
  exhaustMaxM3H: number;
}

export interface HourState {
  state: TentState;
  heaterW: number;
  /** Below the set-point, K. */
  unmetK: number;
  /** Above the highest temperature allowed, K. */
  overK: number;
}

/** Far beyond what a tent reaches; only bounds the search. */
const COLDEST_C = -60;
const HOTTEST_C = 150;

/**
 * The steady state that one set of gains would reach in one hour, with an ideal heater and fan.
 *
 * Too little heat: the heater gives what is missing up to its rating, then the tent slips. Too much: the tent warms freely
 * up to the highest temperature allowed, then the fan opens as far as it goes, then the tent overheats.
 */
export function hourState({
  tent,
  room,
  source,
  gainW,
  setTempC,
  maxTempC,
  heaterRatedW,
  exhaustMaxM3H,
}: HourInput): HourState {
  const atSet = tentState({ tent, room, source, tempC: setTempC });
  const missingW = atSet.lossW - gainW;
  if (missingW >= 0) {
    if (missingW <= heaterRatedW) return { state: atSet, heaterW: missingW, unmetK: 0, overK: 0 };
    const state = temperatureFor({ tent, room, source, heatW: gainW + heaterRatedW, lowC: COLDEST_C, highC: setTempC });
    return { state, heaterW: heaterRatedW, unmetK: setTempC - state.tempC, overK: 0 };
  }
  const warmestC = Math.max(setTempC, maxTempC);
  const atMost = tentState({ tent, room, source, tempC: warmestC });
  if (atMost.lossW >= gainW) {
    return {
      state: temperatureFor({ tent, room, source, heatW: gainW, lowC: setTempC, highC: warmestC }),
      heaterW: 0,
      unmetK: 0,
      overK: 0,
    };
  }
  const needed = airflowFor({ tent, room, source, heatW: gainW, tempC: warmestC });
  if (needed !== null && needed <= exhaustMaxM3H) {
    return {
      state: tentState({ tent, room, source, tempC: warmestC, airflowM3H: needed }),
      heaterW: 0,
      unmetK: 0,
      overK: 0,
    };
  }
  const airflowM3H = Math.max(atMost.airflowM3H, exhaustMaxM3H);
  const state = temperatureFor({ tent, room, source, heatW: gainW, lowC: warmestC, highC: HOTTEST_C, airflowM3H });
  return { state, heaterW: 0, unmetK: 0, overK: Math.max(0, state.tempC - warmestC) };
}
