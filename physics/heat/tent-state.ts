import {
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

/** The tent's own air at one temperature, whatever the room: made once for a set-point that a whole year returns to. */
export interface TentAir extends EvaporationLine {
  tempC: number;
  saturationPa: number;
  /** At the highest humidity allowed: vapour pressure, humidity ratio, and what evaporates, kg/s. */
  allowedPa: number;
  allowedRatio: number;
  atLimitKgS: number;
  latentJKg: number;
}

export function tentAir(tent: TentModel, source: WaterSource, tempC: number): TentAir {
  const { pressurePa } = tent;
  const saturationPa = saturationPressure(tempC);
  const { still, slope } = evaporationOf(source, tempC, pressurePa);
  const allowedPa = (tent.maxRelHumidityPct / 100) * saturationPa;
  return {
    tempC,
    saturationPa,
    still,
    slope,
    allowedPa,
    // Near the boiling point even this humidity would be all vapour: no air need be changed for it.
    allowedRatio: allowedPa < pressurePa ? humidityRatio({ vapourPa: allowedPa, pressurePa }) : Infinity,
    atLimitKgS: Math.max(0, still - slope * allowedPa),
    latentJKg: latentHeat(tempC),
  };
}

/** Everything about a tent held at one temperature beside one room. */
export interface TentState {
  tempC: number;
  relHumidityPct: number;
  vapourPa: number;
  saturationPa: number;
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
  /** J/K for each kg of dry air. */
  capacity: number;
}

export function roomSide(room: RoomAir, pressurePa: number): RoomSide {
  const { tempC, relHumidityPct, slabTempC } = room;
  const ratio = humidityRatio({ vapourPa: vapourPressure(room), pressurePa });
  const volumePerKg = specificVolume({ tempC, ratio, pressurePa });
  return { tempC, relHumidityPct, slabTempC, ratio, volumePerKg, capacity: heatCapacity(ratio) };
}

interface StateInput {
  tent: TentModel;
  room: RoomSide;
  source: WaterSource;
  tempC: number;
  /** Whole air exchange, m³/h; left out, it is what leakage, the fan's minimum and the humidity ask for. */
  airflowM3H?: number | undefined;
}

interface BesideInput {
  tent: TentModel;
  room: RoomSide;
  air: TentAir;
  airflowM3H?: number | undefined;
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
export const tentState = ({ tent, room, source, tempC, airflowM3H }: StateInput): TentState =>
  stateBeside({ tent, room, air: tentAir(tent, source, tempC), airflowM3H });

/** The same for air that has been made ready. */
export function stateBeside({ tent, room, air, airflowM3H }: BesideInput): TentState {
  const { pressurePa } = tent;
  const { tempC, still, slope, saturationPa } = air;
  const toKgS = 1 / (3600 * room.volumePerKg);

  const moistureAirflowM3H =
    air.atLimitKgS === 0
      ? 0
      : air.allowedRatio > room.ratio
        ? air.atLimitKgS / (air.allowedRatio - room.ratio) / toKgS
        : null;
  const least = Math.max(tent.leakageM3H, tent.exhaustMinM3H);
  const most = Math.max(least, tent.exhaustMaxM3H);
  const exchange = airflowM3H ?? Math.min(most, Math.max(least, moistureAirflowM3H ?? least));
  const dryAirKgS = exchange * toKgS;
  // Without any exchange and without evaporation the air keeps the room's moisture.
  const vapourPa =
    dryAirKgS === 0 && still === 0 && slope === 0
      ? Math.min(saturationPa, vapourPressureOfRatio({ ratio: room.ratio, pressurePa }))
      : balancedVapourPressure({ still, slope, dryAirKgS, roomRatio: room.ratio, pressurePa, saturationPa });
  const evaporationKgS = Math.max(0, still - slope * vapourPa);

  const rise = tempC - room.tempC;
  const fabricW = tent.fabricWK * rise;
  const floorW = tent.floorWK * (tempC - room.slabTempC);
  const airW = dryAirKgS * room.capacity * rise;
  const latentW = evaporationKgS * air.latentJKg;
  return {
    tempC,
    relHumidityPct: (100 * vapourPa) / saturationPa,
    vapourPa,
    saturationPa,
    fabricW,
    floorW,
    airW,
    leakageW: Math.min(exchange, tent.leakageM3H) * toKgS * room.capacity * rise,
    latentW,
    lossW: fabricW + floorW + airW + latentW,
    airflowM3H: exchange,
    evaporationKgH: evaporationKgS * 3600,
    moistureAirflowM3H,
    tooHumid: vapourPa > air.allowedPa * (1 + 1e-9),
  };
}
