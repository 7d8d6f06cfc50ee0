import type { FakeContext } from '../context.js';
import { invalidParam, missing, refused } from '../http/api-error.js';
import type { Params } from '../http/params.js';
import { formatMoney } from '../objects/money.js';
import { presentTransfer } from '../objects/present.js';
import type { StoredReversal, StoredTransfer } from '../objects/stored.js';
import { newId, nowSeconds } from '../store/ids.js';
import { balances } from './balance.js';

/** Moves money to a connected account, never more than its source charge or the balance has left. */
export function createTransfer(fake: FakeContext, params: Params): StoredTransfer {
  params.only(
    'amount',
    'currency',
    'destination',
    'transfer_group',
    'source_transaction',
    'metadata',
    'description',
  );
  const currency = params.needText('currency').toLowerCase();
  const destination = params.needText('destination');
  const amount = params.needWhole('amount');
  if (amount < 1) throw invalidParam('Invalid positive integer', 'amount', 'parameter_invalid_integer');
  if (!fake.store.accounts.get(destination)) throw missing('destination', destination, 'destination');
  const source = params.text('source_transaction') ?? null;
  const charge = source ? fake.store.charges.get(source) : undefined;
  if (source && !charge) throw missing('charge', source, 'source_transaction');
  if (charge) {
    const moved = fake.store.transfers.newest((transfer) => transfer.source_transaction === charge.id);
    const left = charge.amount_captured - moved.reduce((sum, transfer) => sum + transfer.amount, 0);
    if (amount > left) {
      throw refused(
        `Transfers using ${charge.id} as their source_transaction may not exceed the source amount: ${formatMoney(Math.max(0, left), currency)} is left.`,
        { param: 'amount' },
      );
    }
  } else if (amount > (balances(fake.store, null).get(currency) ?? 0)) {
    throw refused('You have insufficient available funds in your account for this transfer.', {
      code: 'balance_insufficient',
    });
  }
  const transfer: StoredTransfer = {
    id: newId('tr'),
    object: 'transfer',
    amount,
    amount_reversed: 0,
    balance_transaction: null,
    created: nowSeconds(),
    currency,
    description: params.text('description') ?? null,
    destination,
    livemode: false,
    metadata: params.metadata(),
    reversed: false,
    source_transaction: source,
    source_type: 'card',
    transfer_group: params.text('transfer_group') ?? charge?.transfer_group ?? null,
  };
  fake.store.transfers.set(transfer.id, transfer);
  fake.events.emit('transfer.created', presentTransfer(fake, transfer));
  return transfer;
}

/** Takes money back from a connected account: all that is left of the transfer unless told. */
export function reverseTransfer(fake: FakeContext, transfer: StoredTransfer, params: Params): StoredReversal {
  params.only('amount', 'metadata', 'description');
  const left = transfer.amount - transfer.amount_reversed;
  const amount = params.whole('amount') ?? left;
  if (left === 0) throw refused(`Transfer ${transfer.id} is already fully reversed.`);
  if (amount < 1) throw invalidParam('Invalid positive integer', 'amount', 'parameter_invalid_integer');
  if (amount > left) {
    throw refused(
      `Reversal amount (${formatMoney(amount, transfer.currency)}) is greater than unreversed amount on transfer (${formatMoney(left, transfer.currency)})`,
      { param: 'amount' },
    );
  }
  const reversal: StoredReversal = {
    id: newId('trr'),
    object: 'transfer_reversal',
    amount,
    balance_transaction: null,
    created: nowSeconds(),
    currency: transfer.currency,
    destination_payment_refund: null,
    metadata: params.metadata(),
    source_refund: null,
    transfer: transfer.id,
  };
  fake.store.reversals.set(reversal.id, reversal);
  transfer.amount_reversed += amount;
  transfer.reversed = transfer.amount_reversed === transfer.amount;
  fake.events.emit('transfer.reversed', presentTransfer(fake, transfer));
  return reversal;
}
