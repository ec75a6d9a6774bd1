'use client';

import type { WaysAnswer, WaysRequest } from './ways-out.worker';

type Question = WaysRequest extends infer R ? (R extends { ticket: number } ? Omit<R, 'ticket'> : never) : never;

export interface WaysHelper {
  /** Only the last question is answered. */
  ask: (question: Question, done: (answer: WaysAnswer) => void) => void;
  end: () => void;
}

/** Starts the worker that tries ways out. */
export function askWays(): WaysHelper {
  const worker = new Worker(new URL('./ways-out.worker.ts', import.meta.url), { type: 'module' });
  let last = 0;
  return {
    ask: (question, done) => {
      const ticket = (last += 1);
      worker.onmessage = ({ data }: MessageEvent<WaysAnswer>) => {
        if (data.ticket === last) done(data);
      };
      worker.postMessage({ ...question, ticket } as WaysRequest);
    },
    end: () => worker.terminate(),
  };
}
