/** The painted light: filled tints and isolines from a grid of PPFD, as SVG paths in the section's pixels. */
import { contours } from 'd3-contour';
import { HEAVY_LINES, ISOLINES, RAMP_TINTS, tintFloorPpfd } from '../ppfd-ramp';
import { px, xPx, yPx, type SectionFrame } from './section-frame';

export interface FieldGrid {
  nx: number;
  nz: number;
  /** Row by row from the floor up, left to right; NaN inside solid things. */
  ppfdUmolM2S: ArrayLike<number>;
}

type Pixel = [number, number];
export interface Isoline {
  value: number;
  heavy: boolean;
  d: string;
  rings: Pixel[][];
}

export interface PaintedField {
  tints: { tint: number; d: string }[];
  lines: Isoline[];
}

/**
 * Gives cells inside solid things the value of the nearest open cell above or below them, so that isolines
 * run up to a shelf and not around it, and sets one more cell around the grid, so that none runs along a wall.
 */
export function paddedField({ nx, nz, ppfdUmolM2S }: FieldGrid): { width: number; height: number; values: number[] } {
  const filled = Array.from(ppfdUmolM2S, Number);
  for (let i = 0; i < nx; i += 1) {
    for (let k = 0; k < nz; k += 1) {
      if (!Number.isNaN(ppfdUmolM2S[k * nx + i])) continue;
      let down = 1;
      while (k - down >= 0 && Number.isNaN(ppfdUmolM2S[(k - down) * nx + i])) down += 1;
      let up = 1;
      while (k + up < nz && Number.isNaN(ppfdUmolM2S[(k + up) * nx + i])) up += 1;
      const hasDown = k - down >= 0;
      const hasUp = k + up < nz;
      const from = hasUp && (!hasDown || up <= down) ? k + up : k - down;
      filled[k * nx + i] = hasUp || hasDown ? Number(ppfdUmolM2S[from * nx + i]) : 0;
    }
  }
  const width = nx + 2;
  const height = nz + 2;
  const values: number[] = new Array(width * height);
  for (let k = 0; k < height; k += 1) {
    for (let i = 0; i < width; i += 1) {
      const row = Math.min(nz - 1, Math.max(0, k - 1));
      const column = Math.min(nx - 1, Math.max(0, i - 1));
      values[k * width + i] = filled[row * nx + column]!;
    }
  }
  return { width, height, values };
}

const ringPath = (ring: Pixel[]) => `M${ring.map(([x, y]) => `${px(x)} ${px(y)}`).join('L')}Z`;

export function paintField(grid: FieldGrid, frame: SectionFrame): PaintedField {
  const { width, height, values } = paddedField(grid);
  const toPixels = ([x, y]: number[]): Pixel => [
    xPx(frame, ((x! - 1) / grid.nx) * frame.acrossM),
    yPx(frame, ((y! - 1) / grid.nz) * frame.heightM),
  ];
  const trace = contours().size([width, height]);
  const ringsAt = (value: number): Pixel[][] =>
    trace.contour(values, value).coordinates.flatMap((polygon) => polygon.map((ring) => ring.map(toPixels)));
  const tints = [];
  for (let tint = 1; tint < RAMP_TINTS; tint += 1) {
    const d = ringsAt(tintFloorPpfd(tint)).map(ringPath).join('');
    if (d) tints.push({ tint, d });
  }
  const lines: Isoline[] = [];
  for (const value of ISOLINES) {
    const rings = ringsAt(value).filter((ring) => ring.length >= 8);
    if (rings.length > 0) lines.push({ value, heavy: HEAVY_LINES.has(value), d: rings.map(ringPath).join(''), rings });
  }
  return { tints, lines };
}
