import { describe, expect, it } from 'vitest';
import { evaluateScenario, explainFigure } from '@/lib/evaluation/evaluate-scenario';
import { workedTent } from '../../support/worked-tent';

const noted = (assumptions: unknown) => ({ ...workedTent(), app: { assumptions } });
const source = 'Photons from 4,000 lm of warm white';

describe('an opened figure', () => {
  it('marks photons reckoned from lumens and a price that nobody gave, as the app noted them', () => {
    const doc = noted([
      { path: 'fixtures[0].ppfUmolS', value: 1000, unit: 'µmol/s', source, standing: 'computed' },
      { path: 'power.tariff', value: 0.3, unit: 'EUR/kWh', source: 'Mean price of the country', standing: 'read' },
    ]);
    const evaluation = evaluateScenario(doc);
    const [term] = explainFigure(doc, evaluation, 'fixtures.lamp.ppf')!.terms;
    expect(term).toMatchObject({ standing: 'computed', source: `Default: ${source}` });
    expect(explainFigure(doc, evaluation, 'year.cost')!.sources[0]).toBe('Price: Mean price of the country');
  });

  it('calls them given where nothing is noted, whatever else stands in the notes', () => {
    for (const assumptions of [undefined, 'x', [], [null, 3, {}, { path: 1 }]]) {
      const doc = noted(assumptions);
      const evaluation = evaluateScenario(doc, { year: false });
      expect(explainFigure(doc, evaluation, 'fixtures.lamp.ppf')!.terms[0]!.standing).toBe('given');
    }
  });

  it('counts yen in yen and cents in cents', () => {
    const doc = workedTent();
    doc.fixtures[0]!.priceMinor = 12_000;
    const opened = (currency: string) => {
      doc.power = { ...doc.power, tariff: { ...doc.power.tariff, currency } };
      return explainFigure(doc, evaluateScenario(doc, { year: false }), 'upFront.cost')!.result;
    };
    expect(opened('JPY')).toEqual({ value: 12_000, unit: 'JPY' });
    expect(opened('EUR')).toEqual({ value: 120, unit: 'EUR' });
  });
});
