'use client';

import { RetryState } from '@/app/_components/retry-state';

export default function SectionError({ error, reset }: { error: Error & { digest?: string }; reset: () => void }) {
  return (
    <div className="px-11 max-md:px-4">
      <RetryState error={error} retry={reset} />
    </div>
  );
}
