import type { ReactNode } from 'react';

interface SectionRowProps {
  title: string;
  about?: ReactNode;
  children: ReactNode;
}

/** A ruled row of a page: what it is in the rail, its fields in the drawing's column. */
export function SectionRow({ title, about, children }: SectionRowProps) {
  return (
    <section className="mt-9 grid grid-cols-[196px_minmax(0,1fr)] gap-x-6 gap-y-4 border-t border-line pt-6 max-md:grid-cols-1">
      <div>
        <h2 className="text-17 font-semibold">{title}</h2>
        {about && <p className="pt-1 text-12 text-ink-soft">{about}</p>}
      </div>
      <div className="min-w-0">{children}</div>
    </section>
  );
}
