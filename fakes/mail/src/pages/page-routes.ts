import { Router } from 'express';
import type { Mailbox } from '../mailbox.js';
import { framedHtml, inboxPage, messagePage, noticePage } from './pages.js';
import { MESSAGE_POLICY, PAGE_POLICY } from './style.js';

/** The inbox for people. */
export function pageRoutes(mailbox: Mailbox): Router {
  const router = Router();
  router.use((_req, res, next) => {
    res.set({
      'Content-Security-Policy': PAGE_POLICY,
      'Cache-Control': 'no-store',
      'X-Content-Type-Options': 'nosniff',
    });
    next();
  });

  router.get('/', (_req, res) => void res.type('html').send(inboxPage(mailbox.newest())));

  router.get('/messages/:id', (req, res) => {
    const message = mailbox.find(req.params.id);
    if (!message) return void res.status(404).type('html').send(noticePage('No such message'));
    res.type('html').send(messagePage(message));
  });

  router.get('/messages/:id/html', (req, res) => {
    const message = mailbox.find(req.params.id);
    if (!message?.html) return void res.status(404).type('html').send(noticePage('No such message'));
    res.set('Content-Security-Policy', MESSAGE_POLICY).type('html').send(framedHtml(message));
  });

  router.use((_req, res) => void res.status(404).type('html').send(noticePage('No such page')));
  return router;
}
