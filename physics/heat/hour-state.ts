import { airflowFor, COLDEST_C, HOTTEST_C, temperatureFor } from './settled-state';
import {
  stateBeside,
  type RoomSide,
  type TentAir,
  type TentModel,
  type TentState,
  type WaterSource,
} from './tent-state';

interface HourInput {
  tent: TentModel;
  room: RoomSide;
  source: WaterSource;
  gainW: number;
  /** The tent's air at the set-point, and at the warmest that is allowed. */
  setAir: TentAir;
  maxAir: TentAir;
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

const calm = (state: TentState): HourState => ({ state, heaterW: 0, unmetK: 0, overK: 0 });

/**
 * The steady state that one set of gains would reach in one hour, with an ideal heater and fan.
 *
 * Too little heat: the heater gives what is missing up to its rating, then the tent slips. Too much: the tent warms freely
 * up to the highest temperature allowed, then the fan opens as far as it goes, then the tent overheats.
 */
export function hourState(input: HourInput): HourState {
  const { tent, room, source, gainW, setAir, maxAir, heaterRatedW, exhaustMaxM3H } = input;
  const atSet = stateBeside({ tent, room, air: setAir });
  const missingW = atSet.lossW - gainW;
  const search = { tent, room, source };
  if (missingW >= 0) {
    if (missingW <= heaterRatedW) return { state: atSet, heaterW: missingW, unmetK: 0, overK: 0 };
    const heatW = gainW + heaterRatedW;
    const state = temperatureFor({ ...search, heatW, lowC: COLDEST_C, highC: setAir.tempC, from: atSet });
    return { state, heaterW: heaterRatedW, unmetK: setAir.tempC - state.tempC, overK: 0 };
  }
  const atMost = stateBeside({ tent, room, air: maxAir });
  if (atMost.lossW >= gainW) {
    return calm(temperatureFor({ ...search, heatW: gainW, lowC: setAir.tempC, highC: maxAir.tempC, from: atSet }));
  }
  const needed = airflowFor({ tent, room, air: maxAir, heatW: gainW });
  if (needed !== null && needed <= exhaustMaxM3H) {
    return calm(stateBeside({ tent, room, air: maxAir, airflowM3H: needed }));
  }
  const airflowM3H = Math.max(atMost.airflowM3H, exhaustMaxM3H);
  const from = stateBeside({ tent, room, air: maxAir, airflowM3H });
  const state = temperatureFor({ ...search, heatW: gainW, lowC: maxAir.tempC, highC: HOTTEST_C, airflowM3H, from });
  return { ...calm(state), overK: Math.max(0, state.tempC - maxAir.tempC) };
}
