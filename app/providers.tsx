'use client';

import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { ApiError } from '@/lib/http/api-client';
import type { UnitSystem } from '@/lib/format/quantity';
import { UnitsProvider } from './_components/units-context';

/** A refusal stays a refusal: only what may pass by itself is tried again. */
const mayPass = (error: unknown) => !(error instanceof ApiError) || error.status === 0 || error.status >= 500;

export function Providers({ units, children }: { units: UnitSystem; children: ReactNode }) {
  const [client] = useState(
    () =>
      new QueryClient({
        defaultOptions: {
          queries: { staleTime: 30_000, retry: (count, error) => count < 2 && mayPass(error) },
          mutations: { retry: false },
        },
      }),
  );
  return (
    <QueryClientProvider client={client}>
      <UnitsProvider units={units}>{children}</UnitsProvider>
    </QueryClientProvider>
  );
}
