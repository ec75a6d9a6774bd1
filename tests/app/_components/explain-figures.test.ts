import { describe, expect, it } from 'vitest';
import { explainedFigure, sharedDigits } from '@/app/_components/explain-figures';
import { roundAxis } from '@/app/_components/explain-range';

describe('a figure of an explanation', () => {
  it('shows as many digits as an estimate bears', () => {
    expect(explainedFigure(8.8123, 'mol/m²/d', 'metric').figure).toBe('8.81');
    expect(explainedFigure(156.4, 'µmol/m²/s', 'metric').figure).toBe('156');
    expect(explainedFigure(0.0036, '', 'metric').figure).toBe('0.0036');
  });

  it('keeps the zeros of a whole number', () => {
    expect(explainedFigure(100, 'W', 'metric').figure).toBe('100');
    expect(explainedFigure(20, 'h', 'metric').figure).toBe('20');
  });

  it('is read in the person’s units (exact definition: 0 °C is 32 °F, 1 cfm is 1.699 m³/h)', () => {
    expect(explainedFigure(0, '°C', 'us')).toEqual({ figure: '32.0', unit: '°F' });
    expect(explainedFigure(169.9, 'm³/h', 'us')).toEqual({ figure: '100', unit: 'cfm' });
  });
});

describe('a sum as it is shown', () => {
  it('adds up to what stands under its line', () => {
    const terms = [251.93, 257.41, 6.29, 3.77];
    const total = terms.reduce((sum, term) => sum + term, 0);
    const digits = sharedDigits([...terms, total]);
    const shown = terms.map((term) => Number(term.toFixed(digits))).reduce((sum, term) => sum + term, 0);
    expect(Math.abs(shown - Number(total.toFixed(digits)))).toBeLessThanOrEqual(0.1 + 1e-9);
    expect(digits).toBe(1);
  });
});

describe('the axis of a range', () => {
  it('begins at zero, ends at a round value and holds everything shown', () => {
    const axis = roundAxis([8.8, 7.7, 9.9, 12, 17]);
    expect(axis.low).toBe(0);
    expect(axis.high).toBeGreaterThanOrEqual(17);
    expect(axis.high % axis.step).toBeCloseTo(0);
  });
});
