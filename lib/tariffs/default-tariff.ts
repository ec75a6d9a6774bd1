import type { Tariff } from '../evaluation/evaluate-scenario';

/** A price that stands in until somebody reads the bill. */
export interface ReferenceTariff {
  tariff: Tariff;
  source: string;
}

interface Price {
  pricePerKwh: number;
  currency: string;
  place: string;
  period: string;
  source: string;
}

/** Rough values of euro and dollar prices in other currencies; recalled, good for a first figure only. */
const PER_EURO: Record<string, number> = {
  GBP: 0.86,
  CHF: 0.95,
  NOK: 11.6,
  SEK: 11.2,
  DKK: 7.46,
  ISK: 146,
  PLN: 4.3,
  CZK: 25,
  CAD: 1.5,
  AUD: 1.7,
  NZD: 1.85,
  JPY: 165,
};

/** Mean household price of the currency's home: the United States for dollars, the European Union for the rest. */
export function defaultTariff(currency: string, prices: readonly Price[]): ReferenceTariff {
  const home =
    currency === 'USD'
      ? prices.find((price) => price.currency === 'USD' && /^(US|United States)/.test(price.place))
      : prices.find((price) => price.currency === 'EUR' && /EU|European/.test(price.place));
  const price = home?.pricePerKwh ?? (currency === 'USD' ? 0.16 : 0.287);
  const rate = currency === 'USD' || currency === 'EUR' ? 1 : (PER_EURO[currency] ?? 1);
  return {
    tariff: { kind: 'flat', currency, pricePerKwh: Math.round(price * rate * 1000) / 1000 },
    source: `${home ? `${home.place}, ${home.period}: ${home.source}` : 'Recalled, unconfirmed'}${rate === 1 ? '' : `; in ${currency} by a recalled rate`}`,
  };
}
