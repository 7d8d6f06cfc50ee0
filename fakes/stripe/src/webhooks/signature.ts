import { createHmac } from 'node:crypto';

/**
 * The `Stripe-Signature` header: HMAC-SHA256 over "timestamp.body" with the endpoint's secret.
 * Scheme: https://docs.stripe.com/webhooks/signature
 */
export function signatureHeader(body: string, secret: string, timestamp: number): string {
  const v1 = createHmac('sha256', secret).update(`${timestamp}.${body}`).digest('hex');
  return `t=${timestamp},v1=${v1}`;
}
