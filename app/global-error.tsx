'use client';

import './globals.css';

/** The last net: the frame itself failed, so nothing of it is used. */
export default function GlobalError({ error, reset }: { error: Error & { digest?: string }; reset: () => void }) {
  return (
    <html lang="en">
      <body>
        <main className="px-18 pt-16 max-md:px-4">
          <h1 className="text-34 font-light">Cellarsun could not start this page.</h1>
          <p className="pt-2 text-17">What was saved before is still saved.</p>
          <button type="button" className="mt-5 min-h-11 bg-ink px-5 text-14 font-semibold text-paper" onClick={reset}>
            Try again
          </button>
          {error.digest && <p className="pt-3 text-12 text-ink-soft">Reference {error.digest}</p>}
        </main>
      </body>
    </html>
  );
}
