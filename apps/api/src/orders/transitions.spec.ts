import fc from 'fast-check';

import {
  bookingTransitions,
  orderTransitions,
  parcelTransitions,
  paymentTransitions,
  refundTransitions,
  step,
} from './transitions.js';

const tables = {
  order: { table: orderTransitions, start: 'held', ends: ['completed'] },
  payment: { table: paymentTransitions, start: 'preparing', ends: ['paid'] },
  booking: {
    table: bookingTransitions,
    start: 'held',
    ends: ['declined', 'lapsed', 'cancelled', 'released', 'fitted'],
  },
  parcel: { table: parcelTransitions, start: 'held', ends: ['sent'] },
  refund: { table: refundTransitions, start: 'pending', ends: [] },
} as const;

type Rows = Readonly<Record<string, readonly string[]>>;

describe.each(Object.entries(tables))('states of a %s', (_name, { table, start, ends }) => {
  const rows = table as Rows;
  const states = Object.keys(rows);

  it('are all reached from the first', () => {
    const seen = new Set<string>([start]);
    for (const state of seen) for (const next of rows[state] ?? []) seen.add(next);
    expect([...seen].sort()).toEqual([...states].sort());
  });

  it('end where nothing more can happen', () => {
    expect(states.filter((state) => rows[state]?.length === 0).sort()).toEqual([...ends].sort());
  });

  it('change only as the table has it, whatever is tried', () => {
    fc.assert(
      fc.property(fc.array(fc.constantFrom(...states), { maxLength: 30 }), (tries) => {
        let at: string = start;
        for (const to of tries) {
          const allowed = rows[at]?.includes(to) ?? false;
          if (allowed) at = step(rows, at, to);
          else expect(() => step(rows, at, to)).toThrow(`no way from "${at}" to "${to}"`);
        }
      }),
      { seed: 20261201 },
    );
  });
});

describe('money and goods', () => {
  it('never leave twice: what is sent, fitted, completed or paid stays so', () => {
    expect(parcelTransitions.sent).toEqual([]);
    expect(bookingTransitions.fitted).toEqual([]);
    expect(orderTransitions.completed).toEqual([]);
    expect(paymentTransitions.paid).toEqual([]);
  });

  it('nothing is paid back that was not paid: every way to a refund leads through a payment or its late arrival', () => {
    const before = Object.entries(orderTransitions).filter(([, to]) =>
      (to as readonly string[]).includes('refunding'),
    );
    expect(before.map(([from]) => from).sort()).toEqual(['paid', 'refunded', 'released']);
  });
});
