import { Router } from 'express';
import type { FakeContext } from '../context.js';
import { missing } from '../http/api-error.js';
import { endpoint, type Call } from '../http/endpoint.js';
import { createdWithin, LIST_PARAMS, page } from '../http/list.js';
import { presentTransfer } from '../objects/present.js';
import type { StoredTransfer } from '../objects/stored.js';
import { createTransfer, reverseTransfer } from '../payments/transfer.js';

export function transferRoutes(fake: FakeContext): Router {
  const find = ({ path }: Call): StoredTransfer => {
    const transfer = fake.store.transfers.get(path('id'));
    if (!transfer) throw missing('transfer', path('id'));
    return transfer;
  };
  const router = Router();
  router.post(
    '/',
    endpoint(fake, ({ params }) => presentTransfer(fake, createTransfer(fake, params))),
  );
  router.get(
    '/',
    endpoint(fake, ({ params }) => {
      const within = createdWithin(params.only(...LIST_PARAMS, 'destination', 'transfer_group'));
      const [destination, group] = [params.text('destination'), params.text('transfer_group')];
      const rows = fake.store.transfers.newest(
        (transfer) =>
          within(transfer) &&
          (!destination || transfer.destination === destination) &&
          (!group || transfer.transfer_group === group),
      );
      return page(
        rows.map((transfer) => presentTransfer(fake, transfer)),
        '/v1/transfers',
        params,
      );
    }),
  );
  router.get(
    '/:id',
    endpoint(fake, (call) => presentTransfer(fake, find(call))),
  );
  router.post(
    '/:id',
    endpoint(fake, (call) => {
      const transfer = find(call);
      transfer.metadata = call.params.only('metadata', 'description').mergeMetadata(transfer.metadata);
      transfer.description = call.params.text('description') ?? transfer.description;
      fake.events.emit('transfer.updated', presentTransfer(fake, transfer));
      return presentTransfer(fake, transfer);
    }),
  );
  router.post(
    '/:id/reversals',
    endpoint(fake, (call) => reverseTransfer(fake, find(call), call.params)),
  );
  router.get(
    '/:id/reversals',
    endpoint(fake, (call) => {
      const { id } = find(call);
      const rows = fake.store.reversals.newest((reversal) => reversal.transfer === id);
      return page(rows, `/v1/transfers/${id}/reversals`, call.params.only(...LIST_PARAMS));
    }),
  );
  router.get(
    '/:id/reversals/:reversal',
    endpoint(fake, (call) => {
      const reversal = fake.store.reversals.get(call.path('reversal'));
      if (reversal?.transfer !== find(call).id) throw missing('transfer reversal', call.path('reversal'));
      return reversal;
    }),
  );
  return router;
}
