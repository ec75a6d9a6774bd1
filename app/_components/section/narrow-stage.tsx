'use client';

/** The section on a tablet or a phone: the tent first, its things keyed by letters to ruled rows, the bill at the foot. */
import { useId, useMemo, useRef, type ReactNode } from 'react';
import { ExplainSheet } from '../explain';
import { CautionSign } from '../caution-note';
import { CautionsList } from './cautions-list';
import { DimensionPart } from './dimension-part';
import { HeaterWords } from './heat-notes';
import { Inspector } from './inspector';
import { KeyLetters, keyLetters, type KeyLetter } from './key-letters';
import { isSelected } from './plan-edit';
import { fanNote, TierNote, waterNote } from './plant-notes';
import { RoomLines, SLAB_PX } from './room-lines';
import { AddWords, AirNote, CircuitWords } from './room-notes';
import { BillWords, billOf, LedgerKey, LedgerWords } from './section-foot';
import type { SectionContext } from './section-context';
import { sectionFrame, sectionPxPerM } from './section-frame';
import { SectionPicture } from './section-picture';
import type { StageProps } from './section-stage';
import { StepperRow } from './stepper-row';
import { useOpenFields } from './use-open-fields';
import { useSection } from './use-section';
import { ViewChoice } from './view-choice';
import { MONTHS } from './month-names';

interface NarrowStageProps extends StageProps {
  widthPx: number;
  view: 'front' | 'side';
  left?: ReactNode;
}

export function NarrowStage(props: NarrowStageProps) {
  const { widthPx, view, chooseView, input, state, left, footEnd, explaining } = props;
  const root = useRef<HTMLDivElement>(null);
  const openFields = useOpenFields(root);
  const hatchId = `${useId()}room`;
  const tablet = widthPx >= 700;
  const paperPx = tablet ? Math.round(widthPx * 0.56) : widthPx;
  const { widthM, depthM, heightM } = input.doc.tent;
  const room = { maxWidthPx: paperPx - (tablet ? 168 : 110), maxHeightPx: tablet ? 533 : 421 };
  const floorPx = Math.round(SLAB_PX + (tablet ? 56 : 28) + heightM * sectionPxPerM({ widthM, depthM, heightM }, room));
  const { maxWidthPx, maxHeightPx } = room;
  const frame = useMemo(
    () => sectionFrame({ widthM, depthM, heightM }, view, { maxWidthPx, maxHeightPx, centrePx: paperPx / 2, floorPx }),
    [widthM, depthM, heightM, view, maxWidthPx, maxHeightPx, paperPx, floorPx],
  );
  const { context, drag } = useSection(input, state, frame);
  const letters = keyLetters(context);
  const empty = context.doc.placements.length === 0 && !context.selection;
  const picture = (
    <div className="relative" style={{ width: paperPx }}>
      <svg
        width={paperPx}
        height={floorPx + SLAB_PX}
        role="group"
        aria-label={`${context.doc.name}, cut open, ${view}`}
        className="block select-none"
      >
        <RoomLines widthPx={paperPx} floorPx={floorPx} hatchId={hatchId} walls={false} />
        {tablet && (
          <DimensionPart
            widthOnly
            model={context.model}
            text={(metres) => context.words.say(metres, 'length')}
            widthNote={context.words.say(frame.acrossM, 'length')}
          />
        )}
        <SectionPicture
          context={context}
          drag={drag}
          openFields={openFields}
          stripsBefore={props.stripsBefore(context)}
          labelPx={12}
          pale={context.doc.placements.length === 0 && context.doc.tiers.length === 0}
        />
        <KeyLetters letters={letters} paperPx={paperPx} />
      </svg>
    </div>
  );
  const inspected = (
    <>
      {context.slots.clash}
      <StepperRow context={context} />
      {tablet && state.selection && !context.slots.clash && (
        <div className="border-b border-line py-3">
          <Inspector context={context} />
        </div>
      )}
    </>
  );
  const rows = (
    <div className="flex flex-col">
      {left}
      {empty && props.firstVisit?.(context)}
      {!tablet && inspected}
      <Rows context={context} letters={letters} inspect={!tablet} />
      <div className="border-b border-line py-3">
        <AirNote context={context} />
      </div>
      <div className="border-b border-line py-3">
        <AddWords context={context} />
      </div>
    </div>
  );
  const bill = (
    <div className="flex flex-col gap-4 py-4">
      <BillWords context={context} />
      <div>
        <LedgerWords context={context} widthPx={Math.min(360, (tablet ? paperPx - 24 : widthPx) - 32)} heightPx={110} />
        <LedgerKey context={context} row />
      </div>
    </div>
  );
  const safety = (
    <div id="cautions" className="flex flex-col gap-3 py-4">
      <CircuitWords context={context} left />
      {footEnd ?? <CautionsList context={context} most={6} />}
    </div>
  );
  return (
    <div ref={root}>
      <div
        className={tablet ? 'grid gap-6 pr-6' : ''}
        style={tablet ? { gridTemplateColumns: `${paperPx}px minmax(0, 1fr)` } : undefined}
      >
        <div>
          {picture}
          {tablet && (
            <div className="pl-6">
              {inspected}
              {bill}
            </div>
          )}
        </div>
        <div className={tablet ? 'pt-3' : 'px-4 pt-2'}>
          <ViewChoice view={view} choose={chooseView} quiet />
          {explaining ? <ExplainSheet /> : rows}
          {!tablet && bill}
          {safety}
        </div>
      </div>
      {!tablet && <TotalsBar context={context} />}
    </div>
  );
}

