/** Times one evaluation in process, without and with its year; reads a scenario/1 from stdin, prints one line of JSON. */
import { readFileSync } from 'node:fs';
import { createLightCache, evaluateScenario, type ScenarioDocument } from '../evaluation/evaluate-scenario';
import { parseScenarioDocument } from '../evaluation/problems';

const median = (values: number[]) => values.sort((a, b) => a - b)[Math.floor(values.length / 2)]!;

/** Median of the clock, and the mean of the processor's own time, which a neighbour's load does not stretch. */
function time(times: number, work: (at: number) => void): { clockMs: number; processorMs: number } {
  const warmUp = Math.ceil(times / 5);
  for (let at = 0; at < warmUp; at += 1) work(at);
  const before = process.cpuUsage();
  const clock = Array.from({ length: times }, (_, at) => {
    const from = performance.now();
    work(warmUp + at);
    return performance.now() - from;
  });
  const { user, system } = process.cpuUsage(before);
  return { clockMs: median(clock), processorMs: (user + system) / 1000 / times };
}

/** As a drag does it: one lamp stands elsewhere each time, the others stay. */
function dragged(scenario: ScenarioDocument, at: number): ScenarioDocument {
  const [first, ...others] = scenario.placements;
  if (!first) return scenario;
  const [x, y, z] = first.positionM;
  return { ...scenario, placements: [{ ...first, positionM: [x, y, z - (at % 200) / 1000] }, ...others] };
}

const parsed = parseScenarioDocument(JSON.parse(readFileSync(0, 'utf8')));
if (!parsed.ok) throw new Error(`not a scenario: ${JSON.stringify(parsed.problems)}`);
const scenario = parsed.value;
const lightCache = createLightCache();

console.log(
  JSON.stringify({
    // Nothing kept from before: every lamp is reckoned afresh.
    fresh: time(150, () => void evaluateScenario(scenario, { year: false })),
    drag: time(150, (at) => void evaluateScenario(dragged(scenario, at), { year: false, lightCache })),
    year: time(15, () => void evaluateScenario(scenario)),
  }),
);
