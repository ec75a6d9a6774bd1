'use client';

import { createContext, use } from 'react';
import type { Explanation } from '@/lib/evaluation/evaluate-scenario';

export interface Band {
  low: number;
  high: number;
}

export interface ExplainState {
  /** The path of the figure that is open. */
  open: string | null;
  explanation: Explanation | null;
  /** What is wanted of it, on the same scale. */
  wanted: Band | null;
  /** Where a figure inside the sum leads back to. */
  trail: readonly { path: string; words: string }[];
  show: (path: string) => void;
  /** Opens a figure of the sum in the same place. */
  follow: (path: string, from: string) => void;
  back: () => void;
  close: () => void;
}

export const ExplainContext = createContext<ExplainState | null>(null);

const CLOSED: ExplainState = {
  open: null,
  explanation: null,
  wanted: null,
  trail: [],
  show: () => {},
  follow: () => {},
  back: () => {},
  close: () => {},
};

/** What is open; outside a provider nothing opens. */
export function useExplain(): ExplainState {
  return use(ExplainContext) ?? CLOSED;
}
