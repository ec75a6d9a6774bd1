import type { Standing, Tariff } from '../evaluation/evaluate-scenario';

/** A price that stands in until somebody reads the bill. */
export interface ReferenceTariff {
  tariff: Tariff;
  source: string;
  standing: Standing;
}

interface Price {
  pricePerKwh: number;
  currency: string;
  place: string;
  period: string;
  source: string;
  standing: Standing;
}

/** Rough worth of a euro in other currencies; recalled, good for a first figure only. */
const PER_EURO = new Map<string, number>([
  ['GBP', 0.86],
  ['CHF', 0.95],
  ['NOK', 11.6],
  ['SEK', 11.2],
  ['DKK', 7.46],
  ['ISK', 146],
  ['PLN', 4.3],
  ['CZK', 25],
  ['CAD', 1.5],
  ['AUD', 1.7],
  ['NZD', 1.85],
  ['JPY', 165],
]);

/** The whole country's price, not a part's. Of several periods the one that stands first in the reference is taken. */
const HOME: Record<'USD' | 'EUR', string> = { USD: 'United States', EUR: 'EU' };

const flat = (currency: string, pricePerKwh: number): Tariff => ({ kind: 'flat', currency, pricePerKwh });

/**
 * Mean household price of the currency's home: the United States for dollars, the European Union for euros and, by a recalled
 * rate, for a few currencies more. Of any other nothing is known: the price is 0 and says so, since a guess would look like money.
 */
export function defaultTariff(currency: string, prices: readonly Price[]): ReferenceTariff {
  const home = currency === 'USD' ? 'USD' : 'EUR';
  const rate = currency === home ? 1 : PER_EURO.get(currency);
  const price = prices.find((each) => each.currency === home && each.place === HOME[home]);
  if (!price || rate === undefined)
    return {
      tariff: flat(currency, 0),
      source: `No price is known in ${currency}; it counts as 0 until you type yours`,
      standing: 'recalled',
    };
  const from = `${price.place}, ${price.period}: ${price.source}`;
  return {
    tariff: flat(currency, Math.round(price.pricePerKwh * rate * 1000) / 1000),
    source: rate === 1 ? from : `${from}; in ${currency} by a recalled rate of ${rate} to the euro`,
    standing: rate === 1 ? price.standing : 'recalled',
  };
}
