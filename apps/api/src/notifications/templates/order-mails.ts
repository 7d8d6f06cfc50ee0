import { layOut, type Block, type RenderedMail } from './layout.js';

interface AboutOrder {
  reference: string;
  title: string;
  shockName: string;
  url: string;
}

const facts = (order: AboutOrder, ...rows: (readonly [string, string])[]): Block => ({
  kind: 'facts',
  rows: [['Order', order.reference], ['Bike', order.title], ['Shock', order.shockName], ...rows],
});
const look = (order: AboutOrder, label = 'Look at your order'): Block => ({
  kind: 'button',
  label,
  url: order.url,
});
const help: Block = {
  kind: 'note',
  text: 'Questions? Answer this mail, or write to help@linkfell.example with the reference.',
};

export function orderPaid(
  d: AboutOrder & { name: string; total: string; lines: string[]; next: string },
): RenderedMail {
  return layOut({
    subject: `Order ${d.reference}: paid`,
    preview: d.next,
    heading: 'Your payment has arrived',
    blocks: [
      { kind: 'text', text: `Hello ${d.name}, thank you. ${d.next}` },
      facts(d, ['Paid, VAT included', d.total]),
      { kind: 'list', title: 'What you bought', items: d.lines },
      look(d),
      help,
    ],
  });
}

export function orderReleased(d: AboutOrder & { name: string; why: string; planUrl: string }): RenderedMail {
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
      { kind: 'button', label: 'Open your plan', url: d.planUrl },
      help,
    ],
  });
}

export function orderRefunded(d: AboutOrder & { name: string; amount: string; why: string }): RenderedMail {
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

export function shopOrder(
  d: AboutOrder & { shop: string; items: string[]; to: string; dispatchBy: string; waits: boolean },
): RenderedMail {
  return layOut({
    subject: d.waits ? `Order ${d.reference}: wait for the workshop` : `Order ${d.reference}: please send`,
    preview: d.waits ? 'Send nothing yet.' : `Please send by ${d.dispatchBy}.`,
    heading: d.waits ? 'A new order: send nothing yet' : 'A parcel to send',
    blocks: [
      {
        kind: 'text',
        text: d.waits
          ? `Hello ${d.shop}, a rider has bought from you. The parts go to a workshop, which has yet to accept the fitting. We write again as soon as it has.`
          : `Hello ${d.shop}, please send this parcel by ${d.dispatchBy} and mark it sent.`,
      },
      { kind: 'list', title: 'In the parcel', items: d.items },
      {
        kind: 'facts',
        rows: [
          ['Order', d.reference],
          ['To', d.to],
          ['Send by', d.dispatchBy],
        ],
      },
      look(d, 'Open your parcels'),
    ],
  });
}

export function workshopRequest(
  d: AboutOrder & { workshop: string; when: string; minutes: number; answerBy: string; work: string[] },
): RenderedMail {
  return layOut({
    subject: `Fitting asked for: ${d.when}`,
    preview: `Please answer by ${d.answerBy}.`,
    heading: 'A rider asks for a fitting',
    blocks: [
      {
        kind: 'text',
        text: `Hello ${d.workshop}, please accept or decline by ${d.answerBy}. Parts are sent to you only when you have accepted.`,
      },
      facts(d, ['When', d.when], ['Stand time', `${d.minutes} minutes`]),
      { kind: 'list', title: 'The work', items: d.work },
      look(d, 'Open the job sheet'),
    ],
  });
}

export function bookingAccepted(
  d: AboutOrder & { name: string; workshop: string; address: string; phone: string; when: string },
): RenderedMail {
  return layOut({
    subject: `Your fitting is agreed: ${d.when}`,
    preview: `${d.workshop} has accepted.`,
    heading: `${d.workshop} has accepted your fitting`,
    blocks: [
      {
        kind: 'text',
        text: `Hello ${d.name}, bring the bike on ${d.when}. The parts are now being sent to the workshop. The invitation for your calendar is attached.`,
      },
      facts(d, ['Workshop', `${d.workshop}\n${d.address}\n${d.phone}`], ['When', d.when]),
      look(d),
      help,
    ],
  });
}

export function bookingOpenAgain(
  d: AboutOrder & { name: string; workshop: string; why: string; selfFit: boolean },
): RenderedMail {
  return layOut({
    subject: `Order ${d.reference}: please choose again`,
    preview: d.why,
    heading: 'Your fitting needs another workshop',
    blocks: [
      { kind: 'text', text: `Hello ${d.name}, ${d.why} Nothing has been sent.` },
      {
        kind: 'list',
        title: 'You can',
        items: [
          'choose another workshop',
          ...(d.selfFit ? ['fit it yourself'] : []),
          'have all your money back',
        ],
      },
      facts(d),
      look(d, 'Choose now'),
      help,
    ],
  });
}

export function bookingCancelled(
  d: AboutOrder & { name: string; workshop: string; when: string },
): RenderedMail {
  return layOut({
    subject: `Cancelled: fitting on ${d.when}`,
    preview: `${d.workshop}, ${d.when}`,
    heading: 'The fitting is cancelled',
    blocks: [
      {
        kind: 'text',
        text: `Hello ${d.name}, the fitting at ${d.workshop} on ${d.when} will not take place.`,
      },
      facts(d),
      help,
    ],
  });
}

export function parcelSent(
  d: AboutOrder & { name: string; shop: string; to: string; items: string[]; tracking: string },
): RenderedMail {
  return layOut({
    subject: `Order ${d.reference}: ${d.shop} has sent a parcel`,
    preview: `To ${d.to}`,
    heading: `${d.shop} has sent your parcel`,
    blocks: [
      { kind: 'text', text: `Hello ${d.name}, it is on its way to ${d.to}.` },
      { kind: 'list', title: 'In the parcel', items: d.items },
      facts(d, ['Tracking', d.tracking || 'none given']),
      look(d),
      help,
    ],
  });
}

export function fitted(
  d: AboutOrder & {
    name: string;
    workshop: string;
    mechanic: string;
    rows: [string, string][];
    cautions: string[];
  },
): RenderedMail {
  return layOut({
    subject: `Your shock is fitted: what was set`,
    preview: `${d.workshop} has fitted your ${d.shockName}.`,
    heading: 'Your shock is fitted',
    blocks: [
      {
        kind: 'text',
        text: `Hello ${d.name}, ${d.mechanic} at ${d.workshop} has fitted your ${d.shockName}. This is what was set; keep it.`,
      },
      { kind: 'facts', rows: d.rows },
      {
        kind: 'list',
        title: 'After the first rides',
        items: [
          'Check the sag again with your usual kit.',
          'Check the mounting bolts to the torques above.',
          ...d.cautions,
        ],
      },
      look(d),
      help,
    ],
  });
}
