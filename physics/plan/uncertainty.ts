import { createLightCache } from '../light/light-cache';
import { defaults, type DefaultKey } from './defaults';
import { evaluateScenario } from './evaluate-scenario';
import type { Assumption, Evaluation } from './evaluation-document';
import type { ScenarioDocument } from './scenario-document';
import { withValue } from './set-value';

/** A figure that may lie between two values; defaults of all tiers or lamps move together. */
interface Uncertain {
  words: string;
  low: number;
  high: number;
  set: (document: ScenarioDocument, value: number) => ScenarioDocument | null;
}

/** What a figure rests on. The year rests on heat; its light is in the lamps' watts, not in their photons. */
export type Bearing = 'light' | 'heat' | 'year';

/** U of a tent's fabric between still rooms, from bare metal to a stirred white cloth, W/m²K. @source [ISO6946] its films */
const FABRIC_U = [2, 5] as const;

const LIGHT_WORDS = {
  'tent.liningReflectanceFrac': 'how much the lining throws back',
  'tent.floorReflectanceFrac': 'how much the floor throws back',
  'tier.topReflectanceFrac': 'how much the leaves and trays throw back',
  'tier.bottomReflectanceFrac': 'how much the tiers’ undersides throw back',
  'tier.canopyHeightM': 'how high the leaves stand',
} as const satisfies Partial<Record<DefaultKey, string>>;

const HEAT_WORDS = {
  'tent.floorUWM2K': 'what the floor lets through',
  'tent.leakageAch': 'how much air leaks',
  'room.relHumidityPct': 'the room’s humidity',
  'room.slabTempC': 'how cold the slab is',
  'tier.leafAreaIndex': 'how much leaf stands on the tiers',
  'tier.canopyCoverFrac': 'how much of the tiers the leaves cover',
  'fixture.driverOutsideFrac': 'how much of the drivers’ heat stays outside',
} as const satisfies Partial<Record<DefaultKey, string>>;

/** `tiers[0].leafAreaIndex` is the default `tier.leafAreaIndex`. */
const keyOf = (path: string) => path.replace(/^(tier|fixture)s\[\d+\]/, '$1');

/** What a document says of its own doubts. */
function saidBy(document: ScenarioDocument): Uncertain[] {
  return Object.entries(document.range ?? {}).map(([path, [low, high]]) => ({
    words: path,
    low,
    high,
    set: (each, value) => withValue(each, path, value),
  }));
}

const SERIES: Partial<Record<string, (value: number) => Partial<ScenarioDocument['room']>>> = {
  'room.relHumidityPct': (value) => ({ relHumidityPct: { kind: 'constant', value } }),
  'room.slabTempC': (value) => ({ slabTempC: { kind: 'offset', value } }),
};

/** The defaults that a figure leans on, those that recur by tier or lamp taken together. */
function leanedOn(document: ScenarioDocument, assumptions: readonly Assumption[], bearing: Bearing): Uncertain[] {
  const words: Partial<Record<string, string>> = bearing === 'light' ? LIGHT_WORDS : HEAT_WORDS;
  const said = new Set(Object.keys(document.range ?? {}));
  const paths = new Map<string, string[]>();
  for (const { path } of assumptions) {
    const key = keyOf(path);
    if (words[key] && !said.has(path)) paths.set(key, [...(paths.get(key) ?? []), path]);
  }
  const leaned = [...paths].map(([key, own]): Uncertain => {
    const [low, high] = (defaults[key as DefaultKey] as { range: readonly [number, number] }).range;
    const series = SERIES[key];
    return {
      words: words[key]!,
      low,
      high,
      set: (each, value) =>
        series
          ? { ...each, room: { ...each.room, ...series(value) } }
          : own.reduce<ScenarioDocument | null>((doc, path) => doc && withValue(doc, path, value), each),
    };
  });
  // U from films carries the doubt about the lining's emittance with it.
  const films = assumptions.some(({ path }) => path === 'tent.fabricUWM2K') && !said.has('tent.fabricUWM2K');
  if (bearing !== 'light' && films)
    leaned.push({
      words: 'what the fabric lets through',
      low: FABRIC_U[0],
      high: FABRIC_U[1],
      set: (each, value) => withValue(each, 'tent.fabricUWM2K', value),
    });
  return leaned;
}

export interface Range {
  low: number;
  high: number;
  widestBy: string;
}

/** The year is dear: of the defaults, only those that move the design states most are followed through it, every fifth day. */
const FOLLOWED_THROUGH_YEAR = 4;
const DAY_STEP = 5;

type Read = (evaluation: Evaluation) => number | null;

/** The largest step of a figure when one input goes to either end; 0 where it cannot be set or has no answer there. */
function stepsOf(
  document: ScenarioDocument,
  { low, high, set }: Uncertain,
  middle: number,
  evaluate: (document: ScenarioDocument) => number | null,
) {
  const ends = [low, high].flatMap((value) => {
    const changed = set(document, value);
    if (!changed) return [];
    try {
      const figure = evaluate(changed);
      return figure === null ? [] : [figure - middle];
    } catch {
      // An end that is physically impossible says nothing about the figure.
      return [];
    }
  });
  return { below: Math.min(0, ...ends), above: Math.max(0, ...ends) };
}

const coldLoss: Read = ({ heat }) => heat.coldDark.lossW + heat.coldLight.lossW;

/**
 * The range of a figure, from the ranges of what it rests on: each input moved alone to either end, the differences added as
 * independent errors are, root of the sum of squares.
 *
 * @param read takes the figure from an evaluation
 * @param bearing what the figure rests on
 * @param least a bound that the figure cannot pass, such as 0 for light
 * @returns null where nothing moves it
 */
export function rangeOf(
  document: ScenarioDocument,
  evaluation: Evaluation,
  read: Read,
  bearing: Bearing,
  least = -Infinity,
): Range | null {
  const middle = read(evaluation);
  if (middle === null) return null;
  const lightCache = createLightCache();
  const figure = (of: Read, year: boolean) => (each: ScenarioDocument) =>
    of(evaluateScenario(each, { year, dayStep: DAY_STEP, lightCache }));
  const sizeOf = ({ below, above }: { below: number; above: number }) => above - below;
  let leaned = leanedOn(document, evaluation.assumptions, bearing);
  if (bearing === 'year') {
    const cold = coldLoss(evaluation)!;
    const sized = leaned.map((each) => ({
      each,
      size: sizeOf(stepsOf(document, each, cold, figure(coldLoss, false))),
    }));
    leaned = sized
      .sort((a, b) => b.size - a.size)
      .slice(0, FOLLOWED_THROUGH_YEAR)
      .map(({ each }) => each);
  }
  const rough = bearing === 'year' ? figure(read, true)(document)! : middle;
  let down = 0;
  let up = 0;
  let widest = { by: '', size: 0 };
  for (const uncertain of [...saidBy(document), ...leaned]) {
    const step = stepsOf(document, uncertain, rough, figure(read, bearing === 'year'));
    down += step.below ** 2;
    up += step.above ** 2;
    if (sizeOf(step) > widest.size) widest = { by: uncertain.words, size: sizeOf(step) };
  }
  if (widest.size < 1e-9) return null;
  return { low: Math.max(least, middle - Math.sqrt(down)), high: middle + Math.sqrt(up), widestBy: widest.by };
}
