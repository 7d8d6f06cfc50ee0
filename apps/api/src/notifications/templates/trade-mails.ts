import { facts, help, look, type AboutOrder } from './about-order.js';
import { layOut, type Block, type RenderedMail } from './layout.js';

type ToShop = AboutOrder & { shop: string; items: string[] };
type ToWorkshop = AboutOrder & { workshop: string; when: string };

const inTheParcel = (items: readonly string[], title = 'In the parcel'): Block => ({
  kind: 'list',
  title,
  items,
});

export function shopOrder(
  d: ToShop & { to: string; dispatchBy: string; waitsFor: string | null },
): RenderedMail {
  const waits = d.waitsFor !== null;
  return layOut({
    subject: waits ? `Order ${d.reference}: wait for the workshop` : `Order ${d.reference}: please send`,
    preview: waits ? 'Send nothing yet.' : `Please send by ${d.dispatchBy}.`,
    heading: waits ? 'A new order: send nothing yet' : 'A parcel to send',
    blocks: [
      {
        kind: 'text',
        text: waits
          ? `Hello ${d.shop}, a rider has bought from you. The parts go to ${d.waitsFor}, which has yet to accept the fitting. We write again as soon as it has.`
          : `Hello ${d.shop}, please send this parcel by ${d.dispatchBy} and mark it sent.`,
      },
      inTheParcel(d.items),
      {
        kind: 'facts',
        rows: [
          ['Order', d.reference],
          ...(waits ? [] : [['To', d.to] as const]),
          [waits ? 'To be sent by, once accepted' : 'Send by', d.dispatchBy],
        ],
      },
      look(d, 'Open your parcels'),
      help,
    ],
  });
}

export function shopCancelled(d: ToShop): RenderedMail {
  return layOut({
    subject: `Order ${d.reference}: cancelled, do not send`,
    preview: 'The rider has the money back; the parts are free to sell again.',
    heading: 'Cancelled: do not send this parcel',
    blocks: [
      {
        kind: 'text',
        text: `Hello ${d.shop}, the rider has called this order off. Send nothing; the parts are free in your stock again.`,
      },
      inTheParcel(d.items, 'What was ordered'),
      { kind: 'facts', rows: [['Order', d.reference]] },
      look(d, 'Open your parcels'),
      help,
    ],
  });
}

export function workshopRequest(
  d: ToWorkshop & { minutes: number; answerBy: string; work: string[] },
): RenderedMail {
  return layOut({
    subject: `Fitting asked for: ${d.when}`,
    preview: `Please answer by ${d.answerBy}.`,
    heading: 'A rider asks for a fitting',
    blocks: [
      {
        kind: 'text',
        text: `Hello ${d.workshop}, please accept or decline by ${d.answerBy}. Parts are sent to you only when you have accepted; unanswered, the rider chooses again.`,
      },
      facts(d, ['When', d.when], ['Stand time', `${d.minutes} minutes`]),
      { kind: 'list', title: 'The work', items: d.work },
      look(d, 'Open the job sheet'),
      help,
    ],
  });
}

export function workshopCancelled(d: ToWorkshop): RenderedMail {
  return layOut({
    subject: `Cancelled: fitting on ${d.when}`,
    preview: `${d.reference}: the stand is free again.`,
    heading: 'A fitting is cancelled',
    blocks: [
      {
        kind: 'text',
        text: `Hello ${d.workshop}, the rider has called the fitting on ${d.when} off. Your stand is free again; no parts will come.`,
      },
      facts(d),
      look(d, 'Open the job sheet'),
      help,
    ],
  });
}

/** Nobody answered in time: the stand is free again. */
export function workshopLapsed(d: ToWorkshop): RenderedMail {
  return layOut({
    subject: `Not answered in time: fitting on ${d.when}`,
    preview: `${d.reference}: the rider chooses again.`,
    heading: 'The time to answer is over',
    blocks: [
      {
        kind: 'text',
        text: `Hello ${d.workshop}, the fitting asked for on ${d.when} was not answered within your working day, so the rider now chooses again. Your stand is free; there is nothing to do.`,
      },
      facts(d),
      look(d, 'Open the job sheet'),
      help,
    ],
  });
}

export function workshopParcel(
  d: ToWorkshop & { shop: string; items: string[]; tracking: string },
): RenderedMail {
  return layOut({
    subject: `Order ${d.reference}: parts are on their way to you`,
    preview: `${d.shop} has sent them, for the fitting on ${d.when}.`,
    heading: `${d.shop} has sent you parts`,
    blocks: [
      {
        kind: 'text',
        text: `Hello ${d.workshop}, these parts are for the fitting on ${d.when}. Keep them with the job sheet.`,
      },
      inTheParcel(d.items),
      facts(d, ['Tracking', d.tracking || 'none given']),
      look(d, 'Open the job sheet'),
      help,
    ],
  });
}
