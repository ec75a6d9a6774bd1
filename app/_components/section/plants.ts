/** Simple, few leaves: enough to tell a lettuce from basil, drawn to the height of the canopy. */
import { px } from './section-frame';

export type PlantHabit = 'rosette' | 'herb' | 'seedling' | 'fruiting' | 'tuft';

const HABITS: readonly (readonly [RegExp, PlantHabit])[] = [
  [/microgreen|cress|chive|onion|leek|scallion|wheatgrass/i, 'tuft'],
  [/tomato|pepper|chil|cucumber|strawberr|bean|pea\b|aubergine|eggplant/i, 'fruiting'],
  [/basil|mint|thyme|oregano|rosemary|sage|coriander|cilantro|parsley|dill|herb/i, 'herb'],
];

export function plantHabit(crop: string | undefined, stage: string | undefined): PlantHabit {
  if (/germinat|seedling|propagat|nursery/i.test(stage ?? '')) return 'seedling';
  return HABITS.find(([pattern]) => pattern.test(crop ?? ''))?.[1] ?? 'rosette';
}

interface Leaf {
  /** Foot of the leaf, in plant heights, up is positive. */
  at: readonly [number, number];
  angleDeg: number;
  length: number;
  width: number;
  back?: boolean;
}

const rosette: Leaf[] = [
  { at: [0, 0.1], angleDeg: -80, length: 0.66, width: 0.46, back: true },
  { at: [0, 0.1], angleDeg: 80, length: 0.66, width: 0.46, back: true },
  { at: [0, 0.06], angleDeg: -24, length: 0.92, width: 0.56, back: true },
  { at: [0, 0.06], angleDeg: 24, length: 0.92, width: 0.56, back: true },
  { at: [0, 0.04], angleDeg: -54, length: 0.82, width: 0.54 },
  { at: [0, 0.04], angleDeg: 54, length: 0.82, width: 0.54 },
  { at: [0, 0.02], angleDeg: 0, length: 0.86, width: 0.5 },
];
const pairs = (heights: readonly number[], length: number): Leaf[] =>
  heights.flatMap((up, i) => [
    { at: [0, up] as const, angleDeg: -72 + i * 6, length: length * (1 - i * 0.1), width: 0.17, back: i % 2 === 0 },
    { at: [0, up] as const, angleDeg: 72 - i * 6, length: length * (1 - i * 0.1), width: 0.17, back: i % 2 === 0 },
  ]);
const LEAVES: Record<PlantHabit, Leaf[]> = {
  rosette,
  herb: [
    ...pairs([0.22, 0.46, 0.7], 0.36),
    { at: [0, 0.72], angleDeg: -22, length: 0.28, width: 0.16 },
    { at: [0, 0.72], angleDeg: 22, length: 0.28, width: 0.16 },
  ],
  seedling: [
    { at: [0, 0.5], angleDeg: -62, length: 0.46, width: 0.22, back: true },
    { at: [0, 0.5], angleDeg: 62, length: 0.46, width: 0.22, back: true },
    { at: [0, 0.55], angleDeg: -16, length: 0.45, width: 0.2 },
    { at: [0, 0.55], angleDeg: 18, length: 0.42, width: 0.2 },
  ],
  fruiting: [...pairs([0.18, 0.36, 0.54, 0.72], 0.3), { at: [0, 0.75], angleDeg: 0, length: 0.25, width: 0.14 }],
  tuft: [-24, -14, -5, 5, 14, 24].map((angleDeg, i) => ({
    at: [(i - 2.5) * 0.04, 0] as const,
    angleDeg,
    length: 0.98 - Math.abs(angleDeg) * 0.006,
    width: 0.07,
    back: i % 2 === 0,
  })),
};
/** Width of a plant for a height of one: it is narrowed where the sites stand closer. */
const SPREAD: Record<PlantHabit, number> = { rosette: 1.3, herb: 0.72, seedling: 0.85, fruiting: 0.6, tuft: 0.8 };

export interface PlantBed {
  habit: PlantHabit;
  /** Sites across the view, at the middle of their share of the shelf. */
  count: number;
  x0: number;
  x1: number;
  /** The shelf's top and the top of the leaves. */
  shelfY: number;
  leafY: number;
}

export interface PlantPaths {
  back: string;
  front: string;
  veins: string;
  stems: string;
  pots: string;
}

export function plantPaths({ habit, count, x0, x1, shelfY, leafY }: PlantBed): PlantPaths {
  const paths: PlantPaths = { back: '', front: '', veins: '', stems: '', pots: '' };
  const pitch = (x1 - x0) / Math.max(1, count);
  const whole = Math.max(4, shelfY - leafY);
  const pot = Math.min(8, whole * 0.25);
  const tall = whole - pot;
  const squeeze = Math.min(1, (pitch * 1.12) / (tall * SPREAD[habit]));
  for (let i = 0; i < count; i += 1) {
    const x = x0 + pitch * (i + 0.5);
    const y = shelfY - pot;
    const half = Math.min(7, pitch * 0.22, pot);
    paths.pots += `M${px(x - half)} ${px(y)}L${px(x + half)} ${px(y)}L${px(x + half * 0.7)} ${px(shelfY)}L${px(x - half * 0.7)} ${px(shelfY)}Z`;
    if (habit === 'herb' || habit === 'fruiting' || habit === 'seedling')
      paths.stems += `M${px(x)} ${px(y)}L${px(x)} ${px(y - tall * (habit === 'seedling' ? 0.58 : 0.78))}`;
    for (const leaf of LEAVES[habit]) {
      const { outline, vein } = leafPath(leaf, { x, y, tall, squeeze });
      paths[leaf.back ? 'back' : 'front'] += outline;
      paths.veins += vein;
    }
  }
  return paths;
}

function leafPath(
  leaf: Leaf,
  at: { x: number; y: number; tall: number; squeeze: number },
): { outline: string; vein: string } {
  const angle = (leaf.angleDeg * Math.PI) / 180;
  const place = (along: number, aside: number): string => {
    const right = leaf.at[0] + along * Math.sin(angle) + aside * Math.cos(angle);
    const up = leaf.at[1] + along * Math.cos(angle) - aside * Math.sin(angle);
    return `${px(at.x + right * at.tall * at.squeeze)} ${px(at.y - up * at.tall)}`;
  };
  const { length, width } = leaf;
  const outline =
    `M${place(0, 0)}C${place(length * 0.25, width * 0.5)} ${place(length * 0.85, width * 0.62)} ${place(length, 0)}` +
    `C${place(length * 0.85, -width * 0.62)} ${place(length * 0.25, -width * 0.5)} ${place(0, 0)}Z`;
  return { outline, vein: `M${place(length * 0.12, 0)}L${place(length * 0.82, 0)}` };
}
