import { facts, help, look, type AboutOrder } from './about-order.js';
import { layOut, type RenderedMail } from './layout.js';

/** A mail to the rider. */
export type ToRider = AboutOrder & { name: string };

export function orderPaid(
  d: ToRider & { total: string; lines: string[]; fitting: string | null; next: string },
): RenderedMail {
  return layOut({
    subject: `Order ${d.reference}: paid`,
    preview: d.next,
    heading: 'Your payment has arrived',
    blocks: [
      { kind: 'text', text: `Hello ${d.name}, thank you. ${d.next}` },
      facts(
        d,
        ['Paid, VAT included', d.total],
        ...(d.fitting === null ? [] : [['Fitting asked for', d.fitting] as const]),
      ),
      { kind: 'list', title: 'What you bought', items: d.lines },
      look(d),
      help,
    ],
  });
}

export function orderReleased(d: ToRider & { why: string; planUrl: string | null }): RenderedMail {
  return layOut({
    subject: `Order ${d.reference}: nothing was paid`,
    preview: d.why,
    heading: 'Your order was let go',
    blocks: [
      {
        kind: 'text',
        text: `Hello ${d.name}, ${d.why} Nothing was taken from your card. Your plan and your answers are still there.`,
      },
      facts(d),
      ...(d.planUrl === null ? [] : [look({ ...d, url: d.planUrl }, 'Open your plan')]),
      help,
    ],
  });
}

export function orderRefunded(d: ToRider & { amount: string; why: string }): RenderedMail {
  return layOut({
    subject: `Order ${d.reference}: ${d.amount} goes back to you`,
    preview: d.why,
    heading: `${d.amount} goes back to your card`,
    blocks: [
      { kind: 'text', text: `Hello ${d.name}, ${d.why} Banks take a few days to show it.` },
      facts(d, ['Refund', d.amount]),
      look(d),
      help,
    ],
  });
}

/** The bank has handed a refund back, for instance because the card was closed. */
export function refundFailed(d: ToRider & { amount: string }): RenderedMail {
  return layOut({
    subject: `Order ${d.reference}: your bank did not take ${d.amount} back`,
    preview: 'Tell us how to pay it to you.',
    heading: 'We could not pay you back to your card',
    blocks: [
      {
        kind: 'text',
        text: `Hello ${d.name}, we sent ${d.amount} back to the card you paid with, and your bank returned it to us, as banks do when a card has been closed. The money is yours: answer this mail and we agree on another way to pay it.`,
      },
      facts(d, ['Refund', d.amount]),
      look(d),
      help,
    ],
  });
}

export function parcelSent(
  d: ToRider & { shop: string; to: string; items: string[]; tracking: string; next: string },
): RenderedMail {
  return layOut({
    subject: `Order ${d.reference}: ${d.shop} has sent a parcel`,
    preview: `To ${d.to}`,
    heading: `${d.shop} has sent your parcel`,
    blocks: [
      { kind: 'text', text: `Hello ${d.name}, it is on its way to ${d.to}. ${d.next}` },
      { kind: 'list', title: 'In the parcel', items: d.items },
      facts(d, ['Tracking', d.tracking || 'none given']),
      look(d),
      help,
    ],
  });
}
