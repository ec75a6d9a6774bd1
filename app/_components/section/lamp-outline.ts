/** A lamp as it shows in the section: its housing, its shining face, and what it hangs from. */
import type { ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import { lampCorners, tierBottomM } from '@/lib/scenarios/lamp-pose';
import { xPx, yPx, type SectionFrame } from './section-frame';

type Pixel = readonly [number, number];
type Placement = ScenarioDocument['placements'][number];
type Fixture = ScenarioDocument['fixtures'][number];
type Tier = ScenarioDocument['tiers'][number];

/** Convex hull, counter-clockwise (Andrew's monotone chain). */
export function convexHull(cloud: readonly Pixel[]): Pixel[] {
  const sorted = [...cloud].sort((a, b) => a[0] - b[0] || a[1] - b[1]);
  const turn = (o: Pixel, a: Pixel, b: Pixel) => (a[0] - o[0]) * (b[1] - o[1]) - (a[1] - o[1]) * (b[0] - o[0]);
  const chain = (from: readonly Pixel[]) => {
    const hull: Pixel[] = [];
    for (const point of from) {
      while (hull.length >= 2 && turn(hull.at(-2)!, hull.at(-1)!, point) <= 0) hull.pop();
      hull.push(point);
    }
    hull.pop();
    return hull;
  };
  return [...chain(sorted), ...chain(sorted.reverse())];
}

export interface LampOutline {
  housing: Pixel[];
  face: Pixel[];
  /** Centre of the shining face. */
  facePx: Pixel;
  /** Middle of the whole body: where a hand takes hold. */
  holdPx: Pixel;
  leftPx: number;
  rightPx: number;
  topPx: number;
  bottomPx: number;
}

export function lampOutline(lamp: Placement, fixture: Fixture, frame: SectionFrame): LampOutline {
  const flat = lampCorners(lamp, fixture).map((corner): Pixel => {
    const across = frame.view === 'front' ? corner[0] : corner[1];
    return [xPx(frame, across), yPx(frame, corner[2])];
  });
  const housing = convexHull(flat);
  const xs = housing.map(([x]) => x);
  const ys = housing.map(([, y]) => y);
  const across = frame.view === 'front' ? lamp.positionM[0] : lamp.positionM[1];
  const box = { leftPx: Math.min(...xs), rightPx: Math.max(...xs), topPx: Math.min(...ys), bottomPx: Math.max(...ys) };
  return {
    housing,
    face: convexHull(flat.slice(0, 4)),
    facePx: [xPx(frame, across), yPx(frame, lamp.positionM[2])],
    holdPx: [(box.leftPx + box.rightPx) / 2, (box.topPx + box.bottomPx) / 2],
    ...box,
  };
}

/** What a hanging lamp hangs from: the underside of the shelf above it, else the tent's roof; metres. */
export function hangsFromM(lamp: Placement, tiers: readonly Tier[], tentHeightM: number): number {
  const [x, , z] = lamp.positionM;
  const above = tiers
    .filter((tier) => tier.x0M <= x && x <= tier.x1M)
    .map((tier) => tierBottomM(tier))
    .filter((bottom) => bottom > z);
  return Math.min(tentHeightM, ...above);
}

/** The two wires of a hanging lamp, as pixel segments from the hanger down to the housing. */
export function hangingWires(
  outline: LampOutline,
  hangerPx: number,
): (readonly [x: number, from: number, to: number])[] {
  const width = outline.rightPx - outline.leftPx;
  const inset = width > 60 ? width * 0.1 : width / 2;
  const xs = width > 60 ? [outline.leftPx + inset, outline.rightPx - inset] : [outline.leftPx + inset];
  return xs.map((x) => [x, hangerPx, outline.topPx] as const);
}

/** A clamp: a square on the nearer upright and an arm to the housing. */
export function clampAt(
  outline: LampOutline,
  uprightsPx: readonly [number, number],
): { uprightPx: number; y: number; armTo: Pixel } {
  const [left, right] = uprightsPx;
  const x = outline.holdPx[0];
  const uprightPx = Math.abs(x - left) <= Math.abs(x - right) ? left : right;
  const side = uprightPx < x ? outline.leftPx : outline.rightPx;
  const armTo: Pixel = [side + (x - side) * 0.3, outline.topPx + (outline.bottomPx - outline.topPx) * 0.3];
  return { uprightPx, y: outline.topPx - 4, armTo };
}
