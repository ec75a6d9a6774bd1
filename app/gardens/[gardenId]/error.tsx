'use client';

import { RetryState } from '@/app/_components/retry-state';

export default function GardenError({ error, reset }: { error: Error & { digest?: string }; reset: () => void }) {
  return (
    <main id="main" className="mx-auto max-w-360 px-18 max-lg:px-8 max-md:px-4">
      <RetryState error={error} retry={reset} />
    </main>
  );
}
