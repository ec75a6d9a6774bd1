'use client';

/** The drawing itself, without its sentences: one group of SVG that every layout sets into its own paper. */
import { useId, useMemo } from 'react';
import { FanPart, HeaterPart, UprightsPart, WaterPart } from './device-parts';
import { HeightOfChosen, HeldLamp, ImpossibleLamp, TheirLamps } from './chosen-parts';
import { ExamplePart, exampleDocument } from './example-part';
import { FieldPart } from './field-part';
import { HandleLayer } from './handle-layer';
import { labelIsolines, type KeepOut } from './isoline-labels';
import { LampPart } from './lamp-part';
import { isSelected } from './plan-edit';
import type { SectionContext } from './section-context';
import { DAYS_IN_MONTH } from '@/lib/scenarios/coldest-month';
import { TentShell } from './tent-shell';
import { TierPart } from './tier-part';
import type { Drag } from './use-drag';
import { useField } from './use-field';

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
  const example = useMemo(() => (pale ? exampleDocument(doc) : null), [pale, doc]);
  const field = useField(example ?? doc, frame, edit.held);
  const labels = useMemo(
    () => (field && !pale ? labelIsolines(field.lines, { inside: shrink(tent), keepOut: keepOuts(model) }) : []),
    [field, pale, tent, model],
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
      {example && <ExamplePart doc={example} frame={frame} />}
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
      {context.slots.theirs && <TheirLamps context={context} theirs={context.slots.theirs} />}
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
