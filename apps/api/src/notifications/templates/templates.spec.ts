import { escapeHtml } from './layout.js';
import { templates, type TemplateData, type TemplateName } from './templates.js';

const about = {
  reference: 'LF-7KPQX3DT',
  title: 'Withen & Sons 140',
  shockName: 'Tarn 210x50',
  url: 'https://linkfell.example/orders/LF-7KPQX3DT',
};
const rider = { ...about, name: 'Wren <b>' };
const when = 'Thu, 10 Dec 2026, 09:30';
const workshop = 'Tin Shed';
const items = ['1 x Tarn 210x50', '2 x Kit 30x8'];

const samples: { [Name in TemplateName]: TemplateData<Name> } = {
  'password-changed': { name: 'Wren', url: about.url },
  'password-reset': { name: 'Wren', url: about.url, minutes: 30 },
  'order-paid': {
    ...rider,
    total: '£438.00',
    lines: items,
    fitting: `${workshop}\n${when}`,
    next: 'We write.',
  },
  'order-released': { ...rider, why: 'the time ran out.', planUrl: 'https://linkfell.example/plans/1' },
  'order-refunded': { ...rider, amount: '£438.00', why: 'you asked for it.' },
  'refund-failed': { ...rider, amount: '£438.00' },
  'parcel-sent': {
    ...rider,
    shop: 'Fellside',
    to: workshop,
    items,
    tracking: 'AB 12',
    next: 'They keep it.',
  },
  'booking-accepted': { ...rider, workshop, address: '1 Beck Lane', phone: '01632 960000', when },
  'booking-asked': { ...rider, workshop, when, answerBy: when },
  'booking-open-again': { ...rider, workshop, why: 'the press is away.', selfFit: true },
  'booking-cancelled': { ...rider, workshop, when, invited: true },
  fitted: {
    ...rider,
    workshop,
    mechanic: 'Ada',
    rows: [['Sag', '13.8 mm']],
    cautions: ['Stop if it knocks.'],
  },
  'shop-order': {
    ...about,
    shop: 'Fellside',
    items,
    to: 'Tin Shed, Skelhow',
    dispatchBy: 'Thu',
    waitsFor: null,
  },
  'shop-cancelled': { ...about, shop: 'Fellside', items },
  'workshop-request': { ...about, workshop, when, minutes: 60, answerBy: when, work: ['Put the shock in'] },
  'workshop-cancelled': { ...about, workshop, when },
  'workshop-lapsed': { ...about, workshop, when },
  'workshop-parcel': { ...about, workshop, when, shop: 'Fellside', items, tracking: '' },
};

const render = (name: TemplateName) =>
  (templates[name] as (data: unknown) => ReturnType<(typeof templates)['fitted']>)(samples[name]);
const aboutOrders = (Object.keys(templates) as TemplateName[]).filter((name) => !name.startsWith('password'));

describe('mails', () => {
  it.each(Object.keys(templates) as TemplateName[])('%s says the same in text and HTML, plainly', (name) => {
    const { subject, text, html } = render(name);
    expect(subject).not.toBe('');
    expect(`${subject}${text}`).not.toContain('!');
    expect(text).not.toMatch(/undefined|null|NaN|\[object/);
    const paragraphs = text
      .split('\n')
      .filter((line) => line !== '' && line !== '--' && !/^https?:/.test(line));
    const plain = html.replace(/<br>/g, ', ');
    for (const line of paragraphs) {
      // "Label: value" and "- item" are cells and list entries in HTML.
      for (const part of line.replace(/^- /, '').split(/: |:$/)) expect(plain).toContain(escapeHtml(part));
    }
  });

  it.each(aboutOrders)('%s names the order, where to look and whom to ask', (name) => {
    const { text } = render(name);
    for (const part of [about.reference, 'https://linkfell.example/', 'help@linkfell.example']) {
      expect(text).toContain(part);
    }
  });

  it('lets no name into the HTML as HTML', () => {
    for (const name of aboutOrders) expect(render(name).html).not.toContain('<b>');
  });

  it('tells a shop where to send only when it may', () => {
    const waiting = templates['shop-order']({ ...samples['shop-order'], waitsFor: workshop });
    expect(waiting.text).toContain('send nothing yet');
    expect(waiting.text).toContain(workshop);
    expect(waiting.text).not.toContain('Skelhow');
    expect(render('shop-order').text).toContain('Skelhow');
  });

  it('offers self-fit only where it is offered', () => {
    expect(render('booking-open-again').text).toContain('fit it yourself');
    const without = templates['booking-open-again']({ ...samples['booking-open-again'], selfFit: false });
    expect(without.text).not.toContain('fit it yourself');
  });
});
