import { describe, expect, it } from 'vitest';
import { targetKey } from '@/lib/crops/crop.schema';
import { figuresOf, resolveTarget } from '@/lib/crops/reference-target';
import { targetFiguresSchema } from '@/lib/evaluation/scenario-fields';
import { referenceData } from '@/lib/reference-data/reference-data';
import { targetInputSchema } from '@/lib/targets/target.schema';

const { crops } = referenceData();
const ref = { crop: 'Lettuce, butterhead/leaf', stage: 'production' };

describe('the crop reference', () => {
  it('holds 47 crops, each figure with a source and a standing', () => {
    expect(new Set(crops.map((stage) => stage.crop)).size).toBe(47);
    const figures = crops.flatMap((stage) => Object.values(stage.figures).flat());
    expect(figures.length).toBeGreaterThan(500);
    for (const figure of figures) {
      expect(figure.source.length).toBeGreaterThan(0);
      expect(['read', 'secondary', 'computed', 'judgement', 'recalled']).toContain(figure.standing);
    }
  });

  it('keeps sources that disagree side by side', () => {
    const disagreeing = crops.filter((stage) => Object.values(stage.figures).some((figures) => figures.length > 1));
    expect(disagreeing.length).toBeGreaterThan(0);
  });

  it('gives every crop that has light figures a target that a tier may have', () => {
    const lit = crops.filter((stage) => figuresOf(stage) !== null);
    expect(lit.length).toBeGreaterThan(40);
    for (const stage of lit) {
      const figures = figuresOf(stage)!;
      expect(targetFiguresSchema.safeParse(figures).error, targetKey(stage)).toBeUndefined();
      const sent = { crop: stage.crop, stage: stage.stage, figures };
      expect(targetInputSchema.safeParse(sent).error, targetKey(stage)).toBeUndefined();
    }
  });
});

describe('a target of a tier', () => {
  it("is the reference's, each figure with its own source and standing", () => {
    const target = resolveTarget(ref, [], crops)!;
    const stage = crops.find((each) => targetKey(each) === targetKey(ref))!;
    expect(target.target.dliTargetMolM2D).toBeGreaterThan(10);
    expect(target.known.dliTargetMolM2D).toEqual({
      standing: stage.figures['dli']![0]!.standing,
      source: stage.figures['dli']![0]!.source,
    });
    expect(Object.keys(target.known).sort()).toEqual(
      Object.keys(target.target)
        .filter((key) => key !== 'crop' && key !== 'stage')
        .sort(),
    );
  });

  it("is the garden's own where it has one, whole, and not mixed with the reference", () => {
    const own = [{ ...ref, figures: { dliTargetMolM2D: 9 } }];
    expect(resolveTarget(ref, own, crops)).toEqual({
      ...ref,
      target: { ...ref, dliTargetMolM2D: 9 },
      standing: 'own',
      source: 'Set in this garden',
      known: { dliTargetMolM2D: { standing: 'own', source: 'Set in this garden' } },
    });
    expect(resolveTarget({ ...ref, stage: 'seedling' }, own, crops)?.standing).not.toBe('own');
  });

  it('is none where no source gives any light, rather than one made up', () => {
    expect(resolveTarget({ crop: 'Moon cheese', stage: 'production' }, [], crops)).toBeNull();
    const dark = crops.find((stage) => !stage.figures['dli']);
    if (dark) expect(resolveTarget(dark, [], crops)).toBeNull();
  });

  it('is refused where the least is more than the aim or the most is less', () => {
    const problems = (figures: object) =>
      targetInputSchema.safeParse({ ...ref, figures }).error?.issues.map((issue) => issue.path.join('.'));
    expect(problems({ dliTargetMolM2D: 10, dliLowMolM2D: 11 })).toEqual(['figures.dliLowMolM2D']);
    expect(problems({ dliTargetMolM2D: 10, dliHighMolM2D: 9 })).toEqual(['figures.dliHighMolM2D']);
  });
});
