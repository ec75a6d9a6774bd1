'use client';

/** What is typed, shown or hidden: a word, not an eye. */
export function ShowWord({ shown, onToggle }: { shown: boolean; onToggle: () => void }) {
  return (
    <button
      type="button"
      aria-pressed={shown}
      aria-label="Show the passphrase"
      className="min-h-6 cursor-pointer px-1 text-12 text-lamp-ink max-md:min-h-11"
      onClick={onToggle}
    >
      {shown ? 'Hide' : 'Show'}
    </button>
  );
}
