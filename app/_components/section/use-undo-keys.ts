'use client';

import { useEffect } from 'react';

/** Ctrl or Cmd with Z undoes, with Shift Z (or Y) redoes; a text field keeps its own undo while it is typed in. */
export function useUndoKeys(undo: () => void, redo: () => void): void {
  useEffect(() => {
    const typedOver = new WeakMap<EventTarget, string>();
    const enter = (event: FocusEvent) => {
      if (event.target instanceof HTMLInputElement) typedOver.set(event.target, event.target.value);
    };
    const press = (event: KeyboardEvent) => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey) return;
      const target = event.target;
      // What is being typed in a field has its own undo until it is left.
      if (target instanceof HTMLInputElement && target.type === 'text' && typedOver.get(target) !== target.value)
        return;
      const key = event.key.toLowerCase();
      if (key !== 'z' && key !== 'y') return;
      event.preventDefault();
      if (key === 'y' || event.shiftKey) redo();
      else undo();
    };
    window.addEventListener('keydown', press);
    window.addEventListener('focusin', enter);
    return () => {
      window.removeEventListener('keydown', press);
      window.removeEventListener('focusin', enter);
    };
  }, [undo, redo]);
}
