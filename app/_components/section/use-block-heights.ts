'use client';

import { useLayoutEffect, useState } from 'react';

export type BlockHeights = Readonly<Record<string, number>>;

/** Heights of the sentences beside the drawing as the browser set them; until then the estimates stand. */
export function useBlockHeights(container: React.RefObject<HTMLElement | null>): BlockHeights {
  const [heights, setHeights] = useState<BlockHeights>({});
  // Before the browser paints: an estimate that is too small would flash words over the bill.
  useLayoutEffect(() => {
    const root = container.current;
    if (!root) return;
    const read = () => {
      const next: Record<string, number> = {};
      for (const block of root.querySelectorAll<HTMLElement>('[data-block]'))
        next[block.dataset.block!] = Math.ceil(block.offsetHeight);
      setHeights((before) => {
        const ids = Object.keys(next);
        const same = ids.length === Object.keys(before).length && ids.every((id) => before[id] === next[id]);
        return same ? before : next;
      });
    };
    const sizes = new ResizeObserver(read);
    const watchAll = () => {
      sizes.disconnect();
      for (const block of root.querySelectorAll('[data-block]')) sizes.observe(block);
      read();
    };
    const arrivals = new MutationObserver(watchAll);
    arrivals.observe(root, { childList: true, subtree: true });
    watchAll();
    return () => {
      sizes.disconnect();
      arrivals.disconnect();
    };
  }, [container]);
  return heights;
}
