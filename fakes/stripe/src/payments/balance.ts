import type { Store } from '../store/store.js';

/**
 * Money per currency in minor units. The platform's own: taken less refunded, less what was transferred and not
 * taken back. A connected account's: what was transferred to it and not taken back. All of it is available at once.
 */
export function balances(store: Store, account: string | null): Map<string, number> {
  const totals = new Map<string, number>();
  const add = (currency: string, amount: number): void => {
    totals.set(currency, (totals.get(currency) ?? 0) + amount);
  };
  if (account === null) {
    for (const charge of store.charges.all())
      add(charge.currency, charge.amount_captured - charge.amount_refunded);
  }
  for (const transfer of store.transfers.all()) {
    const moved = transfer.amount - transfer.amount_reversed;
    if (account === null) add(transfer.currency, -moved);
    else if (transfer.destination === account) add(transfer.currency, moved);
  }
  return totals;
}
