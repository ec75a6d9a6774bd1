/**
 * Three-way merge of two people's changes to one document. Things in lists are told apart by their `id`;
 * a figure that both changed, to different values, is a conflict and stays mine until somebody chooses.
 */

export interface Conflict {
  /** Dotted path; a thing in a list is named by its id: `placements.lamp-2.positionM`. */
  path: string;
  base: unknown;
  mine: unknown;
  theirs: unknown;
}

export interface Merge<T> {
  merged: T;
  conflicts: Conflict[];
  /** How many figures only I, and only they, changed. */
  mineOnly: number;
  theirsOnly: number;
}

type Bag = Record<string, unknown>;
const isBag = (value: unknown): value is Bag => typeof value === 'object' && value !== null && !Array.isArray(value);
const isKeyed = (value: unknown): value is (Bag & { id: string })[] =>
  Array.isArray(value) && value.every((thing) => isBag(thing) && typeof thing.id === 'string');

export function sameValue(one: unknown, other: unknown): boolean {
  if (Object.is(one, other)) return true;
  if (Array.isArray(one) && Array.isArray(other))
    return one.length === other.length && one.every((value, i) => sameValue(value, other[i]));
  if (!isBag(one) || !isBag(other)) return false;
  const keys = new Set([...Object.keys(one), ...Object.keys(other)]);
  return [...keys].every((key) => sameValue(one[key], other[key]));
}

interface Tally {
  conflicts: Conflict[];
  mineOnly: number;
  theirsOnly: number;
}

function mergeKeyed(base: unknown, mine: Bag[], theirs: Bag[], path: string, tally: Tally): Bag[] {
  const byId = (list: unknown): Bag =>
    Object.fromEntries((isKeyed(list) ? list : []).map((thing) => [thing.id, thing]));
  const merged = mergeBags(byId(base), byId(mine), byId(theirs), path, tally);
  const order = [...mine, ...theirs].map((thing) => thing.id as string);
  return [...new Set(order)].map((id) => merged[id]).filter((thing): thing is Bag => thing !== undefined);
}

function mergeBags(base: Bag, mine: Bag, theirs: Bag, path: string, tally: Tally): Bag {
  const merged: Bag = {};
  for (const key of new Set([...Object.keys(mine), ...Object.keys(theirs)])) {
    const value = mergeValue(base[key], mine[key], theirs[key], path ? `${path}.${key}` : key, tally);
    if (value !== undefined) merged[key] = value;
  }
  return merged;
}

function mergeValue(base: unknown, mine: unknown, theirs: unknown, path: string, tally: Tally): unknown {
  if (sameValue(mine, theirs)) return mine;
  if (sameValue(base, theirs)) {
    tally.mineOnly += 1;
    return mine;
  }
  if (sameValue(base, mine)) {
    tally.theirsOnly += 1;
    return theirs;
  }
  if (isKeyed(mine) && isKeyed(theirs)) return mergeKeyed(base, mine, theirs, path, tally);
  if (isBag(mine) && isBag(theirs)) return mergeBags(isBag(base) ? base : {}, mine, theirs, path, tally);
  tally.conflicts.push({ path, base, mine, theirs });
  return mine;
}

export function mergePlans<T extends object>(base: T, mine: T, theirs: T): Merge<T> {
  const tally: Tally = { conflicts: [], mineOnly: 0, theirsOnly: 0 };
  const merged = mergeBags(base as Bag, mine as Bag, theirs as Bag, '', tally) as T;
  return { merged, ...tally };
}

/** The document with the value at a conflict's path replaced; undefined takes the thing out. */
export function setAtPath<T>(document: T, path: string, value: unknown): T {
  const [head, ...rest] = path.split('.') as [string, ...string[]];
  const inner = rest.join('.');
  if (isKeyed(document)) {
    if (inner) return document.map((thing) => (thing.id === head ? setAtPath(thing, inner, value) : thing)) as T;
    const others = document.filter((thing) => thing.id !== head);
    return (value === undefined ? others : [...others, value]) as T;
  }
  const bag = { ...(document as Bag) };
  if (inner) bag[head] = setAtPath(bag[head] ?? {}, inner, value);
  else if (value === undefined) delete bag[head];
  else bag[head] = value;
  return bag as T;
}
