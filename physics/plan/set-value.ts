import type { ScenarioDocument } from './scenario-document';

type Node = Record<string, unknown> | unknown[];
const isNode = (value: unknown): value is Node => typeof value === 'object' && value !== null;

/** A place in a list by its number or by the id of what stands there. */
function placeOf(list: readonly unknown[], key: string): number {
  if (/^\d+$/.test(key)) return Number(key);
  return list.findIndex((each) => isNode(each) && !Array.isArray(each) && each['id'] === key);
}

function setIn(node: Node, [key, ...rest]: readonly string[], value: number): Node | null {
  if (key === undefined) return null;
  const at = Array.isArray(node) ? placeOf(node, key) : key;
  if (Array.isArray(node) && !((at as number) >= 0 && (at as number) < node.length)) return null;
  const old: unknown = Array.isArray(node) ? node[at as number] : node[at as string];
  let made: unknown;
  if (rest.length > 0) made = isNode(old) ? setIn(old, rest, value) : null;
  // A series, or the slab's temperature, holds its figure one level down.
  else if (isNode(old)) made = 'value' in old ? { ...old, value } : null;
  else made = old === undefined || typeof old === 'number' ? value : null;
  if (made === null) return null;
  if (Array.isArray(node)) return node.map((each, index) => (index === at ? made : each));
  return { ...node, [at as string]: made };
}

/**
 * A document with one of its figures set, the rest shared with the old one.
 *
 * @param path dotted, such as `tent.fabricUWM2K`, `tiers.lower.leafAreaIndex` or `fixtures.0.ppfUmolS`; `tiers[0].x` is read alike
 * @returns null where the path leads to no figure
 */
export function withValue(document: ScenarioDocument, path: string, value: number): ScenarioDocument | null {
  const keys = path.replaceAll(/\[(\d+)\]/g, '.$1').split('.');
  if (keys.some((key) => key === '__proto__') || !keys[0] || keys.length < 2) return null;
  if (keys[0] === 'app' || keys[0] === 'range') return null;
  return setIn(document as unknown as Record<string, unknown>, keys, value) as ScenarioDocument | null;
}
