import {
  density,
  heatCapacity,
  humidityRatio,
  latentHeat,
  saturationPressure,
  specificVolume,
  vapourPressure,
  vapourPressureOfRatio,
} from '../air/psychrometrics';
import { waterEvaporationLine } from '../moisture/open-water';
import { balancedVapourPressure } from '../moisture/tent-humidity';
import { evaporationLine, type Canopy } from '../moisture/transpiration';

/** The tent as heat and moisture see it: one volume of mixed air. */
export interface TentModel {
  /** W/K of walls and ceiling, and of the floor. */
  fabricWK: number;
  floorWK: number;
  volumeM3: number;
  leakageM3H: number;
  /** 0 where there is no fan. */
  exhaustMinM3H: number;
  exhaustMaxM3H: number;
  maxRelHumidityPct: number;
  pressurePa: number;
}

export interface RoomAir {
  tempC: number;
  relHumidityPct: number;
  slabTempC: number;
}

/** What gives off water in a state: a canopy and wet trays on each tier, or a fixed rate. */
export type WaterSource =
  | { kind: 'fixed'; kgH: number }
  | { kind: 'model'; tiers: { areaM2: number; wetM2: number; canopy: Canopy }[]; openWaterM2: number };

/** A line E = still − slope·p_w for the whole tent at one temperature, kg/s. */
interface EvaporationLine {
  still: number;
  slope: number;
}

function evaporationOf(source: WaterSource, tempC: number, pressurePa: number): EvaporationLine {
  if (source.kind === 'fixed') return { still: source.kgH / 3600, slope: 0 };
  const water = waterEvaporationLine({ waterTempC: tempC });
  const line = { still: water.still * source.openWaterM2, slope: water.slope * source.openWaterM2 };
  for (const { areaM2, wetM2, canopy } of source.tiers) {
    const leaves = evaporationLine({ canopy, tempC, pressurePa });
    line.still += leaves.still * areaM2 + water.still * wetM2;
    line.slope += leaves.slope * areaM2 + water.slope * wetM2;
  }
  return line;
}

/** Everything about a tent held at one temperature beside one room. */
export interface TentState {
  tempC: number;
  relHumidityPct: number;
  vapourPa: number;
  fabricW: number;
  floorW: number;
  airW: number;
  leakageW: number;
  latentW: number;
  lossW: number;
  airflowM3H: number;
  evaporationKgH: number;
  /** The whole air exchange that holds the highest humidity allowed; null where the room's air is too moist to dry anything. */
  moistureAirflowM3H: number | null;
  /** Humidity stands above what is allowed. */
  tooHumid: boolean;
}

/** The room's air made ready for many states beside it. */
export interface RoomSide extends RoomAir {
  ratio: number;
  /** m³ of room air for each kg of dry air. */
  volumePerKg: number;
  capacity: number;
  densityKgM3: number;
}

export function roomSide(room: RoomAir, pressurePa: number): RoomSide {
  const ratio = humidityRatio({ vapourPa: vapourPressure(room), pressurePa });
  const air = { tempC: room.tempC, ratio, pressurePa };
  return { ...room, ratio, volumePerKg: specificVolume(air), capacity: heatCapacity(ratio), densityKgM3: density(air) };
}

interface StateInput {
  tent: TentModel;
  room: RoomSide;
  source: WaterSource;
  tempC: number;
  /** Whole air exchange, m³/h; left out, it is what leakage, the fan's minimum and the humidity ask for. */
  airflowM3H?: number;
}

/**
 * A tent held at a temperature beside a room: its losses, its humidity and the air that it exchanges. Steady state.
 *
 *   loss = UA_fabric·(T − T_room) + UA_floor·(T − T_slab) + ṁ·c_p·(T − T_room) + λ·E
 *
 * The exchange is the largest of leakage, the fan's minimum and what holds the highest humidity, as far as the fan goes.
 * Volumes are at the density of the room's air.
 *
 * @source energy and mass balance; [ASHRAE2017] for air, [Graamans2017] and [POOL1998] for water
 * @accuracy exact for its inputs; fabric U ± 20 %, transpiration ± 40 %
 */
