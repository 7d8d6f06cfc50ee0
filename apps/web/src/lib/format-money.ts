const whole = new Intl.NumberFormat('en-GB', {
  style: 'currency',
  currency: 'GBP',
  maximumFractionDigits: 0,
});
const exact = new Intl.NumberFormat('en-GB', { style: 'currency', currency: 'GBP' });

/** £438 from 43800 pence, £438.50 from 43850. Negative amounts carry a true minus sign. */
export function formatMoney(minor: number): string {
  if (!Number.isSafeInteger(minor)) throw new RangeError(`Money is whole pence, not ${minor}`);
  const text = (minor % 100 === 0 ? whole : exact).format(Math.abs(minor) / 100);
  return minor < 0 ? `−${text}` : text;
}

/** Always with pence, for columns that are added up. */
export function formatMoneyExact(minor: number): string {
  if (!Number.isSafeInteger(minor)) throw new RangeError(`Money is whole pence, not ${minor}`);
  const text = exact.format(Math.abs(minor) / 100);
  return minor < 0 ? `−${text}` : text;
}
