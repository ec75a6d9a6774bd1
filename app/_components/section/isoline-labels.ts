/** Where an isoline says its value: on its calmest, most level stretch, clear of everything else. */
import type { Isoline } from './field-contours';

export interface KeepOut {
  x0: number;
  y0: number;
  x1: number;
  y1: number;
}

export interface LineLabel {
  value: number;
  x: number;
  y: number;
}

export interface LabelRules {
  /** The paper on which labels may stand. */
  inside: KeepOut;
  keepOut: readonly KeepOut[];
  apartPx?: number;
  sameValueApartPx?: number;
  perValue?: number;
}

const HALF_WIDTH = 14;
const HALF_HEIGHT = 8;

function meets(x: number, y: number, box: KeepOut): boolean {
  return x + HALF_WIDTH > box.x0 && x - HALF_WIDTH < box.x1 && y + HALF_HEIGHT > box.y0 && y - HALF_HEIGHT < box.y1;
}

interface Candidate extends LineLabel {
  unrest: number;
}

function candidates(line: Isoline): Candidate[] {
  const found: Candidate[] = [];
  for (const ring of line.rings) {
    const count = ring.length - 1;
    if (count < 12) continue;
    for (let i = 0; i < count; i += 2) {
      const [x, y] = ring[i]!;
      const before = ring[(i - 4 + count) % count]!;
      const after = ring[(i + 4) % count]!;
      const slope = Math.abs(Math.atan2(after[1] - before[1], after[0] - before[0]));
      const level = Math.min(slope, Math.PI - slope);
      const bend = Math.hypot(before[0] + after[0] - 2 * x, before[1] + after[1] - 2 * y);
      found.push({ value: line.value, x, y, unrest: level + bend / 12 - Math.min(count, 200) / 400 });
    }
  }
  return found.sort((a, b) => a.unrest - b.unrest);
}

export function labelIsolines(lines: readonly Isoline[], rules: LabelRules): LineLabel[] {
  const { inside, keepOut, apartPx = 58, sameValueApartPx = 150, perValue = 2 } = rules;
  const labels: LineLabel[] = [];
  // Strong lines first: where there is room for few, those are the ones that a reader looks for.
  const ordered = [...lines].sort((a, b) => Number(b.heavy) - Number(a.heavy) || a.value - b.value);
  for (const line of ordered) {
    let placed = 0;
    for (const { value, x, y } of candidates(line)) {
      if (placed >= perValue) break;
      const within =
        x - HALF_WIDTH > inside.x0 &&
        x + HALF_WIDTH < inside.x1 &&
        y - HALF_HEIGHT > inside.y0 &&
        y + HALF_HEIGHT < inside.y1;
      if (!within || keepOut.some((box) => meets(x, y, box))) continue;
      const tooNear = labels.some(
        (label) => Math.hypot(label.x - x, label.y - y) < (label.value === value ? sameValueApartPx : apartPx),
      );
      if (tooNear) continue;
      labels.push({ value, x, y });
      placed += 1;
    }
  }
  return labels;
}
