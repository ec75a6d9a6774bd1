'use client';

/** What can be taken hold of, in the order in which Tab walks it: top to bottom, left to right. */
import { useEffect, useRef } from 'react';
import { lampRange } from '@/lib/scenarios/lamp-range';
import { tierRange } from '@/lib/scenarios/edit-rack';
import type { ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import { lampKeyChange, tierKeyChange } from './lamp-keys';
import { isSelected, type SectionEdit, type Selection } from './plan-edit';
import { px } from './section-frame';
import type { LampModel, SectionModel, TierModel } from './section-model';
import type { Drag } from './use-drag';

export interface HandleWords {
  lampName: (model: LampModel) => string;
  lampValue: (model: LampModel) => string;
  tierName: (model: TierModel) => string;
  tierValue: (model: TierModel) => string;
}

interface HandleLayerProps {
  model: SectionModel;
  doc: ScenarioDocument;
  edit: SectionEdit;
  drag: Drag;
  selection: Selection | null;
  select: (selection: Selection | null) => void;
  openFields: () => void;
  words: HandleWords;
}

const GRAB = 44;
/** The page's own focus ring fits a handle too. */
const FOCUS = 'outline-lamp';

export function HandleLayer(props: HandleLayerProps) {
  const { model } = props;
  const { isHolding } = props.drag;
  const layer = useRef<SVGGElement>(null);
  // `touch-action` on a shape of a drawing does not keep every browser from scrolling away with the finger.
  useEffect(() => {
    const node = layer.current;
    if (!node) return;
    const keepStill = (event: TouchEvent) => {
      if (isHolding() && event.cancelable) event.preventDefault();
    };
    node.addEventListener('touchmove', keepStill, { passive: false });
    return () => node.removeEventListener('touchmove', keepStill);
  }, [isHolding]);
  const things = [
    ...model.lamps.map((lamp) => ({
      y: lamp.outline.topPx,
      x: lamp.outline.leftPx,
      node: <LampHandle key={`lamp-${lamp.lamp.id}`} lamp={lamp} {...props} />,
    })),
    ...model.tiers.map((tier) => ({
      y: tier.shelf.y0,
      x: tier.shelf.x0,
      node: <TierHandle key={`tier-${tier.tier.id}`} tier={tier} {...props} />,
    })),
  ].sort((a, b) => a.y - b.y || a.x - b.x);
  const { reservoir, heater, fan } = model;
  return (
    <g ref={layer}>
      {things.map((thing) => thing.node)}
      {reservoir && <ThingHandle kind="water" label="Reservoir and pump" box={reservoir.box} {...props} />}
      {heater && <ThingHandle kind="heater" label="Heater" box={heater.box} {...props} />}
      {fan && (
        <ThingHandle
          kind="fan"
          label="Exhaust fan"
          box={{ x0: fan.x - GRAB / 2, x1: fan.x + GRAB / 2, y0: fan.y - GRAB / 2, y1: fan.y + GRAB / 2 }}
          {...props}
        />
      )}
    </g>
  );
}

function ThingHandle({
  kind,
  label,
  box,
  selection,
  select,
  openFields,
}: HandleLayerProps & {
  kind: 'water' | 'heater' | 'fan';
  label: string;
  box: { x0: number; y0: number; x1: number; y1: number };
}) {
  return (
    <rect
      role="button"
      tabIndex={0}
      aria-label={`${label}: open its fields`}
      aria-pressed={isSelected(selection, kind)}
      x={px(box.x0)}
      y={px(box.y0)}
      width={px(box.x1 - box.x0)}
      height={px(box.y1 - box.y0)}
      fill="transparent"
      className={`${FOCUS} cursor-pointer`}
      onClick={() => select({ kind })}
      onKeyDown={(event) => {
        if (event.key !== 'Enter' && event.key !== ' ') return;
        event.preventDefault();
        select({ kind });
        openFields();
      }}
    />
  );
}

function LampHandle({
  lamp,
  doc,
  model,
  edit,
  drag,
  selection,
  select,
  openFields,
  words,
}: HandleLayerProps & { lamp: LampModel }) {
  const { outline, group } = lamp;
  const selected = isSelected(selection, 'lamp', lamp.lamp.id);
  const width = Math.max(GRAB, outline.rightPx - outline.leftPx);
  const height = Math.max(GRAB, outline.bottomPx - outline.topPx);
  const ids = group.lamps.map((each) => each.id);
  const range = lampRange(doc, ids);
  return (
    <g role="group" aria-label={words.lampName(lamp)}>
      <rect
        role="slider"
        tabIndex={0}
        data-lamp={lamp.lamp.id}
        aria-label={`${words.lampName(lamp)}, height above the leaves`}
        aria-orientation="vertical"
        aria-valuemin={Math.round(range.lowM * 100)}
        aria-valuemax={Math.round(range.highM * 100)}
        aria-valuenow={Math.round(group.aboveLeavesM * 100)}
        aria-valuetext={words.lampValue(lamp)}
        aria-readonly={edit.readOnly !== null || undefined}
        x={px(outline.holdPx[0] - width / 2)}
        y={px(outline.holdPx[1] - height / 2)}
        width={px(width)}
        height={px(height)}
        fill="transparent"
        className={`${FOCUS} ${edit.readOnly === null ? 'cursor-ns-resize' : 'cursor-pointer'}`}
        style={{ touchAction: selected ? 'none' : 'manipulation' }}
        onFocus={() => select({ kind: 'lamp', id: lamp.lamp.id })}
        onPointerDown={(event) => {
          // A finger chooses first and drags then, so that the page still scrolls.
          if (event.pointerType !== 'touch' || selected) drag.grab(event, 'lamp', lamp.lamp.id, group);
          select({ kind: 'lamp', id: lamp.lamp.id });
        }}
        onKeyDown={(event) => {
          if (event.key === 'Enter') {
            event.preventDefault();
            openFields();
            return;
          }
          if (edit.readOnly !== null || event.ctrlKey || event.metaKey || event.altKey) return;
          const change = lampKeyChange(event, doc, lamp.lamp.id, group, model.frame);
          if (!change) return;
          event.preventDefault();
          edit.apply(change, `keys lamp ${lamp.lamp.id}`);
        }}
      />
      {selected && edit.readOnly === null && <SwingHandle lamp={lamp} drag={drag} />}
    </g>
  );
}

/** A second handle, 40 px along the beam, swings the lamp. The keys [ and ] and the field do the same. */
function SwingHandle({ lamp, drag }: { lamp: LampModel; drag: Drag }) {
  const [fx, fy] = lamp.outline.facePx;
  const front = lamp.outline;
  const deg = Math.atan2(lamp.lamp.aim[0], -lamp.lamp.aim[2]);
  const x = fx + 40 * Math.sin(deg);
  const y = Math.max(front.bottomPx + 14, fy + 40 * Math.cos(deg));
  return (
    <g aria-hidden="true">
      <path d={`M${px(fx)} ${px(fy)}L${px(x)} ${px(y)}`} stroke="var(--lamp)" strokeWidth={1} strokeDasharray="3 2" />
      <circle cx={px(x)} cy={px(y)} r={4.5} fill="var(--sheet)" stroke="var(--lamp)" strokeWidth={1.5} />
      <circle
        cx={px(x)}
        cy={px(y)}
        r={14}
        fill="transparent"
        className="cursor-ew-resize"
        style={{ touchAction: 'none' }}
        onPointerDown={(event) => {
          event.stopPropagation();
          drag.grab(event, 'swing', lamp.lamp.id, lamp.group);
        }}
      />
    </g>
  );
}

function TierHandle({
  tier,
  doc,
  edit,
  drag,
  selection,
  select,
  openFields,
  words,
}: HandleLayerProps & { tier: TierModel }) {
  const { shelf } = tier;
  const id = tier.tier.id;
  const selected = isSelected(selection, 'tier', id);
  const range = tierRange(doc, id, doc.tent);
  const middle = (shelf.y0 + shelf.y1) / 2;
  return (
    <g role="group" aria-label={words.tierName(tier)}>
      <rect
        role="slider"
        tabIndex={0}
        data-tier={id}
        aria-label={`${words.tierName(tier)}, height of the shelf`}
        aria-orientation="vertical"
        aria-valuemin={Math.round(range.lowM * 100)}
        aria-valuemax={Math.round(range.highM * 100)}
        aria-valuenow={Math.round(tier.tier.topHeightM * 100)}
        aria-valuetext={words.tierValue(tier)}
        aria-readonly={edit.readOnly !== null || undefined}
        x={px(shelf.x0)}
        y={px(Math.min(shelf.y0, middle - 9))}
        width={px(shelf.x1 - shelf.x0)}
        height={px(Math.max(shelf.y1 - shelf.y0, 18))}
        fill="transparent"
        className={`${FOCUS} ${edit.readOnly === null ? 'cursor-ns-resize' : 'cursor-pointer'}`}
        style={{ touchAction: selected ? 'none' : 'manipulation' }}
        onFocus={() => select({ kind: 'tier', id })}
        onPointerDown={(event) => {
          if (event.pointerType !== 'touch' || selected) drag.grab(event, 'tier', id, null);
          select({ kind: 'tier', id });
        }}
        onKeyDown={(event) => {
          if (event.key === 'Enter') {
            event.preventDefault();
            openFields();
            return;
          }
          if (edit.readOnly !== null || event.ctrlKey || event.metaKey || event.altKey) return;
          const change = tierKeyChange(event, doc, id);
          if (!change) return;
          event.preventDefault();
          edit.apply(change, `keys tier ${id}`);
        }}
      />
    </g>
  );
}
