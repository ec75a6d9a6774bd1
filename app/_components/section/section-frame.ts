/** The scale of the section: metres of the tent to pixels of the drawing. */
import type { View } from '@/lib/scenarios/lamp-pose';

export type { View };

export interface TentSize {
  widthM: number;
  depthM: number;
  heightM: number;
}

export interface SectionFrame {
  view: View;
  pxPerM: number;
  /** The tent's extent across the view: its width (front) or its depth (side). */
  acrossM: number;
  heightM: number;
  /** The inner face of the left wall, and the floor. */
  leftPx: number;
  floorPx: number;
}

/** The paper that the tent may take up. Floor and centre line stay; the scale follows the tent. */
export interface DrawingRoom {
  maxWidthPx: number;
  maxHeightPx: number;
  centrePx: number;
  floorPx: number;
}

/** One scale for both views, so that a lamp keeps its size when the view turns. */
export function sectionPxPerM(tent: TentSize, room: Pick<DrawingRoom, 'maxWidthPx' | 'maxHeightPx'>): number {
  return Math.min(room.maxWidthPx / Math.max(tent.widthM, tent.depthM * 0.75), room.maxHeightPx / tent.heightM);
}

export function sectionFrame(tent: TentSize, view: View, room: DrawingRoom): SectionFrame {
  const pxPerM = sectionPxPerM(tent, room);
  const acrossM = view === 'front' ? tent.widthM : tent.depthM;
  const leftPx = room.centrePx - (acrossM * pxPerM) / 2;
  return { view, pxPerM, acrossM, heightM: tent.heightM, leftPx, floorPx: room.floorPx };
}

export const xPx = (frame: SectionFrame, acrossM: number): number => frame.leftPx + acrossM * frame.pxPerM;
export const yPx = (frame: SectionFrame, upM: number): number => frame.floorPx - upM * frame.pxPerM;
export const acrossAtPx = (frame: SectionFrame, x: number): number => (x - frame.leftPx) / frame.pxPerM;
export const upAtPx = (frame: SectionFrame, y: number): number => (frame.floorPx - y) / frame.pxPerM;
export const rightPx = (frame: SectionFrame): number => xPx(frame, frame.acrossM);
export const topPx = (frame: SectionFrame): number => yPx(frame, frame.heightM);

/** Tenths of a pixel are enough for a line and halve the markup. */
export const px = (value: number): number => Math.round(value * 10) / 10;
export const points = (corners: readonly (readonly [number, number])[]): string =>
  corners.map(([x, y]) => `${px(x)},${px(y)}`).join(' ');
