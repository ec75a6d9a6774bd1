'use client';

/** The section on a wide page: the tent in the middle, what burns at its left, what grows at its right, the bill below. */
import { useCallback, useEffect, useId, useMemo, useRef, useState, type ReactNode } from 'react';
import { ExplainSheet } from '../explain';
import { AnnotationColumn, columnsNeedPx, type NoteBlock } from './annotation-column';
import { CautionsList } from './cautions-list';
import { DimensionPart } from './dimension-part';
import { heaterNote, lampNotes, otherInspector } from './heat-notes';
import { Inspector } from './inspector';
import { LegendPart } from './legend-part';
import { fanNote, tierNotes, waterNote } from './plant-notes';
import { RoomLines, SLAB_PX } from './room-lines';
import { AddWords, AirNote, CircuitWords, DrawingKey } from './room-notes';
import { BillWords, LedgerKey, LedgerWords } from './section-foot';
import { sectionFrame, sectionPxPerM } from './section-frame';
import { SectionPicture } from './section-picture';
import type { StageProps } from './section-stage';
import { legendBrackets } from './section-words';
import { useBlockHeights } from './use-block-heights';
import { useOpenFields } from './use-open-fields';
import { useSection } from './use-section';
import { ViewChoice } from './view-choice';

const FLOOR_PX = 722;
const TENT = { maxWidthPx: 420, maxHeightPx: 620 };
const COLUMN_TOP_PX = 150;

interface WideStageProps extends StageProps {
  widthPx: number;
  view: 'front' | 'side';
  /** In place of the left column: the landing page's own words. */
  left?: ReactNode;
}

/** True from the moment something is pressed until it is let go. */
function usePressed() {
  const [pressed, setPressed] = useState(false);
  useEffect(() => {
    if (!pressed) return;
    // After the click that follows, so that what was pressed does not move away from under it.
    const letGo = () => setTimeout(() => setPressed(false));
    window.addEventListener('pointerup', letGo);
    window.addEventListener('pointercancel', letGo);
    return () => {
      window.removeEventListener('pointerup', letGo);
      window.removeEventListener('pointercancel', letGo);
    };
  }, [pressed]);
  return { pressed, press: useCallback(() => setPressed(true), []) };
}

