const ZERO_DECIMAL = new Set('bif clp djf gnf jpy kmf krw mga pyg rwf ugx vnd vuv xaf xof xpf'.split(' '));

/** An amount in minor units as people read it: 1250 gbp is £12.50. */
export function formatMoney(minor: number, currency: string): string {
  const digits = ZERO_DECIMAL.has(currency) ? 0 : 2;
  return new Intl.NumberFormat('en-GB', {
    style: 'currency',
    currency: currency.toUpperCase(),
    minimumFractionDigits: digits,
    maximumFractionDigits: digits,
  }).format(minor / 10 ** digits);
}

/** Smallest charge in minor units, for the currencies that are used here; the published table has more. */
export const MINIMUM_CHARGE: Readonly<Record<string, number>> = { gbp: 30, eur: 50, usd: 50 };

/** True for three letters that the runtime knows as a currency. */
export function isCurrency(code: string): boolean {
  return /^[a-z]{3}$/.test(code) && Intl.supportedValuesOf('currency').includes(code.toUpperCase());
}
