import { randomUUID } from 'node:crypto';
import { setTimeout as sleep } from 'node:timers/promises';
import { buffer } from 'node:stream/consumers';
import { SMTPServer, type SMTPServerSession } from 'smtp-server';
import type { Mailbox } from './mailbox.js';
import { parseMessage } from './message.js';
import type { ModeSwitch } from './mode.js';

const MAX_BYTES = 25 * 1024 * 1024;

class SmtpRefusal extends Error {
  constructor(
    readonly responseCode: number,
    message: string,
  ) {
    super(message);
  }
}

function envelopeOf({ envelope }: SMTPServerSession): { from: string; to: string[] } {
  return {
    from: envelope.mailFrom ? envelope.mailFrom.address : '',
    to: envelope.rcptTo.map(({ address }) => address),
  };
}

/** A plain SMTP server: no sign-in, no encryption, for loopback only. */
export function createSmtpServer(mailbox: Mailbox, mode: ModeSwitch, stop: AbortSignal): SMTPServer {
  const server = new SMTPServer({
    banner: 'Linkfell test mail',
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    disableReverseLookup: true,
    size: MAX_BYTES,
    closeTimeout: 200,
    logger: false,
    onRcptTo(_address, _session, callback) {
      const { mode: now, code } = mode.current;
      if (now !== 'refuse') return callback();
      callback(new SmtpRefusal(code, code < 500 ? 'Mailbox busy, try again later' : 'No such mailbox here'));
    },
    onData(stream, session, callback) {
      const take = async (): Promise<string> => {
        const raw = await buffer(stream);
        if (stream.sizeExceeded) throw new SmtpRefusal(552, 'Message too large');
        const { mode: now, stallMs } = mode.current;
        if (now === 'stall') {
          // The client hears nothing; whether it gives up first is what the test wants to see.
          await sleep(stallMs, undefined, { signal: stop });
          throw new SmtpRefusal(451, 'Took too long, try again later');
        }
        const message = await parseMessage(randomUUID(), raw, envelopeOf(session));
        mailbox.add(message);
        return `Kept as ${message.id}`;
      };
      take().then(
        (reply) => callback(null, reply),
        (error: Error) => callback(error),
      );
    },
  });
  // A client that hangs up in the middle is its own affair.
  server.on('error', () => undefined);
  return server;
}
