'use client';

/** The drawing itself, without its sentences: one group of SVG that every layout sets into its own paper. */
import { useId, useMemo } from 'react';
import { FanPart, HeaterPart, UprightsPart, WaterPart } from './device-parts';
import { FieldPart } from './field-part';
import { HandleLayer } from './handle-layer';
import { HeldPart, Slip } from './held-part';
import { labelIsolines, type KeepOut } from './isoline-labels';
import { LampGhost, LampPart } from './lamp-part';
import { lampOutline } from './lamp-outline';
import { isSelected } from './plan-edit';
import type { SectionContext } from './section-context';
import { leafHeightM, servedTier } from '@/lib/scenarios/lamp-pose';
import { stripProfile } from './light-strip';
import { DAYS_IN_MONTH } from '@/lib/scenarios/coldest-month';
import { TentShell } from './tent-shell';
import { TierPart } from './tier-part';
import type { Drag } from './use-drag';
import { useField } from './use-field';
import { useRail } from './use-ways';
import { px } from './section-frame';

interface SectionPictureProps {
  context: SectionContext;
  drag: Drag;
  openFields: () => void;
  /** As it was before something was taken hold of. */
  stripsBefore: ReadonlyMap<string, readonly number[]> | null;
  labelPx?: number;
  pale?: boolean;
}

export function SectionPicture({ context, drag, openFields, labelPx = 12, pale, stripsBefore }: SectionPictureProps) {
  const { model, doc, edit, selection, select, words, verdicts, evaluation, told, impossible } = context;
  const { frame, tent } = model;
  const id = useId();
  const clipId = `${id}clip`;
  const hatchId = `${id}hatch`;
  const field = useField(doc, frame, edit.held);
  const labels = useMemo(
    () => (field ? labelIsolines(field.lines, { inside: shrink(tent), keepOut: keepOuts(model) }) : []),
    [field, tent, model],
  );
  const month = evaluation?.year.months.find((each) => each.month === told?.month);
  const heaterW = month ? (month.energyKwh.heater * 1000) / ((DAYS_IN_MONTH[month.month - 1] ?? 30) * 24) : 0;
  const outW = evaluation ? evaluation.heat.coldLight.exhaustW + evaluation.heat.coldLight.latentW : 0;
  const chosenGroup = model.lamps.find(({ lamp }) => isSelected(selection, 'lamp', lamp.id))?.group;
  return (
    <g>
      <defs>
        <pattern id={hatchId} width="5" height="5" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
          <rect width="1" height="5" fill="var(--hatch)" />
        </pattern>
      </defs>
      <FieldPart
        field={field}
        labels={labels}
        tent={tent}
        clipId={clipId}
        labelPx={labelPx}
        {...(pale ? { pale } : {})}
      />
      <TentShell model={model} />
      <WaterPart model={model} />
      <UprightsPart uprights={model.uprights} floorPx={frame.floorPx} />
      {model.tiers.map((tier) => {
        const verdict = verdicts.get(tier.tier.id);
        return (
          <TierPart
            key={tier.tier.id}
            model={tier}
            section={model}
            hatchId={hatchId}
            selected={isSelected(selection, 'tier', tier.tier.id)}
            hours={verdict?.hours ?? 0}
            band={
              verdict && verdict.low !== null && verdict.high !== null ? { low: verdict.low, high: verdict.high } : null
            }
            before={stripsBefore?.get(tier.tier.id) ?? null}
          />
        );
      })}
      {model.lamps.map((lamp) => (
        <LampPart
          key={lamp.lamp.id}
          model={lamp}
          uprights={model.uprights}
          selected={isSelected(selection, 'lamp', lamp.lamp.id) || (chosenGroup === lamp.group && edit.held)}
        />
      ))}
      <HeaterPart model={model} watts={heaterW} selected={isSelected(selection, 'heater')} />
      <FanPart model={model} watts={outW} selected={isSelected(selection, 'fan')} />
      {chosenGroup && !edit.held && <HeightOfChosen context={context} />}
      {impossible && <ImpossibleLamp context={context} />}
      <HeldLamp context={context} drag={drag} />
      <HandleLayer
        model={model}
        doc={doc}
        edit={edit}
        drag={drag}
        selection={selection}
        select={select}
        openFields={openFields}
        words={{
          lampName: words.lamp,
          lampValue: (lamp) => words.lampValue(lamp, verdicts.get(lamp.group.tier?.id ?? '')),
          tierName: (tier) => words.tier(tier.tier.id),
          tierValue: (tier) => words.tierValue(tier, verdicts.get(tier.tier.id)),
        }}
      />
    </g>
  );
}

const shrink = (box: KeepOut): KeepOut => ({ x0: box.x0 + 4, y0: box.y0 + 4, x1: box.x1 - 4, y1: box.y1 - 4 });

function keepOuts({ tiers, lamps, reservoir, uprights, frame }: SectionContext['model']): KeepOut[] {
  return [
    ...tiers.map(({ shelf, leafY, strip }) => ({
      x0: shelf.x0 - 4,
      x1: shelf.x1 + 4,
      y0: leafY - 6,
      y1: strip ? strip.cells.y1 + 3 : shelf.y1,
    })),
    ...lamps.map(({ outline }) => ({
      x0: outline.leftPx - 8,
      x1: outline.rightPx + 8,
      y0: outline.topPx - 8,
      y1: outline.bottomPx + 10,
    })),
    ...lamps.map(({ outline }) => ({
      x0: outline.facePx[0] - 10,
      x1: outline.facePx[0] + 54,
      y0: outline.facePx[1] + 24,
      y1: outline.facePx[1] + 74,
    })),
    ...(reservoir ? [{ ...reservoir.box, y0: reservoir.box.y0 - 14 }] : []),
    ...(uprights
      ? [
          { x0: uprights.leftPx - 16, x1: uprights.leftPx + 2, y0: uprights.topPx, y1: frame.floorPx },
          { x0: uprights.rightPx - 2, x1: uprights.rightPx + 22, y0: uprights.topPx, y1: frame.floorPx },
        ]
      : []),
  ];
}

