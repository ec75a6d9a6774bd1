/** What every sentence and field of the section needs to know. */
import type { ReactNode } from 'react';
import type { Evaluation, ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';
import type { WayOut } from '@/lib/scenarios/ways-out';
import type { ToldMonth } from '@/lib/scenarios/coldest-month';
import type { SectionEdit, Selection } from './plan-edit';
import type { SectionModel } from './section-model';
import type { SectionWords } from './section-words';
import type { TierVerdict } from './tier-verdict';

type TentBody = ScenarioDocument['tent'];

/** What only a page with rows behind it can offer; the landing page leaves these out. */
export interface SectionSlots {
  /** Chooses crop and stage of a tier. */
  cropField?: ((tierId: string) => ReactNode) | undefined;
  /** Goes to the lamps of the garden. */
  fixturesLink?: ReactNode;
  setTent?: ((patch: Partial<TentBody>) => void) | undefined;
  /** Crop and stage of tiers whose light nobody knows. */
  cropNames?: Readonly<Record<string, string>> | undefined;
  circuitNames?: Readonly<Record<string, string>> | undefined;
  /** Every lamp that could be hung; left out: those of the document. */
  fixtures?: ScenarioDocument['fixtures'] | undefined;
  /** The document with somebody else's values, while a clash waits: drawn dashed beside ours. */
  theirs?: ScenarioDocument | undefined;
  /** Stands in the inspector's place while a clash waits for a choice. */
  clash?: ReactNode;
}

export interface Impossible {
  lampId: string;
  aboveLeavesM: number;
}

export interface SectionContext {
  doc: ScenarioDocument;
  evaluation: Evaluation | null;
  /** The year is being reckoned again; its figures are those of a moment ago. */
  yearPending: boolean;
  model: SectionModel;
  verdicts: ReadonlyMap<string, TierVerdict>;
  /** As they were before the held thing was taken hold of. */
  verdictsBefore: ReadonlyMap<string, TierVerdict> | null;
  worst: string | null;
  told: ToldMonth | null;
  ways: readonly WayOut[];
  waysTier: string | null;
  words: SectionWords;
  edit: SectionEdit;
  selection: Selection | null;
  select: (selection: Selection | null) => void;
  /** Lamps that were parted from their group. */
  parted: ReadonlySet<string>;
  setParted: (ids: readonly string[], apart: boolean) => void;
  impossible: Impossible | null;
  setImpossible: (impossible: Impossible | null) => void;
  currency: string;
  fixtures: ScenarioDocument['fixtures'];
  slots: SectionSlots;
}
