/** The tent cut open, in pixels: everything that the drawing, its handles and its sentences point at. */
import type { Evaluation, ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import { leafHeightM, tierBottomM } from '@/lib/scenarios/lamp-pose';
import { lampGroups, type LampGroup } from './lamp-groups';
import { hangsFromM, lampOutline, type LampOutline } from './lamp-outline';
import {
  stripForm,
  STRIP_HEIGHTS,
  stripProfile,
  stripTopPpfd,
  type StripBox,
  type StripForm,
  type StripProfile,
} from './light-strip';
import { plantHabit, type PlantHabit } from './plants';
import { rightPx, xPx, yPx, type SectionFrame } from './section-frame';

type Tier = ScenarioDocument['tiers'][number];
type Placement = ScenarioDocument['placements'][number];

export interface Box {
  x0: number;
  y0: number;
  x1: number;
  y1: number;
}

export interface TierModel {
  tier: Tier;
  shelf: Box;
  leafY: number;
  habit: PlantHabit;
  sitesAcross: number;
  strip: { form: StripForm; curve: StripBox; cells: Box; profile: StripProfile } | null;
}

export interface LampModel {
  lamp: Placement;
  group: LampGroup;
  outline: LampOutline;
  hangerPx: number;
}

export interface SectionModel {
  frame: SectionFrame;
  tent: Box;
  tiers: TierModel[];
  lamps: LampModel[];
  groups: LampGroup[];
  /** Inner edges of the rack's two uprights, and their top. */
  uprights: { leftPx: number; rightPx: number; topPx: number; widthPx: number } | null;
  reservoir: { box: Box; waterY: number; pump: Box | null } | null;
  pipe: { x: number; fromY: number; toYs: number[] } | null;
  heater: { box: Box; portY: number; inside: boolean } | null;
  fan: { x: number; y: number; r: number } | null;
  stripTopPpfd: number;
}

export interface SectionModelOptions {
  doc: ScenarioDocument;
  evaluation: Evaluation | null;
  frame: SectionFrame;
  parted: ReadonlySet<string>;
}

const HEATER_PX = { width: 46, height: 68 };
/** The reservoir is drawn as wide as a common tote; its height follows its litres. */
const RESERVOIR_DEPTH_M = 0.38;

export function sectionModel({ doc, evaluation, frame, parted }: SectionModelOptions): SectionModel {
  const tent = { x0: frame.leftPx, y0: yPx(frame, frame.heightM), x1: rightPx(frame), y1: frame.floorPx };
  const groups = lampGroups(doc, parted);
  const lamps = groups
    .flatMap((group) => group.lamps.map((lamp) => ({ lamp, group })))
    .map(({ lamp, group }): LampModel => ({
      lamp,
      group,
      outline: lampOutline(lamp, group.fixture, frame),
      hangerPx: yPx(frame, hangsFromM(lamp, doc.tiers, frame.heightM)),
    }));
  const downward = [...doc.tiers].sort((a, b) => b.topHeightM - a.topHeightM);
  const profiles = new Map(
    (evaluation?.tiers ?? []).map((result) => [result.id, stripProfile(result.grid, frame.view)]),
  );
  const topPpfd = stripTopPpfd([...profiles.values()]);
  const tiers = downward.map((tier, i) =>
    tierModel({ tier, below: downward[i + 1], frame, profile: profiles.get(tier.id), topPpfd }),
  );
  const reservoir = reservoirModel(doc, frame);
  return {
    frame,
    tent,
    tiers,
    lamps,
    groups,
    uprights: uprightsModel(doc, frame, lamps),
    reservoir,
    pipe: pipeModel(tiers, reservoir, frame),
    heater: heaterModel(doc, frame),
    fan: fanModel(doc, frame),
    stripTopPpfd: topPpfd,
  };
}

const span = (tier: Tier, frame: SectionFrame): [number, number] =>
  frame.view === 'front' ? [tier.x0M, tier.x1M] : [tier.y0M, tier.y1M];

interface TierParts {
  tier: Tier;
  below: Tier | undefined;
  frame: SectionFrame;
  profile: StripProfile | undefined;
  topPpfd: number;
}

function tierModel({ tier, below, frame, profile, topPpfd }: TierParts): TierModel {
  const [from, to] = span(tier, frame);
  const bottomM = tierBottomM(tier);
  const shelf = { x0: xPx(frame, from), y0: yPx(frame, tier.topHeightM), x1: xPx(frame, to), y1: yPx(frame, bottomM) };
  if (shelf.y1 - shelf.y0 < 2) shelf.y1 = shelf.y0 + 2;
  const freeM = bottomM - (below ? leafHeightM(below) : 0);
  const form = stripForm(freeM, frame.pxPerM);
  const { curve, cells } = STRIP_HEIGHTS[form];
  const inset = form === 'bar' ? 0 : 8;
  const top = shelf.y1 + (form === 'bar' ? 3 : 4);
  const x0 = shelf.x0 + inset;
  const x1 = shelf.x1 - inset;
  return {
    tier,
    shelf,
    leafY: yPx(frame, leafHeightM(tier)),
    habit: plantHabit(tier.target?.crop, tier.target?.stage),
    sitesAcross: tier.sites ? (frame.view === 'front' ? tier.sites.columns : tier.sites.rows) : 5,
    strip: profile
      ? {
          form,
          profile,
          curve: { x0, x1, top, height: curve, topPpfd },
          cells: { x0, y0: top + curve, x1, y1: top + curve + cells },
        }
      : null,
  };
}

function uprightsModel(doc: ScenarioDocument, frame: SectionFrame, lamps: LampModel[]): SectionModel['uprights'] {
  if (doc.tiers.length === 0) return null;
  const spans = doc.tiers.map((tier) => span(tier, frame));
  const topM = Math.max(...doc.tiers.map((tier) => tier.topHeightM)) + 0.2;
  const clampsPx = lamps.filter(({ lamp }) => lamp.mount === 'clamped').map(({ outline }) => outline.topPx - 14);
  const roofPx = yPx(frame, frame.heightM) + 6;
  const widthPx = Math.max(3, Math.min(9, frame.pxPerM * 0.025));
  return {
    leftPx: Math.max(frame.leftPx + widthPx, xPx(frame, Math.min(...spans.map(([from]) => from)))),
    rightPx: Math.min(rightPx(frame) - widthPx, xPx(frame, Math.max(...spans.map(([, to]) => to)))),
    topPx: Math.max(roofPx, Math.min(yPx(frame, topM), ...clampsPx)),
    widthPx,
  };
}

function reservoirModel(doc: ScenarioDocument, frame: SectionFrame): SectionModel['reservoir'] {
  const litres = doc.water?.reservoirL ?? 0;
  if (litres <= 0) return null;
  const widthM = Math.min(0.56, frame.acrossM * 0.55);
  const lowest = Math.min(frame.heightM, ...doc.tiers.map((tier) => tierBottomM(tier)));
  const tallM = Math.min(litres / 1000 / (0.5 * RESERVOIR_DEPTH_M) + 0.03, Math.max(0.06, lowest - 0.2), 0.45);
  const middle = frame.acrossM / 2 + Math.min(0.06, frame.acrossM * 0.03);
  const box = {
    x0: xPx(frame, middle - widthM / 2),
    x1: xPx(frame, middle + widthM / 2),
    y0: yPx(frame, tallM),
    y1: frame.floorPx - 3,
  };
  const pumpPx = Math.min(30, (box.x1 - box.x0) * 0.2);
  const pumpX = box.x0 + (box.x1 - box.x0) * 0.68;
  const pumpTall = Math.min(22, (box.y1 - box.y0) * 0.4);
  const pump = doc.water?.pump ? { x0: pumpX, x1: pumpX + pumpPx, y0: box.y1 - pumpTall, y1: box.y1 } : null;
  return { box, waterY: box.y0 + (box.y1 - box.y0) * 0.26, pump };
}

function pipeModel(
  tiers: TierModel[],
  reservoir: SectionModel['reservoir'],
  frame: SectionFrame,
): SectionModel['pipe'] {
  if (!reservoir?.pump || tiers.length === 0) return null;
  const shelvesRight = Math.max(...tiers.map(({ shelf }) => shelf.x1));
  const x = Math.min(shelvesRight + Math.max(6, frame.pxPerM * 0.045), rightPx(frame) - 5);
  return {
    x,
    fromY: reservoir.box.y0 - 9,
    toYs: tiers.map(({ shelf }) => shelf.y0 - Math.min(12, frame.pxPerM * 0.03)),
  };
}

function heaterModel(doc: ScenarioDocument, frame: SectionFrame): SectionModel['heater'] {
  const heater = doc.climate.heater;
  if (!heater) return null;
  const scale = Math.min(1, frame.pxPerM / 300);
  const width = HEATER_PX.width * Math.max(0.75, scale);
  const height = HEATER_PX.height * Math.max(0.75, scale);
  const place = heater.placeM;
  const across = place ? (frame.view === 'front' ? place[0] : place[1]) : null;
  const portY = frame.floorPx - Math.min(44, frame.pxPerM * 0.13);
  if (place && across !== null) {
    const x = Math.min(Math.max(xPx(frame, across), frame.leftPx + width / 2 + 3), rightPx(frame) - width / 2 - 3);
    const y1 = Math.min(frame.floorPx, yPx(frame, place[2]) + height * 0.4);
    return { box: { x0: x - width / 2, x1: x + width / 2, y0: y1 - height, y1 }, portY, inside: true };
  }
  if (frame.view === 'side') return null;
  const x0 = Math.max(5, frame.leftPx - 76 * Math.max(0.72, scale));
  const box = { x0, x1: Math.min(x0 + width, frame.leftPx - 12), y0: frame.floorPx - height, y1: frame.floorPx };
  return { box, portY, inside: false };
}

function fanModel(doc: ScenarioDocument, frame: SectionFrame): SectionModel['fan'] {
  if (!doc.climate.exhaust) return null;
  const port = doc.tent.ports?.find((each) => each.kind === 'exhaust');
  const upM = port && port.wall !== 'ceiling' ? port.atM[1] : frame.heightM - 0.14;
  const r = Math.max(11, Math.min(17, frame.pxPerM * 0.05));
  const y = Math.min(Math.max(yPx(frame, upM), yPx(frame, frame.heightM) + r + 8), frame.floorPx - r - 8);
  if (frame.view === 'front') return { x: rightPx(frame) + r + 6, y, r };
  const across = port && (port.wall === 'xMin' || port.wall === 'xMax') ? port.atM[0] : frame.acrossM * 0.75;
  return { x: xPx(frame, across), y, r };
}
