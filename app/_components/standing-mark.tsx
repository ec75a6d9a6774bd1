import type { Standing } from '@/lib/evaluation/evaluate-scenario';

/** How a figure is known; `own` is a figure that somebody of the garden set. */
export type ShownStanding = Standing | 'own';

export const standingWords: Record<ShownStanding, string> = {
  given: 'typed here',
  own: 'our own',
  read: 'read',
  secondary: 'read second-hand',
  computed: 'computed',
  judgement: 'judged',
  recalled: 'recalled, unconfirmed',
};

export const standingSentences: Record<ShownStanding, string> = {
  given: 'Somebody typed it into this garden.',
  own: 'Somebody of this garden set it.',
  read: 'We read it in the source named beside it.',
  secondary: 'We read it where another work quotes it, not in the work itself.',
  computed: 'It follows from other figures by a formula that is shown.',
  judgement: 'Chosen by us between figures that were read, or from kin; the reason is given.',
  recalled: 'From memory, found in no source yet. Do not rest a purchase on it.',
};

/** Marks are ink: a standing is not good or bad. */
export function StandingMark({ standing, word = true }: { standing: ShownStanding; word?: boolean }) {
  return (
    <span className="inline-flex items-baseline gap-1.5 whitespace-nowrap">
      <svg
        viewBox="0 0 12 12"
        className="size-3 shrink-0 translate-y-px text-ink"
        {...(word ? { 'aria-hidden': true } : { role: 'img', 'aria-label': standingWords[standing] })}
      >
        <Mark standing={standing} />
      </svg>
      {word && <span>{standingWords[standing]}</span>}
    </span>
  );
}

function Mark({ standing }: { standing: ShownStanding }) {
  switch (standing) {
    case 'read':
      return <circle cx={6} cy={6} r={4.5} fill="currentColor" />;
    case 'secondary':
      return (
        <>
          <circle cx={6} cy={6} r={4} fill="none" stroke="currentColor" />
          <path d="M6 2a4 4 0 0 0 0 8z" fill="currentColor" />
        </>
      );
    case 'computed':
      return <path d="M1.5 4h9M1.5 8h9" stroke="currentColor" strokeWidth={1.25} />;
    case 'judgement':
      return <path d="M6 1l5 5-5 5-5-5z" fill="none" stroke="currentColor" />;
    case 'recalled':
      return <circle cx={6} cy={6} r={4.5} fill="none" stroke="currentColor" strokeDasharray="2 1.5" />;
    default:
      return (
        <g className="text-lamp">
          <path d="M1.5 11V2h9v9" fill="none" stroke="currentColor" strokeWidth={1.5} />
          <circle cx={6} cy={7.5} r={1.5} fill="currentColor" />
        </g>
      );
  }
}
