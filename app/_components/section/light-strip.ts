/** The strip under a shelf: PPFD on its leaves across the view, lowest, mean and highest over the other direction. */
import { area, curveMonotoneX, line } from 'd3-shape';
import type { View } from './section-frame';

export interface TierGrid {
  nx: number;
  ny: number;
  ppfdUmolM2S: readonly number[];
}

export interface StripProfile {
  mean: number[];
  low: number[];
  high: number[];
}

export function stripProfile({ nx, ny, ppfdUmolM2S }: TierGrid, view: View): StripProfile {
  const along = view === 'front' ? nx : ny;
  const over = view === 'front' ? ny : nx;
  const profile: StripProfile = { mean: [], low: [], high: [] };
  for (let a = 0; a < along; a += 1) {
    const values = Array.from({ length: over }, (_, o) => ppfdUmolM2S[view === 'front' ? o * nx + a : a * nx + o] ?? 0);
    profile.mean.push(values.reduce((sum, value) => sum + value, 0) / over);
    profile.low.push(Math.min(...values));
    profile.high.push(Math.max(...values));
  }
  return profile;
}

/** One scale for all strips of a drawing: 400, or the next round value above what the brightest tier gets. */
export function stripTopPpfd(profiles: readonly StripProfile[]): number {
  const highest = Math.max(0, ...profiles.flatMap((profile) => profile.high));
  return [400, 600, 800, 1200, 1600, 2400].find((top) => highest <= top) ?? Math.ceil(highest / 1000) * 1000;
}

export type StripForm = 'full' | 'small' | 'bar';

/** Full where there are 12 cm of free air under the shelf to show it in; a bar at small scales. */
export function stripForm(freeAirM: number, pxPerM: number): StripForm {
  if (pxPerM < 200) return 'bar';
  return freeAirM >= 0.12 && pxPerM >= 220 ? 'full' : 'small';
}

export const STRIP_HEIGHTS: Record<StripForm, { curve: number; cells: number }> = {
  full: { curve: 29, cells: 9 },
  small: { curve: 11, cells: 5 },
  bar: { curve: 0, cells: 7 },
};

export interface StripBox {
  x0: number;
  x1: number;
  /** Zero of the curve is the lower edge. */
  top: number;
  height: number;
  topPpfd: number;
}

export const stripY = (box: StripBox, ppfd: number): number =>
  box.top + box.height * (1 - Math.min(1, Math.max(0, ppfd / box.topPpfd)));

const stripX = (box: StripBox, i: number, count: number) => box.x0 + ((box.x1 - box.x0) * (i + 0.5)) / count;

/** The curve runs to both ends of the shelf at the outermost cells' values. */
const withEnds = (values: readonly number[], box: StripBox): [number, number][] => [
  [box.x0, values[0] ?? 0],
  ...values.map((value, i): [number, number] => [stripX(box, i, values.length), value]),
  [box.x1, values.at(-1) ?? 0],
];

export function stripCurve(values: readonly number[], box: StripBox): string {
  const draw = line<[number, number]>(
    (p) => p[0],
    (p) => stripY(box, p[1]),
  )
    .curve(curveMonotoneX)
    .digits(1);
  return draw(withEnds(values, box)) ?? '';
}

export function stripBand(low: readonly number[], high: readonly number[], box: StripBox): string {
  const lows = withEnds(low, box);
  const highs = withEnds(high, box);
  const pairs = lows.map(([x, value], i): [number, number, number] => [x, value, highs[i]![1]]);
  const draw = area<[number, number, number]>()
    .x((p) => p[0])
    .y0((p) => stripY(box, p[1]))
    .y1((p) => stripY(box, p[2]))
    .curve(curveMonotoneX)
    .digits(1);
  return draw(pairs) ?? '';
}

/** PPFD that a crop's day needs when the lamps burn for so many hours. */
export function bandPpfd(dliMolM2D: number, hours: number): number | null {
  return hours > 0 ? dliMolM2D / (hours * 0.0036) : null;
}
