import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatQuantity, parseQuantity, rangeProblem, editableText } from '@/lib/format/quantity';
import { quantityRules, type QuantityKind, type UnitSystem } from '@/lib/format/quantity-kinds';
import { differenceText, figureText } from '@/lib/format/figure';
import { formatMoney } from '@/lib/format/money';

const value = (text: string, kind: QuantityKind, system: UnitSystem = 'metric') => {
  const parsed = parseQuantity(text, kind, system);
  if (!parsed.ok) throw new Error(parsed.problem);
  return parsed.value;
};

describe('parseQuantity', () => {
  // NIST SP 811 appendix B: 1 ft = 0.3048 m, 1 in = 25.4 mm, 1 cfm = 1.699011 m³/h, exact or to seven digits.
  it.each([
    ['8 ft', 'tallLength', 2.4384],
    ['7\' 6"', 'tallLength', 2.286],
    ['7 ft 6 in', 'tallLength', 2.286],
    ['96 in', 'tallLength', 2.4384],
    ['96"', 'tallLength', 2.4384],
    ['244 cm', 'tallLength', 2.44],
    ['2.4 m', 'tallLength', 2.4],
    ['2,4', 'tallLength', 2.4],
    ['½ in', 'length', 0.0127],
    ['7 1/2 in', 'length', 0.1905],
    ['36', 'length', 0.36],
    ['60 F', 'temperature', 15.5555556],
    ['60°F', 'temperature', 15.5555556],
    ['15.6 °C', 'temperature', 15.6],
    ['−40 F', 'temperature', -40],
    ['200 cfm', 'airflow', 339.802159],
    ['1 234,5', 'power', 1234.5],
    ['1,200 W', 'power', 1200],
    ['1.5 kW', 'power', 1500],
    ['62 %', 'fraction', 0.62],
    ['10 gal', 'volume', 37.85411784],
    ['N 52° 24′ 36″', 'latitude', 52.41],
    ['33.87 S', 'latitude', -33.87],
    ['-80.19', 'longitude', -80.19],
    ['W 80.19', 'longitude', -80.19],
  ] as const)('reads %s as %s', (text, kind, expected) => {
    expect(value(text, kind)).toBeCloseTo(expected, 6);
  });

  it('reads a bare number in the person’s own unit', () => {
    expect(value('60', 'temperature', 'us')).toBeCloseTo(15.5555556, 6);
    expect(value('8', 'tallLength', 'us')).toBeCloseTo(2.4384, 9);
    expect(value('14', 'length', 'us')).toBeCloseTo(0.3556, 9);
  });

  it.each([
    ['', 'length', /^Type a length/],
    ['tall', 'length', /not a number/],
    ['8 furlongs', 'length', /not a unit/],
    ['12 W', 'temperature', /not a unit/],
    ['95 N', 'latitude', /between/],
    ['1..2', 'power', /not a number/],
  ] as const)('says what to do with “%s”', (text, kind, pattern) => {
    const parsed = parseQuantity(text, kind, 'metric');
    expect(parsed.ok).toBe(false);
    if (!parsed.ok) expect(parsed.problem).toMatch(pattern);
  });

  it('reads back every kind in both systems as it is printed and as it stands in a field', () => {
    const kinds = Object.keys(quantityRules) as QuantityKind[];
    fc.assert(
      fc.property(
        fc.constantFrom(...kinds),
        fc.constantFrom<UnitSystem>('metric', 'us'),
        fc.double({ min: 0, max: 80, noNaN: true }),
        (kind, system, stored) => {
          const shown = formatQuantity(stored, kind, system, { digits: 9 });
          expect(value(shown.text, kind, system)).toBeCloseTo(stored, 5);
          const rule = quantityRules[kind];
          const unit = rule.units[rule.shown[system]]!;
          const step = unit.factor * 10 ** -(unit.digits + 2);
          expect(Math.abs(value(editableText(stored, kind, system), kind, system) - stored)).toBeLessThanOrEqual(step);
        },
      ),
      { numRuns: 2000 },
    );
  });
});

describe('what people read', () => {
  it('prints a true minus, thin spaces and the digits of the kind', () => {
    expect(figureText(-1234.56, 1)).toBe('−1\u202f234.6');
    expect(figureText(-0.001, 1)).toBe('0.0');
    expect(formatQuantity(15.6, 'temperature', 'us').text).toBe('60.1\u00a0°F');
    expect(formatQuantity(0.36, 'length', 'metric').text).toBe('36\u00a0cm');
    expect(formatMoney(54.6, 'EUR')).toBe('€\u00a054.60');
    expect(formatMoney(-1240.4, 'GBP')).toBe('−£\u00a01\u202f240');
  });

  it('signs a difference and calls what rounds to nothing the same', () => {
    expect(differenceText(1.24, 1)).toBe('+1.2');
    expect(differenceText(-1.26, 1)).toBe('−1.3');
    expect(differenceText(0.04, 1)).toBe('same');
  });

  it('names the range in the person’s units', () => {
    expect(rangeProblem({ value: 3, min: 0, max: 2.4384, kind: 'tallLength', system: 'us' })).toBe(
      'Give at most 8.00\u00a0ft.',
    );
  });
});
