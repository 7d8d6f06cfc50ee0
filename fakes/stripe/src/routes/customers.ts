import { Router } from 'express';
import type { FakeContext } from '../context.js';
import { missing } from '../http/api-error.js';
import { endpoint, type Call } from '../http/endpoint.js';
import { createdWithin, LIST_PARAMS, page } from '../http/list.js';
import { newCustomer } from '../objects/new-customer.js';
import type { StoredCustomer } from '../objects/stored.js';

const FIELDS = ['email', 'name', 'phone', 'description'] as const;

export function customerRoutes(fake: FakeContext): Router {
  const find = ({ path }: Call): StoredCustomer => {
    const customer = fake.store.customers.get(path('id'));
    if (!customer) throw missing('customer', path('id'));
    return customer;
  };
  const router = Router();
  router.post(
    '/',
    endpoint(fake, ({ params }) => {
      params.only(...FIELDS, 'metadata');
      const values = Object.fromEntries(FIELDS.map((field) => [field, params.text(field) ?? null]));
      const customer = newCustomer({ ...values, metadata: params.metadata() });
      fake.store.customers.set(customer.id, customer);
      fake.events.emit('customer.created', customer);
      return customer;
    }),
  );
  router.get(
    '/',
    endpoint(fake, ({ params }) => {
      const within = createdWithin(params.only(...LIST_PARAMS, 'email'));
      const email = params.text('email');
      const rows = fake.store.customers.newest(
        (customer) => within(customer) && (!email || customer.email === email),
      );
      return page(rows, '/v1/customers', params);
    }),
  );
  router.get('/:id', endpoint(fake, find));
  router.post(
    '/:id',
    endpoint(fake, (call) => {
      const customer = find(call);
      const { params } = call;
      params.only(...FIELDS, 'metadata');
      for (const field of FIELDS) if (params.has(field)) customer[field] = params.text(field) ?? null;
      customer.metadata = params.mergeMetadata(customer.metadata);
      fake.events.emit('customer.updated', customer);
      return customer;
    }),
  );
  return router;
}
