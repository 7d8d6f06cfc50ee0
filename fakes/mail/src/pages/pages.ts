import type { StoredMessage } from '../message.js';
import { markup, Html } from './html.js';
import { STYLE } from './style.js';

const WHEN = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'medium' });

function layout(title: string, body: Html): string {
  return markup`<!doctype html>
    <html lang="en-GB">
      <head>
        <meta charset="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <title>${title}</title>
        <style>${new Html(STYLE)}</style>
      </head>
      <body>
        <main>${body}</main>
      </body>
    </html>`.text;
}

export function inboxPage(messages: StoredMessage[]): string {
  const count = messages.length === 1 ? '1 message' : `${messages.length} messages`;
  const rows = messages.map(
    (message) =>
      markup`<li>
        <a href="/messages/${message.id}">${message.subject || 'No subject'}</a>
        <p>To ${message.to.join(', ') || message.envelope.to.join(', ')}</p>
        <p>From ${message.from}, ${WHEN.format(new Date(message.receivedAt))}</p>
      </li>`,
  );
  return layout(
    `Test mail: ${count}`,
    markup`<h1>Test mail</h1>
      <p class="soft">Every e-mail that was sent here, the newest first. Nothing leaves this machine.</p>
      <p role="status">${messages.length === 0 ? 'No messages yet.' : `${count}.`}</p>
      <a href="/">Refresh</a>
      ${
        messages.length > 0 &&
        markup`<ul class="inbox">
          ${rows}
        </ul>`
      }`,
  );
}

function parts(message: StoredMessage): Html {
  const attachments = message.attachments.map(
    (attachment, index) =>
      markup`<li>
        <a href="/api/messages/${message.id}/attachments/${index}"
          >${attachment.filename ?? `Part ${index + 1}`}</a
        >
        <p>${attachment.contentType}, ${attachment.size} bytes</p>
      </li>`,
  );
  return markup` ${
    message.html &&
    markup`<h2>HTML</h2>
        <iframe
          title="HTML part of the message"
          sandbox="allow-popups"
          src="/messages/${message.id}/html"
        ></iframe>`
  }
    <h2>Text</h2>
    ${message.text === null ? markup`<p>There is no text part.</p>` : markup`<pre>${message.text}</pre>`}
    ${message.calendars.map(
      ({ method, text }) =>
        markup`<h2>Calendar${method ? ` (${method})` : ''}</h2>
          <pre>${text}</pre>`,
    )}
    ${
      attachments.length > 0 &&
      markup`<h2>Attachments</h2>
        <ul class="inbox">
          ${attachments}
        </ul>`
    }`;
}

export function messagePage(message: StoredMessage): string {
  return layout(
    message.subject || 'No subject',
    markup`<a href="/">Back to all messages</a>
      <h1>${message.subject || 'No subject'}</h1>
      <p class="soft">
        From ${message.from} to ${message.to.join(', ')}, ${WHEN.format(new Date(message.receivedAt))}
      </p>
      ${parts(message)}
      <h2>Headers</h2>
      <dl>
        ${message.headers.map(
          ({ name, value }) =>
            markup`<div>
              <dt>${name}</dt>
              <dd>${value}</dd>
            </div>`,
        )}
      </dl>`,
  );
}

export function noticePage(heading: string): string {
  return layout(
    heading,
    markup`<h1>${heading}</h1>
      <a href="/">Back to all messages</a>`,
  );
}

/** The message's HTML with its own pictures put in, for the frame; links open outside of it. */
export function framedHtml(message: StoredMessage): string {
  const pictures = new Map(message.attachments.map((one) => [one.contentId, one]));
  const body = (message.html ?? '').replace(/cid:([^"'\s)>]+)/g, (whole, id: string) => {
    const picture = pictures.get(`<${id}>`) ?? pictures.get(id);
    return picture ? `data:${picture.contentType};base64,${picture.content.toString('base64')}` : whole;
  });
  return `<base target="_blank">${body}`;
}
