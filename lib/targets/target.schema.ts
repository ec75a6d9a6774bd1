import { z } from 'zod';
import { targetFiguresSchema } from '../evaluation/scenario-fields';
import { words } from '../evaluation/fields';
import { gardenParams, newIdField, versionField } from '../gardens/garden.schema';
import type { TargetFigures } from '../crops/crop.schema';

const figures = targetFiguresSchema.superRefine((target, context) => {
  const { dliLowMolM2D: low, dliTargetMolM2D: aim, dliHighMolM2D: high } = target;
  if (low !== undefined && low > aim)
    context.addIssue({ code: 'custom', path: ['dliLowMolM2D'], message: 'The least must not exceed the aim.' });
  if (high !== undefined && high < aim)
    context.addIssue({ code: 'custom', path: ['dliHighMolM2D'], message: 'The most must not be less than the aim.' });
});

export const targetParams = gardenParams.extend({ targetId: z.uuid() });
export const targetInputSchema = z.strictObject({
  targetId: newIdField,
  crop: words({ most: 120 }),
  stage: words({ most: 60 }),
  figures,
  note: z.string().max(500, 'At most 500 characters.').default(''),
});
export const targetChangeSchema = z.strictObject({
  version: versionField,
  figures: figures.optional(),
  note: z.string().max(500, 'At most 500 characters.').optional(),
});

export type TargetInput = z.input<typeof targetInputSchema>;
export type TargetChange = z.infer<typeof targetChangeSchema>;

export interface GardenTarget {
  targetId: string;
  crop: string;
  stage: string;
  figures: TargetFigures;
  note: string;
  version: number;
}
