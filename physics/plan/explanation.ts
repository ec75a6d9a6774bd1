import type { Standing } from './evaluation-document';

export interface ExplanationTerm {
  /** As on paper: '', '+', '−', '×', '÷', '='. */
  operator: '' | '+' | '−' | '×' | '÷';
  value: number;
  unit: string;
  label: string;
  /** Another figure that opens. */
  path?: string;
  standing: Standing;
  source: string;
}

/** How a figure comes about, written out as on paper. */
export interface Explanation {
  path: string;
  title: string;
  formula: string;
  terms: ExplanationTerm[];
  result: { value: number; unit: string };
  range: { low: number; high: number; widestBy: string } | null;
  sources: string[];
  makesItSurer: string;
}
