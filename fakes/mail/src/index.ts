import { createServer, type Server } from 'node:http';
import type { AddressInfo, Server as NetServer } from 'node:net';
import express from 'express';
import { apiRoutes } from './api-routes.js';
import { Mailbox } from './mailbox.js';
import type { StoredMessage } from './message.js';
import { ModeSwitch, type MailMode, type ModeOptions } from './mode.js';
import { pageRoutes } from './pages/page-routes.js';
import { createSmtpServer } from './smtp.js';

export type { CalendarPart, StoredAttachment, StoredMessage } from './message.js';
export type { MailMode, ModeOptions } from './mode.js';

export interface FakeMailOptions {
  /** 0, the default, takes any free port. */
  smtpPort?: number;
  httpPort?: number;
}

export interface FakeMail {
  smtpPort: number;
  httpPort: number;
  /** Address of the inbox page and the JSON API. */
  url: string;
  /** The newest first. */
  messages(): StoredMessage[];
  clear(): void;
  setMode(mode: MailMode, options?: ModeOptions): void;
  close(): Promise<void>;
}

function listen(server: Server | NetServer, port: number): Promise<number> {
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, '127.0.0.1', () => resolve((server.address() as AddressInfo).port));
  });
}

/** Starts the SMTP server and its inbox on loopback. Rejects when a port is taken. */
export async function startFakeMail(options: FakeMailOptions = {}): Promise<FakeMail> {
  const mailbox = new Mailbox();
  const mode = new ModeSwitch();
  const stop = new AbortController();
  const smtp = createSmtpServer(mailbox, mode, stop.signal);
  const app = express();
  app.disable('x-powered-by');
  app.use('/api', apiRoutes(mailbox, mode));
  app.use(pageRoutes(mailbox));
  const http = createServer(app);

  const smtpPort = await listen(smtp.server, options.smtpPort ?? 0);
  const httpPort = await listen(http, options.httpPort ?? 0);

  return {
    smtpPort,
    httpPort,
    url: `http://127.0.0.1:${httpPort}`,
    messages: () => mailbox.newest(),
    clear: () => mailbox.clear(),
    setMode: (wanted, modeOptions) => void mode.set(wanted, modeOptions),
    close: async () => {
      stop.abort();
      const closed = [
        new Promise<void>((resolve) => smtp.close(resolve)),
        new Promise((resolve) => http.close(resolve)),
      ];
      http.closeAllConnections();
      await Promise.all(closed);
    },
  };
}
