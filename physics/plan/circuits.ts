import { circuitLoad, CONTINUOUS_H, type Load } from '../power/circuit-load';
import { spansOf } from '../schedule/clock';
import type { CircuitResult } from './evaluation-document';
import type { ResolvedScenario } from './resolved-scenario';

interface NamedLoad extends Load {
  kind: 'light' | 'heater' | 'exhaust' | 'circulation' | 'pump';
  /** A placement's id, for lamps. */
  id?: string;
}

/** Longest unbroken run of a timer, hours; one that runs through midnight is one run. */
const runH = (hours: number) => Math.min(24, hours);

function allLoads(scenario: ResolvedScenario): NamedLoad[] {
  const { climate, water } = scenario;
  const fixtures = new Map(scenario.fixtures.map((fixture) => [fixture.id, fixture]));
  const schedules = new Map(scenario.schedules.map((schedule) => [schedule.id, schedule]));
  const lamps = scenario.placements.map((placement): NamedLoad => {
    const fixture = fixtures.get(placement.fixture)!;
    const schedule = schedules.get(placement.schedule)!;
    const continuous = spansOf(schedule).length > 0 && runH(schedule.hours) >= CONTINUOUS_H;
    return {
      kind: 'light',
      id: placement.id,
      powerW: fixture.inputPowerW,
      powerFactor: fixture.powerFactor,
      continuous,
    };
  });
  const flooding = water.flood.minutes >= water.flood.everyMinutes;
  const steady = (kind: NamedLoad['kind'], powerW: number, continuous = true): NamedLoad => ({
    kind,
    powerW,
    powerFactor: 1,
    continuous,
  });
  return [
    ...lamps,
    steady('heater', climate.heater?.ratedPowerW ?? 0),
    steady('exhaust', climate.exhaust?.inputPowerW ?? 0),
    steady('circulation', climate.circulationW),
    steady('pump', water.pumpW, flooding || water.flood.minutes >= CONTINUOUS_H * 60),
  ];
}

/** What hangs on each circuit: a lamp named by itself hangs where it is named, the others with their kind. */
function loadsOf(scenario: ResolvedScenario, carries: readonly string[], everywhere: ReadonlySet<string>): NamedLoad[] {
  return allLoads(scenario).filter((load) =>
    load.id !== undefined && everywhere.has(load.id) ? carries.includes(load.id) : carries.includes(load.kind),
  );
}

export function circuitResults(
  scenario: ResolvedScenario,
  options: { without?: NamedLoad['kind'] } = {},
): CircuitResult[] {
  const { circuits, supplyV } = scenario.power;
  const named = new Set(circuits.flatMap((circuit) => circuit.carries));
  return circuits.map((circuit) => {
    const other: Load = { powerW: circuit.otherLoadsW, powerFactor: 1, continuous: true };
    const own = loadsOf(scenario, circuit.carries, named).filter((load) => load.kind !== options.without);
    return { id: circuit.id, ...circuitLoad({ loads: [...own, other], supplyV, ratingA: circuit.ratingA }) };
  });
}
