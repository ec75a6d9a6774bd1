'use client';

import { useCallback, useEffect, useRef, useState } from 'react';
import { ApiError } from './api-client';

export type RowStatus = 'saved' | 'saving' | 'unsaved' | 'offline' | 'waiting';

interface Versioned {
  version: number;
}

export interface SavedRow<T extends Versioned> {
  row: T;
  /** Lays a change over the row at once and saves it. */
  change: (patch: Partial<T>) => void;
  undo: () => void;
  canUndo: boolean;
  status: RowStatus;
  savedAt: number | null;
  /** What the server said against it; what was typed stays. */
  problem: string | null;
  /** The row as somebody else left it, while a choice is open. */
  theirs: T | null;
  keepMine: () => void;
  takeTheirs: () => void;
}

/** How long after a server that did not answer it is asked again. */
const RETRY_MS = 4000;

/**
 * A row that saves by itself. Saves go one after another against the version last seen; a clash keeps both until somebody chooses.
 */
export function useSavedRow<T extends Versioned>(
  initial: T,
  save: (patch: Partial<T>, version: number) => Promise<T>,
): SavedRow<T> {
  const [row, setRow] = useState(initial);
  const [history, setHistory] = useState<Partial<T>[]>([]);
  const [status, setStatus] = useState<RowStatus>('saved');
  const [savedAt, setSavedAt] = useState<number | null>(null);
  const [problem, setProblem] = useState<string | null>(null);
  const [theirs, setTheirs] = useState<T | null>(null);
  const version = useRef(initial.version);
  const waiting = useRef<Partial<T>>({});
  const sending = useRef(false);

  const again = useRef(async () => {});
  const send = useCallback(async () => {
    if (sending.current) return;
    sending.current = true;
    try {
      while (Object.keys(waiting.current).length > 0) {
        const patch = waiting.current;
        waiting.current = {};
        setStatus('saving');
        try {
          const saved = await save(patch, version.current);
          version.current = saved.version;
          // What the server derives from the change comes back with it; what was typed meanwhile stays on top.
          setRow({ ...saved, ...waiting.current });
          setProblem(null);
          setSavedAt(Date.now());
          setStatus('saved');
        } catch (error) {
          waiting.current = { ...patch, ...waiting.current };
          if (!(error instanceof ApiError)) throw error;
          if (error.status === 409 && error.problem.current) {
            setTheirs(error.problem.current as T);
            setStatus('waiting');
          } else {
            setProblem(error.problem.problems?.[0]?.message ?? error.problem.detail ?? error.problem.title);
            setStatus(error.status === 0 ? 'offline' : 'unsaved');
            if (error.status === 0) setTimeout(() => void again.current(), RETRY_MS);
          }
          return;
        }
      }
    } finally {
      sending.current = false;
    }
  }, [save]);

  useEffect(() => {
    again.current = send;
  }, [send]);

  const lay = useCallback(
    (patch: Partial<T>) => {
      setRow((now) => ({ ...now, ...patch }));
      waiting.current = { ...waiting.current, ...patch };
      void send();
    },
    [send],
  );

  const change = useCallback(
    (patch: Partial<T>) => {
      const before = Object.fromEntries(Object.keys(patch).map((key) => [key, row[key as keyof T]])) as Partial<T>;
      setHistory((past) => [...past.slice(-49), before]);
      lay(patch);
    },
    [lay, row],
  );

  const undo = useCallback(() => {
    const last = history.at(-1);
    if (!last) return;
    setHistory((past) => past.slice(0, -1));
    lay(last);
  }, [history, lay]);

  const keepMine = useCallback(() => {
    if (!theirs) return;
    version.current = theirs.version;
    setTheirs(null);
    void send();
  }, [send, theirs]);

  const takeTheirs = useCallback(() => {
    if (!theirs) return;
    version.current = theirs.version;
    waiting.current = {};
    setRow(theirs);
    setTheirs(null);
    setStatus('saved');
  }, [theirs]);

  return { row, change, undo, canUndo: history.length > 0, status, savedAt, problem, theirs, keepMine, takeTheirs };
}
