'use client';

import { useCallback } from 'react';

/** Enter in the drawing goes to the first field of the inspector. */
export function useOpenFields(root: React.RefObject<HTMLElement | null>): () => void {
  return useCallback(() => {
    // The inspector may only now be set: wait for it.
    requestAnimationFrame(() => {
      root.current?.querySelector<HTMLElement>('[data-inspector] input, [data-inspector] select')?.focus();
    });
  }, [root]);
}
