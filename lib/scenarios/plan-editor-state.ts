/** What the plan editor remembers, as a pure state machine: undo, redo, what is saved, and what waits. */
import { mergePlans, setAtPath, type Conflict } from './merge-plans';

export interface SavedPlan<P> {
  plan: P;
  version: number;
}

export interface Clash<P> {
  conflicts: Conflict[];
  theirs: SavedPlan<P>;
  theirName: string | null;
  /** ISO time of their change. */
  theirsAt: string | null;
  /** Changes that needed no choice. */
  mineOnly: number;
  theirsOnly: number;
}

export type SaveStatus = 'saved' | 'waiting' | 'saving' | 'offline' | 'failed' | 'clash';

export interface PlanEditorState<P> {
  past: P[];
  plan: P;
  future: P[];
  /** What a held lamp would make of the plan; never saved. */
  preview: P | null;
  saved: SavedPlan<P>;
  /** What a draft in this tab's store was made on: an open clash must come back after a reload. */
  draftBase: SavedPlan<P>;
  status: SaveStatus;
  /** What the server said when it refused. */
  problem: string | null;
  savedAt: number | null;
  clash: Clash<P> | null;
  lastEdit: { label: string; at: number } | null;
}

export type PlanEditorAction<P> =
  | { type: 'apply'; plan: P; label: string; at: number }
  | { type: 'preview'; plan: P | null }
  | { type: 'undo' }
  | { type: 'redo' }
  | { type: 'restore'; plan: P }
  | { type: 'saving' }
  | { type: 'saved'; plan: P; version: number; at: number }
  | { type: 'notSaved'; offline: boolean; problem: string }
  | { type: 'retry' }
  | { type: 'clashed'; theirs: SavedPlan<P>; theirName: string | null; theirsAt: string | null }
  | { type: 'choose'; path: string; whose: 'mine' | 'theirs' };

/** Nudges of one thing in quick succession are one step of undo. */
export const NUDGE_MS = 900;
const UNDO_STEPS = 100;

export function startPlanEditor<P>(saved: SavedPlan<P>): PlanEditorState<P> {
  return {
    past: [],
    plan: saved.plan,
    future: [],
    preview: null,
    saved,
    draftBase: saved,
    status: 'saved',
    problem: null,
    savedAt: null,
    clash: null,
    lastEdit: null,
  };
}

/** After the plan changed: a clash stays open until it is settled, anything else waits to be saved. */
function waiting<P>(state: PlanEditorState<P>): PlanEditorState<P> {
  if (state.clash) return { ...state, status: 'clash' };
  if (state.plan === state.saved.plan && state.status !== 'saving') return { ...state, status: 'saved', problem: null };
  return { ...state, status: 'waiting', problem: null };
}

export function planEditorReducer<P extends object>(
  state: PlanEditorState<P>,
  action: PlanEditorAction<P>,
): PlanEditorState<P> {
  switch (action.type) {
    case 'apply': {
      if (action.plan === state.plan) return { ...state, preview: null };
      const last = state.lastEdit;
      const nudge =
        last !== null && last.label === action.label && action.at - last.at < NUDGE_MS && state.past.length > 0;
      const past = nudge ? state.past : [...state.past, state.plan].slice(-UNDO_STEPS);
      const lastEdit = { label: action.label, at: action.at };
      return waiting({ ...state, past, plan: action.plan, future: [], preview: null, lastEdit });
    }
    case 'preview':
      return { ...state, preview: action.plan };
    case 'undo': {
      const plan = state.past.at(-1);
      if (plan === undefined) return state;
      const future = [state.plan, ...state.future];
      return waiting({ ...state, past: state.past.slice(0, -1), plan, future, preview: null, lastEdit: null });
    }
    case 'redo': {
      const [plan, ...future] = state.future;
      if (plan === undefined) return state;
      return waiting({ ...state, past: [...state.past, state.plan], plan, future, preview: null, lastEdit: null });
    }
    case 'restore':
      return waiting({ ...state, past: [...state.past, state.plan], plan: action.plan, future: [], lastEdit: null });
    case 'saving':
      return { ...state, status: 'saving', problem: null };
    case 'saved': {
      const saved = { plan: action.plan, version: action.version };
      const status = state.plan === action.plan ? 'saved' : 'waiting';
      return { ...state, saved, draftBase: saved, status, savedAt: action.at, problem: null };
    }
    case 'notSaved':
      return { ...state, status: action.offline ? 'offline' : 'failed', problem: action.problem };
    case 'retry':
      return waiting(state);
    case 'clashed':
      return meet(state, action);
    case 'choose':
      return choose(state, action.path, action.whose);
  }
}

/** Their plan arrived: lay the two together; what both changed waits for a choice, and the page goes on with mine. */
function meet<P extends object>(
  state: PlanEditorState<P>,
  { theirs, theirName, theirsAt }: { theirs: SavedPlan<P>; theirName: string | null; theirsAt: string | null },
): PlanEditorState<P> {
  const { merged, conflicts, mineOnly, theirsOnly } = mergePlans(state.saved.plan, state.plan, theirs.plan);
  const past = theirsOnly > 0 ? [...state.past, state.plan] : state.past;
  const next = { ...state, past, plan: merged, preview: null, saved: theirs, problem: null, lastEdit: null };
  if (conflicts.length === 0) return { ...next, draftBase: theirs, clash: null, status: 'waiting' };
  return { ...next, status: 'clash', clash: { conflicts, theirs, theirName, theirsAt, mineOnly, theirsOnly } };
}

function choose<P extends object>(
  state: PlanEditorState<P>,
  path: string,
  whose: 'mine' | 'theirs',
): PlanEditorState<P> {
  const conflict = state.clash?.conflicts.find((candidate) => candidate.path === path);
  if (!state.clash || !conflict) return state;
  const conflicts = state.clash.conflicts.filter((candidate) => candidate !== conflict);
  const plan = whose === 'theirs' ? setAtPath(state.plan, path, conflict.theirs) : state.plan;
  const past = plan === state.plan ? state.past : [...state.past, state.plan];
  const clash = conflicts.length > 0 ? { ...state.clash, conflicts } : null;
  const draftBase = clash ? state.draftBase : state.saved;
  return { ...state, past, plan, clash, draftBase, status: clash ? 'clash' : 'waiting' };
}
