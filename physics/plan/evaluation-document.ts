/** What the physics says of a scenario: `evaluation/1`. */

/** How a figure is known, from surest to least sure. */
export type Standing = 'given' | 'read' | 'secondary' | 'computed' | 'judgement' | 'recalled';

export interface Assumption {
  /** Dotted path into the scenario document. */
  path: string;
  value: number | string | boolean | null;
  unit: string;
  source: string;
  standing: Standing;
}

export interface Caution {
  /** Stable code such as `heater.clearance`. */
  code: string;
  severity: 'danger' | 'warning' | 'note';
  /** Dotted path of the thing it is about. */
  where: string;
  text: string;
  source: string;
}

export type Verdict = 'below' | 'inside' | 'above' | 'none';

export interface TierResult {
  id: string;
  ppfdUmolM2S: { mean: number; min: number; max: number; p10: number; minOverMean: number };
  dliMolM2D: { mean: number; min: number; max: number };
  photoperiodH: number;
  /** Largest mean PPFD in any dark minute; null: no dark minute. */
  strayPpfdUmolM2S: number | null;
  verdict: Verdict;
  incidentFrac: number;
  grid: { nx: number; ny: number; ppfdUmolM2S: number[] };
  byPlacement: { id: string; meanPpfdUmolM2S: number }[];
}

/** One steady state; watts. `gainW` splits into `lampsW`, `circulationW` and `pumpW`. */
export interface HeatState {
  roomTempC: number;
  tentTempC: number;
  tentRelHumidityPct: number;
  lossW: number;
  fabricW: number;
  floorW: number;
  /** Sensible heat of all exchanged air; `leakageW` is the part that leaks anyway, `exhaustW` the rest. */
  airW: number;
  leakageW: number;
  exhaustW: number;
  latentW: number;
  gainW: number;
  lampsW: number;
  circulationW: number;
  pumpW: number;
  heaterW: number;
  airflowM3H: number;
  evaporationKgH: number;
}

/** The tent at `maxTempC` on the hot day, all lamps on; same signs as `HeatState`. */
export interface HotState {
  roomTempC: number;
  tentTempC: number;
  excessW: number;
  /** Whole air exchange that holds `maxTempC`; null: the room is as warm as that. */
  exhaustAirflowM3H: number | null;
  fabricW: number;
  floorW: number;
  airW: number;
  latentW: number;
  gainW: number;
  lampsW: number;
  circulationW: number;
  pumpW: number;
}

export interface HeatResult {
  coldDark: HeatState;
  coldDawn: HeatState;
  coldLight: HeatState;
  recommendedHeaterW: number;
  /** null: no circuit carries it. */
  recommendedHeaterCircuit: string | null;
  /** Smallest listed airflow that meets both the hot day and the moisture, m³/h; null: no fan can. */
  recommendedExhaustM3H: number | null;
  hotLight: HotState;
  /** null: nothing lets the heat out, so no temperature is steady. */
  freeFloatTempC: { light: number | null; dark: number | null };
  moistureAirflowM3H: { light: number | null; dark: number | null };
  wallDewMarginK: number;
}

export type Device = 'light' | 'heater' | 'exhaust' | 'circulation' | 'pump';
export type EnergyByDevice = Record<Device | 'total', number>;

export interface MonthResult {
  month: number;
  energyKwh: EnergyByDevice;
  cost: number;
  costByDevice: Record<Device, number>;
  airTempC: { min: number; mean: number; max: number };
  relHumidityPct: { min: number; mean: number; max: number };
  vpdKpa: { mean: number };
  unmetHeatKh: number;
  overheatKh: number;
  condensationH: number;
  waterL: number;
}

export interface YearResult {
  months: MonthResult[];
  energyKwh: EnergyByDevice;
  cost: number;
  costByDevice: Record<Device, number>;
  co2Kg: number;
  peakPowerW: number;
  netLightEnergyKwh: number;
  heaterCyclesPerH: number;
}

export interface CircuitResult {
  id: string;
  peakA: number;
  continuousA: number;
  limitA: number;
  within: boolean;
}

export interface Evaluation {
  schema: 'evaluation/1';
  physicsVersion: string;
  tiers: TierResult[];
  heat: HeatResult;
  year: YearResult;
  upFront: { costMinor: number };
  circuits: CircuitResult[];
  cautions: Caution[];
  assumptions: Assumption[];
  warnings: string[];
  elapsedMs: { light: number; year: number };
}
