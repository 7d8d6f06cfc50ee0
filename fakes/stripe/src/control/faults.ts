export const API_FAULTS = [
  'lose-answer',
  'lose-request',
  'answer-500-once',
  'answer-500-saved',
  'answer-429',
  'slow-answer',
] as const;
export const WEBHOOK_FAULTS = [
  'webhook-duplicate',
  'webhook-late',
  'webhook-reversed',
  'webhook-bad-signature',
  'webhook-lost',
] as const;

export type ApiFault = (typeof API_FAULTS)[number];
export type WebhookFault = (typeof WEBHOOK_FAULTS)[number];

/** What a test orders: which fault, how many times, and for which calls or events. */
export interface FaultOrder {
  fault: ApiFault | WebhookFault;
  /** How many calls or events it strikes; 1 unless told. For webhook-reversed: the size of the batch. */
  times?: number;
  /** Only calls of this path (a trailing * matches any rest). */
  path?: string;
  method?: string;
  /** Only events of this type. */
  type?: string;
  delayMs?: number;
}

interface Armed extends FaultOrder {
  left: number;
}

const isApi = (fault: string): fault is ApiFault => (API_FAULTS as readonly string[]).includes(fault);
const isWebhook = (fault: string): fault is WebhookFault =>
  (WEBHOOK_FAULTS as readonly string[]).includes(fault);

/** Faults that have been ordered and not yet struck; the oldest that matches strikes first. */
export class Faults {
  private armed: Armed[] = [];

  /** Returns false for a fault that does not exist. */
  order(order: FaultOrder): boolean {
    if (!isApi(order.fault) && !isWebhook(order.fault)) return false;
    const usual = order.fault === 'webhook-reversed' ? 2 : 1;
    this.armed.push({ ...order, left: order.times ?? usual });
    return true;
  }

  pending(): FaultOrder[] {
    return this.armed.map(({ left, ...order }) => ({ ...order, times: left }));
  }

  clear(): void {
    this.armed = [];
  }

  takeApi(method: string, path: string): { fault: ApiFault; delayMs?: number } | undefined {
    const armed = this.armed.find(
      (one) =>
        isApi(one.fault) &&
        pathMatches(one.path, path) &&
        (!one.method || one.method.toUpperCase() === method),
    );
    if (!armed || !isApi(armed.fault)) return undefined;
    this.use(armed);
    return { fault: armed.fault, delayMs: armed.delayMs };
  }

  takeWebhook(type: string): { fault: WebhookFault; delayMs?: number; last: boolean } | undefined {
    const armed = this.armed.find((one) => isWebhook(one.fault) && (!one.type || one.type === type));
    if (!armed || !isWebhook(armed.fault)) return undefined;
    this.use(armed);
    return { fault: armed.fault, delayMs: armed.delayMs, last: armed.left === 0 };
  }

  private use(armed: Armed): void {
    armed.left -= 1;
    if (armed.left <= 0) this.armed = this.armed.filter((one) => one !== armed);
  }
}

function pathMatches(pattern: string | undefined, path: string): boolean {
  if (!pattern) return true;
  return pattern.endsWith('*') ? path.startsWith(pattern.slice(0, -1)) : path === pattern;
}
