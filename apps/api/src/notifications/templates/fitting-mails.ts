import { facts, help, look } from './about-order.js';
import { layOut, type RenderedMail } from './layout.js';
import type { ToRider } from './order-mails.js';

export function bookingAccepted(
  d: ToRider & { workshop: string; address: string; phone: string; when: string },
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

/** Another date or workshop was asked for after the first had said no. */
export function bookingAsked(
  d: ToRider & { workshop: string; when: string; answerBy: string },
): RenderedMail {
  return layOut({
    subject: `Order ${d.reference}: ${d.workshop} has been asked`,
    preview: `They answer by ${d.answerBy}.`,
    heading: `${d.workshop} has been asked for your fitting`,
    blocks: [
      {
        kind: 'text',
        text: `Hello ${d.name}, ${d.workshop} has until ${d.answerBy} to accept. Parts are sent when it has; we write to you either way.`,
      },
      facts(d, ['Workshop', d.workshop], ['When', d.when]),
      look(d),
      help,
    ],
  });
}

export function bookingOpenAgain(
  d: ToRider & { workshop: string; why: string; selfFit: boolean },
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
      facts(d, ['Workshop', d.workshop]),
      look(d, 'Choose now'),
      help,
    ],
  });
}

export function bookingCancelled(
  d: ToRider & { workshop: string; when: string; invited: boolean },
): RenderedMail {
  return layOut({
    subject: `Cancelled: fitting on ${d.when}`,
    preview: `${d.workshop}, ${d.when}`,
    heading: 'The fitting is cancelled',
    blocks: [
      {
        kind: 'text',
        text:
          `Hello ${d.name}, the fitting at ${d.workshop} on ${d.when} will not take place.` +
          (d.invited ? ' The message for your calendar that takes it out again is attached.' : ''),
      },
      facts(d),
      look(d),
      help,
    ],
  });
}

export function fitted(
  d: ToRider & { workshop: string; mechanic: string; rows: [string, string][]; cautions: string[] },
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
      { kind: 'facts', rows: [['Order', d.reference], ['Bike', d.title], ...d.rows] },
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
