import { findOrderBody } from '@linkfell/contracts';

import { newReference } from './reference.js';

describe('newReference', () => {
  const many = Array.from({ length: 2_000 }, newReference);

  it('is LF- and eight signs that are not mistaken for each other', () => {
    for (const reference of many) expect(reference).toMatch(/^LF-[CDFGHJKMNPQRTVWXY34679]{8}$/);
  });

  it('is what the form for finding an order takes, typed in small letters as well', () => {
    const [reference = ''] = many;
    const email = 'wren@rider.example';
    expect(findOrderBody.parse({ reference: ` ${reference.toLowerCase()} `, email }).reference).toBe(
      reference,
    );
  });

  it('does not repeat, and uses every sign', () => {
    // 2,000 of 22^8 = 5.5e10: the chance of any pair is below 4e-5.
    expect(new Set(many).size).toBe(many.length);
    expect(new Set(many.join('').replace(/LF-/g, '')).size).toBe(22);
  });
});
