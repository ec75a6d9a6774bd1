import { dewPoint } from '../air/psychrometrics';
import type { TierLight } from '../light/tier-light';
import type { HeatResult, HeatState, HotState } from '../plan/evaluation-document';
import { lampSegments, type LampSegment } from '../plan/lamp-groups';
import type { ResolvedScenario } from '../plan/resolved-scenario';
import { percentile } from '../light/tier-light';
import { FAN_SIZES_M3H, HEATER_MARGIN, HEATER_SIZES_W, sizeUp } from './recommended-size';
import { pumpShare, tentModel, waterSource } from './tent-model';
import { airflowFor, roomSide, tentState, type RoomAir, type TentModel, type TentState } from './tent-state';

interface Year {
  roomTempC: Float64Array;
  roomRelHumidityPct: Float64Array;
}

/** The room in the hour whose temperature comes nearest to the wanted one, so that its humidity belongs to it. */
function roomAt(scenario: ResolvedScenario, { roomTempC, roomRelHumidityPct }: Year, tempC: number): RoomAir {
  let nearest = 0;
  for (let hour = 1; hour < roomTempC.length; hour += 1) {
    if (Math.abs(roomTempC[hour]! - tempC) < Math.abs(roomTempC[nearest]! - tempC) - 1e-12) nearest = hour;
  }
  const slab = scenario.room.slabTempC;
  return {
    tempC,
    relHumidityPct: roomRelHumidityPct[nearest]!,
    slabTempC: slab.kind === 'offset' ? tempC + slab.value : slab.value,
  };
}

interface Sides {
  scenario: ResolvedScenario;
  lights: readonly TierLight[];
  tent: TentModel;
  room: RoomAir;
}

const DARK: Pick<LampSegment, 'on' | 'lampInsideW'> = { on: [], lampInsideW: 0 };

function gains(scenario: ResolvedScenario, lampsW: number) {
  const circulationW = scenario.climate.circulationW;
  const pumpW = scenario.water.pumpW * pumpShare(scenario.water);
  return { lampsW, circulationW, pumpW, gainW: lampsW + circulationW + pumpW };
}

function coldState(
  { scenario, lights, tent, room }: Sides,
  lamps: Pick<LampSegment, 'on' | 'lampInsideW'>,
  tempC: number,
): { out: HeatState; state: TentState } {
  const state = tentState({
    tent,
    room: roomSide(room, tent.pressurePa),
    source: waterSource(scenario, lights, lamps.on),
    tempC,
  });
  const gain = gains(scenario, lamps.lampInsideW);
  const out: HeatState = {
    roomTempC: room.tempC,
    tentTempC: tempC,
    tentRelHumidityPct: state.relHumidityPct,
    lossW: state.lossW,
    fabricW: state.fabricW,
    floorW: state.floorW,
    airW: state.airW,
    leakageW: state.leakageW,
    exhaustW: state.airW - state.leakageW,
    latentW: state.latentW,
    ...gain,
    heaterW: Math.max(0, state.lossW - gain.gainW),
    airflowM3H: state.airflowM3H,
    evaporationKgH: state.evaporationKgH,
  };
  return { out, state };
}

/** How far the fabric's inner face stands above the dew point of the tent's air, K. Below 0 the wall sweats. */
export function dewMargin(
  scenario: ResolvedScenario,
  state: Pick<TentState, 'tempC' | 'vapourPa'>,
  roomTempC: number,
): number {
  const { wallUWM2K, innerFilmWM2K } = scenario.tent;
  const faceC = state.tempC - Math.min(1, wallUWM2K / innerFilmWM2K) * (state.tempC - roomTempC);
  return state.vapourPa < 0.01 ? faceC + 100 : faceC - dewPoint(state.vapourPa);
}

function hotState(sides: Sides, all: Pick<LampSegment, 'on' | 'lampInsideW'>): HotState {
  const { scenario, lights, tent, room } = sides;
  const tempC = scenario.climate.maxTempC;
  const side = roomSide(room, tent.pressurePa);
  const source = waterSource(scenario, lights, all.on);
  const state = tentState({ tent, room: side, source, tempC });
  const gain = gains(scenario, all.lampInsideW);
  return {
    roomTempC: room.tempC,
    tentTempC: tempC,
    excessW: Math.max(0, gain.gainW - state.lossW),
    exhaustAirflowM3H: tempC <= room.tempC ? null : airflowFor({ tent, room: side, source, heatW: gain.gainW, tempC }),
    fabricW: state.fabricW,
    floorW: state.floorW,
    airW: state.airW,
    latentW: state.latentW,
    ...gain,
  };
}