export function tentState({ tent, room, source, tempC, airflowM3H }: StateInput): TentState {
  const { pressurePa } = tent;
  const saturationPa = saturationPressure(tempC);
  const line = evaporationOf(source, tempC, pressurePa);
  const toKgS = 1 / (3600 * room.volumePerKg);

  const allowedPa = (tent.maxRelHumidityPct / 100) * saturationPa;
  // Near the boiling point even this humidity would be all vapour: no air need be changed for it.
  const allowedRatio = allowedPa < pressurePa ? humidityRatio({ vapourPa: allowedPa, pressurePa }) : Infinity;
  const atLimit = Math.max(0, line.still - line.slope * allowedPa);
  const moistureAirflowM3H =
    atLimit === 0 ? 0 : allowedRatio > room.ratio ? atLimit / (allowedRatio - room.ratio) / toKgS : null;

  const least = Math.max(tent.leakageM3H, tent.exhaustMinM3H);
  const most = Math.max(least, tent.exhaustMaxM3H);
  const exchange = airflowM3H ?? Math.min(most, Math.max(least, moistureAirflowM3H ?? least));
  const dryAirKgS = exchange * toKgS;
  const balanced = balancedVapourPressure({ ...line, dryAirKgS, roomRatio: room.ratio, pressurePa, saturationPa });
  // Without any exchange and without evaporation the air keeps the room's moisture.
  const vapourPa =
    dryAirKgS === 0 && line.still === 0 && line.slope === 0
      ? Math.min(saturationPa, vapourPressureOfRatio({ ratio: room.ratio, pressurePa }))
      : balanced;
  const evaporationKgS = Math.max(0, line.still - line.slope * vapourPa);

  const rise = tempC - room.tempC;
  const fabricW = tent.fabricWK * rise;
  const floorW = tent.floorWK * (tempC - room.slabTempC);
  const airW = dryAirKgS * room.capacity * rise;
  const latentW = evaporationKgS * latentHeat(tempC);
  return {
    tempC,
    relHumidityPct: (100 * vapourPa) / saturationPa,
    vapourPa,
    fabricW,
    floorW,
    airW,
    leakageW: Math.min(exchange, tent.leakageM3H) * toKgS * room.capacity * rise,
    latentW,
    lossW: fabricW + floorW + airW + latentW,
    airflowM3H: exchange,
    evaporationKgH: evaporationKgS * 3600,
    moistureAirflowM3H,
    tooHumid: vapourPa > allowedPa * (1 + 1e-9),
  };
}

/** Temperature at which the losses, the exchange following the humidity, equal a heat input. Losses rise with temperature. */
export function temperatureFor({
  tent,
  room,
  source,
  heatW,
  lowC,
  highC,
  airflowM3H,
}: Omit<StateInput, 'tempC'> & { heatW: number; lowC: number; highC: number }): TentState {
  const at = (tempC: number) =>
    tentState({ tent, room, source, tempC, ...(airflowM3H !== undefined && { airflowM3H }) });
  let low = at(lowC);
  let high = at(highC);
  let lowError = low.lossW - heatW;
  let highError = high.lossW - heatW;
  if (lowError >= 0) return low;
  if (highError <= 0) return high;
  // Regula falsi after Illinois: an end that stays twice has its error halved, so that the search never creeps.
  let stayed = 0;
  for (let i = 0; i < 80; i += 1) {
    const middle = at((low.tempC * highError - high.tempC * lowError) / (highError - lowError));
    const error = middle.lossW - heatW;
    if (Math.abs(error) < 1e-7 * Math.max(1, Math.abs(heatW)) || high.tempC - low.tempC < 1e-10) return middle;
    if (error < 0) {
      low = middle;
      lowError = error;
      if (stayed === 1) highError /= 2;
      stayed = 1;
    } else {
      high = middle;
      highError = error;
      if (stayed === -1) lowError /= 2;
      stayed = -1;
    }
  }
  return at((low.tempC + high.tempC) / 2);
}

/** The exchange that keeps a tent at a temperature against a heat input; null where no exchange can, for the room is as warm. */
export function airflowFor({
  tent,
  room,
  source,
  heatW,
  tempC,
}: Omit<StateInput, 'airflowM3H'> & { heatW: number }): number | null {
  const loss = (airflowM3H: number) => tentState({ tent, room, source, tempC, airflowM3H }).lossW;
  const usual = tentState({ tent, room, source, tempC });
  if (usual.lossW >= heatW) return usual.airflowM3H;
  if (tempC - room.tempC < 1e-9) return null;
  let low = usual.airflowM3H;
  let high = Math.max(100, 2 * low);
  while (loss(high) < heatW) {
    low = high;
    high *= 4;
    if (high > 1e9) return null;
  }
  while (high - low > 1e-9 * high) {
    const middle = (low + high) / 2;
    if (loss(middle) < heatW) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
