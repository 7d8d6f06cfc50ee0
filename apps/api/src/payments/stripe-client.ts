import Stripe from 'stripe';

import type { Config } from '../config/config.js';

/** Injection token of the one client through which we talk to the payment provider. */
export const STRIPE = Symbol('stripe');

/** The provider's own address unless the configuration names another. */
export function stripeClient(config: Config): Stripe {
  const base = config.STRIPE_API_BASE ? new URL(config.STRIPE_API_BASE) : null;
  return new Stripe(config.STRIPE_SECRET_KEY, {
    maxNetworkRetries: 2,
    timeout: 15_000,
    ...(base
      ? {
          host: base.hostname,
          port: Number(base.port || (base.protocol === 'https:' ? 443 : 80)),
          protocol: base.protocol === 'https:' ? ('https' as const) : ('http' as const),
        }
      : {}),
  });
}
