import { designStates } from '../heat/design-states';
import { boxOf } from '../heat/tent-model';
import { COLDEST_C, HOTTEST_C } from '../heat/settled-state';
import { FABRIC_CAPACITY_J_K, heaterCycles } from '../heat/thermostat';
import { behindFace, REFLECTED_IS_AN_ESTIMATE } from '../light/evaluate-light-scene';
import type { LightCache } from '../light/light-field';
import { solveTierLight, type TierLight } from '../light/tier-light';
import { roomYear, type RoomYear } from '../room/room-year';
import { cautionsFor } from './cautions';
import { circuitResults } from './circuits';
import type { Assumption, Evaluation, HeatResult, YearResult } from './evaluation-document';
import { physicsVersion } from './physics-version';
import { resolveScenario } from './resolve-scenario';
import type { ResolvedScenario } from './resolved-scenario';
import type { ScenarioDocument } from './scenario-document';
import { tierResults } from './tier-results';
import { roomSides, simulateYear, yearEnergyKwh } from './year';

export interface EvaluateOptions {
  /** false leaves the year at zero: light and design states alone, for a lamp that is being dragged. */
  year?: boolean;
  /**
   * Every how many days of the year one is reckoned and stands for the others: 1 unless a rough year will do, as for the range of
   * a figure. A rough year leaves `netLightEnergyKwh` at 0.
   */
  dayStep?: number;
  lightCache?: LightCache | undefined;
  /** Milliseconds, for `elapsedMs`: physics has no clock of its own. */
  clock?: () => number;
}

const noClock = () => 0;

/** What is placed and not had already, in minor units. */
function upFrontMinor(scenario: ResolvedScenario): number {
  const lamps = scenario.fixtures.reduce((sum, fixture) => {
    const placed = scenario.placements.filter((placement) => placement.fixture === fixture.id).length;
    return sum + Math.max(0, placed - fixture.owned) * fixture.priceMinor;
  }, 0);
  const { heater, exhaust } = scenario.climate;
  return (
    lamps + (heater && !heater.owned ? heater.priceMinor : 0) + (exhaust && !exhaust.owned ? exhaust.priceMinor : 0)
  );
}

const noEnergy = () => ({ light: 0, heater: 0, exhaust: 0, circulation: 0, pump: 0 });

/** A year that was not asked for has no months, so that nobody takes a zero for a figure. */
function emptyYear(): YearResult {
  return {
    months: [],
    energyKwh: { ...noEnergy(), total: 0 },
    cost: 0,
    costByDevice: noEnergy(),
    co2Kg: 0,
    peakPowerW: 0,
    netLightEnergyKwh: 0,
    heaterCyclesPerH: 0,
  };
}

const darkened = (scenario: ResolvedScenario): ResolvedScenario => ({
  ...scenario,
  placements: scenario.placements.map((placement) => ({ ...placement, dimFrac: 0 })),
});

const darkenedLight = (lights: readonly TierLight[]): TierLight[] =>
  lights.map((light) => ({ ...light, byPlacement: light.byPlacement.map((own) => ({ ...own, meanPpfdUmolM2S: 0 })) }));

/** Thermostat cycling on the design night, of air and fabric alone. */
function cyclesOf(scenario: ResolvedScenario, heat: HeatResult): number {
  const heater = scenario.climate.heater;
  const { coldDark } = heat;
  const rise = coldDark.tentTempC - coldDark.roomTempC;
  if (!heater || rise <= 0 || coldDark.lossW <= 0) return 0;
  const conductanceWK = coldDark.lossW / rise;
  const capacityJK = 1.2 * 1006 * boxOf(scenario.tent).volumeM3 + FABRIC_CAPACITY_J_K;
  const freeTempC = coldDark.roomTempC + coldDark.gainW / conductanceWK;
  return heaterCycles({
    ratedPowerW: heater.ratedPowerW,
    conductanceWK,
    capacityJK,
    setTempC: coldDark.tentTempC,
    freeTempC,
  });
}

function wholeYear(
  scenario: ResolvedScenario,
  lights: readonly TierLight[],
  room: RoomYear,
  heat: HeatResult,
  dayStep: number,
): YearResult {
  const rooms = roomSides(scenario, room);
  const year = simulateYear({ scenario, lights, rooms, dayStep });
  const cycles = { heaterCyclesPerH: cyclesOf(scenario, heat) };
  if (dayStep > 1) return { ...year, ...cycles };
  const darkKwh = yearEnergyKwh({ scenario: darkened(scenario), lights: darkenedLight(lights), rooms });
  return {
    ...year,
    ...cycles,
    netLightEnergyKwh: year.energyKwh.total - darkKwh,
  };
}

