'use client';

import { createContext, use, type ReactNode } from 'react';
import type { UnitSystem } from '@/lib/format/quantity';

const Units = createContext<UnitSystem>('metric');

export function UnitsProvider({ units, children }: { units: UnitSystem; children: ReactNode }) {
  return <Units value={units}>{children}</Units>;
}

/** The units that the person reads. */
export function useUnits(): UnitSystem {
  return use(Units);
}
