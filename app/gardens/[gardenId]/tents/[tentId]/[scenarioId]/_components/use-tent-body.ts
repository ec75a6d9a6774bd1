'use client';

import { useCallback, useState } from 'react';
import { ApiError } from '@/lib/http/api-client';
import type { Tent } from '@/lib/tents/tent.schema';
import { useUpdateTent } from '@/lib/tents/tent.hooks';

/** The tent's own body: drawn at once, saved at once, and put back with a reason where the server refuses. */
export function useTentBody(gardenId: string, first: Tent) {
  const [tent, setTent] = useState(first);
  const [problem, setProblem] = useState<string | null>(null);
  const update = useUpdateTent(gardenId);
  const { mutate } = update;
  const set = useCallback(
    (patch: Partial<Tent['body']>) => {
      const body = { ...tent.body, ...patch };
      setTent({ ...tent, body });
      setProblem(null);
      mutate(
        { tentId: tent.tentId, version: tent.version, body },
        {
          onSuccess: setTent,
          onError: (error) => {
            const current = error instanceof ApiError ? (error.problem.current as Tent | undefined) : undefined;
            setTent(current ?? tent);
            setProblem(
              error instanceof ApiError
                ? (error.problem.problems?.[0]?.message ?? error.problem.detail ?? error.problem.title)
                : 'The tent was not saved.',
            );
          },
        },
      );
    },
    [tent, mutate],
  );
  return { tent, set, problem };
}
