/** Times one evaluation in process, without and with its year; reads a scenario/1 from stdin, prints one line of JSON. */
import { readFileSync } from 'node:fs';
import { createLightCache, evaluateScenario, type ScenarioDocument } from '../evaluation/evaluate-scenario';
import { parseScenarioDocument } from '../evaluation/problems';

function medianMs(times: number, work: (at: number) => void): number {
  const warmUp = Math.ceil(times / 5);
  const took: number[] = [];
  for (let at = 0; at < warmUp + times; at += 1) {
    const from = performance.now();
    work(at);
    if (at >= warmUp) took.push(performance.now() - from);
  }
  took.sort((a, b) => a - b);
  return took[Math.floor(times / 2)]!;
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
    freshMs: medianMs(150, () => void evaluateScenario(scenario, { year: false })),
    dragMs: medianMs(150, (at) => void evaluateScenario(dragged(scenario, at), { year: false, lightCache })),
    yearMs: medianMs(15, () => void evaluateScenario(scenario)),
  }),
);
