import type { CropFigure, CropStage, ResolvedTarget, TargetFigures, TargetRef } from './crop.schema';

const first = (stage: CropStage, quantity: string): CropFigure | undefined => stage.figures[quantity]?.[0];

/** Middle of a band whose aim no source gives. */
const aim = ({ low, target, high }: CropFigure): number | null =>
  target ?? (low !== null && high !== null ? (low + high) / 2 : (low ?? high));

type FigureKey = keyof TargetFigures;

/** Which quantity of the reference each figure of a target is read from, and how. */
const READINGS: readonly [FigureKey, string, (figure: CropFigure) => number | null][] = [
  ['dliLowMolM2D', 'dli', ({ low }) => low],
  ['dliTargetMolM2D', 'dli', aim],
  ['dliHighMolM2D', 'dli', ({ high }) => high],
  ['photoperiodMinH', 'photoperiod', ({ low }) => low],
  ['photoperiodMaxH', 'photoperiod', ({ high }) => high],
  ['dayTempC', 't_day', aim],
  ['nightTempC', 't_night', aim],
  ['vpdLowKpa', 'vpd_air', ({ low }) => low],
  ['vpdHighKpa', 'vpd_air', ({ high }) => high],
];

function readingsOf(stage: CropStage): [FigureKey, number, CropFigure][] {
  return READINGS.flatMap(([key, quantity, read]): [FigureKey, number, CropFigure][] => {
    const figure = first(stage, quantity);
    const value = figure ? read(figure) : null;
    return figure && value !== null ? [[key, value, figure]] : [];
  });
}

/** A crop's suggested figures as a target; null where no source gives any daily light for the stage. */
export function figuresOf(stage: CropStage): TargetFigures | null {
  const figures: Partial<TargetFigures> = Object.fromEntries(readingsOf(stage).map(([key, value]) => [key, value]));
  const { dliTargetMolM2D } = figures;
  return dliTargetMolM2D === undefined ? null : { ...figures, dliTargetMolM2D };
}

export interface OwnTarget extends TargetRef {
  figures: TargetFigures;
}

/** The garden's own target for a crop and stage wins over the reference. */
export function resolveTarget(
  ref: TargetRef,
  own: readonly OwnTarget[],
  reference: readonly CropStage[],
): ResolvedTarget | null {
  const ours = own.find((each) => each.crop === ref.crop && each.stage === ref.stage);
  const plain = { crop: ref.crop, stage: ref.stage };
  if (ours) {
    const own = { standing: 'own', source: 'Set in this garden' } as const;
    const known = Object.fromEntries(Object.keys(ours.figures).map((key) => [key, own]));
    return { ...plain, target: { ...ours.figures, ...plain }, ...own, known };
  }
  const stage = reference.find((each) => each.crop === ref.crop && each.stage === ref.stage);
  const figures = stage && figuresOf(stage);
  if (!stage || !figures) return null;
  const known = Object.fromEntries(
    readingsOf(stage).map(([key, , { standing, source }]) => [key, { standing, source }]),
  ) as ResolvedTarget['known'];
  return { ...plain, target: { ...figures, ...plain }, ...known.dliTargetMolM2D!, known };
}
