'use client';

import { useEffect, useId, useState, type CSSProperties, type Ref } from 'react';
import { missingLetters, PASSPHRASE_LEAST } from '@/lib/accounts/account.schema';
import { CheckField } from '@/app/_components/check-field';
import { suggestPassphrase } from './passphrase-words';

interface PassphraseFieldProps {
  label?: string;
  value: string;
  onChange: (value: string) => void;
  /** Refused by the server or on submit. */
  error?: string | undefined;
  inputRef?: Ref<HTMLInputElement>;
  name?: string;
}

const SPOKEN_AFTER_MS = 500;

/** What is missing, said once the person pauses: a count on every key would talk over their typing. */
function useSpoken(words: string): string {
  const [spoken, setSpoken] = useState('');
  useEffect(() => {
    const timer = setTimeout(() => setSpoken(words), SPOKEN_AFTER_MS);
    return () => clearTimeout(timer);
  }, [words]);
  return spoken;
}

/** A passphrase measured like a plank: a cell for each letter, a dimension line, and the mark that it must reach. */
export function PassphraseField(props: PassphraseFieldProps) {
  const { label = 'Passphrase', value, onChange, error, inputRef, name = 'password' } = props;
  const [shown, setShown] = useState(false);
  const id = useId();
  const letters = value.length;
  const short = letters > 0 && letters < PASSPHRASE_LEAST;
  const words = short ? missingLetters(letters) : (error ?? '');
  const spoken = useSpoken(words);
  return (
    <div className="w-96 max-w-full">
      <div className="flex items-baseline justify-between pb-0.5">
        <label htmlFor={id} className="text-12 text-ink-soft">
          {label}
        </label>
        <button
          type="button"
          className="min-h-6 cursor-pointer px-1 text-12 text-lamp-ink max-md:min-h-11"
          onClick={() => {
            onChange(suggestPassphrase());
            setShown(true);
          }}
        >
          Suggest one
        </button>
      </div>
      <div className="@container">
        <input
          id={id}
          ref={inputRef}
          name={name}
          type={shown ? 'text' : 'password'}
          autoComplete="new-password"
          spellCheck={false}
          autoCapitalize="off"
          value={value}
          aria-invalid={short || error ? true : undefined}
          aria-describedby={`${id}about ${id}words`}
          onChange={(event) => onChange(event.target.value)}
          style={{ '--letters': Math.max(22, letters) } as CSSProperties}
          className={`h-7 w-full touch-44 border border-line bg-sheet px-2 font-mono text-14 tracking-[calc(var(--cell)-1ch)] [--cell:max(1ch,min(17px,calc((100cqw-18px)/var(--letters))))] ${short || error ? 'border-b-2 border-b-ember' : 'border-b-[1.25px] border-b-ink'}`}
        />
        <Plank letters={letters} />
      </div>
      <p id={`${id}words`} className="pt-1 text-14 font-semibold text-ember-ink">
        {words}
      </p>
      <p className="sr-only" aria-live="polite">
        {spoken}
      </p>
      <p id={`${id}about`} className="text-12 text-ink-soft">
        {short || error ? 'Nothing you typed is lost. ' : ''}At least {PASSPHRASE_LEAST} letters. Four plain words make
        a good one; signs, digits and capitals are welcome, never asked for. Spaces count.
      </p>
      <div className="pt-2">
        <CheckField
          label={
            <>
              Show what I type <span className="text-ink-soft">(on this screen only)</span>
            </>
          }
          checked={shown}
          onChange={setShown}
        />
      </div>
    </div>
  );
}

const TICKS = [0, 5, 10, 15, 20];

/** The dimension line: drawn up to the last letter, dashed up to the mark. */
function Plank({ letters }: { letters: number }) {
  const across = (count: number) => `calc(9px + var(--cell) * ${count})`;
  const drawn = Math.min(letters, 22);
  return (
    <div aria-hidden="true" className="relative h-8 text-12 text-ink-soft [--cell:min(17px,calc((100cqw-18px)/22))]">
      <span
        className="absolute top-2 border-t border-ink"
        style={{ left: across(0), width: `calc(var(--cell) * ${drawn})` }}
      />
      {drawn < PASSPHRASE_LEAST && (
        <span
          className={`absolute top-2 border-t border-dashed ${drawn ? 'border-ember' : 'border-ink-soft'}`}
          style={{ left: across(drawn), width: `calc(var(--cell) * ${PASSPHRASE_LEAST - drawn})` }}
        />
      )}
      {TICKS.map((tick) => {
        const mark = tick === PASSPHRASE_LEAST;
        return (
          <span key={tick} className="absolute top-1" style={{ left: across(tick) }}>
            <span
              className={`absolute h-2.25 -translate-x-1/2 ${mark ? '-top-0.5 h-3 border-l-2 border-ink' : 'border-l border-ink-soft'}`}
            />
            <span
              className={`absolute top-3 -translate-x-1/2 whitespace-nowrap ${mark ? 'font-semibold text-ink' : ''}`}
            >
              {mark ? '15 letters' : tick}
            </span>
          </span>
        );
      })}
      {drawn > 0 && (
        <span className="absolute top-1 h-2 rotate-40 border-l border-ink" style={{ left: across(drawn) }} />
      )}
    </div>
  );
}
