'use client';

import { sentenceInUnits } from '@/lib/format/sentence-units';
import { useUnits } from './units-context';

/** A sentence of the physics, in the units that the person reads. */
export function Sentence({ text }: { text: string }) {
  return sentenceInUnits(text, useUnits());
}
