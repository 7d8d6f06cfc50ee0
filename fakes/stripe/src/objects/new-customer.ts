import type { StoredCustomer } from './stored.js';
import { newId, nowSeconds } from '../store/ids.js';

export interface CustomerInput {
  email?: string | null;
  name?: string | null;
  phone?: string | null;
  description?: string | null;
  metadata?: Record<string, string>;
}

export function newCustomer(input: CustomerInput): StoredCustomer {
  const id = newId('cus', 14);
  return {
    id,
    object: 'customer',
    address: null,
    balance: 0,
    created: nowSeconds(),
    currency: null,
    default_source: null,
    delinquent: false,
    description: input.description ?? null,
    discount: null,
    email: input.email ?? null,
    invoice_prefix: id.slice(-8).toUpperCase(),
    invoice_settings: {
      custom_fields: null,
      default_payment_method: null,
      footer: null,
      rendering_options: null,
    },
    livemode: false,
    metadata: input.metadata ?? {},
    name: input.name ?? null,
    phone: input.phone ?? null,
    preferred_locales: [],
    shipping: null,
    tax_exempt: 'none',
    test_clock: null,
  };
}
