import { figureText } from './figure';
import { parseNumber } from './parse-number';
import { parseCoordinate } from './parse-coordinate';
import {
  ruleOf,
  shownUnit,
  type QuantityKind,
  type QuantityRule,
  type UnitSystem,
  type WrittenUnit,
} from './quantity-kinds';

export type { QuantityKind, UnitSystem };

export type ParsedQuantity = { ok: true; value: number } | { ok: false; problem: string };

export interface FormattedQuantity {
  figure: string;
  unit: string;
  /** Figure and unit with a space that does not break. */
  text: string;
}

const NO_BREAK = '\u00a0';

/** A stored value in the units that a person reads. The only place, with `parseQuantity`, that converts for people. */
export function formatQuantity(
  value: number,
  kind: QuantityKind,
  system: UnitSystem,
  options: { digits?: number } = {},
): FormattedQuantity {
  const unit = shownUnit(kind, system);
  const figure = figureText((value - (unit.offset ?? 0)) / unit.factor, options.digits ?? unit.digits);
  return { figure, unit: unit.symbol, text: unit.symbol ? `${figure}${NO_BREAK}${unit.symbol}` : figure };
}

/** What stands in a field: as many digits as the value needs, up to two more than are usually shown. */
export function editableText(value: number, kind: QuantityKind, system: UnitSystem): string {
  const unit = shownUnit(kind, system);
  const shown = (value - (unit.offset ?? 0)) / unit.factor;
  const rounded = Number(shown.toFixed(unit.digits + 2));
  return String(rounded).replace('-', '−');
}

const toStored = (written: number, unit: WrittenUnit): number => written * unit.factor + (unit.offset ?? 0);

function unitNamed(rule: QuantityRule, name: string): WrittenUnit | undefined {
  const plain = name.toLowerCase().replaceAll(' ', '').replace(/\.$/, '').replaceAll('μ', 'µ');
  return rule.units.find(
    (each) => each.symbol.toLowerCase().replaceAll(' ', '') === plain || each.names.includes(plain),
  );
}

/** `7' 6"`, `2 m 10 cm`: larger part first. */
function parseCompound(text: string, rule: QuantityRule): number | null {
  const parts = [
    ...text.matchAll(/([\d.,/½¼¾⅛⅜⅝⅞ ]+?)\s*(ft|feet|foot|'|′|in|inch|inches|"|″|m|cm)(?=[\s\d.,½¼¾]|$)/giy),
  ];
  if (parts.length !== 2) return null;
  const [first, second] = parts;
  if (first![0].length + second![0].length < text.replaceAll(/^\s+|\s+$/g, '').length - 2) return null;
  const large = unitNamed(rule, first![2]!);
  const small = unitNamed(rule, second![2]!);
  const a = parseNumber(first![1]!);
  const b = parseNumber(second![1]!);
  if (!large || !small || a === null || b === null || small.factor >= large.factor || a < 0 || b < 0) return null;
  return toStored(a, large) + toStored(b, small);
}

/**
 * What a person typed, as the value that is stored. A bare number is in the person's own unit; any unit of the trade for
 * this kind is understood, in either system.
 */
export function parseQuantity(text: string, kind: QuantityKind, system: UnitSystem): ParsedQuantity {
  const rule = ruleOf(kind);
  const typed = text.trim().replaceAll(/\s/g, ' ');
  if (typed === '') return { ok: false, problem: `Type ${rule.noun} such as ${rule.examples}.` };
  if (kind === 'latitude' || kind === 'longitude') return parseCoordinate(typed, kind);
  const compound = parseCompound(typed, rule);
  if (compound !== null) return { ok: true, value: compound };
  const match = /^([+\-−]?[\d.,/½¼¾⅓⅔⅛⅜⅝⅞'’   ]*[\d½¼¾⅓⅔⅛⅜⅝⅞.])\s*(.*)$/.exec(typed);
  const number = match ? parseNumber(match[1]!) : null;
  if (!match || number === null)
    return { ok: false, problem: `“${typed}” is not a number. Type ${rule.noun} such as ${rule.examples}.` };
  const name = match[2]!.trim();
  const unit = name === '' ? shownUnit(kind, system) : unitNamed(rule, name);
  if (!unit) return { ok: false, problem: `“${name}” is not a unit for ${rule.noun}. Type it as ${rule.examples}.` };
  return { ok: true, value: toStored(number, unit) };
}

/** The range of a field in the person's units, for an error that says what to do. */
export function rangeProblem({
  value,
  min,
  max,
  kind,
  system,
}: {
  value: number;
  min?: number | undefined;
  max?: number | undefined;
  kind: QuantityKind;
  system: UnitSystem;
}): string | null {
  const tolerance = 1e-9 * Math.max(1, Math.abs(value));
  if (min !== undefined && value < min - tolerance) return `Give at least ${formatQuantity(min, kind, system).text}.`;
  if (max !== undefined && value > max + tolerance) return `Give at most ${formatQuantity(max, kind, system).text}.`;
  return null;
}
