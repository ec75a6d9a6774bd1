'use client';

/** Takes hold of a lamp or a shelf with mouse, pen or finger; the plan follows the hand and is kept on release. */
import { useCallback, useEffect, useRef, useState } from 'react';
import { setLampAboveLeaves, setLampAcross, setLampSwing } from '@/lib/scenarios/edit-plan';
import { slideTier, tierRange } from '@/lib/scenarios/edit-rack';
import { lampAcrossRange, lampRange } from '@/lib/scenarios/lamp-range';
import { swingDeg, TILT_LIMIT_DEG } from '@/lib/scenarios/lamp-pose';
import type { ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import type { LampGroup } from './lamp-groups';
import type { PlanChange, SectionEdit } from './plan-edit';
import type { SectionFrame } from './section-frame';

export interface Held {
  what: 'lamp' | 'swing' | 'tier';
  /** The lamp's or the tier's id. */
  id: string;
  axis: 'up' | 'across' | null;
}

interface Grip extends Held {
  startX: number;
  startY: number;
  group: LampGroup | null;
  /** The settled plan when it was taken hold of. */
  doc: ScenarioDocument;
  change: PlanChange | null;
}

const AXIS_AFTER_PX = 5;
const clamp = (value: number, low: number, high: number) => Math.min(high, Math.max(low, value));
const toCm = (metres: number) => Math.round(metres * 100) / 100;

export interface DragOptions {
  doc: ScenarioDocument;
  frame: SectionFrame;
  edit: SectionEdit;
}

export interface Drag {
  held: Held | null;
  /** The document as it was when something was taken hold of. */
  before: ScenarioDocument | null;
  grab: (event: React.PointerEvent, what: Held['what'], id: string, group: LampGroup | null) => void;
  /** True from the touch on, before anything is drawn again. */
  isHolding: () => boolean;
}

export function useDrag({ doc, frame, edit }: DragOptions): Drag {
  const [held, setHeld] = useState<{ held: Held; before: ScenarioDocument } | null>(null);
  const grip = useRef<Grip | null>(null);
  const active = held !== null;

  useEffect(() => {
    if (!active) return;
    const move = (event: PointerEvent) => {
      const now = grip.current;
      if (!now) return;
      const change = changeFor(now, frame, event);
      if (!change) return;
      if (now.axis !== null)
        setHeld((old) => old && (old.held.axis === now.axis ? old : { ...old, held: { ...old.held, axis: now.axis } }));
      now.change = change;
      edit.preview(change);
    };
    const end = (keep: boolean) => {
      const change = grip.current?.change ?? null;
      grip.current = null;
      setHeld(null);
      if (keep && change) edit.apply(change, `drag ${Math.round(performance.now())}`);
      else edit.preview(null);
    };
    const up = () => end(true);
    const cancel = () => end(false);
    const key = (event: KeyboardEvent) => {
      if (event.key !== 'Escape') return;
      event.preventDefault();
      event.stopPropagation();
      end(false);
    };
    window.addEventListener('pointermove', move);
    window.addEventListener('pointerup', up);
    window.addEventListener('pointercancel', cancel);
    window.addEventListener('keydown', key, true);
    return () => {
      window.removeEventListener('pointermove', move);
      window.removeEventListener('pointerup', up);
      window.removeEventListener('pointercancel', cancel);
      window.removeEventListener('keydown', key, true);
    };
  }, [active, frame, edit]);

  const grab: Drag['grab'] = (event, what, id, group) => {
    if (edit.readOnly !== null || event.button !== 0) return;
    grip.current = { what, id, axis: null, startX: event.clientX, startY: event.clientY, group, doc, change: null };
    setHeld({ held: { what, id, axis: null }, before: doc });
  };
  const isHolding = useCallback(() => grip.current !== null, []);
  return { held: held?.held ?? null, before: held?.before ?? null, grab, isHolding };
}

function changeFor(grip: Grip, frame: SectionFrame, event: { clientX: number; clientY: number }): PlanChange | null {
  const dx = event.clientX - grip.startX;
  const dy = event.clientY - grip.startY;
  if (grip.what === 'tier') {
    const tier = grip.doc.tiers.find((candidate) => candidate.id === grip.id);
    if (!tier) return null;
    const range = tierRange(grip.doc, tier.id, grip.doc.tent);
    const top = clamp(toCm(tier.topHeightM - dy / frame.pxPerM), range.lowM, range.highM);
    return (plan) => slideTier(plan, tier.id, top);
  }
  const group = grip.group;
  const lamp = group?.lamps.find((candidate) => candidate.id === grip.id);
  if (!group || !lamp) return null;
  const ids = group.lamps.map((each) => each.id);
  const middleM = frame.acrossM / 2;
  const lead = { lead: lamp.id, ids, view: frame.view, middleM };
  if (grip.what === 'swing') {
    const turn = (Math.atan2(dx, 40) * 180) / Math.PI;
    const deg = clamp(Math.round(swingDeg(lamp, frame.view) + turn), -TILT_LIMIT_DEG, TILT_LIMIT_DEG);
    return (plan) => setLampSwing(plan, lead, deg);
  }
  if (grip.axis === null) {
    if (Math.hypot(dx, dy) < AXIS_AFTER_PX) return null;
    grip.axis = lamp.mount !== 'clamped' && Math.abs(dx) > Math.abs(dy) * 1.5 ? 'across' : 'up';
  }
  if (grip.axis === 'across') {
    const range = lampAcrossRange(grip.doc, lamp.id, frame.view);
    const at = lamp.positionM[frame.view === 'front' ? 0 : 1];
    const to = clamp(toCm(at + dx / frame.pxPerM), range.lowM, range.highM);
    return (plan) => setLampAcross(plan, lead, to);
  }
  const range = lampRange(grip.doc, ids);
  const above = clamp(toCm(group.aboveLeavesM - dy / frame.pxPerM), range.lowM, range.highM);
  return (plan) => setLampAboveLeaves(plan, ids, above);
}
