'use client';

import { useSyncExternalStore } from 'react';
import type { ScenarioDocument } from '@/lib/evaluation/evaluate-scenario';

/** The drawing of somebody without an account: it stays in this browser until they keep it. */
const KEY = 'cellarsun.draft';

export function keepDraft(document: ScenarioDocument): void {
  try {
    localStorage.setItem(KEY, JSON.stringify(document));
  } catch {
    // A browser that stores nothing still draws; the drawing lives as long as the page.
  }
}

/** What another version of this page stored may not fit any more: then there is no draft. */
export function readDraft(): ScenarioDocument | null {
  try {
    const text = localStorage.getItem(KEY);
    const found = text ? (JSON.parse(text) as ScenarioDocument) : null;
    return found?.schema === 'scenario/1' && Array.isArray(found.tiers) && found.tent ? found : null;
  } catch {
    return null;
  }
}

export function dropDraft(): void {
  try {
    localStorage.removeItem(KEY);
  } catch {
    // Nothing was stored.
  }
}

let seen: { text: string | null; draft: ScenarioDocument | null } | null = null;

function snapshot(): ScenarioDocument | null {
  let text: string | null;
  try {
    text = localStorage.getItem(KEY);
  } catch {
    text = null;
  }
  if (!seen || seen.text !== text) seen = { text, draft: readDraft() };
  return seen.draft;
}

function listen(changed: () => void): () => void {
  window.addEventListener('storage', changed);
  return () => window.removeEventListener('storage', changed);
}

/** The draft as it stands in this browser; null on the server and where there is none. */
export function useDraft(): ScenarioDocument | null {
  return useSyncExternalStore(listen, snapshot, () => null);
}
