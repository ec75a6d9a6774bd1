import { figureText } from '@/lib/format/figure';
import { formatQuantity, type QuantityKind, type UnitSystem } from '@/lib/format/quantity';

/** Units of an explanation that a person may read in another system. */
const KINDS: Record<string, QuantityKind> = {
  '°C': 'temperature',
  K: 'temperatureDifference',
  'm³/h': 'airflow',
  m: 'tallLength',
  'm²': 'area',
  L: 'volume',
  'W/m²K': 'uValue',
  'W/(m²K)': 'uValue',
  'kg/h': 'massFlow',
};

/** Three figures that count, four from a thousand on: as exact as an estimate may look. */
function digitsFor(value: number): number {
  const size = Math.abs(value);
  if (size === 0 || size >= 100) return 0;
  if (size >= 10) return 1;
  if (size >= 1) return 2;
  return Math.min(6, 1 - Math.floor(Math.log10(size)));
}

/** Decimals that all figures of one unit in a sum share, so that what is shown adds up. */
export function sharedDigits(values: readonly number[]): number {
  const largest = Math.max(0, ...values.map(Math.abs));
  const digits = digitsFor(largest);
  return values.length > 2 && largest >= 100 && largest < 10_000 ? digits + 1 : digits;
}

/** A figure of an explanation in the person's units; without shared decimals it takes as many as it needs. */
export function explainedFigure(
  value: number,
  unit: string,
  system: UnitSystem,
  digits?: number,
): { figure: string; unit: string } {
  const kind = KINDS[unit];
  if (kind && system === 'us') {
    const shown = formatQuantity(value, kind, system);
    return { figure: shown.figure, unit: shown.unit };
  }
  if (digits !== undefined) return { figure: figureText(value, digits), unit };
  const figure = figureText(value, digitsFor(value));
  return { figure: figure.includes('.') ? figure.replace(/\.?0+$/, '') : figure, unit };
}
