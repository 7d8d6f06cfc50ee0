import express, { Router } from 'express';
import type { Mailbox } from './mailbox.js';
import type { StoredMessage } from './message.js';
import { isMode, MODES, type ModeSwitch } from './mode.js';

/** A message for JSON: attachments by name and type, their bytes at an address of their own. */
function toJson(message: StoredMessage): object {
  const { raw: _raw, attachments, ...rest } = message;
  return {
    ...rest,
    attachments: attachments.map(({ content: _content, ...attachment }, index) => ({
      ...attachment,
      url: `/api/messages/${message.id}/attachments/${index}`,
    })),
  };
}

const textOf = (value: unknown): string | undefined =>
  typeof value === 'string' && value ? value : undefined;

/** The inbox for tests: list, one message, its parts, clear, and how the SMTP side behaves. */
export function apiRoutes(mailbox: Mailbox, mode: ModeSwitch): Router {
  const router = Router();
  router.use(express.json());

  router.get('/messages', (req, res) => {
    const found = mailbox.search({ to: textOf(req.query.to), subject: textOf(req.query.subject) });
    res.json({ total: found.length, messages: found.map(toJson) });
  });

  router.delete('/messages', (_req, res) => {
    mailbox.clear();
    res.status(204).end();
  });

  router.get('/messages/:id', (req, res) => {
    const message = mailbox.find(req.params.id);
    if (!message) return void res.status(404).json({ error: 'No such message.' });
    res.json(toJson(message));
  });

  router.get('/messages/:id/raw', (req, res) => {
    const message = mailbox.find(req.params.id);
    if (!message) return void res.status(404).json({ error: 'No such message.' });
    res.type('text/plain').send(Buffer.from(message.raw, 'latin1'));
  });

  router.get('/messages/:id/attachments/:n', (req, res) => {
    const attachment = mailbox.find(req.params.id)?.attachments[Number(req.params.n)];
    if (!attachment) return void res.status(404).json({ error: 'No such attachment.' });
    res.attachment(attachment.filename ?? 'attachment');
    res.set({ 'Content-Type': attachment.contentType, 'X-Content-Type-Options': 'nosniff' });
    res.set('Content-Security-Policy', "default-src 'none'; sandbox");
    res.send(attachment.content);
  });

  router.get('/mode', (_req, res) => void res.json(mode.current));

  router.post('/mode', (req, res) => {
    const { mode: wanted, code, stallMs } = (req.body ?? {}) as Record<string, unknown>;
    const numbers = [code, stallMs].every((value) => value === undefined || Number.isInteger(value));
    if (!isMode(wanted) || !numbers) {
      return void res
        .status(400)
        .json({ error: `Send mode, one of ${MODES.join(', ')}; code and stallMs are whole numbers.` });
    }
    try {
      res.json(
        mode.set(wanted, { code: code as number | undefined, stallMs: stallMs as number | undefined }),
      );
    } catch (error) {
      res.status(400).json({ error: error instanceof Error ? error.message : 'Refused.' });
    }
  });

  return router;
}
