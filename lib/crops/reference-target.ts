import type { CropFigure, CropStage, ResolvedTarget, TargetFigures, TargetRef } from './crop.schema';

const first = (stage: CropStage, quantity: string): CropFigure | undefined => stage.figures[quantity]?.[0];

/** Middle of a band whose aim no source gives. */
const aim = ({ low, target, high }: CropFigure): number | null =>
  target ?? (low !== null && high !== null ? (low + high) / 2 : (low ?? high));

/** A crop's suggested figures as a target; null where no source gives any daily light for the stage. */
export function figuresOf(stage: CropStage): TargetFigures | null {
  const dli = first(stage, 'dli');
  const wanted = dli && aim(dli);
  if (!dli || wanted === null || wanted === undefined) return null;
  const hours = first(stage, 'photoperiod');
  const day = first(stage, 't_day');
  const night = first(stage, 't_night');
  const vpd = first(stage, 'vpd_air');
  const given = <K extends keyof TargetFigures>(key: K, value: number | null | undefined) =>
    value === null || value === undefined ? {} : { [key]: value };
  return {
    dliTargetMolM2D: wanted,
    ...given('dliLowMolM2D', dli.low),
    ...given('dliHighMolM2D', dli.high),
    ...given('photoperiodMinH', hours?.low),
    ...given('photoperiodMaxH', hours?.high),
    ...given('dayTempC', day && aim(day)),
    ...given('nightTempC', night && aim(night)),
    ...given('vpdLowKpa', vpd?.low),
    ...given('vpdHighKpa', vpd?.high),
  };
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
  if (ours) return { ...ref, target: { ...ours.figures, ...ref }, standing: 'own', source: 'Set in this garden' };
  const stage = reference.find((each) => each.crop === ref.crop && each.stage === ref.stage);
  const figures = stage && figuresOf(stage);
  if (!stage || !figures) return null;
  const dli = first(stage, 'dli')!;
  return { ...ref, target: { ...figures, ...ref }, standing: dli.standing, source: dli.source };
}
