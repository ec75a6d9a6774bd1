import { describe, expect, it } from 'vitest';
import { referenceData } from '@/lib/reference-data/reference-data';
import { defaultTariff } from '@/lib/tariffs/default-tariff';

const { prices } = referenceData();

describe('the price that stands in for a bill nobody has read', () => {
  it('is the European household mean of Eurostat nrg_pc_204, first half of 2025, 0.2872 EUR/kWh to a tenth of a cent', () => {
    const { tariff, source, standing } = defaultTariff('EUR', prices);
    expect(tariff).toEqual({ kind: 'flat', currency: 'EUR', pricePerKwh: 0.287 });
    expect(source).toMatch(/Eurostat nrg_pc_204/);
    expect(standing).toBe('read');
  });

  it('is 16 US cents for dollars, the residential mean of 2023 by the EIA, read second-hand', () => {
    const { tariff, source, standing } = defaultTariff('USD', prices);
    expect(tariff).toEqual({ kind: 'flat', currency: 'USD', pricePerKwh: 0.16 });
    expect(source).toMatch(/EIA/);
    expect(standing).toBe('secondary');
  });

  it('is marked recalled where a recalled rate turned it into another currency', () => {
    const { tariff, source, standing } = defaultTariff('NOK', prices);
    expect(tariff).toMatchObject({ currency: 'NOK', pricePerKwh: 3.332 });
    expect(source).toMatch(/recalled rate of 11.6/);
    expect(standing).toBe('recalled');
  });

  it('is 0, said to be unknown, in a currency of which nothing is on hand: never euros under another name', () => {
    for (const currency of ['INR', 'XYZ']) {
      const { tariff, source } = defaultTariff(currency, prices);
      expect(tariff).toEqual({ kind: 'flat', currency, pricePerKwh: 0 });
      expect(source).toMatch(/No price is known/);
    }
    expect(defaultTariff('EUR', []).tariff).toMatchObject({ pricePerKwh: 0 });
  });
});
