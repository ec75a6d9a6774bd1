import { dewPoint, saturationPressure } from '../air/psychrometrics';
import type { TierLight } from '../light/tier-light';
import type { CircuitResult, HeatResult, HeatState, HotState } from '../plan/evaluation-document';
import { lampSegments, type LampSegment } from '../plan/lamp-groups';
import type { ResolvedScenario } from '../plan/resolved-scenario';
import { CONTINUOUS_SHARE } from '../power/circuit-load';
import { freeFloat } from './free-float';
import { FAN_SIZES_M3H, HEATER_MARGIN, HEATER_SIZES_W, sizeUp } from './recommended-size';
import { pumpShare, tentModel, waterSource } from './tent-model';
import { airflowFor, COLDEST_C, temperatureFor } from './settled-state';
import { roomSide, stateBeside, tentAir, tentState, type RoomAir, type TentModel, type TentState } from './tent-state';

interface Year {
  roomTempC: Float64Array;
  roomRelHumidityPct: Float64Array;
  /** 1st and 99th percentile of the hours. */
  coldTempC: number;
  hotTempC: number;
}

/** The room in the hour whose temperature comes nearest to the wanted one, so that its humidity belongs to it. */
export function roomAt(
  scenario: ResolvedScenario,
  { roomTempC, roomRelHumidityPct }: Pick<Year, 'roomTempC' | 'roomRelHumidityPct'>,
  tempC: number,
): RoomAir {
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

type Lamps = Pick<LampSegment, 'on' | 'lampInsideW'>;

const DARK: Lamps = { on: [], lampInsideW: 0 };

function gains(scenario: ResolvedScenario, lampsW: number) {
  const circulationW = scenario.climate.circulationW;
  const pumpW = scenario.water.pumpW * pumpShare(scenario.water);
  return { lampsW, circulationW, pumpW, gainW: lampsW + circulationW + pumpW };
}

function coldState(
  { scenario, lights, tent, room }: Sides,
  lamps: Lamps,
  tempC: number,
): { out: HeatState; state: TentState; lamps: Lamps } {
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
  return { out, state, lamps };
}

/** Temperature of the fabric's inner face: the film inside bears its share of the whole drop. */
export function wallFaceC({ tent }: ResolvedScenario, tempC: number, roomTempC: number): number {
  return tempC - Math.min(1, tent.wallUWM2K / tent.innerFilmWM2K) * (tempC - roomTempC);
}

/** How far the fabric's inner face stands above the dew point of the tent's air, K. Below 0 the wall sweats. */
function dewMargin(scenario: ResolvedScenario, { tempC, vapourPa }: TentState, roomTempC: number): number {
  const faceC = wallFaceC(scenario, tempC, roomTempC);
  // Air without any vapour has no dew point; −100 °C stands for it.
  return vapourPa < 0.01 ? faceC + 100 : faceC - dewPoint(vapourPa);
}

/** The same as a yes or no, without the dew point: the air holds more vapour than the face would let it. */
export function wallSweats(scenario: ResolvedScenario, { tempC, vapourPa }: TentState, roomTempC: number): boolean {
  return vapourPa > saturationPressure(wallFaceC(scenario, tempC, roomTempC));
}

function hotState(sides: Sides, all: Lamps): HotState {
  const { scenario, lights, tent, room } = sides;
  const tempC = scenario.climate.maxTempC;
  const side = roomSide(room, tent.pressurePa);
  const air = tentAir(tent, waterSource(scenario, lights, all.on), tempC);
  const state = stateBeside({ tent, room: side, air });
  const gain = gains(scenario, all.lampInsideW);
  return {
    roomTempC: room.tempC,
    tentTempC: tempC,
    excessW: Math.max(0, gain.gainW - state.lossW),
    exhaustAirflowM3H: tempC <= room.tempC ? null : airflowFor({ tent, room: side, air, heatW: gain.gainW }),
    fabricW: state.fabricW,
    floorW: state.floorW,
    airW: state.airW,
    latentW: state.latentW,
    ...gain,
  };
}

/** What hangs on a circuit, but for the heater. */
type Loaded = Pick<CircuitResult, 'peakA' | 'continuousA'>;

/** The circuit that could carry a heater of this power beside what it carries already; the one meant for heaters first. */
function circuitFor(scenario: ResolvedScenario, heaterW: number, withoutHeater: readonly Loaded[]): string | null {
  const { circuits, supplyV } = scenario.power;
  const heaterA = heaterW / supplyV;
  const order = circuits
    .map((circuit, index) => ({ circuit, loaded: withoutHeater[index]! }))
    .sort((a, b) => Number(b.circuit.carries.includes('heater')) - Number(a.circuit.carries.includes('heater')));
  const found = order.find(
    ({ circuit, loaded }) =>
      loaded.continuousA + heaterA <= CONTINUOUS_SHARE * circuit.ratingA + 1e-9 &&
      loaded.peakA + heaterA <= circuit.ratingA + 1e-9,
  );
  return (found ?? (heaterW === 0 ? order[0] : undefined))?.circuit.id ?? null;
}

/** Where the tent settles in the worst of the cold states with the heater that is planned, °C. */
function slipTemperature(sides: Sides, states: readonly { out: HeatState; lamps: Lamps }[]): number | null {
  const { scenario, lights, tent, room } = sides;
  const ratedW = scenario.climate.heater?.ratedPowerW ?? 0;
  const short = states.filter(({ out }) => out.heaterW > ratedW);
  if (short.length === 0) return null;
  const settled = short.map(
    ({ out, lamps }) =>
      temperatureFor({
        tent,
        room: roomSide(room, tent.pressurePa),
        source: waterSource(scenario, lights, lamps.on),
        heatW: out.gainW + ratedW,
        lowC: COLDEST_C,
        highC: out.tentTempC,
      }).tempC,
  );
  return Math.min(...settled);
}

interface Design {
  heat: HeatResult;
  /** What the tent slips to in the coldest hours with the heater that is planned; null where it holds. */
  slipTempC: number | null;
}

function inputInsideW(scenario: ResolvedScenario): number {
  const fixtures = new Map(scenario.fixtures.map((fixture) => [fixture.id, fixture]));
  return scenario.placements.reduce((sum, placement) => {
    const fixture = fixtures.get(placement.fixture)!;
    return sum + fixture.inputPowerW * placement.dimFrac * (1 - fixture.driverOutsideFrac);
  }, 0);
}

function recommendedExhaust(hot: HotState, moisture: readonly (number | null)[]): number | null {
  const airflows = [hot.excessW > 0 ? hot.exhaustAirflowM3H : 0, ...moisture];
  if (airflows.includes(null)) return null;
  return sizeUp(Math.max(...airflows.map((each) => each ?? 0)), FAN_SIZES_M3H);
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
  withoutHeater,
}: {
  scenario: ResolvedScenario;
  lights: readonly TierLight[];
  year: Year;
  withoutHeater: readonly Loaded[];
}): Design {
  const tent = tentModel(scenario);
  const coldRoom = roomAt(scenario, year, scenario.room.designTempC ?? year.coldTempC);
  const hotRoom = roomAt(scenario, year, scenario.room.hotDayTempC ?? year.hotTempC);
  const cold: Sides = { scenario, lights, tent, room: coldRoom };
  const day = lampSegments(scenario)
    .filter((segment) => segment.isDay)
    .sort((a, b) => a.lampW - b.lampW);
  const { dayTempC, nightTempC } = scenario.climate;
  const everything: Lamps = { on: scenario.placements.map((_, index) => index), lampInsideW: inputInsideW(scenario) };

  const dark = coldState(cold, DARK, nightTempC);
  const dawn = day.length > 0 ? coldState(cold, day[0]!, dayTempC) : dark;
  const light = day.length > 0 ? coldState(cold, day.at(-1)!, dayTempC) : dark;
  const states = [dark, dawn, light];
  const hotLight = hotState({ ...cold, room: hotRoom }, everything);
  const needW = Math.max(...states.map(({ out }) => out.heaterW));
  const recommendedHeaterW = sizeUp(needW * HEATER_MARGIN, HEATER_SIZES_W);
  const moistureAirflowM3H = { light: light.state.moistureAirflowM3H, dark: dark.state.moistureAirflowM3H };
  const heat: HeatResult = {
    coldDark: dark.out,
    coldDawn: dawn.out,
    coldLight: light.out,
    recommendedHeaterW,
    recommendedHeaterCircuit: circuitFor(scenario, recommendedHeaterW, withoutHeater),
    recommendedExhaustM3H: recommendedExhaust(hotLight, Object.values(moistureAirflowM3H)),
    hotLight,
    freeFloatTempC: {
      light: freeFloat({ tent, room: coldRoom, gainW: gains(scenario, everything.lampInsideW).gainW }).tempC,
      dark: freeFloat({ tent, room: coldRoom, gainW: gains(scenario, 0).gainW }).tempC,
    },
    moistureAirflowM3H,
    wallDewMarginK: Math.min(...states.map(({ state }) => dewMargin(scenario, state, coldRoom.tempC))),
  };
  return { heat, slipTempC: slipTemperature(cold, states) };
}
