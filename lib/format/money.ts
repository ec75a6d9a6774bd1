import { figureText } from './figure';

const symbols: Record<string, string> = {
  EUR: '€',
  GBP: '£',
  USD: '$',
  CAD: 'CA$',
  AUD: 'A$',
  NZD: 'NZ$',
  CHF: 'CHF',
  NOK: 'NOK',
  SEK: 'SEK',
  DKK: 'DKK',
  ISK: 'ISK',
  PLN: 'PLN',
  CZK: 'CZK',
  JPY: '¥',
};

export const currencies = Object.keys(symbols);

/** How many minor units one major unit has: 100 for most, 1 for some. */
export function minorPerMajor(currency: string): number {
  try {
    const digits =
      new Intl.NumberFormat('en', { style: 'currency', currency }).resolvedOptions().maximumFractionDigits ?? 2;
    return 10 ** digits;
  } catch {
    return 100;
  }
}

export const currencySymbol = (currency: string): string => symbols[currency] ?? currency;

/** An amount of money in major units: `€ 54.60`, `£ 1 240` where the pennies would only be noise. */
export function formatMoney(major: number, currency: string, options: { digits?: number } = {}): string {
  const most = Math.log10(minorPerMajor(currency));
  const digits = options.digits ?? (Math.abs(major) >= 1000 ? 0 : most);
  const figure = figureText(major, digits);
  return `${figure.startsWith('−') ? '−' : ''}${currencySymbol(currency)}\u00a0${figure.replace('−', '')}`;
}

/** A price of a kWh: `€ 0.287`, with as many digits as it has, four at most. */
export function formatPrice(perKwh: number, currency: string): string {
  const least = Math.log10(minorPerMajor(currency));
  const written = Number(perKwh.toFixed(4)).toString().split('.')[1]?.length ?? 0;
  return formatMoney(perKwh, currency, { digits: Math.max(least, written) });
}

export const formatMinor = (minor: number, currency: string): string =>
  formatMoney(minor / minorPerMajor(currency), currency);
