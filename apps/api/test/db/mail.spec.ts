import { MailLog } from '../../src/notifications/mail-log.entity.js';
import type { Mail } from '../../src/notifications/mail.js';
import { MailService } from '../../src/notifications/mail.service.js';
import { OutboxMessage } from '../../src/outbox/outbox-message.entity.js';
import { startTestApp, type TestApp } from '../support/app.js';

const invitation = [
  'BEGIN:VCALENDAR',
  'VERSION:2.0',
  'PRODID:-//Linkfell//EN',
  'METHOD:REQUEST',
  'BEGIN:VEVENT',
  'UID:test@linkfell.example',
  'DTSTAMP:20260302T093000Z',
  'DTSTART:20260303T090000Z',
  'END:VEVENT',
  'END:VCALENDAR',
  '',
].join('\r\n');

describe('mail', () => {
  let app: TestApp;
  beforeAll(async () => {
    app = await startTestApp();
  });
  beforeEach(() => {
    app.mail.clear();
    app.mail.setMode('accept');
  });
  afterAll(() => app.close());

  const queue = (over: Partial<Mail> & { dedupeKey?: string } = {}) =>
    app.dataSource.transaction((manager) =>
      app.nest.get(MailService).queue(manager, {
        template: 'password-changed',
        to: 'wren@example.test',
        data: { name: 'Wren <b>', url: 'http://127.0.0.1:4310/forgotten-password' },
        ...over,
      } as Mail),
    );

  it('leaves in HTML and in text, saying the same, with names escaped', async () => {
    await queue();
    await app.drainOutbox();
    const [message] = app.mail.messages();
    expect(message).toMatchObject({ to: ['wren@example.test'], from: 'post@linkfell.example' });
    expect(message?.text).toContain('Hello Wren <b>, the password');
    expect(message?.html).toContain('Hello Wren &lt;b&gt;, the password');
    expect(message?.html).toContain('<html lang="en-GB">');
    expect(message?.html).not.toMatch(/<img|<script/);
    for (const part of [message?.text, message?.html]) {
      expect(part).toContain('http://127.0.0.1:4310/forgotten-password');
    }
  });

  it('goes once per dedupe key', async () => {
    await queue({ dedupeKey: 'order 7 paid' });
    await queue({ dedupeKey: 'order 7 paid' });
    await app.drainOutbox();
    expect(app.mail.messages()).toHaveLength(1);
  });

  it('goes once when the process dies after sending and the message is delivered again', async () => {
    await queue();
    await app.drainOutbox();
    await app.manager.update(OutboxMessage, { topic: 'mail' }, { state: 'pending' });
    await app.drainOutbox();
    expect(app.mail.messages()).toHaveLength(1);
  });

  it('carries an invitation that calendars understand', async () => {
    await queue({ calendar: { method: 'REQUEST', content: invitation } });
    await app.drainOutbox();
    const calendars = app.mail.messages()[0]?.calendars ?? [];
    expect(calendars.map(({ method }) => method)).toContain('REQUEST');
    expect(calendars[0]?.text.replace(/\r?\n/g, '\r\n')).toBe(invitation);
  });

  it.each([
    'wren@example.test\r\nBcc: crow@example.test',
    'wren@example.test, crow@example.test',
    'Wren <w@x.test>',
  ])('refuses %j as a recipient', async (to) => {
    await app.manager.delete(OutboxMessage, { topic: 'mail' });
    await queue({ to });
    await app.drainOutbox();
    expect(app.mail.messages()).toHaveLength(0);
    expect(await app.manager.countBy(OutboxMessage, { topic: 'mail', state: 'dead' })).toBe(1);
  });

  it('waits for a server that is busy and gives up on an address that is refused for good', async () => {
    await app.manager.delete(OutboxMessage, { topic: 'mail' });
    app.mail.setMode('refuse', { code: 451 });
    await queue();
    await app.drainOutbox();
    expect(await app.manager.countBy(OutboxMessage, { topic: 'mail', state: 'pending', attempts: 1 })).toBe(
      1,
    );
    app.mail.setMode('refuse', { code: 550 });
    app.clock.advance({ minutes: 1 });
    await app.drainOutbox();
    expect(await app.manager.countBy(OutboxMessage, { topic: 'mail', state: 'dead', attempts: 2 })).toBe(1);
    expect(await app.manager.countBy(MailLog, { recipient: 'wren@example.test' })).toBe(4);
  });
});
