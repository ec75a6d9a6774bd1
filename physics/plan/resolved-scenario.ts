import type { FaceReflectance } from '../light/light-documents';
import type {
  Box,
  Circuit,
  ExhaustFan,
  FixtureType,
  Heater,
  Place,
  Placement,
  PowerSupply,
  Schedule,
  Series,
  Target,
  Tariff,
  TentBody,
  Tier,
} from './scenario-document';

type Filled<T, Optional extends keyof T = never> = {
  [K in Exclude<keyof T, Optional>]-?: Exclude<T[K], undefined>;
} & Pick<T, Optional>;

export type ResolvedTarget = Filled<
  Target,
  'photoperiodMinH' | 'photoperiodMaxH' | 'dayTempC' | 'nightTempC' | 'vpdLowKpa' | 'vpdHighKpa'
>;
export type ResolvedTier = Omit<Filled<Tier, 'sites'>, 'target'> & { target: ResolvedTarget | null };
export type ResolvedFixture = Filled<FixtureType, 'lengthM' | 'widthM'>;
export type ResolvedPlacement = Omit<Filled<Placement, 'mount'>, 'tier'> & { tier: string | null };
export type ResolvedHeater = Filled<Heater, 'placeM' | 'clearanceM'>;
export type ResolvedExhaust = Filled<ExhaustFan>;

/** A scenario with every figure in place: what was left out has its default, and `assumptions` says so. */
export interface ResolvedScenario {
  name: string;
  year: number;
  place: Place;
  room: {
    airTempC: Series;
    relHumidityPct: Series;
    slabTempC: { kind: 'offset' | 'constant'; value: number };
    /** undefined: the 1st percentile of the year's hours. */
    designTempC: number | undefined;
    /** undefined: the 99th. */
    hotDayTempC: number | undefined;
  };
  tent: Pick<TentBody, 'widthM' | 'depthM' | 'heightM'> & {
    reflectance: FaceReflectance;
    wallUWM2K: number;
    roofUWM2K: number;
    floorUWM2K: number;
    leakageAch: number;
    liningEmittanceFrac: number;
    /** Film coefficient at the fabric's inner face, W/m²K. */
    innerFilmWM2K: number;
  };
  boxes: Box[];
  tiers: ResolvedTier[];
  fixtures: ResolvedFixture[];
  placements: ResolvedPlacement[];
  schedules: Schedule[];
  climate: {
    dayTempC: number;
    nightTempC: number;
    maxTempC: number;
    maxRelHumidityPct: number;
    heater: ResolvedHeater | null;
    exhaust: ResolvedExhaust | null;
    circulationW: number;
  };
  water: {
    reservoirL: number;
    coveredFrac: number;
    transpiration: { kind: 'model' } | { kind: 'fixed'; lightKgH: number; darkKgH: number };
    pumpW: number;
    flood: { minutes: number; everyMinutes: number };
  };
  power: Omit<PowerSupply, 'circuits' | 'co2GKwh' | 'tariff'> & {
    circuits: Filled<Circuit>[];
    tariff: Tariff;
    co2GKwh: number;
  };
}
