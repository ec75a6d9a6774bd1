'use client';

/** The fields of the one thing that is chosen; they and the drawing are twins. */
import { Children, type ReactNode } from 'react';
import { ClimateFields } from './climate-fields';
import { FanFields } from './fan-fields';
import { HeaterFields } from './heater-fields';
import { LampFields } from './lamp-fields';
import type { SectionContext } from './section-context';
import { TentFields } from './tent-fields';
import { TierFields } from './tier-fields';
import { WaterFields } from './water-fields';

export function Inspector({ context }: { context: SectionContext }) {
  const { selection, slots } = context;
  if (slots.clash) return <>{slots.clash}</>;
  if (!selection) return null;
  switch (selection.kind) {
    case 'lamp':
      return <LampFields key={selection.id} context={context} lampId={selection.id} />;
    case 'tier':
      return <TierFields key={selection.id} context={context} tierId={selection.id} />;
    case 'heater':
      return <HeaterFields context={context} />;
    case 'fan':
      return <FanFields context={context} />;
    case 'water':
      return <WaterFields context={context} />;
    case 'climate':
      return <ClimateFields context={context} />;
    case 'tent':
      return <TentFields context={context} />;
  }
}

interface InspectorFrameProps {
  title: string;
  facts?: ReactNode;
  hint?: ReactNode;
  context: SectionContext;
  children: ReactNode;
  verbs?: ReactNode;
  /** Under the fields, as wide as the column allows. */
  foot?: ReactNode;
}

/** Title, facts, one column of fields 214 px wide, and the hint beside them where there is room. */
export function InspectorFrame({ title, facts, hint, context, children, verbs, foot }: InspectorFrameProps) {
  const { select, edit } = context;
  return (
    <section aria-label={title} data-inspector="" className="@container">
      <h2 className="text-14 font-semibold text-lamp-ink">{title}</h2>
      <div className="flex items-baseline gap-4">
        <p className="text-12 text-ink-soft">{facts}</p>
        <button
          type="button"
          className="cursor-pointer border-b border-dotted border-ink-soft py-0.5 text-12 text-ink-soft"
          onClick={() => select(null)}
        >
          Close
        </button>
      </div>
      <div className="mt-1 flex gap-6">
        <div className="flex w-full max-w-[13.375rem] flex-none flex-col gap-1.5">{children}</div>
        <div className="hidden text-12 text-ink-soft @[21rem]:block">{edit.readOnly ?? hint}</div>
      </div>
      {edit.readOnly && <p className="mt-1 text-12 text-ink-soft @[21rem]:hidden">{edit.readOnly}</p>}
      {foot}
      {verbs && edit.readOnly === null && <div className="mt-2 flex flex-wrap gap-x-4 gap-y-1">{verbs}</div>}
    </section>
  );
}

export function Verb({ onClick, children, danger }: { onClick: () => void; children: ReactNode; danger?: boolean }) {
  return (
    <button
      type="button"
      onClick={onClick}
      className={`cursor-pointer border-b-2 py-0.5 text-14 font-semibold ${danger ? 'border-ember-ink text-ember-ink' : 'border-lamp-ink text-lamp-ink'}`}
    >
      {children}
    </button>
  );
}

/** What is changed seldom stays folded until it is wanted. */
export function More({ words, children }: { words: string; children: ReactNode }) {
  return (
    <details>
      <summary className="min-h-6 touch-44 cursor-pointer list-none text-12 link-opens [&::-webkit-details-marker]:hidden">
        {words}
      </summary>
      <div className="flex flex-col gap-1.5 pt-1">{children}</div>
    </details>
  );
}

/** Two fields that lie side by side in the world lie side by side here. */
export function Pair({ children }: { children: ReactNode }) {
  return (
    <div className="grid grid-cols-[5fr_6fr] gap-2">
      {Children.map(children, (child) => child && <div className="min-w-0">{child}</div>)}
    </div>
  );
}