function Letter({ letters, id, selected }: { letters: readonly KeyLetter[]; id: string; selected: boolean }) {
  const letter = letters.find((each) => each.id === id)?.letter;
  if (!letter) return <span className="w-[22px] flex-none" />;
  return (
    <span
      aria-hidden="true"
      className={`grid h-[22px] w-[22px] flex-none place-items-center rounded-full border text-12 font-semibold ${selected ? 'border-chip bg-chip text-on-chip' : 'border-ink'}`}
    >
      {letter}
    </span>
  );
}

/** A row for each thing: the tier that most wants a person first. */
function Rows({
  context,
  letters,
  inspect,
}: {
  context: SectionContext;
  letters: readonly KeyLetter[];
  inspect: boolean;
}) {
  const { model, worst, selection, select, words } = context;
  const tiers = [...model.tiers].sort((a, b) => Number(b.tier.id === worst) - Number(a.tier.id === worst));
  const row = (id: string, selected: boolean, node: ReactNode, open: boolean) => (
    <li key={id} className="flex gap-2.5 border-b border-line py-2.5">
      <Letter letters={letters} id={id} selected={selected} />
      <div className="min-w-0 flex-1">
        {node}
        {open && inspect && (
          <div className="mt-2">
            <Inspector context={context} />
          </div>
        )}
      </div>
    </li>
  );
  const fan = fanNote(context)[0];
  const water = waterNote(context)[0];
  const { heater } = context.doc.climate;
  // What is chosen without a row of its own: the air, the tent, a thing that is not there yet.
  const free =
    selection !== null &&
    (selection.kind === 'climate' ||
      selection.kind === 'tent' ||
      (selection.kind === 'heater' && !heater) ||
      (selection.kind === 'fan' && !fan) ||
      (selection.kind === 'water' && !water));
  return (
    <ul>
      {tiers.map((tier) => {
        const chosen = isSelected(selection, 'tier', tier.tier.id);
        const verdict = context.verdicts.get(tier.tier.id);
        return row(
          `tier-${tier.tier.id}`,
          chosen,
          <TierNote context={context} tier={tier} verdict={verdict} compact />,
          chosen,
        );
      })}
      {model.groups.map((group) => {
        const chosen = selection?.kind === 'lamp' && group.lamps.some((lamp) => lamp.id === selection.id);
        return row(
          `lamp-${group.id}`,
          chosen,
          chosen && inspect ? null : (
            <button
              type="button"
              className="min-h-6 cursor-pointer text-left"
              onClick={() => select({ kind: 'lamp', id: group.lamps[0]!.id })}
            >
              <span className="font-semibold">{words.group(group)}</span>
              <span className="block text-12 text-ink-soft">{words.groupFacts(group)}</span>
            </button>
          ),
          chosen,
        );
      })}
      {context.doc.climate.heater &&
        row(
          'heater',
          isSelected(selection, 'heater'),
          isSelected(selection, 'heater') && inspect ? null : <HeaterWords context={context} />,
          isSelected(selection, 'heater'),
        )}
      {fan && row('fan', isSelected(selection, 'fan'), fan.node, isSelected(selection, 'fan'))}
      {water && row('water', isSelected(selection, 'water'), water.node, isSelected(selection, 'water'))}
      {free && inspect && row('free', true, null, true)}
    </ul>
  );
}

function TotalsBar({ context }: { context: SectionContext }) {
  const bill = billOf(context);
  const cautions = context.evaluation?.cautions.length ?? 0;
  const bar =
    'sticky bottom-0 z-10 flex min-h-[58px] items-center justify-between border-t-[1.5px] border-ink bg-sheet px-4 py-1.5';
  if (!bill) return <p className={`${bar} text-14 text-ink-soft`}>Being reckoned</p>;
  return (
    <div className={bar}>
      <p className="text-14 text-ink-soft">
        <span className="text-22 font-semibold text-ink">{bill.kwh.toFixed(0)}</span> kWh in {MONTHS[bill.month - 1]}
      </p>
      <a href="#cautions" className="flex min-h-11 items-center gap-2 text-14 font-semibold">
        {cautions > 0 && <CautionSign />}
        {cautions === 0 ? 'No cautions' : cautions === 1 ? '1 caution' : `${cautions} cautions`}
      </a>
    </div>
  );
}
