import { isOn, daySegments, spansOf, type Span } from '../schedule/clock';
import type { ResolvedScenario } from '../plan/resolved-scenario';

/** A stretch of the day in which the same lamps burn. */
export interface LampSegment extends Span {
  /** Places in `placements` of the lamps whose timer is on. */
  on: number[];
  /** Any timer is on, whatever the dimming: day set-points hold. */
  isDay: boolean;
  /** Input power of the lamps that are on, all of it and what stays in the tent, W. */
  lampW: number;
  lampInsideW: number;
}

export function placementSpans(scenario: ResolvedScenario): Span[][] {
  const schedules = new Map(scenario.schedules.map((schedule) => [schedule.id, spansOf(schedule)]));
  return scenario.placements.map((placement) => schedules.get(placement.schedule) ?? []);
}

/** The day cut where lamps turn on or off, and at the extra minutes given. */
export function lampSegments(scenario: ResolvedScenario, extraCuts: readonly number[] = []): LampSegment[] {
  const spans = placementSpans(scenario);
  const fixtures = new Map(scenario.fixtures.map((fixture) => [fixture.id, fixture]));
  return daySegments(spans, extraCuts).map(({ fromMin, toMin }) => {
    const middle = (fromMin + toMin) / 2;
    const on = spans.flatMap((own, index) => (isOn(own, middle) ? [index] : []));
    let lampW = 0;
    let lampInsideW = 0;
    for (const index of on) {
      const placement = scenario.placements[index]!;
      const fixture = fixtures.get(placement.fixture)!;
      lampW += fixture.inputPowerW * placement.dimFrac;
      lampInsideW += fixture.inputPowerW * placement.dimFrac * (1 - fixture.driverOutsideFrac);
    }
    return { fromMin, toMin, on, isDay: on.length > 0, lampW, lampInsideW };
  });
}
