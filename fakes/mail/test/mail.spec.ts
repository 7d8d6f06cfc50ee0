import { createHash } from 'node:crypto';
import { createTransport, type SendMailOptions } from 'nodemailer';
import { describe, expect, it, onTestFinished } from 'vitest';
import { startFakeMail, type FakeMail } from '../src/index.js';

const PIXEL = Buffer.from(
  'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNk+M9QDwADhgGAWjR9awAAAABJRU5ErkJggg==',
  'base64',
);
const ICS = [
  'BEGIN:VCALENDAR',
  'VERSION:2.0',
  'PRODID:-//Linkfell//test',
  'METHOD:REQUEST',
  'END:VCALENDAR',
  '',
].join('\r\n');

async function start(): Promise<FakeMail> {
  const fake = await startFakeMail();
  onTestFinished(() => fake.close());
  return fake;
}

/** Sends as an application would, by nodemailer over SMTP. */
async function send(fake: FakeMail, over: SendMailOptions = {}, socketTimeout = 5000): Promise<void> {
  const transport = createTransport({ host: '127.0.0.1', port: fake.smtpPort, secure: false, socketTimeout });
  try {
    await transport.sendMail({
      from: 'Linkfell <orders@example.com>',
      to: 'rider@example.com',
      subject: 'Your order LF-1',
      text: 'Paid: £740.00 – thank you',
      html: '<p>Paid: <b>£740.00</b></p><img src="cid:drawing" alt="drawing">',
      ...over,
    });
  } finally {
    transport.close();
  }
}

const api = async <T>(fake: FakeMail, path: string): Promise<T> =>
  (await (await fetch(`${fake.url}/api${path}`)).json()) as T;
const post = (fake: FakeMail, body: object): Promise<Response> =>
  fetch(`${fake.url}/api/mode`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify(body),
  });

interface ListAnswer {
  total: number;
  messages: {
    id: string;
    from: string;
    to: string[];
    subject: string;
    text: string;
    html: string;
    headers: { name: string; value: string }[];
    attachments: { filename: string; contentType: string; url: string }[];
    calendars: { method: string | null; text: string }[];
    raw?: string;
  }[];
}

describe('the SMTP server and its JSON API', () => {
  it('takes a message apart: text, HTML, picture, attachment and invitation', async () => {
    const fake = await start();
    await send(fake, {
      headers: { 'X-Order': 'LF-1' },
      icalEvent: { method: 'REQUEST', filename: 'fitting.ics', content: ICS },
      attachments: [
        { filename: 'drawing.png', content: PIXEL, cid: 'drawing' },
        { filename: 'Größe.txt', content: 'two' },
      ],
    });
    const { total, messages } = await api<ListAnswer>(fake, '/messages');
    expect(total).toBe(1);
    const [message] = messages;
    expect(message).toMatchObject({
      from: 'orders@example.com',
      to: ['rider@example.com'],
      subject: 'Your order LF-1',
      envelope: { from: 'orders@example.com', to: ['rider@example.com'] },
    });
    expect(message?.text).toContain('Paid: £740.00 – thank you');
    expect(message?.html).toContain('<b>£740.00</b>');
    expect(message?.raw).toBeUndefined();
    expect(message?.headers).toContainEqual({ name: 'X-Order', value: 'LF-1' });
    expect(
      message?.calendars.find(({ method }) => method === 'REQUEST')?.text.replace(/\r?\n/g, '\r\n'),
    ).toBe(ICS);
    expect(message?.attachments.map(({ filename }) => filename)).toEqual(
      expect.arrayContaining(['drawing.png', 'Größe.txt', 'fitting.ics']),
    );
    const picture = message?.attachments.find(({ filename }) => filename === 'drawing.png');
    const answer = await fetch(`${fake.url}${picture?.url}`);
    expect(answer.headers.get('content-type')).toBe('image/png');
    expect(Buffer.from(await answer.arrayBuffer()).equals(PIXEL)).toBe(true);
    expect((await api<ListAnswer['messages'][number]>(fake, `/messages/${message?.id}`)).subject).toBe(
      'Your order LF-1',
    );
    expect((await fetch(`${fake.url}/api/messages/${message?.id}/attachments/9`)).status).toBe(404);
  });

  it('finds by whole address, also of a blind copy, and by part of the subject', async () => {
    const fake = await start();
    await send(fake);
    await send(fake, { to: 'shop@example.com', bcc: 'archive@example.com', subject: 'Order to send' });
    const subjects = async (query: string): Promise<string[]> =>
      (await api<ListAnswer>(fake, `/messages?${query}`)).messages.map(({ subject }) => subject);
    expect(await subjects('')).toEqual(['Order to send', 'Your order LF-1']);
    expect(await subjects('to=Rider@example.com')).toEqual(['Your order LF-1']);
    expect(await subjects('to=rider@example')).toEqual([]);
    expect(await subjects('to=archive@example.com')).toEqual(['Order to send']);
    expect(await subjects('subject=lf-1')).toEqual(['Your order LF-1']);
    expect((await fetch(`${fake.url}/api/messages`, { method: 'DELETE' })).status).toBe(204);
    expect(fake.messages()).toEqual([]);
  });

  it('keeps the newest 500', async () => {
    const fake = await start();
    const transport = createTransport({
      host: '127.0.0.1',
      port: fake.smtpPort,
      secure: false,
      pool: true,
      maxConnections: 4,
      maxMessages: Infinity,
    });
    const mail = (n: number): SendMailOptions => ({
      from: 'a@example.com',
      to: 'b@example.com',
      subject: `n ${n}`,
      text: 'x',
    });
    await transport.sendMail(mail(0));
    await Promise.all(Array.from({ length: 500 }, (_, index) => transport.sendMail(mail(index + 1))));
    transport.close();
    expect(fake.messages()).toHaveLength(500);
    expect(fake.messages().some(({ subject }) => subject === 'n 0')).toBe(false);
  }, 20_000);
});

