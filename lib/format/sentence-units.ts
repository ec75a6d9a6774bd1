import type { QuantityKind, UnitSystem } from './quantity';
import { formatQuantity } from './quantity';

/** What a sentence of the physics may hold, which writes metric units: the unit as printed, and what makes one of it. */
const PRINTED: readonly { symbol: string; kind: QuantityKind; stored: (printed: number) => number; digits?: number }[] =
  [
    { symbol: 'cm', kind: 'length', stored: (cm) => cm / 100, digits: 0 },
    { symbol: '°C', kind: 'temperature', stored: (c) => c, digits: 0 },
    { symbol: 'K', kind: 'temperatureDifference', stored: (k) => k },
    { symbol: 'm³/h', kind: 'airflow', stored: (flow) => flow },
    { symbol: 'L', kind: 'volume', stored: (litres) => litres },
  ];
const FIGURE = /(−?\d+(?:\.\d+)?) (cm|°C|K|m³\/h|L)(?![\p{L}\d/²])/gu;
/** A sentence that says both has the other one already. */
const BOTH = /\d+(?:\.\d+)? m \((\d+ ft)\)/g;

/** A sentence of the physics, a caution or a warning, in the units that the person reads. */
export function sentenceInUnits(text: string, units: UnitSystem): string {
  if (units === 'metric') return text;
  return text.replaceAll(BOTH, '$1').replaceAll(FIGURE, (_all, figure: string, symbol: string) => {
    const { kind, stored, digits } = PRINTED.find((each) => each.symbol === symbol)!;
    const printed = Number(figure.replace('−', '-'));
    return formatQuantity(stored(printed), kind, units, digits === undefined ? {} : { digits }).text;
  });
}
