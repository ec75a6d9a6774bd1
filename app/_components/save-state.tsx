'use client';

import { useUnits } from './units-context';

export type SaveStatus = 'nothing' | 'saving' | 'saved' | 'unsaved' | 'waiting' | 'offline' | 'read-only';

interface SaveStateProps {
  status: SaveStatus;
  /** When it was saved last: an ISO time or milliseconds. */
  at?: string | number | null | undefined;
  /** How many figures are not saved, or wait for a choice between two answers. */
  count?: number;
  /** Where a clash is answered. */
  onOpen?: () => void;
}

const figures = (count: number) => `${count} ${count === 1 ? 'figure' : 'figures'}`;

function words({ status, at, count = 1 }: SaveStateProps, twelveHours: boolean): string {
  switch (status) {
    case 'nothing':
      return 'Nothing to save yet';
    case 'saving':
      return 'Saving';
    case 'unsaved':
      return `${figures(count)} not saved`;
    case 'waiting':
      return `${figures(count)} ${count === 1 ? 'waits' : 'wait'} for you`;
    case 'offline':
      return 'Not saved: no connection. It is sent as soon as there is one';
    case 'read-only':
      return 'Read only';
    default: {
      const time = at
        ? ` ${new Date(at).toLocaleTimeString(twelveHours ? 'en-US' : 'en-GB', { hour: twelveHours ? 'numeric' : '2-digit', minute: '2-digit' })}`
        : '';
      return `Saved${time}`;
    }
  }
}

/** Whether what stands on the page is kept. Polite: it is heard when the reader pauses. */
export function SaveState(props: SaveStateProps) {
  const text = words(props, useUnits() === 'us');
  const wants = props.status === 'unsaved' || props.status === 'waiting' || props.status === 'offline';
  const tone = wants ? 'font-semibold text-ember-ink' : 'text-ink';
  return (
    <span role="status" className={`text-14 ${tone}`} suppressHydrationWarning>
      {props.onOpen && wants ? (
        <button type="button" className="min-h-6 cursor-pointer underline underline-offset-4" onClick={props.onOpen}>
          {text}
        </button>
      ) : (
        text
      )}
    </span>
  );
}
