'use client';

import { useEffect, useRef, useState } from 'react';

/** The width in CSS pixels of the element that carries the ref, so that a drawing keeps its type size at any width. */
export function useWidth<T extends HTMLElement>(initialPx: number) {
  const ref = useRef<T>(null);
  const [widthPx, setWidthPx] = useState(initialPx);
  useEffect(() => {
    const element = ref.current;
    if (!element) return;
    const observer = new ResizeObserver(([entry]) => {
      if (entry && entry.contentRect.width > 0) setWidthPx(Math.round(entry.contentRect.width));
    });
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [ref, widthPx] as const;
}
