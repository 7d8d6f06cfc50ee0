import type { Response } from 'express';
import { markup, Html } from './html.js';
import { CONTENT_SECURITY_POLICY, STYLE } from './style.js';

/** Sends a whole page. `title` is what the browser's tab says. */
export function sendPage(res: Response, status: number, title: string, body: Html): void {
  const page = markup`<!doctype html>
    <html lang="en-GB">
      <head>
        <meta charset="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <meta name="robots" content="noindex" />
        <title>${title}</title>
        <style>${new Html(STYLE)}</style>
      </head>
      <body>
        <main>${body}</main>
      </body>
    </html> `;
  res
    .status(status)
    .set({
      'Content-Security-Policy': CONTENT_SECURITY_POLICY,
      'Cache-Control': 'no-store',
      'Referrer-Policy': 'no-referrer',
      'X-Content-Type-Options': 'nosniff',
    })
    .type('html')
    .send(page.text);
}

/** A plain page that says one thing and offers at most one way on. */
export function sendNotice(
  res: Response,
  status: number,
  heading: string,
  text: string,
  link?: { href: string; label: string },
): void {
  sendPage(
    res,
    status,
    `${heading} - Test payment page`,
    markup`<h1>${heading}</h1>
      <p>${text}</p>
      <p class="note">This is a test server. No real money moves.</p>
      ${link && markup`<p><a class="button" href="${link.href}">${link.label}</a></p>`}`,
  );
}
