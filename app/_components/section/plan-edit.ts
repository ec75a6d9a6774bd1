/** How the parts of the section ask for a change: a pure edit and a name for it, applied by whoever keeps the plan. */
import type { EditablePlan } from '@/lib/scenarios/edit-plan';

export type PlanChange = <P extends EditablePlan>(plan: P) => P;

export interface SectionEdit {
  /** null: everything may be changed; else the sentence that says why not. */
  readOnly: string | null;
  held: boolean;
  apply: (change: PlanChange, label: string) => void;
  /** Shows what a held thing would make of the plan; null puts it back. */
  preview: (change: PlanChange | null) => void;
}

export type Selection =
  | { kind: 'lamp'; id: string }
  | { kind: 'tier'; id: string }
  | { kind: 'water' }
  | { kind: 'heater' }
  | { kind: 'fan' }
  | { kind: 'climate' }
  | { kind: 'tent' };

export function isSelected(selection: Selection | null, kind: Selection['kind'], id?: string): boolean {
  if (!selection || selection.kind !== kind) return false;
  return id === undefined || ('id' in selection && selection.id === id);
}
