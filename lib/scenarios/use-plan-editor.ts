'use client';

/**
 * Edits of one scenario: applied at once, saved by themselves, undone and redone. What cannot be saved stays in this
 * tab's own store and is sent again; what somebody else changed meanwhile is laid beside it, never over it.
 */
import { useCallback, useEffect, useMemo, useReducer, useRef } from 'react';
import { ApiError } from '../http/api-client';
import {
  planEditorReducer,
  startPlanEditor,
  type Clash,
  type PlanEditorAction,
  type PlanEditorState,
  type SavedPlan,
  type SaveStatus,
} from './plan-editor-state';

export interface SavedRow<P> extends SavedPlan<P> {
  updatedAt?: string | undefined;
  updatedByName?: string | null | undefined;
}

export interface PlanEditorOptions<P> {
  /** Names the draft in this tab's store; null keeps no draft. */
  draftKey: string | null;
  initial: SavedPlan<P>;
  /** Sends the plan; null for a plan that is saved nowhere. */
  save: ((plan: P, version: number) => Promise<SavedRow<P>>) | null;
}

export interface PlanEditor<P> {
  /** What is drawn: the plan, or what the held lamp would make of it. */
  plan: P;
  /** The plan without what is only held. */
  settled: P;
  held: boolean;
  apply: (plan: P, label: string) => void;
  preview: (plan: P | null) => void;
  undo: () => void;
  redo: () => void;
  canUndo: boolean;
  canRedo: boolean;
  status: SaveStatus;
  problem: string | null;
  savedAt: number | null;
  version: number;
  clash: Clash<P> | null;
  choose: (path: string, whose: 'mine' | 'theirs') => void;
  retry: () => void;
}

const SAVE_AFTER_MS = 700;
const TRY_AGAIN_MS = 8000;

interface Draft<P> {
  plan: P;
  base: SavedPlan<P>;
}

function readDraft<P>(key: string): Draft<P> | null {
  try {
    const text = window.sessionStorage.getItem(key);
    return text ? (JSON.parse(text) as Draft<P>) : null;
  } catch {
    return null;
  }
}

function writeDraft<P>(key: string, draft: Draft<P> | null) {
  try {
    if (draft) window.sessionStorage.setItem(key, JSON.stringify(draft));
    else window.sessionStorage.removeItem(key);
  } catch {
    // A full or forbidden store loses only the safety net, not the edit on the page.
  }
}

function isRow<P>(value: unknown): value is SavedRow<P> {
  return typeof value === 'object' && value !== null && 'plan' in value && 'version' in value;
}

type Machine<P> = (state: PlanEditorState<P>, action: PlanEditorAction<P>) => PlanEditorState<P>;

export function usePlanEditor<P extends object>({ draftKey, initial, save }: PlanEditorOptions<P>): PlanEditor<P> {
  const [state, dispatch] = useReducer(planEditorReducer as Machine<P>, initial, startPlanEditor<P>);
  const sending = useRef(false);

  useRestoredDraft(draftKey, initial, dispatch);
  useKeptDraft(draftKey, state);

  useEffect(() => {
    if (state.status !== 'waiting' || !save) return;
    const { plan, saved } = state;
    const timer = window.setTimeout(async () => {
      if (sending.current) return;
      sending.current = true;
      dispatch({ type: 'saving' });
      try {
        const row = await save(plan, saved.version);
        dispatch({ type: 'saved', plan, version: row.version, at: Date.now() });
      } catch (error) {
        dispatch(failure<P>(error));
      } finally {
        sending.current = false;
      }
    }, SAVE_AFTER_MS);
    return () => window.clearTimeout(timer);
  }, [state, save]);

  useEffect(() => {
    if (state.status !== 'offline') return;
    const again = () => dispatch({ type: 'retry' });
    const timer = window.setInterval(again, TRY_AGAIN_MS);
    window.addEventListener('online', again);
    return () => {
      window.clearInterval(timer);
      window.removeEventListener('online', again);
    };
  }, [state.status]);

  const apply = useCallback((plan: P, label: string) => dispatch({ type: 'apply', plan, label, at: Date.now() }), []);
  const preview = useCallback((plan: P | null) => dispatch({ type: 'preview', plan }), []);
  const undo = useCallback(() => dispatch({ type: 'undo' }), []);
  const redo = useCallback(() => dispatch({ type: 'redo' }), []);
  const retry = useCallback(() => dispatch({ type: 'retry' }), []);
  const choose = useCallback((path: string, whose: 'mine' | 'theirs') => dispatch({ type: 'choose', path, whose }), []);
  return useMemo(
    () => ({
      plan: state.preview ?? state.plan,
      settled: state.plan,
      held: state.preview !== null,
      apply,
      preview,
      undo,
      redo,
      retry,
      choose,
      canUndo: state.past.length > 0,
      canRedo: state.future.length > 0,
      status: state.status,
      problem: state.problem,
      savedAt: state.savedAt,
      version: state.saved.version,
      clash: state.clash,
    }),
    [state, apply, preview, undo, redo, retry, choose],
  );
}

/** A save that failed: offline, refused, or met by somebody else's change (409 carries their row). */
function failure<P>(error: unknown): PlanEditorAction<P> {
  if (!(error instanceof ApiError))
    return { type: 'notSaved', offline: false, problem: 'The plan could not be sent. It is kept in this tab.' };
  if (error.status === 409 && isRow<P>(error.problem.current)) {
    const { plan, version, updatedAt, updatedByName } = error.problem.current;
    return {
      type: 'clashed',
      theirs: { plan, version },
      theirName: updatedByName ?? null,
      theirsAt: updatedAt ?? null,
    };
  }
  const first = error.problem.problems?.[0];
  const problem = first ? `${first.path}: ${first.message}` : (error.problem.detail ?? error.problem.title);
  return { type: 'notSaved', offline: error.status === 0 || error.status >= 502, problem };
}

/** A draft that an earlier visit of this tab could not save comes back, laid over what the server has now. */
function useRestoredDraft<P extends object>(
  key: string | null,
  initial: SavedPlan<P>,
  dispatch: (action: PlanEditorAction<P>) => void,
) {
  const done = useRef(false);
  useEffect(() => {
    if (!key || done.current) return;
    done.current = true;
    const draft = readDraft<P>(key);
    if (!draft) return;
    if (draft.base.version === initial.version) {
      dispatch({ type: 'restore', plan: draft.plan });
      return;
    }
    // The server moved on: start from what the draft was made on, then meet what is there now.
    dispatch({ type: 'saved', plan: draft.base.plan, version: draft.base.version, at: Date.now() });
    dispatch({ type: 'restore', plan: draft.plan });
    dispatch({ type: 'clashed', theirs: initial, theirName: null, theirsAt: null });
  }, [key, initial, dispatch]);
}

function useKeptDraft<P>(key: string | null, state: PlanEditorState<P>) {
  const { plan, saved, draftBase, status } = state;
  useEffect(() => {
    if (!key) return;
    if (plan !== saved.plan || status === 'clash') writeDraft(key, { plan, base: draftBase });
    else if (status === 'saved') writeDraft<P>(key, null);
  }, [key, plan, saved, draftBase, status]);
}
