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

/** A figure of an explanation in the person's units. */
export function explainedFigure(value: number, unit: string, system: UnitSystem): { figure: string; unit: string } {
  const kind = KINDS[unit];
  if (kind && system === 'us') {
    const shown = formatQuantity(value, kind, system);
    return { figure: shown.figure, unit: shown.unit };
  }
  const digits = digitsFor(value);
  const figure = figureText(value, digits);
  return { figure: figure.includes('.') ? figure.replace(/\.?0+$/, '') : figure, unit };
}
