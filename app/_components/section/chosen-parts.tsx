'use client';

/** What the drawing adds for the lamp that is chosen, held, impossible, or somewhere else in another person's plan. */
import type { ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import { aboveLeavesM, leafHeightM, servedTier } from '@/lib/scenarios/lamp-pose';
import { HeldPart, Slip } from './held-part';
import { lampOutline } from './lamp-outline';
import { LampGhost } from './lamp-part';
import { isSelected } from './plan-edit';
import type { SectionContext } from './section-context';
import { px } from './section-frame';
import type { Drag } from './use-drag';
import { useRail } from './use-ways';

/** A dimension line from the chosen lamp's face down to the leaves of its tier. */
export function HeightOfChosen({ context }: { context: SectionContext }) {
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

export function ImpossibleLamp({ context }: { context: SectionContext }) {
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

export function HeldLamp({ context, drag }: { context: SectionContext; drag: Drag }) {
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

/** Lamps that hang elsewhere in the other person's plan: dashed, with a slip for each place. */
export function TheirLamps({ context, theirs }: { context: SectionContext; theirs: ScenarioDocument }) {
  const { model, words } = context;
  const moved = model.lamps.flatMap((mine) => {
    const other = theirs.placements.find((each) => each.id === mine.lamp.id);
    if (!other || other.positionM.every((value, i) => Math.abs(value - mine.lamp.positionM[i]!) < 1e-6)) return [];
    return [{ mine, other, outline: lampOutline(other, mine.group.fixture, model.frame) }];
  });
  const height = (lamp: ScenarioDocument['placements'][number], doc: ScenarioDocument) =>
    words.say(aboveLeavesM(lamp, servedTier(lamp, doc.tiers)), 'length');
  return (
    <g>
      {moved.map(({ mine, other, outline }, i) => (
        <g key={other.id}>
          <LampGhost outline={outline} tone="theirs" />
          {i === 0 && (
            <>
              <Slip
                x={outline.rightPx + 30}
                y={mine.outline.topPx - 14}
                text={`${height(mine.lamp, context.doc)} yours`}
              />
              <Slip
                x={outline.rightPx + 30}
                y={outline.topPx - 6}
                text={`${height(other, theirs)} theirs`}
                tone="slate"
              />
            </>
          )}
        </g>
      ))}
    </g>
  );
}
