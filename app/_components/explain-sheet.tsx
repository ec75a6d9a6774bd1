'use client';

import { useEffect, useRef } from 'react';
import type { Explanation, ExplanationTerm } from '@/lib/evaluation/evaluate-scenario';
import { explainedFigure, sharedDigits } from './explain-figures';
import { ExplainRange } from './explain-range';
import { useExplain } from './explain-context';
import { Num } from './num';
import { StandingMark, standingWords } from './standing-mark';
import { useUnits } from './units-context';

/** How a figure comes about, in the column it belongs to: the sum, how sure, what went in, what would make it surer. */
export function ExplainSheet() {
  const { open, explanation, wanted, trail, back, close } = useExplain();
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => {
    heading.current?.focus({ preventScroll: true });
    heading.current?.scrollIntoView({ block: 'nearest' });
  }, [open]);
  if (!open || !explanation) return null;
  const last = trail.at(-1);
  return (
    <section
      id="explain-sheet"
      aria-labelledby="explain-title"
      className="w-107 max-w-full border border-l-[3px] border-line border-l-lamp bg-sheet px-4 py-3"
      onKeyDown={(event) => {
        if (event.key !== 'Escape') return;
        event.stopPropagation();
        close();
      }}
    >
      <div className="flex items-baseline justify-between gap-4">
        <h2 id="explain-title" ref={heading} tabIndex={-1} className="text-14 font-semibold outline-none">
          {explanation.title}
        </h2>
        <button type="button" className="min-h-6 touch-44 shrink-0 text-12 link-does" onClick={close}>
          Close
        </button>
      </div>
      {last && (
        <button type="button" className="min-h-6 text-12 link-opens text-ink-soft" onClick={back}>
          Back to {last.words}
        </button>
      )}
      <p className="text-12 text-ink-soft">{explanation.formula}</p>
      <Sum explanation={explanation} />
      {explanation.range && <ExplainRange explanation={explanation} range={explanation.range} wanted={wanted} />}
      <WentIn explanation={explanation} />
      <h3 className="pt-3 text-14 font-semibold">What would make it surer</h3>
      <p className="text-12">{explanation.makesItSurer}</p>
    </section>
  );
}

/** Terms that are added share their decimals with the result; factors take their own. */
function digitsOf({ terms, result }: Explanation): (unit: string) => number | undefined {
  const added = terms.length > 1 && terms.every((term) => term.operator !== '×' && term.operator !== '÷');
  const stem = (unit: string) => unit.replace(/\/d$/, '');
  return (unit) => {
    if (!added) return undefined;
    const alike = [...terms, result].filter((each) => stem(each.unit) === stem(unit));
    return sharedDigits(alike.map((each) => each.value));
  };
}

function Sum({ explanation }: { explanation: Explanation }) {
  const units = useUnits();
  const { follow } = useExplain();
  const digits = digitsOf(explanation);
  const result = explainedFigure(
    explanation.result.value,
    explanation.result.unit,
    units,
    digits(explanation.result.unit),
  );
  return (
    <table className="mt-1 w-full border-collapse">
      <caption className="sr-only">The sum</caption>
      <tbody>
        {explanation.terms.map((term, at) => (
          <tr key={at} className="align-baseline">
            <td className="w-6 py-1 pr-2 text-14 text-ink-soft">
              {at === 0 && term.operator === '+' ? '' : term.operator}
            </td>
            <td className="py-1 pr-1.5 text-right text-17 whitespace-nowrap">
              <TermFigure
                term={term}
                digits={digits(term.unit)}
                follow={() => follow(term.path!, `${result.figure} ${result.unit}`)}
              />
            </td>
            <td className="py-1 pr-3 text-12 whitespace-nowrap text-ink-soft">
              {explainedFigure(term.value, term.unit, units).unit}
            </td>
            <td className="w-full py-1 text-12">{term.label}</td>
          </tr>
        ))}
      </tbody>
      <tfoot>
        <tr className="border-t border-ink align-baseline">
          <td className="py-1 text-14 text-ink-soft">=</td>
          <td className="py-1 pr-1.5 text-right text-17 font-semibold whitespace-nowrap text-lamp-ink">
            <Num text={result.figure} />
          </td>
          <td colSpan={2} className="py-1 text-12 text-ink-soft">
            {result.unit}
          </td>
        </tr>
      </tfoot>
    </table>
  );
}

interface TermFigureProps {
  term: ExplanationTerm;
  digits: number | undefined;
  follow: () => void;
}

function TermFigure({ term, digits, follow }: TermFigureProps) {
  const { figure } = explainedFigure(term.value, term.unit, useUnits(), digits);
  if (!term.path) return <Num text={figure} />;
  return (
    <button
      type="button"
      className="cursor-pointer border-b border-dotted border-ink-soft [font:inherit]"
      onClick={follow}
      title="How it comes about"
    >
      <Num text={figure} />
    </button>
  );
}

function WentIn({ explanation }: { explanation: Explanation }) {
  return (
    <>
      <h3 className="pt-3 text-14 font-semibold">What went in</h3>
      <ul className="text-12">
        {explanation.terms.map((term, at) => (
          <li key={at} className="flex gap-2 border-b border-line py-1.5">
            <span className="pt-0.5">
              <StandingMark standing={term.standing} word={false} />
            </span>
            <span className="grow">{term.label}</span>
            <span className="max-w-[55%] text-right text-ink-soft">
              {term.source.toLowerCase().startsWith(standingWords[term.standing])
                ? term.source
                : `${standingWords[term.standing]}; ${term.source}`}
            </span>
          </li>
        ))}
      </ul>
      {explanation.sources.length > 0 && (
        <>
          <h3 className="pt-3 text-14 font-semibold">What it rests on</h3>
          <ul className="text-12 text-ink-soft">
            {explanation.sources.map((source) => (
              <li key={source} className="border-b border-line py-1.5">
                {source}
              </li>
            ))}
          </ul>
        </>
      )}
    </>
  );
}
