/**
 * What it would take for a tier that misses its band: each way is tried out with the whole evaluation, never guessed,
 * and is offered only if it truly lands inside.
 */
import type { Evaluation } from '@/physics/plan/evaluation-document';
import type { ScenarioDocument, Target } from '@/physics/plan/scenario-document';
import { setLampAboveLeaves, setLampOutput, setLampSchedule, type EditablePlan } from './edit-plan';
import { aboveLeavesM, servedTier, tierBottomM } from './lamp-pose';
import { toldMonth } from './coldest-month';

export interface WayOut {
  /** The lamps that change, and what of them; absent is unchanged. */
  lamps: string[];
  hours?: { from: number; to: number };
  output?: { from: number; to: number };
  aboveLeavesM?: { from: number; to: number };
  dliMolM2D: number;
  /** Change of the told month's energy; null until the year has been computed for it. */
  monthKwh: number | null;
}

export type Evaluate = (doc: ScenarioDocument, options: { year: boolean }) => Evaluation;

/** Nobody hangs a lamp nearer to leaves than this to save hours. */
const NEAREST_M = 0.1;
const HALF_HOUR = 0.5;

export function targetEdges(target: Target): { low: number; high: number } {
  return {
    low: target.dliLowMolM2D ?? 0.8 * target.dliTargetMolM2D,
    high: target.dliHighMolM2D ?? 1.2 * target.dliTargetMolM2D,
  };
}

export function applyWayOut<P extends EditablePlan>(plan: P, way: WayOut): P {
  let next = plan;
  if (way.hours) next = setLampSchedule(next, way.lamps, { hours: way.hours.to });
  if (way.output) next = setLampOutput(next, way.lamps, way.output.to);
  if (way.aboveLeavesM) next = setLampAboveLeaves(next, way.lamps, way.aboveLeavesM.to);
  return next;
}

interface Case {
  doc: ScenarioDocument;
  tierId: string;
  lamps: string[];
  hours: number;
  output: number;
  aboveM: number;
  low: number;
  high: number;
  longestH: number;
  shortestH: number;
  /** By how much the tier's own lamps must change. */
  factor: number;
  evaluate: Evaluate;
}

type Change = Omit<WayOut, 'lamps' | 'dliMolM2D' | 'monthKwh'>;

function dliOf(evaluation: Evaluation, tierId: string): number {
  return evaluation.tiers.find((tier) => tier.id === tierId)?.dliMolM2D.mean ?? 0;
}

/** Tries a change; null where it does not land inside the band. */
function attempt(at: Case, change: Change): WayOut | null {
  const way: WayOut = { lamps: at.lamps, ...change, dliMolM2D: 0, monthKwh: null };
  const dli = dliOf(at.evaluate(applyWayOut(at.doc, way), { year: false }), at.tierId);
  return dli >= at.low - 1e-9 && dli <= at.high + 1e-9 ? { ...way, dliMolM2D: dli } : null;
}

const upTo = (value: number, step: number) => Math.ceil(value / step - 1e-6) * step;
const downTo = (value: number, step: number) => Math.floor(value / step + 1e-6) * step;

function byHours(at: Case): WayOut | null {
  const wanted = at.hours * at.factor;
  const to = at.factor > 1 ? upTo(wanted, HALF_HOUR) : downTo(wanted, HALF_HOUR);
  if (to > at.longestH || to < at.shortestH || to <= 0) return null;
  return attempt(at, { hours: { from: at.hours, to } });
}

function byOutput(at: Case): WayOut | null {
  const wanted = at.output * at.factor;
  const to = at.factor > 1 ? upTo(wanted, 0.01) : downTo(wanted, 0.01);
  if (to > 1 || to <= 0.05) return null;
  return attempt(at, { output: { from: at.output, to: to > 0.97 ? 1 : Math.round(to * 100) / 100 } });
}

/** The smallest move, in whole centimetres, that lands inside, with `rest` changed as well. */
function byHeight(at: Case, rest: Change = {}): WayOut | null {
  const towards = at.factor > 1 ? -1 : 1;
  const roomM = towards < 0 ? at.aboveM - NEAREST_M : freeAboveM(at);
  let enough = Math.floor(roomM * 100 + 1e-6);
  if (enough < 1) return null;
  const tryCm = (cm: number) =>
    attempt(at, {
      ...rest,
      aboveLeavesM: { from: at.aboveM, to: Math.round((at.aboveM + (towards * cm) / 100) * 1e4) / 1e4 },
    });
  let best = tryCm(enough);
  if (!best) return null;
  let short = 0;
  while (enough - short > 1) {
    const middle = Math.floor((enough + short) / 2);
    const way = tryCm(middle);
    if (way) [enough, best] = [middle, way];
    else short = middle;
  }
  return best;
}

/** How far the lamps can rise before they meet the shelf above or the roof. */
function freeAboveM({ doc, lamps }: Case): number {
  const heights = doc.placements.filter((lamp) => lamps.includes(lamp.id)).map((lamp) => lamp.positionM[2]);
  const lampM = Math.max(...heights);
  const above = doc.tiers
    .map((tier) => tier.topHeightM - (tier.topHeightM - tierBottomM(tier)))
    .filter((bottom) => bottom > lampM);
  return Math.min(doc.tent.heightM, ...above) - lampM - 0.08;
}

