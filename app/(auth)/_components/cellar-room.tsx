import type { ReactNode } from 'react';
import { TextLink } from '@/app/_components/link';

interface CellarRoomProps {
  /** The form, at the left edge of the garden pages' drawings. */
  children: ReactNode;
  /** What stands on the floor at the right; left out on a narrow page. */
  drawing: ReactNode;
  /** Below the floor slab. */
  below: ReactNode;
}

/** A room cut open between two slabs: the place of whoever is not signed in. */
export function CellarRoom({ children, drawing, below }: CellarRoomProps) {
  return (
    <div className="grid min-h-dvh grid-rows-[68px_10px_1fr_10px_auto]">
      <header className="flex items-center pr-14 pl-73 max-xl:px-20 max-md:px-4">
        <TextLink href="/" look="plain" className="text-17 font-semibold">
          Cellarsun
        </TextLink>
      </header>
      <div aria-hidden="true" className="hatch-cut border-t border-line" />
      <div className="grid grid-cols-[12px_minmax(0,1fr)_12px] max-md:grid-cols-1">
        <div aria-hidden="true" className="hatch-cut max-md:hidden" />
        <div className="flex border-[1.5px] border-ink pr-14 pl-69.5 max-xl:px-16.5 max-md:border-x-0 max-md:px-4">
          <main id="main" tabIndex={-1} className="w-full max-w-107.5 shrink-0 pt-17 pb-12 outline-none max-md:pt-8">
            {children}
          </main>
          <aside aria-label="A drawing" className="flex grow items-end justify-center pl-12 max-lg:hidden">
            {drawing}
          </aside>
        </div>
        <div aria-hidden="true" className="hatch-cut max-md:hidden" />
      </div>
      <div aria-hidden="true" className="hatch-cut border-b border-line" />
      <footer className="flex flex-wrap gap-x-6 gap-y-1 pt-4 pr-14 pb-10 pl-73 text-12 text-ink-soft max-xl:px-20 max-md:px-4">
        {below}
      </footer>
    </div>
  );
}
