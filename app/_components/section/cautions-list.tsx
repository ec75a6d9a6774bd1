'use client';

/** Every caution as a line that opens beside the drawing, with its reason and its source. */
import { useState } from 'react';
import { sentenceInUnits } from '@/lib/format/sentence-units';
import { CautionSign } from '../caution-note';
import { useUnits } from '../units-context';
import type { SectionContext } from './section-context';

function order(severity: string): number {
  return ['danger', 'warning', 'note'].indexOf(severity);
}

/** The first words of a caution, up to its first stop. */
export function cautionHead(text: string): string {
  const head = text.split(/(?<=[.:;])\s/)[0]!.replace(/[.:;]$/, '');
  return head.length > 64 ? `${head.slice(0, 63).replace(/[\s,]+\S*$/, '')}…` : head;
}

export function CautionsList({ context, most = 3 }: { context: SectionContext; most?: number }) {
  const [open, setOpen] = useState<number | null>(null);
  const [all, setAll] = useState(false);
  const units = useUnits();
  const cautions = (context.evaluation?.cautions ?? [])
    .map((caution) => ({ ...caution, text: sentenceInUnits(caution.text, units) }))
    .sort((a, b) => order(a.severity) - order(b.severity));
  if (cautions.length === 0)
    return <p className="text-12 text-ink-soft">No cautions. Local code and the makers’ instructions still stand.</p>;
  const shown = all ? cautions : cautions.slice(0, most);
  return (
    <section aria-label="Cautions">
      <h2 className="flex items-center gap-2 text-14 font-semibold">
        <CautionSign />
        {cautions.length === 1 ? '1 caution' : `${cautions.length} cautions`}
      </h2>
      <ul>
        {shown.map((caution, i) => (
          <li key={`${caution.code}${caution.where}${i}`} className="text-12">
            <button
              type="button"
              aria-expanded={open === i}
              className="cursor-pointer border-b border-dotted border-ink-soft py-1 text-left"
              onClick={() => setOpen(open === i ? null : i)}
            >
              {cautionHead(caution.text)}
            </button>
            {open === i && (
              <div className="my-1 border-l-[3px] border-ember bg-sheet py-1 pr-2 pl-3">
                <p>{caution.text}</p>
                <p className="text-ink-soft">{caution.source}</p>
              </div>
            )}
          </li>
        ))}
      </ul>
      {cautions.length > most && (
        <button
          type="button"
          className="cursor-pointer border-b border-dotted border-ink-soft py-1 text-12 text-ink-soft"
          onClick={() => setAll(!all)}
        >
          {all ? 'Fewer' : `${cautions.length - most} more`}
        </button>
      )}
    </section>
  );
}
