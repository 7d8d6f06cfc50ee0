/** Pence as people write them: "£438.00". */
export const poundsText = (minor: number): string =>
  new Intl.NumberFormat('en-GB', { style: 'currency', currency: 'GBP' }).format(minor / 100);
