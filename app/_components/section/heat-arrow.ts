/** Heat in and out as arrows: 10 px of width is 100 W, and never less than 2 px. */
import { points } from './section-frame';

export const PX_PER_W = 0.1;

export function heatWidthPx(watts: number): number {
  return Math.max(2, Math.abs(watts) * PX_PER_W);
}

export interface HeatArrow {
  x: number;
  y: number;
  lengthPx: number;
  watts: number;
}

/** A block arrow pointing right, its shaft as wide as its watts. */
export function heatArrow({ x, y, lengthPx, watts }: HeatArrow): string {
  const half = Math.min(heatWidthPx(watts), 60) / 2;
  const head = Math.min(lengthPx * 0.45, 7 + half * 0.7);
  const neck = x + lengthPx - head;
  const wide = half + 4;
  return points([
    [x, y - half],
    [neck, y - half],
    [neck, y - wide],
    [x + lengthPx, y],
    [neck, y + wide],
    [neck, y + half],
    [x, y + half],
  ]);
}
