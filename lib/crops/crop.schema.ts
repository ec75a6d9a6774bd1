import type { z } from 'zod';
import type { Standing, Target } from '@/lib/evaluation/evaluate-scenario';
import type { targetFiguresSchema } from '@/lib/evaluation/scenario-fields';

export type TargetFigures = z.infer<typeof targetFiguresSchema>;

/** One figure of one source. */
export interface CropFigure {
  low: number | null;
  target: number | null;
  high: number | null;
  unit: string;
  sourceKey: string;
  source: string;
  standing: Standing;
}

/** What a crop wants in a stage; each quantity's first figure is the suggested one, the others say otherwise. */
export interface CropStage {
  crop: string;
  botanicalName: string;
  stage: string;
  /** Words on how it answers to day length. */
  response: string | null;
  figures: Record<string, CropFigure[]>;
}

/** What a tier is to have, and how it is known. */
export interface ResolvedTarget {
  crop: string;
  stage: string;
  target: Target;
  /** Of the daily light, the figure that the verdict hangs on. */
  standing: Standing | 'own';
  source: string;
  /** Of each figure by itself: they seldom come from one work. */
  known: Partial<Record<keyof TargetFigures, { standing: Standing | 'own'; source: string }>>;
}

export interface TargetRef {
  crop: string;
  stage: string;
}

export const targetKey = ({ crop, stage }: TargetRef): string => `${crop} · ${stage}`;
