import type { LightScene, SceneFixture, Vec3 } from '@/physics/light/light-documents';

/**
 * PPFD by brute force, for tests alone: the lamp's face is cut into many small emitters, and each straight line to the sensor
 * is walked past every box. Shares no code with the product.
 */
type Box = { centre: number[]; frame: number[][]; half: number[]; open: number };

const dot = (a: readonly number[], b: readonly number[]) => a[0]! * b[0]! + a[1]! * b[1]! + a[2]! * b[2]!;
const unit = (a: readonly number[]) => a.map((x) => x / Math.sqrt(dot(a, a)));
const crossOf = (a: readonly number[], b: readonly number[]) => [
  a[1]! * b[2]! - a[2]! * b[1]!,
  a[2]! * b[0]! - a[0]! * b[2]!,
  a[0]! * b[1]! - a[1]! * b[0]!,
];

export function frameOf({ aim, axis }: SceneFixture) {
  const w = unit(aim);
  const along = dot(axis, w);
  const u = unit(axis.map((x, i) => x - along * w[i]!));
  return { u, v: crossOf(u, w), w };
}

function boxesOf(scene: LightScene, except: string): Box[] {
  const upright = [
    [1, 0, 0],
    [0, 1, 0],
    [0, 0, 1],
  ];
  const between = (low: readonly number[], high: readonly number[], open: number): Box => ({
    centre: low.map((x, i) => (x + high[i]!) / 2),
    frame: upright,
    half: low.map((x, i) => (high[i]! - x) / 2),
    open,
  });
  const housings = scene.fixtures
    .filter((lamp) => lamp.shape === 'rect' && lamp.id !== except)
    .map((lamp): Box => {
      const { u, v, w } = frameOf(lamp);
      const t = lamp.housing?.thickness ?? 0;
      return {
        centre: lamp.position.map((x, i) => x - (w[i]! * t) / 2),
        frame: [u, v, w],
        half: [lamp.length! / 2, lamp.width! / 2, t / 2],
        open: 0,
      };
    });
  return [
    ...scene.slabs.map((s) =>
      between([s.x0, s.y0, s.openFraction > 0 ? s.zTop : s.zTop - s.thickness], [s.x1, s.y1, s.zTop], s.openFraction),
    ),
    ...scene.boxes.map((b) => between(b.min, b.max, 0)),
    ...housings,
  ];
}

function shareThrough(from: readonly number[], to: readonly number[], { centre, frame, half, open }: Box): number {
  let enter = 0;
  let leave = 1;
  for (let i = 0; i < 3; i += 1) {
    const a = dot(
      from.map((x, k) => x - centre[k]!),
      frame[i]!,
    );
    const b = dot(
      to.map((x, k) => x - centre[k]!),
      frame[i]!,
    );
    const way = b - a;
    if (way === 0) {
      if (Math.abs(a) > half[i]!) return 1;
      continue;
    }
    const t = [(-half[i]! - a) / way, (half[i]! - a) / way].sort((p, q) => p - q);
    enter = Math.max(enter, t[0]!);
    leave = Math.min(leave, t[1]!);
  }
  return enter > leave || leave <= 1e-9 || enter >= 1 - 1e-9 ? 1 : open;
}

/** `intensity(cosGamma)` for a unit of flux; `cuts` small emitters along each side of the face. */
export function bruteForcePpfd(
  scene: LightScene,
  lamp: SceneFixture,
  point: Vec3,
  normal: Vec3,
  cuts: number,
  intensity: (cosGamma: number) => number = (cos) => Math.max(0, cos) / Math.PI,
): number {
  const { u, v, w } = frameOf(lamp);
  const boxes = boxesOf(scene, lamp.id);
  const n = lamp.shape === 'rect' ? cuts : 1;
  let sum = 0;
  for (let i = 0; i < n; i += 1) {
    for (let j = 0; j < n; j += 1) {
      const s = ((i + 0.5) / n - 0.5) * (lamp.length ?? 0);
      const t = ((j + 0.5) / n - 0.5) * (lamp.width ?? 0);
      const from = lamp.position.map((x, k) => x + s * u[k]! + t * v[k]!);
      const way = point.map((x, k) => x - from[k]!);
      const r = Math.sqrt(dot(way, way));
      const facing = -dot(way, normal) / r;
      if (facing <= 0) continue;
      let share = 1;
      for (const box of boxes) share *= shareThrough(from, point, box);
      sum += (share * intensity(dot(way, w) / r) * facing) / (r * r);
    }
  }
  return (lamp.ppf * sum) / (n * n);
}
