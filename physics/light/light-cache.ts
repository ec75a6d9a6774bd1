/**
 * What may be kept between two evaluations, so that moving one lamp reckons that lamp alone.
 *
 * Keys say all that a map depends on, so a stale entry is never met; the entries longest unused fall out.
 */
export interface LightCache {
  entries: Map<string, Float64Array>;
  heldBytes: number;
}

const MOST_BYTES = 32e6;
/** Key and bookkeeping of an entry, roughly. */
const ENTRY_BYTES = 1000;

export const createLightCache = (): LightCache => ({ entries: new Map(), heldBytes: 0 });

export function kept(cache: LightCache | undefined, key: string, make: () => Float64Array): Float64Array {
  if (!cache) return make();
  const { entries } = cache;
  const found = entries.get(key);
  if (found) {
    // Seen again: to the young end.
    entries.delete(key);
    entries.set(key, found);
    return found;
  }
  const made = make();
  entries.set(key, made);
  cache.heldBytes += made.byteLength + ENTRY_BYTES;
  for (const [oldest, map] of entries) {
    if (cache.heldBytes <= MOST_BYTES || oldest === key) break;
    entries.delete(oldest);
    cache.heldBytes -= map.byteLength + ENTRY_BYTES;
  }
  return made;
}
