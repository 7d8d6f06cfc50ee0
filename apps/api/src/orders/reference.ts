import { randomInt } from 'node:crypto';

/** No 0/O, 1/I/L, 5/S, 8/B, 2/Z or vowels: nothing to misread, and no words. */
const signs = 'CDFGHJKMNPQRTVWXY34679';

/** What people use for an order, such as LF-7KPQX3DT: 22^8 possibilities. */
export const newReference = (): string =>
  `LF-${Array.from({ length: 8 }, () => signs[randomInt(signs.length)]).join('')}`;
