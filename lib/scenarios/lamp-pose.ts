/** Where a lamp hangs, in the words of the person who hangs it: above the leaves, from a wall, swung by so much. */
import type { Vec3 } from '@/physics/light/light-documents';
import { defaults } from '@/physics/plan/defaults';
import type { FixtureType, Placement, Tier } from '@/physics/plan/scenario-document';

export type View = 'front' | 'side';
export type RackTier = Omit<Tier, 'target'>;
export type LampBody = Pick<FixtureType, 'id' | 'shape' | 'lengthM' | 'widthM' | 'housingThicknessM'>;

/** What the evaluation takes where the plan does not say; the drawing stands on the same. */
const CANOPY_HEIGHT_M = defaults['tier.canopyHeightM'].value;
const TIER_THICKNESS_M = defaults['tier.thicknessM'].value;
const HOUSING_THICKNESS_M = defaults['fixture.housingThicknessM'].value;
/** A lamp swung further than this shines at the wall; the drawing stops there. */
export const TILT_LIMIT_DEG = 80;

const degrees = (radians: number) => (radians * 180) / Math.PI;
const radians = (deg: number) => (deg * Math.PI) / 180;

export function canopyHeightM(tier: Pick<Tier, 'canopyHeightM'>): number {
  return tier.canopyHeightM ?? CANOPY_HEIGHT_M;
}

export function leafHeightM(tier: Pick<Tier, 'topHeightM' | 'canopyHeightM'>): number {
  return tier.topHeightM + canopyHeightM(tier);
}

export function tierBottomM(tier: Pick<Tier, 'topHeightM' | 'thicknessM' | 'openFrac'>): number {
  return tier.topHeightM - ((tier.openFrac ?? 0) > 0 ? 0 : (tier.thicknessM ?? TIER_THICKNESS_M));
}

/** The tier a lamp serves: the one it names, else the highest one below it. */
export function servedTier<T extends RackTier>(lamp: Placement, tiers: readonly T[]): T | null {
  const named = tiers.find((tier) => tier.id === lamp.tier);
  if (named) return named;
  const below = tiers.filter((tier) => tier.topHeightM < lamp.positionM[2]);
  return below.reduce<T | null>((best, tier) => (best && best.topHeightM > tier.topHeightM ? best : tier), null);
}

/** Height of the lamp's face above the leaves of its tier; above the floor where there is no tier. */
export function aboveLeavesM(lamp: Placement, tier: RackTier | null): number {
  return lamp.positionM[2] - (tier ? leafHeightM(tier) : 0);
}

/** Swing from straight down in the plane of the view; positive turns the light to the right (front) or the back (side). */
export function swingDeg(lamp: Pick<Placement, 'aim'>, view: View): number {
  const along = view === 'front' ? lamp.aim[0] : lamp.aim[1];
  return degrees(Math.atan2(along, -lamp.aim[2]));
}

/** The aim with one plane's swing replaced and the other's kept. */
export function aimWithSwing(lamp: Pick<Placement, 'aim'>, view: View, deg: number): Vec3 {
  const across = Math.tan(radians(view === 'front' ? deg : swingDeg(lamp, 'front')));
  const along = Math.tan(radians(view === 'side' ? deg : swingDeg(lamp, 'side')));
  const length = Math.hypot(across, along, 1);
  const clean = (value: number) => (Math.abs(value) < 1e-12 ? 0 : value);
  return [clean(across / length), clean(along / length), -1 / length];
}

const unit = (v: Vec3): Vec3 => {
  const length = Math.hypot(...v) || 1;
  return [v[0] / length, v[1] / length, v[2] / length];
};
const dot = (a: Vec3, b: Vec3) => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
const cross = (a: Vec3, b: Vec3): Vec3 => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];

/** The eight corners of the housing, the four of the emitting face first. */
export function lampCorners(lamp: Placement, body: LampBody): Vec3[] {
  const aim = unit(lamp.aim);
  const raw = lamp.axis;
  const along = dot(raw, aim);
  const axis = unit([raw[0] - along * aim[0], raw[1] - along * aim[1], raw[2] - along * aim[2]]);
  const side = cross(axis, aim);
  const point = body.shape === 'point';
  const halfLength = (point ? 0.06 : (body.lengthM ?? 0.1)) / 2;
  const halfWidth = (point ? 0.06 : (body.widthM ?? 0.1)) / 2;
  const depth = point ? 0.06 : (body.housingThicknessM ?? HOUSING_THICKNESS_M);
  const corner = (a: number, w: number, back: number): Vec3 =>
    [0, 1, 2].map((i) => lamp.positionM[i]! + a * axis[i]! + w * side[i]! - back * aim[i]!) as unknown as Vec3;
  const face: Vec3[] = [];
  const rear: Vec3[] = [];
  for (const [a, w] of [
    [-halfLength, -halfWidth],
    [halfLength, -halfWidth],
    [halfLength, halfWidth],
    [-halfLength, halfWidth],
  ] as const) {
    face.push(corner(a, w, 0));
    rear.push(corner(a, w, depth));
  }
  return [...face, ...rear];
}

export interface Extent {
  min: Vec3;
  max: Vec3;
}

export function lampExtent(lamp: Placement, body: LampBody): Extent {
  const corners = lampCorners(lamp, body);
  const pick = (choose: (...values: number[]) => number): Vec3 =>
    [0, 1, 2].map((i) => choose(...corners.map((corner) => corner[i]!))) as unknown as Vec3;
  return { min: pick(Math.min), max: pick(Math.max) };
}
