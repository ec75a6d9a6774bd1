/**
 * One complete way to equip and run one tent: `scenario/1`.
 *
 * Every key carries its unit. Optional keys that are left out take the defaults of
 * `physics/plan/defaults.ts`, and the evaluation lists each default that it used.
 */
import type { Distribution, FaceReflectance, Vec3 } from '../light/light-documents';

export type Series =
  | { kind: 'constant'; value: number }
  | { kind: 'monthly'; values: number[]; dailySwingK?: number | undefined }
  | { kind: 'hourly'; values: number[] };

export interface Place {
  latitudeDeg: number;
  longitudeDeg: number;
  timeZone: string;
  altitudeM: number;
}

export interface RoomClimate {
  airTempC: Series;
  relHumidityPct?: Series | undefined;
  slabTempC?: { kind: 'offset' | 'constant'; value: number } | undefined;
  designTempC?: number | undefined;
  hotDayTempC?: number | undefined;
}

export interface Port {
  kind: 'exhaust' | 'intake' | 'cable';
  wall: 'xMin' | 'xMax' | 'yMin' | 'yMax' | 'ceiling';
  atM: readonly [number, number];
  diameterM: number;
}

export interface TentBody {
  widthM: number;
  depthM: number;
  heightM: number;
  liningReflectanceFrac?: number | FaceReflectance | undefined;
  floorReflectanceFrac?: number | undefined;
  fabricUWM2K?: number | undefined;
  floorUWM2K?: number | undefined;
  leakageAch?: number | undefined;
  liningEmittanceFrac?: number | undefined;
  ports?: Port[] | undefined;
}

export interface Box {
  id: string;
  min: Vec3;
  max: Vec3;
  reflectanceFrac: number;
}

export interface Target {
  crop: string;
  stage: string;
  dliLowMolM2D?: number | undefined;
  dliTargetMolM2D: number;
  dliHighMolM2D?: number | undefined;
  photoperiodMinH?: number | undefined;
  photoperiodMaxH?: number | undefined;
  dayTempC?: number | undefined;
  nightTempC?: number | undefined;
  vpdLowKpa?: number | undefined;
  vpdHighKpa?: number | undefined;
}

export interface Tier {
  id: string;
  name?: string | undefined;
  topHeightM: number;
  thicknessM?: number | undefined;
  x0M: number;
  x1M: number;
  y0M: number;
  y1M: number;
  openFrac?: number | undefined;
  topReflectanceFrac?: number | undefined;
  bottomReflectanceFrac?: number | undefined;
  edgeReflectanceFrac?: number | undefined;
  /** Above the tier's top. */
  canopyHeightM?: number | undefined;
  leafAreaIndex?: number | undefined;
  canopyCoverFrac?: number | undefined;
  sites?: { rows: number; columns: number } | undefined;
  target?: Target | null | undefined;
}

export interface FixtureType {
  id: string;
  name?: string | undefined;
  inputPowerW: number;
  ppfUmolS: number;
  shape: 'rect' | 'point';
  lengthM?: number | undefined;
  widthM?: number | undefined;
  distribution: Distribution;
  housingThicknessM?: number | undefined;
  housingReflectanceFrac?: number | undefined;
  driverOutsideFrac?: number | undefined;
  powerFactor?: number | undefined;
  /** Minor units of the tariff's currency, for one. */
  priceMinor?: number | undefined;
  /** How many are had already. */
  owned?: number | undefined;
  lifeH?: number | undefined;
}

export interface Placement {
  id: string;
  /** A fixture's id. */
  fixture: string;
  /** The tier it serves, by id; null or absent when it serves none by name. */
  tier?: string | null | undefined;
  mount?: 'hanging' | 'clamped' | undefined;
  /** Centre of the emitting face. */
  positionM: Vec3;
  aim: Vec3;
  axis: Vec3;
  dimFrac?: number | undefined;
  /** A schedule's id. */
  schedule: string;
}

export interface Schedule {
  id: string;
  /** Local wall clock, HH:MM. */
  onAt: string;
  hours: number;
}

export interface Heater {
  ratedPowerW: number;
  priceMinor?: number | undefined;
  owned?: boolean | undefined;
  placeM?: Vec3 | undefined;
  /** The maker's label; null: unknown. */
  clearanceM?: number | null | undefined;
}

export interface ExhaustFan {
  maxAirflowM3H: number;
  minAirflowM3H?: number | undefined;
  inputPowerW: number;
  priceMinor?: number | undefined;
  owned?: boolean | undefined;
}

export interface ClimateControl {
  dayTempC: number;
  nightTempC: number;
  maxTempC: number;
  maxRelHumidityPct?: number | undefined;
  heater?: Heater | null | undefined;
  exhaust?: ExhaustFan | null | undefined;
  circulation?: { inputPowerW: number } | null | undefined;
}

export interface WaterSystem {
  reservoirL?: number | undefined;
  coveredFrac?: number | undefined;
  transpiration?: { kind: 'model' } | { kind: 'fixed'; lightKgH: number; darkKgH: number } | undefined;
  pump?: { inputPowerW: number } | null | undefined;
  flood?: { minutes: number; everyMinutes: number } | undefined;
}

export type LoadKind = 'light' | 'heater' | 'exhaust' | 'circulation' | 'pump';

export interface Circuit {
  id: string;
  ratingA: number;
  otherLoadsW?: number | undefined;
  /** Kinds of load, or ids of placements. */
  carries: string[];
}

interface TariffCommon {
  /** ISO 4217. */
  currency: string;
  fixedPerMonth?: number | undefined;
  taxPct?: number | undefined;
  householdBaseKwhPerMonth?: number | undefined;
}

export interface TariffPeriod {
  price: number;
  weekdays?: 'all' | 'weekday' | 'weekend' | undefined;
  from: string;
  to: string;
  months?: number[] | undefined;
}

export type Tariff = TariffCommon &
  (
    | { kind: 'flat'; pricePerKwh: number }
    | { kind: 'timeOfUse'; periods: TariffPeriod[]; otherwise: number }
    | { kind: 'tiered'; tiers: { upToKwh?: number | undefined; price: number }[]; prorateByDays?: boolean | undefined }
  );

export interface PowerSupply {
  supplyV: number;
  circuits: Circuit[];
  tariff: Tariff;
  co2GKwh?: number | undefined;
}

export interface ScenarioDocument {
  schema: 'scenario/1';
  name: string;
  calendar?: { year: number } | undefined;
  place: Place;
  room: RoomClimate;
  tent: TentBody;
  boxes?: Box[] | undefined;
  tiers: Tier[];
  fixtures: FixtureType[];
  placements: Placement[];
  schedules: Schedule[];
  climate: ClimateControl;
  water?: WaterSystem | undefined;
  power: PowerSupply;
  /** What is uncertain: dotted path → [low, high]. */
  range?: Record<string, readonly [number, number]> | undefined;
  /** Notes and drawing state; physics never looks. */
  app?: Record<string, unknown> | undefined;
}