/** Steady temperature without heater and without plants' water: leakage and the fan's least flow only. */
function freeFloat({ scenario, tent, room }: Sides, lampsW: number): number {
  const side = roomSide(room, tent.pressurePa);
  const airWK = (Math.max(tent.leakageM3H, tent.exhaustMinM3H) / 3600 / side.volumePerKg) * side.capacity;
  const conductance = tent.fabricWK + tent.floorWK + airWK;
  const { gainW } = gains(scenario, lampsW);
  if (conductance === 0) return gainW > 0 ? Infinity : room.tempC;
  return ((tent.fabricWK + airWK) * room.tempC + tent.floorWK * room.slabTempC + gainW) / conductance;
}

/** The circuit that could carry a heater of this power beside what it carries already; the one meant for heaters first. */
function circuitFor(
  scenario: ResolvedScenario,
  heaterW: number,
  continuousWithoutHeaterA: readonly number[],
): string | null {
  if (heaterW === 0) return scenario.power.circuits[0]?.id ?? null;
  const { circuits, supplyV } = scenario.power;
  const order = circuits
    .map((circuit, index) => ({ circuit, index }))
    .sort((a, b) => Number(b.circuit.carries.includes('heater')) - Number(a.circuit.carries.includes('heater')));
  const found = order.find(
    ({ circuit, index }) => continuousWithoutHeaterA[index]! + heaterW / supplyV <= 0.8 * circuit.ratingA + 1e-9,
  );
  return found?.circuit.id ?? null;
}

/**
 * The design night, dawn, day and hot day; what they ask of heater and fan.
 *
 * @source /physics/heat/tent-state.ts; margins judged
 */
export function designStates({
  scenario,
  lights,
  year,
  continuousWithoutHeaterA,
}: {
  scenario: ResolvedScenario;
  lights: readonly TierLight[];
  year: Year;
  continuousWithoutHeaterA: readonly number[];
}): HeatResult {
  const tent = tentModel(scenario);
  const coldRoom = roomAt(scenario, year, scenario.room.designTempC ?? percentile(year.roomTempC, 0.01));
  const hotRoom = roomAt(scenario, year, scenario.room.hotDayTempC ?? percentile(year.roomTempC, 0.99));
  const cold: Sides = { scenario, lights, tent, room: coldRoom };
  const day = lampSegments(scenario)
    .filter((segment) => segment.isDay)
    .sort((a, b) => a.lampW - b.lampW);
  const { dayTempC, nightTempC } = scenario.climate;
  const all = scenario.placements.map((_, index) => index);
  const allInsideW = scenario.placements.reduce((sum, placement) => {
    const fixture = scenario.fixtures.find((each) => each.id === placement.fixture)!;
    return sum + fixture.inputPowerW * placement.dimFrac * (1 - fixture.driverOutsideFrac);
  }, 0);
  const everything = { on: all, lampInsideW: allInsideW };

  const dark = coldState(cold, DARK, nightTempC);
  const dawn = day.length > 0 ? coldState(cold, day[0]!, dayTempC) : dark;
  const light = day.length > 0 ? coldState(cold, day.at(-1)!, dayTempC) : dark;
  const hotLight = hotState({ ...cold, room: hotRoom }, everything);
  const needW = Math.max(dark.out.heaterW, dawn.out.heaterW, light.out.heaterW);
  const recommendedHeaterW = sizeUp(needW * HEATER_MARGIN, HEATER_SIZES_W);
  const airflows = [
    hotLight.excessW > 0 ? hotLight.exhaustAirflowM3H : 0,
    dark.state.moistureAirflowM3H,
    light.state.moistureAirflowM3H,
  ];
  return {
    coldDark: dark.out,
    coldDawn: dawn.out,
    coldLight: light.out,
    recommendedHeaterW,
    recommendedHeaterCircuit: circuitFor(scenario, recommendedHeaterW, continuousWithoutHeaterA),
    recommendedExhaustM3H: airflows.includes(null)
      ? null
      : sizeUp(Math.max(...airflows.map((each) => each ?? 0)), FAN_SIZES_M3H),
    hotLight,
    freeFloatTempC: { light: freeFloat(cold, allInsideW), dark: freeFloat(cold, 0) },
    moistureAirflowM3H: { light: light.state.moistureAirflowM3H, dark: dark.state.moistureAirflowM3H },
    wallDewMarginK: Math.min(...[dark, dawn, light].map(({ state }) => dewMargin(scenario, state, coldRoom.tempC))),
  };
}