/** A dimension line from the chosen lamp's face down to the leaves of its tier. */
function HeightOfChosen({ context }: { context: SectionContext }) {
  const { model, selection, words } = context;
  const chosen = model.lamps.find(({ lamp }) => isSelected(selection, 'lamp', lamp.id));
  if (!chosen) return null;
  const { frame } = model;
  const [x, y] = chosen.outline.facePx;
  const leafM = chosen.group.tier ? leafHeightM(chosen.group.tier) : 0;
  const end = frame.floorPx - leafM * frame.pxPerM;
  if (end - y < 24) return null;
  const text = words.say(chosen.group.aboveLeavesM, 'length');
  const middle = y + Math.min((end - y) / 2, 60);
  return (
    <g aria-hidden="true">
      <path d={`M${px(x)} ${px(y)}V${px(end)}`} stroke="var(--lamp)" strokeWidth={1.1} strokeDasharray="2 2" />
      <path d={`M${px(x - 3.5)} ${px(end + 3.5)}l7 -7`} stroke="var(--lamp)" strokeWidth={1.1} />
      <text
        x={px(x + 7)}
        y={px(middle + 4)}
        fontSize={12}
        fontWeight={600}
        fill="var(--ink)"
        stroke="var(--paper)"
        strokeOpacity={0.75}
        strokeWidth={4}
        paintOrder="stroke"
      >
        {text}
      </text>
    </g>
  );
}

function ImpossibleLamp({ context }: { context: SectionContext }) {
  const { model, impossible, words, doc } = context;
  const lamp = model.lamps.find((each) => each.lamp.id === impossible?.lampId);
  if (!lamp || !impossible) return null;
  const tier = servedTier(lamp.lamp, doc.tiers);
  const z = (tier ? leafHeightM(tier) : 0) + impossible.aboveLeavesM;
  const [x, y] = lamp.lamp.positionM;
  const shown = Math.min(Math.max(z, 0), doc.tent.heightM);
  const outline = lampOutline({ ...lamp.lamp, positionM: [x, y, shown] }, lamp.group.fixture, model.frame);
  const text = `${words.say(impossible.aboveLeavesM, 'length')} lands here`;
  return (
    <g>
      <LampGhost outline={outline} tone="impossible" />
      <path
        d={`M${px(outline.holdPx[0])} ${px(outline.holdPx[1])}l26 -26h14`}
        fill="none"
        stroke="var(--ember)"
        strokeWidth={1}
      />
      <Slip x={outline.holdPx[0] + 40} y={outline.holdPx[1] - 38} text={text} tone="ember" />
    </g>
  );
}

function HeldLamp({ context, drag }: { context: SectionContext; drag: Drag }) {
  const { model, words } = context;
  const held = drag.held?.what === 'lamp' ? drag.held : null;
  const lamp = held && model.lamps.find((each) => each.lamp.id === held.id);
  const ids = lamp ? lamp.group.lamps.map((each) => each.id) : [];
  const tier = lamp?.group.tier ?? null;
  const rail = useRail(drag.before, held?.id ?? null, ids, tier?.id ?? null);
  if (!held || !lamp || !drag.before || held.axis === null) return null;
  const before = drag.before;
  const leafM = tier ? leafHeightM(tier) : 0;
  const ghosts = before.placements
    .filter((each) => ids.includes(each.id))
    .map((each) => lampOutline(each, lamp.group.fixture, model.frame));
  if (held.axis === 'across')
    return (
      <g>
        {ghosts.map((ghost, i) => (
          <LampGhost key={i} outline={ghost} tone="was" />
        ))}
        <Slip
          x={lamp.outline.holdPx[0] + 16}
          y={lamp.outline.topPx - 34}
          text={`${words.say(lamp.lamp.positionM[model.frame.view === 'front' ? 0 : 1], 'length')} from the ${model.frame.view === 'front' ? 'left' : 'front'}`}
        />
      </g>
    );
  const lift = (metres: number) => metres + leafM;
  return (
    <HeldPart
      frame={model.frame}
      ghosts={ghosts}
      lead={lamp.outline}
      railM={rail ? { lowM: lift(rail.lowM), highM: lift(rail.highM) } : { lowM: leafM, highM: lamp.lamp.positionM[2] }}
      insideM={rail?.insideM ? { fromM: lift(rail.insideM.fromM), toM: lift(rail.insideM.toM) } : null}
      tag={words.say(lamp.group.aboveLeavesM, 'length')}
      insideWords={rail?.insideM ? `enough from ${words.say(rail.insideM.toM, 'length')} down` : null}
    />
  );
}

/** The strips' means as they were, for the dashed line of a held lamp. */
export function stripMeans(
  context: SectionContext,
  tiers: readonly { id: string; grid: { nx: number; ny: number; ppfdUmolM2S: number[] } }[],
) {
  return new Map(tiers.map((tier) => [tier.id, stripProfile(tier.grid, context.model.frame.view).mean]));
}