export function WideStage(props: WideStageProps) {
  const { widthPx, view, chooseView, input, state, left, footEnd, explaining } = props;
  const root = useRef<HTMLDivElement>(null);
  const hatchId = `${useId()}room`;
  const heights = useBlockHeights(root);
  const openFields = useOpenFields(root);
  const { doc } = input;
  const centre = widthPx / 2;
  const leftX = Math.max(44, centre - 676);
  const leftWidth = centre - 290 - leftX;
  const rightX = centre + 264;
  const rightWidth = Math.min(412, widthPx - 44 - rightX);
  // A circuit's words need two lines in a narrow column.
  const circuitsPx = (input.evaluation?.circuits.length ?? 0) * (rightWidth < 390 ? 35 : 18);
  // A first frame at the usual floor tells what the columns need; a fuller column lowers the floor.
  const wantedFloorPx =
    FLOOR_PX + Math.max(0, Math.ceil(columnsNeedPx(heights) - (FLOOR_PX - COLUMN_TOP_PX - 20 - circuitsPx)));
  // While something is held the drawing stands still under the pointer, whatever the words beside it grow to.
  const { pressed, press } = usePressed();
  const held = pressed || input.edit.held;
  const [keptFloorPx, setKeptFloorPx] = useState(wantedFloorPx);
  if (!held && keptFloorPx !== wantedFloorPx) setKeptFloorPx(wantedFloorPx);
  const floorPx = held ? keptFloorPx : wantedFloorPx;
  const { widthM, depthM, heightM } = doc.tent;
  const frame = useMemo(
    () => sectionFrame({ widthM, depthM, heightM }, view, { ...TENT, centrePx: centre, floorPx }),
    [widthM, depthM, heightM, view, centre, floorPx],
  );
  const { context, drag } = useSection(input, state, frame);
  const { model, words } = context;
  const small = sectionPxPerM(doc.tent, TENT) < 200;
  const empty = doc.placements.length === 0;
  const leftBlocks: NoteBlock[] = left
    ? []
    : context.slots.clash
      ? [
          { id: 'clash', node: <Inspector context={context} />, estimatePx: 320, wantedTopPx: 200, toPx: null },
          ...heaterNote(context),
        ]
      : [...lampNotes(context, leftX), ...otherInspector(context), ...heaterNote(context)];
  // Seen from the door the fan's words are pinned to the fan: its arrow takes that place.
  const fan = fanNote(context);
  const pinned = view === 'front' && !explaining ? fan[0] : undefined;
  const rightBlocks = [...(pinned ? [] : fan), ...tierNotes(context), ...waterNote(context)];
  const rightTop = Math.max(COLUMN_TOP_PX, pinned ? pinned.wantedTopPx + pinned.estimatePx + 8 : 0);
  const width = `${words.say(frame.acrossM, 'length')}${view === 'side' ? ' deep' : ''}`;
  const over = Math.max(0, ...(input.evaluation?.tiers ?? []).map((tier) => tier.ppfdUmolM2S.max)) > 800;
  return (
    <div
      ref={root}
      onPointerDownCapture={press}
      className="relative overflow-x-clip"
      style={{ paddingTop: floorPx + SLAB_PX }}
    >
      <svg
        className="absolute inset-x-0 top-0 select-none"
        width={widthPx}
        height={floorPx + SLAB_PX}
        role="group"
        aria-label={`${doc.name}, cut open, ${view}`}
      >
        <RoomLines widthPx={widthPx} floorPx={floorPx} hatchId={hatchId} walls />
        <LegendPart
          x0={centre - 204}
          x1={centre + 204}
          y={51}
          brackets={legendBrackets(model, context.verdicts)}
          over={over}
        />
        <DimensionPart model={model} text={(metres) => words.say(metres, 'length')} widthNote={width} />
        <SectionPicture
          context={context}
          drag={drag}
          openFields={openFields}
          stripsBefore={props.stripsBefore(context)}
          pale={empty && doc.tiers.length === 0}
        />
        {view === 'side' && (
          <g fontSize={12} fill="var(--ink-soft)">
            <text x={frame.leftPx - 52} y={floorPx - 6} textAnchor="end">
              door
            </text>
            <text x={frame.leftPx + frame.acrossM * frame.pxPerM + 12} y={floorPx - 6}>
              back
            </text>
          </g>
        )}
      </svg>
      {left ? (
        <div className="absolute" style={{ left: leftX, width: leftWidth, top: 40, height: floorPx - 48 }}>
          {left}
        </div>
      ) : (
        <>
          <div className="absolute" style={{ left: leftX - 20, width: leftWidth + 20, top: 26 }}>
            <AirNote context={context} />
            <div className="mt-2 pl-5">
              <AddWords context={context} />
            </div>
          </div>
          {empty && !context.selection ? (
            <div className="absolute" style={{ left: leftX, width: leftWidth, top: 210 }}>
              {props.firstVisit?.(context)}
            </div>
          ) : (
            <AnnotationColumn
              blocks={leftBlocks}
              heights={heights}
              column={{
                side: 'left',
                xPx: leftX,
                widthPx: leftWidth,
                topPx: COLUMN_TOP_PX,
                bottomPx: floorPx - 12,
                bendPx: Math.min(frame.leftPx - 50, centre - 262),
              }}
            />
          )}
        </>
      )}
      <div className="absolute" style={{ left: rightX, width: rightWidth, top: 20 }}>
        <div className="flex justify-end">
          <ViewChoice view={view} choose={chooseView} />
        </div>
        <div className="pt-1 pr-2">
          <DrawingKey bar={small} />
        </div>
      </div>
      {pinned && (
        <div className="absolute" style={{ left: rightX + 40, width: rightWidth - 40, top: pinned.wantedTopPx }}>
          {pinned.node}
        </div>
      )}
      {explaining ? (
        <div
          className="absolute z-10 overflow-y-auto"
          style={{
            left: rightX - 16,
            width: rightWidth + 16,
            top: COLUMN_TOP_PX,
            maxHeight: floorPx - COLUMN_TOP_PX - 8,
          }}
        >
          <ExplainSheet />
        </div>
      ) : (
        <AnnotationColumn
          blocks={rightBlocks}
          heights={heights}
          column={{
            side: 'right',
            xPx: rightX,
            widthPx: rightWidth,
            topPx: rightTop,
            bottomPx: floorPx - 14 - circuitsPx,
            bendPx: rightX - 40,
          }}
        />
      )}
      <div className="absolute -translate-y-full" style={{ left: rightX, width: rightWidth, top: floorPx - 6 }}>
        <CircuitWords context={context} />
      </div>
      <div
        className="grid items-start gap-x-4 pt-3 pb-6"
        style={{
          paddingLeft: leftX - 12,
          gridTemplateColumns: `${centre - 204 - leftX - 4}px 408px 168px minmax(0, 1fr)`,
          paddingRight: 24,
        }}
      >
        <BillWords context={context} />
        <LedgerWords context={context} widthPx={408} heightPx={90} />
        <div className="pt-2">
          <LedgerKey context={context} />
        </div>
        <div>{footEnd ?? <CautionsList context={context} />}</div>
      </div>
    </div>
  );
}