/** Where the coldest and the hottest room are not given, the year's own hours give them. */
function designAssumptions(
  { room }: ResolvedScenario,
  { coldTempC, hotTempC }: Pick<RoomYear, 'coldTempC' | 'hotTempC'>,
): Assumption[] {
  const from = (path: string, value: number, nth: string): Assumption => ({
    path,
    value,
    unit: '°C',
    source: `${nth} percentile of the room’s hours`,
    standing: 'computed',
  });
  return [
    ...(room.designTempC === undefined ? [from('room.designTempC', coldTempC, '1st')] : []),
    ...(room.hotDayTempC === undefined ? [from('room.hotDayTempC', hotTempC, '99th')] : []),
  ];
}

interface Warned {
  heat: HeatResult;
  year: YearResult;
  room: RoomYear;
  withYear: boolean;
}

function warningsOf(scenario: ResolvedScenario, { heat, year, room, withYear }: Warned): string[] {
  const warnings: string[] = [];
  const { reflectance } = scenario.tent;
  if (scenario.placements.length > 0 && Object.values(reflectance).some((value) => value > 0))
    warnings.push(REFLECTED_IS_AN_ESTIMATE);
  const placed = new Set(scenario.placements.map((placement) => placement.fixture));
  warnings.push(...scenario.fixtures.filter((fixture) => placed.has(fixture.id)).flatMap(behindFace));
  if (withYear)
    warnings.push(
      'The year is a steady balance of each hour; what the tent stores from one hour to the next is left out.',
    );
  if (withYear && year.months.some(({ airTempC }) => airTempC.min <= COLDEST_C || airTempC.max >= HOTTEST_C))
    warnings.push(
      `In some hours nothing holds the tent's temperature: it is reckoned no further than ${COLDEST_C} °C and ${HOTTEST_C} °C. Check the lamps' watts and what the fabric, the floor and the air let through.`,
    );
  if (room.drawnIn)
    warnings.push(
      "Some months of the room's series would, joined smoothly, pass what a room's air can be; there the hours are drawn in towards the month's mean, which is kept.",
    );
  if (heat.freeFloatTempC.light === null || heat.freeFloatTempC.dark === null)
    warnings.push('Nothing lets heat out of this tent, so unheated it has no steady temperature.');
  const tooMoist = [
    heat.moistureAirflowM3H.dark === null ? 'night' : null,
    heat.moistureAirflowM3H.light === null ? 'day' : null,
  ].filter((each) => each !== null);
  if (tooMoist.length > 0)
    warnings.push(
      `The room's air is too moist to dry the tent by ${tooMoist.join(' and by ')}: no airflow holds ${scenario.climate.maxRelHumidityPct} %, and humidity runs towards 100 %.`,
    );
  const largestW =
    Math.max(...['coldDark', 'coldDawn', 'coldLight'].map((key) => heat[key as 'coldDark'].heaterW)) * 1.25;
  if (largestW > 3000)
    warnings.push(`The heater needed, ${Math.round(largestW)} W, is larger than any plug-in heater.`);
  return warnings;
}

/**
 * Everything that the physics says of a scenario.
 *
 * @param document scenario/1, checked
 * @returns evaluation/1; `elapsedMs` is 0 unless a clock is given
 * @throws DomainError for what is physically impossible
 * @accuracy see the parts: light/evaluate-light-scene.ts, heat/tent-state.ts, plan/year.ts
 */
export function evaluateScenario(
  document: ScenarioDocument,
  { year: withYear = true, dayStep = 1, lightCache, clock = noClock }: EvaluateOptions = {},
): Evaluation {
  const { scenario, assumptions } = resolveScenario(document);
  const startMs = clock();
  const lights = solveTierLight(scenario, lightCache);
  const lightMs = clock() - startMs;
  const room = roomYear(scenario);
  const withoutHeater = circuitResults(scenario, { without: 'heater' });
  const { heat, slipTempC } = designStates({ scenario, lights, year: room, withoutHeater });
  const yearStartMs = clock();
  const year = withYear ? wholeYear(scenario, lights, room, heat, dayStep) : emptyYear();
  const yearMs = clock() - yearStartMs;
  const facts = { tiers: tierResults(scenario, lights), heat, year, circuits: circuitResults(scenario) };
  return {
    schema: 'evaluation/1',
    physicsVersion,
    ...facts,
    upFront: { costMinor: upFrontMinor(scenario) },
    cautions: cautionsFor({ scenario, slipTempC, ...facts }),
    assumptions: [...assumptions, ...designAssumptions(scenario, room)],
    warnings: warningsOf(scenario, { heat, year, room, withYear }),
    elapsedMs: { light: lightMs, year: yearMs },
  };
}
