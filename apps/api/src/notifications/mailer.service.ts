import { Inject, Injectable, type OnApplicationShutdown } from '@nestjs/common';
import { createTransport } from 'nodemailer';
import { DataSource } from 'typeorm';

import { Clock } from '../common/clock.js';
import { CONFIG, type Config } from '../config/config.js';
import { GiveUp } from '../outbox/outbox-handler.js';
import { MailLog } from './mail-log.entity.js';
import { render, type Mail } from './mail.js';

const oneAddress = /^[^\s@,;:<>"()[\]\\]+@[^\s@,;:<>"()[\]\\]+$/;
const control = /\p{Cc}/u;

/** @throws GiveUp when a value could start a header of its own (CWE-93) or name a second recipient */
function guardHeaders(to: string, subject: string): void {
  if (!oneAddress.test(to)) throw new GiveUp('the recipient is not one plain address');
  if (control.test(subject)) throw new GiveUp('the subject holds control characters');
}

/** Talks SMTP. Everything but what must not be written down goes through {@link MailService}. */
@Injectable()
export class Mailer implements OnApplicationShutdown {
  private readonly transport;

  constructor(
    @Inject(CONFIG) private readonly config: Config,
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {
    this.transport = createTransport(
      {
        url: config.SMTP_URL,
        connectionTimeout: 10_000,
        greetingTimeout: 10_000,
        socketTimeout: 30_000,
        disableFileAccess: true,
        disableUrlAccess: true,
      },
      { from: config.MAIL_FROM },
    );
  }

  /**
   * Sends one mail, once per message of the outbox: its id makes the Message-ID and is kept in the mail log.
   * @throws GiveUp when the server refuses this mail for good; any other error is worth another try
   */
  async send(outboxId: string, mail: Mail): Promise<void> {
    if (await this.dataSource.manager.existsBy(MailLog, { outboxId })) return;
    const { subject, text, html } = render(mail);
    guardHeaders(mail.to, subject);
    const messageId = `<${outboxId}@${new URL(this.config.PUBLIC_URL).hostname}>`;
    await this.transport
      .sendMail({
        to: { name: '', address: mail.to },
        subject,
        text,
        html,
        messageId,
        // RFC 3834: no out-of-office notes in answer.
        headers: { 'Auto-Submitted': 'auto-generated' },
        ...(mail.calendar && { icalEvent: { ...mail.calendar, filename: 'fitting.ics' } }),
        ...(mail.attachments && {
          attachments: mail.attachments.map((attachment) => ({ ...attachment, encoding: 'base64' })),
        }),
      })
      .catch((error: unknown) => {
        throw isForGood(error)
          ? new GiveUp('the mail server refused the mail for good', { cause: error })
          : error;
      });
    await this.dataSource
      .createQueryBuilder()
      .insert()
      .into(MailLog)
      .values({
        outboxId,
        template: mail.template,
        recipient: mail.to,
        subject,
        messageId,
        sentAt: this.clock.now(),
      })
      .orIgnore()
      .execute();
  }

  onApplicationShutdown(): void {
    this.transport.close();
  }
}

/** 5xx answers to this recipient or this message; a 5xx to our sign-in at the server is a fault to be mended. */
function isForGood(error: unknown): boolean {
  if (!(error instanceof Error) || !('responseCode' in error) || !('code' in error)) return false;
  const { responseCode, code } = error;
  return (
    typeof responseCode === 'number' && responseCode >= 500 && (code === 'EENVELOPE' || code === 'EMESSAGE')
  );
}
