import type { AddressObject, Attachment, ParsedMail } from 'mailparser';
import { simpleParser } from 'mailparser';

export interface StoredAttachment {
  filename: string | null;
  contentType: string;
  /** Bytes. */
  size: number;
  /** Set when the HTML shows it by cid:. */
  contentId: string | null;
  content: Buffer;
}

/** A calendar part: an alternative of the text (an invitation) or an attached .ics file. */
export interface CalendarPart {
  /** As the part's header says: REQUEST, CANCEL and so on. */
  method: string | null;
  contentType: string;
  text: string;
}

export interface StoredMessage {
  id: string;
  /** When it was accepted, ISO 8601. */
  receivedAt: string;
  /** The addresses of the SMTP envelope. */
  envelope: { from: string; to: string[] };
  from: string;
  to: string[];
  cc: string[];
  replyTo: string | null;
  subject: string;
  text: string | null;
  html: string | null;
  headers: { name: string; value: string }[];
  attachments: StoredAttachment[];
  calendars: CalendarPart[];
  /** The message as it came over the wire. */
  raw: string;
}

function addresses(found: AddressObject | AddressObject[] | undefined): string[] {
  const objects = found === undefined ? [] : Array.isArray(found) ? found : [found];
  return objects.flatMap(({ value }) =>
    value.flatMap(({ address, group }) => group?.map((one) => one.address ?? '') ?? address ?? []),
  );
}

function calendarOf(attachment: Attachment): CalendarPart {
  const header = attachment.headers.get('content-type');
  const params =
    typeof header === 'object' && 'params' in header ? (header.params as Record<string, string>) : {};
  return {
    method: params.method?.toUpperCase() ?? null,
    contentType: attachment.contentType,
    text: attachment.content.toString('utf8'),
  };
}

function headersOf(mail: ParsedMail): { name: string; value: string }[] {
  return mail.headerLines.map(({ line }) => {
    const colon = line.indexOf(':');
    return {
      name: line.slice(0, colon),
      value: line
        .slice(colon + 1)
        .replace(/\r?\n\s+/g, ' ')
        .trim(),
    };
  });
}

/** Takes a received message apart. Rejects when it is no message at all. */
export async function parseMessage(
  id: string,
  raw: Buffer,
  envelope: StoredMessage['envelope'],
): Promise<StoredMessage> {
  const mail = await simpleParser(raw, { skipImageLinks: true, skipTextToHtml: true, skipHtmlToText: true });
  return {
    id,
    receivedAt: new Date().toISOString(),
    envelope,
    from: addresses(mail.from)[0] ?? envelope.from,
    to: addresses(mail.to),
    cc: addresses(mail.cc),
    replyTo: addresses(mail.replyTo)[0] ?? null,
    subject: mail.subject ?? '',
    text: mail.text ?? null,
    html: mail.html || null,
    headers: headersOf(mail),
    attachments: mail.attachments.map((attachment) => ({
      filename: attachment.filename ?? null,
      contentType: attachment.contentType,
      size: attachment.size,
      contentId: attachment.cid ?? null,
      content: attachment.content,
    })),
    calendars: mail.attachments
      .filter(({ contentType }) => contentType === 'text/calendar' || contentType === 'application/ics')
      .map(calendarOf),
    raw: raw.toString('latin1'),
  };
}
