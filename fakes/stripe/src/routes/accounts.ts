import { Router } from 'express';
import type { FakeContext } from '../context.js';
import { missing } from '../http/api-error.js';
import { endpoint, type Call } from '../http/endpoint.js';
import { createdWithin, LIST_PARAMS, page } from '../http/list.js';
import type { StoredAccount } from '../objects/stored.js';
import { newId, nowSeconds } from '../store/ids.js';

const CREATE = [
  'type',
  'country',
  'email',
  'metadata',
  'business_type',
  'business_profile',
  'capabilities',
  'controller',
  'default_currency',
];

/** A connected account that may be paid at once: there is no onboarding here. */
function newAccount({ params }: Call): StoredAccount {
  params.only(...CREATE);
  const profile = params.child('business_profile');
  return {
    id: newId('acct', 16),
    object: 'account',
    business_profile: {
      annual_revenue: null,
      estimated_worker_count: null,
      minority_owned_business_designation: null,
      specified_commercial_transactions_act_url: null,
      mcc: profile.text('mcc') ?? null,
      name: profile.text('name') ?? null,
      support_address: null,
      support_email: null,
      support_phone: null,
      support_url: null,
      url: profile.text('url') ?? null,
    },
    capabilities: { transfers: 'active' },
    charges_enabled: true,
    country: params.text('country') ?? 'GB',
    created: nowSeconds(),
    default_currency: params.text('default_currency') ?? 'gbp',
    details_submitted: true,
    email: params.text('email') ?? null,
    metadata: params.metadata(),
    payouts_enabled: true,
    type: params.oneOf('type', ['standard', 'express', 'custom']) ?? 'none',
  };
}

export function accountRoutes(fake: FakeContext): Router {
  const find = ({ path }: Call): StoredAccount => {
    const account = fake.store.accounts.get(path('id'));
    if (!account) throw missing('account', path('id'));
    return account;
  };
  const router = Router();
  router.post(
    '/',
    endpoint(fake, (call) => {
      const account = newAccount(call);
      fake.store.accounts.set(account.id, account);
      fake.events.emit('account.updated', account);
      return account;
    }),
  );
  router.get(
    '/',
    endpoint(fake, ({ params }) => {
      const within = createdWithin(params.only(...LIST_PARAMS));
      return page(fake.store.accounts.newest(within), '/v1/accounts', params);
    }),
  );
  router.get('/:id', endpoint(fake, find));
  router.post(
    '/:id',
    endpoint(fake, (call) => {
      const account = find(call);
      call.params.only('metadata', 'email');
      account.metadata = call.params.mergeMetadata(account.metadata ?? {});
      account.email = call.params.text('email') ?? account.email;
      fake.events.emit('account.updated', account);
      return account;
    }),
  );
  return router;
}
