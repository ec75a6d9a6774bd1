/**
 * What may be kept between two evaluations, so that moving one lamp reckons that lamp alone.
 *
 * Keys say all that a map depends on, so a stale entry is never met; the entries longest unused fall out.
 */
export interface LightCache {
  entries: Map<string, Float64Array>;
  /** Short names of long texts: a rack, a table of intensities. */
  names: Map<string, string>;
  heldBytes: number;
}

const MOST_BYTES = 32e6;
/** Key and bookkeeping of an entry, roughly. */
const ENTRY_BYTES = 1000;

export const createLightCache = (): LightCache => ({ entries: new Map(), names: new Map(), heldBytes: 0 });

const MOST_NAMES = 500;

/** A short name that stands for the text as long as the cache lives. */
export function shortName(cache: LightCache | undefined, text: string): string {
  if (!cache) return '';
  const known = cache.names.get(text);
  if (known) return known;
  if (cache.names.size >= MOST_NAMES) {
    cache.names.clear();
    cache.entries.clear();
    cache.heldBytes = 0;
  }
  const name = `${cache.names.size}`;
  cache.names.set(text, name);
  return name;
}

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