describe('misbehaving on request', () => {
  it.each([451, 550])('refuses the recipient with %i, then accepts again', async (code) => {
    const fake = await start();
    expect(await (await post(fake, { mode: 'refuse', code })).json()).toMatchObject({ mode: 'refuse', code });
    await expect(send(fake)).rejects.toMatchObject({ responseCode: code });
    expect(fake.messages()).toEqual([]);
    fake.setMode('accept');
    await send(fake);
    expect(fake.messages()).toHaveLength(1);
  });

  it('stalls after DATA until the client gives up', async () => {
    const fake = await start();
    fake.setMode('stall', { stallMs: 5000 });
    await expect(send(fake, {}, 200)).rejects.toMatchObject({ code: 'ETIMEDOUT' });
    expect(fake.messages()).toEqual([]);
  });

  it('answers 451 to a client that waits long enough', async () => {
    const fake = await start();
    await post(fake, { mode: 'stall', stallMs: 50 });
    await expect(send(fake)).rejects.toMatchObject({ responseCode: 451 });
  });

  it('refuses a mode that it does not know', async () => {
    const fake = await start();
    expect((await post(fake, { mode: 'nonsense' })).status).toBe(400);
    expect((await post(fake, { mode: 'refuse', code: 250 })).status).toBe(400);
    expect(await api(fake, '/mode')).toMatchObject({ mode: 'accept' });
  });
});

describe('the inbox page', () => {
  it('lists the newest first and shows a message with its HTML locked in a frame', async () => {
    const fake = await start();
    const empty = await fetch(fake.url);
    const first = await empty.text();
    expect(first).toContain('No messages yet.');
    const hash = createHash('sha256')
      .update(/<style>([^]*)<\/style>/.exec(first)?.[1] ?? '')
      .digest('base64');
    expect(empty.headers.get('content-security-policy')).toContain(`style-src 'sha256-${hash}'`);
    await send(fake, { attachments: [{ filename: 'drawing.png', content: PIXEL, cid: 'drawing' }] });
    await send(fake, { subject: '<script>alert(1)</script>' });
    const inbox = await (await fetch(fake.url)).text();
    expect(inbox.indexOf('&lt;script&gt;')).toBeGreaterThan(0);
    expect(inbox.indexOf('Your order LF-1')).toBeGreaterThan(inbox.indexOf('&lt;script&gt;'));
    expect(inbox).not.toContain('<script>');
    const { id } = fake.messages()[1] ?? {};
    const page = await (await fetch(`${fake.url}/messages/${id}`)).text();
    expect(page).toMatch(new RegExp(`<iframe[^>]*sandbox="allow-popups"[^>]*src="/messages/${id}/html"`));
    expect(page).toContain('Paid: £740.00 – thank you');
    const frame = await fetch(`${fake.url}/messages/${id}/html`);
    expect(frame.headers.get('content-security-policy')).toMatch(/^sandbox allow-popups; default-src 'none'/);
    expect(await frame.text()).toContain(`src="data:image/png;base64,${PIXEL.toString('base64')}"`);
    expect((await fetch(`${fake.url}/messages/none`)).status).toBe(404);
  });
});
