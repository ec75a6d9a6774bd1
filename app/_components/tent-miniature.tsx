import { createLightCache, verticalSlice, type ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import { lampOutline } from './section/lamp-outline';
import { paintField, type PaintedField } from './section/field-contours';
import { plantHabit, plantPaths } from './section/plants';
import { points, px, type SectionFrame } from './section/section-frame';
import { sectionModel, type SectionModel } from './section/section-model';

const CELL_M = 0.05;

interface TentMiniatureProps {
  doc: ScenarioDocument;
  pxPerM: number;
  /** The tent's left wall and its floor, in the drawing it stands in. */
  leftPx: number;
  floorPx: number;
  /** Before the timers come on: no light, plants and lamps only. */
  dark?: boolean;
  /** A heater beside it, as far off as a label asks where nothing is known. */
  heater?: boolean;
}

function fieldOf(doc: ScenarioDocument, frame: SectionFrame): PaintedField | null {
  const request = {
    cut: 'front' as const,
    atM: doc.tent.depthM / 2,
    nx: Math.max(8, Math.round(doc.tent.widthM / CELL_M)),
    nz: Math.max(8, Math.round(doc.tent.heightM / CELL_M)),
  };
  try {
    return paintField(verticalSlice(doc, request, createLightCache()), frame);
  } catch {
    // A plan that the physics refuses is drawn without light; its page says why.
    return null;
  }
}

/** A tent cut open at a small scale: its computed light in tints without lines, plants without veins. */
export function TentMiniature({ doc, pxPerM, leftPx, floorPx, dark, heater }: TentMiniatureProps) {
  const frame: SectionFrame = {
    view: 'front',
    pxPerM,
    acrossM: doc.tent.widthM,
    heightM: doc.tent.heightM,
    leftPx,
    floorPx,
  };
  const model = sectionModel({ doc, evaluation: null, frame, parted: new Set() });
  const field = dark ? null : fieldOf(doc, frame);
  const { tent } = model;
  const box = { x: px(tent.x0), y: px(tent.y0), width: px(tent.x1 - tent.x0), height: px(tent.y1 - tent.y0) };
  const clip = `mini${Math.round(leftPx)}x${Math.round(floorPx)}${Math.round(box.width)}`;
  return (
    <g aria-hidden="true">
      <clipPath id={clip}>
        <rect {...box} />
      </clipPath>
      <rect {...box} fill="var(--ramp-0)" />
      <g clipPath={`url(#${clip})`}>
        {field?.tints.map(({ tint, d }) => (
          <path key={tint} d={d} fill={`var(--ramp-${tint})`} fillRule="evenodd" />
        ))}
      </g>
      <Reservoir model={model} />
      {model.tiers.map(({ tier, shelf, leafY, sitesAcross }) => (
        <MiniTier
          key={tier.id}
          shelf={{ ...shelf, y1: Math.max(shelf.y1, shelf.y0 + 2.5) }}
          plants={plantPaths({
            habit: plantHabit(tier.target?.crop, tier.target?.stage),
            count: sitesAcross,
            x0: shelf.x0,
            x1: shelf.x1,
            shelfY: shelf.y0,
            leafY: Math.min(leafY, shelf.y0 - 6),
          })}
          planted={tier.target !== null && tier.target !== undefined}
        />
      ))}
      {model.lamps.map(({ lamp, group }) => (
        <MiniLamp
          key={lamp.id}
          outline={lampOutline(lamp, group.fixture, frame)}
          lit={!dark && (lamp.dimFrac ?? 1) > 0}
        />
      ))}
      <path
        d={`M${px(tent.x0)} ${px(tent.y1)}V${px(tent.y0)}H${px(tent.x1)}V${px(tent.y1)}`}
        fill="none"
        stroke="var(--ink)"
        strokeWidth={2}
      />
      {heater && doc.climate.heater && !doc.climate.heater.placeM && <MiniHeater x={tent.x0 - 20} floorPx={floorPx} />}
    </g>
  );
}

function Reservoir({ model }: { model: SectionModel }) {
  if (!model.reservoir) return null;
  const { box, waterY } = model.reservoir;
  const width = px(box.x1 - box.x0);
  return (
    <>
      <rect x={px(box.x0)} y={px(waterY)} width={width} height={px(model.frame.floorPx - waterY)} fill="var(--water)" />
      <path
        d={`M${px(box.x0)} ${px(box.y0)}V${px(model.frame.floorPx)}H${px(box.x1)}V${px(box.y0)}`}
        fill="none"
        stroke="var(--ink)"
        strokeWidth={1.2}
      />
    </>
  );
}

interface MiniTierProps {
  shelf: { x0: number; x1: number; y0: number; y1: number };
  plants: ReturnType<typeof plantPaths>;
  planted: boolean;
}

function MiniTier({ shelf, plants, planted }: MiniTierProps) {
  return (
    <>
      {planted && (
        <g stroke="var(--moss)" strokeWidth={0.7}>
          <path d={plants.stems} fill="none" />
          <path d={plants.back} fill="var(--leaf-back)" />
          <path d={plants.front} fill="var(--leaf)" />
        </g>
      )}
      <rect
        x={px(shelf.x0)}
        y={px(shelf.y0)}
        width={px(shelf.x1 - shelf.x0)}
        height={px(shelf.y1 - shelf.y0)}
        fill="var(--sheet)"
        stroke="var(--ink)"
      />
    </>
  );
}

/** At this scale a lamp is a mark: at least 3.6 px thick. */
function MiniLamp({ outline, lit }: { outline: ReturnType<typeof lampOutline>; lit: boolean }) {
  const fill = lit ? 'var(--ramp-22)' : 'var(--sheet)';
  const thick = outline.bottomPx - outline.topPx;
  if (outline.housing.length < 3 || thick < 3.6) {
    const width = Math.max(7, outline.rightPx - outline.leftPx);
    const x = (outline.leftPx + outline.rightPx) / 2 - width / 2;
    return (
      <rect x={px(x)} y={px(outline.bottomPx - 3.6)} width={px(width)} height={3.6} fill={fill} stroke="var(--ink)" />
    );
  }
  return <polygon points={points(outline.housing)} fill={fill} stroke="var(--ink)" />;
}

function MiniHeater({ x, floorPx }: { x: number; floorPx: number }) {
  return (
    <>
      <rect x={px(x)} y={px(floorPx - 14)} width={13} height={13} fill="var(--sheet)" stroke="var(--ink)" />
      <path
        d={`M${px(x + 4)} ${px(floorPx - 11)}v7M${px(x + 6.5)} ${px(floorPx - 11)}v7M${px(x + 9)} ${px(floorPx - 11)}v7`}
        stroke="var(--ember)"
        strokeWidth={1.25}
      />
    </>
  );
}
