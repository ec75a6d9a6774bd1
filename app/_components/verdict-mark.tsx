import type { Verdict } from '@/lib/evaluation/evaluate-scenario';

type Tone = 'lamp' | 'moss' | 'ember' | 'frost' | 'soft';

const TONES: Record<Tone, string> = {
  lamp: 'text-lamp-ink',
  moss: 'text-moss',
  ember: 'text-ember-ink',
  frost: 'text-frost',
  soft: 'text-ink-soft',
};
const USUAL: Record<Verdict, Tone> = { below: 'lamp', inside: 'moss', above: 'ember', none: 'soft' };
const DOT_X: Record<Verdict, number | null> = { below: 3, inside: 14, above: 25, none: null };

interface VerdictMarkProps {
  verdict: Verdict;
  tone?: Tone;
  /** Only where no word beside it says the same. */
  label?: string;
}

/** A bracket with a dot left of it, in it or right of it; the word stands beside it. */
export function VerdictMark({ verdict, tone = USUAL[verdict], label }: VerdictMarkProps) {
  const dot = DOT_X[verdict];
  return (
    <svg
      viewBox="0 0 28 12"
      className={`inline-block h-3 w-7 shrink-0 align-[-1px] ${TONES[tone]}`}
      {...(label ? { role: 'img', 'aria-label': label } : { 'aria-hidden': true })}
    >
      <path d="M11.5 1H8v10h3.5M16.5 1H20v10h-3.5" fill="none" stroke="currentColor" strokeWidth={1.75} />
      {dot !== null && <circle cx={dot} cy={6} r={2.5} fill="currentColor" />}
    </svg>
  );
}
