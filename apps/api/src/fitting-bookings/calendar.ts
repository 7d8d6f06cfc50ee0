/** One appointment as RFC 5545 has it. */
export interface Appointment {
  uid: string;
  sequence: number;
  method: 'REQUEST' | 'CANCEL';
  stampedAt: Date;
  start: Date;
  end: Date;
  summary: string;
  description: string;
  location: string;
  organizer: { name: string; email: string };
  attendee: { name: string; email: string };
}

const utc = (at: Date): string => at.toISOString().replace(/[-:]|\.\d{3}/g, '');
const text = (value: string): string =>
  value.replace(/[\\;,]/g, (sign) => `\\${sign}`).replace(/\r?\n/g, '\\n');
/** A parameter value in quotes may hold anything but quotes and control characters. */
const quoted = (value: string): string => `"${value.replace(/["\p{Cc}]/gu, ' ')}"`;

/** Lines of at most 75 octets, never cut inside a character. */
function fold(line: string): string {
  const parts: string[] = [];
  let part = '';
  let octets = 0;
  for (const sign of line) {
    const size = Buffer.byteLength(sign);
    if (octets + size > (parts.length === 0 ? 75 : 74)) {
      parts.push(part);
      part = '';
      octets = 0;
    }
    part += sign;
    octets += size;
  }
  return [...parts, part].join('\r\n ');
}

/** An invitation or its cancellation; times in UTC, so that no zone table is needed (RFC 5545, 5546). */
export function calendarText(a: Appointment): string {
  const lines = [
    'BEGIN:VCALENDAR',
    'VERSION:2.0',
    'PRODID:-//Linkfell//Fitting//EN',
    'CALSCALE:GREGORIAN',
    `METHOD:${a.method}`,
    'BEGIN:VEVENT',
    `UID:${a.uid}`,
    `SEQUENCE:${a.sequence}`,
    `DTSTAMP:${utc(a.stampedAt)}`,
    `DTSTART:${utc(a.start)}`,
    `DTEND:${utc(a.end)}`,
    `SUMMARY:${text(a.summary)}`,
    `DESCRIPTION:${text(a.description)}`,
    `LOCATION:${text(a.location)}`,
    `ORGANIZER;CN=${quoted(a.organizer.name)}:mailto:${a.organizer.email}`,
    `ATTENDEE;CN=${quoted(a.attendee.name)};ROLE=REQ-PARTICIPANT;PARTSTAT=ACCEPTED;RSVP=FALSE:mailto:${a.attendee.email}`,
    `STATUS:${a.method === 'CANCEL' ? 'CANCELLED' : 'CONFIRMED'}`,
    'END:VEVENT',
    'END:VCALENDAR',
  ];
  return lines.map(fold).join('\r\n') + '\r\n';
}