function combined(at: Case): (WayOut | null)[] {
  if (at.factor < 1) return [];
  const longest = downTo(at.longestH, HALF_HOUR);
  const hours = longest > at.hours ? { from: at.hours, to: longest } : undefined;
  const output = at.output < 1 ? { from: at.output, to: 1 } : undefined;
  const ways: (WayOut | null)[] = [];
  if (hours) ways.push(byHeight(at, { hours }));
  if (output) ways.push(byHeight(at, { output }));
  if (hours && output) {
    const to = upTo(at.hours * Math.max(1, at.factor * at.output), HALF_HOUR);
    ways.push(to <= longest ? attempt(at, { output, hours: { from: at.hours, to } }) : byHeight(at, { hours, output }));
  }
  return ways;
}

function caseOf(doc: ScenarioDocument, evaluation: Evaluation, tierId: string, evaluate: Evaluate): Case | null {
  const tier = doc.tiers.find((candidate) => candidate.id === tierId);
  const result = evaluation.tiers.find((candidate) => candidate.id === tierId);
  if (!tier?.target || !result || result.verdict === 'inside' || result.verdict === 'none') return null;
  const own = doc.placements.filter((lamp) => servedTier(lamp, doc.tiers)?.id === tierId);
  const first = own[0];
  const hours = doc.schedules.find((schedule) => schedule.id === first?.schedule)?.hours ?? 0;
  if (!first || hours <= 0 || (first.dimFrac ?? 1) <= 0) return null;
  const lamps = own.map((lamp) => lamp.id);
  const share = (id: string) => result.byPlacement.find((part) => part.id === id)?.meanPpfdUmolM2S ?? 0;
  const ownDli = own.reduce((sum, lamp) => sum + share(lamp.id), 0) * hours * 0.0036;
  const { low, high } = targetEdges(tier.target);
  if (ownDli <= 0) return null;
  const edge = result.verdict === 'below' ? low : high;
  return {
    doc,
    tierId,
    lamps,
    hours,
    output: first.dimFrac ?? 1,
    aboveM: aboveLeavesM(first, tier),
    low,
    high,
    longestH: Math.min(24, tier.target.photoperiodMaxH ?? 24),
    shortestH: tier.target.photoperiodMinH ?? 0,
    factor: (edge - (result.dliMolM2D.mean - ownDli)) / ownDli,
    evaluate,
  };
}

/**
 * At most two ways for a tier that misses, the cheapest first. Runs in steps with a pause between them, so that the
 * page stays free; an aborted signal ends it.
 */
export async function waysOut(
  doc: ScenarioDocument,
  evaluation: Evaluation,
  tierId: string,
  { evaluate, pause, signal }: { evaluate: Evaluate; pause: () => Promise<void>; signal?: AbortSignal },
): Promise<WayOut[]> {
  const at = caseOf(doc, evaluation, tierId, evaluate);
  if (!at || at.factor <= 0) return [];
  const found: WayOut[] = [];
  const steps: (() => (WayOut | null)[])[] = [() => [byHours(at)], () => [byOutput(at)], () => [byHeight(at)]];
  for (const step of steps) {
    await pause();
    if (signal?.aborted) return [];
    found.push(...step().filter((way) => way !== null));
  }
  if (found.length < 2) {
    await pause();
    if (signal?.aborted) return [];
    found.push(...combined(at).filter((way) => way !== null));
  }
  const month = toldMonth(doc.room.airTempC, evaluation).month;
  const kwh = (from: Evaluation) => from.year.months.find((each) => each.month === month)?.energyKwh.total ?? 0;
  const priced: WayOut[] = [];
  for (const way of found.slice(0, 4)) {
    await pause();
    if (signal?.aborted) return [];
    priced.push({ ...way, monthKwh: kwh(evaluate(applyWayOut(doc, way), { year: true })) - kwh(evaluation) });
  }
  return priced.sort((a, b) => (a.monthKwh ?? 0) - (b.monthKwh ?? 0)).slice(0, 2);
}

/** Heights above the leaves from which the tier is inside its band, tried at nine places; for the rail of a held lamp. */
export function heightsInside(
  doc: ScenarioDocument,
  {
    lamps,
    tierId,
    lowM,
    highM,
    evaluate,
  }: { lamps: string[]; tierId: string; lowM: number; highM: number; evaluate: Evaluate },
): { fromM: number; toM: number } | null {
  const target = doc.tiers.find((tier) => tier.id === tierId)?.target;
  if (!target || highM <= lowM) return null;
  const { low, high } = targetEdges(target);
  const tried = Array.from({ length: 9 }, (_, i) => {
    const aboveM = lowM + ((highM - lowM) * i) / 8;
    const dli = dliOf(evaluate(setLampAboveLeaves(doc, lamps, aboveM), { year: false }), tierId);
    return { aboveM, dli };
  });
  const crossing = (edge: number): number[] =>
    tried.slice(1).flatMap((next, i) => {
      const before = tried[i]!;
      if ((before.dli - edge) * (next.dli - edge) > 0 || before.dli === next.dli) return [];
      return [before.aboveM + ((edge - before.dli) / (next.dli - before.dli)) * (next.aboveM - before.aboveM)];
    });
  const inside = tried.filter(({ dli }) => dli >= low && dli <= high).map(({ aboveM }) => aboveM);
  const ends = [...inside, ...crossing(low), ...crossing(high)];
  return ends.length < 2 ? null : { fromM: Math.min(...ends), toM: Math.max(...ends) };
}
