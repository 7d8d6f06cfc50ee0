import fc from 'fast-check';
import ICAL from 'ical.js';

import { calendarText, type Appointment } from './calendar.js';

const appointment = (over: Partial<Appointment> = {}): Appointment => ({
  uid: '6c5b8a52-1c1f-4d4c-9d7e-0a5a4f0f3b11@linkfell',
  sequence: 0,
  method: 'REQUEST',
  stampedAt: new Date('2026-03-02T09:30:00Z'),
  start: new Date('2026-03-30T08:00:00Z'),
  end: new Date('2026-03-30T09:15:00Z'),
  summary: 'Shock fitting at Tin Shed',
  description: 'Tarn 210x50, into a bike; order LF-7KPQX3DT',
  location: 'Tin Shed, 1 Beck Lane, Skelhow',
  organizer: { name: 'Tin Shed', email: 'desk@tin-shed.example' },
  attendee: { name: 'Wren Hollis', email: 'wren@rider.example' },
  ...over,
});

/** Read by ical.js, which shares no code with ours. */
function read(text: string) {
  const calendar = new ICAL.Component(ICAL.parse(text));
  const component = calendar.getFirstSubcomponent('vevent');
  if (!component) throw new Error('no event');
  return { calendar, component, event: new ICAL.Event(component) };
}

describe('calendarText', () => {
  it('is an invitation that a calendar reads as it was meant', () => {
    const { calendar, component, event } = read(calendarText(appointment()));
    expect(calendar.getFirstPropertyValue('method')).toBe('REQUEST');
    expect(calendar.getFirstPropertyValue('version')).toBe('2.0');
    expect(event.startDate.toJSDate()).toEqual(appointment().start);
    expect(event.endDate.toJSDate()).toEqual(appointment().end);
    expect(component.getFirstPropertyValue('status')).toBe('CONFIRMED');
    expect(component.getFirstPropertyValue('organizer')).toBe('mailto:desk@tin-shed.example');
    expect(component.getFirstPropertyValue('attendee')).toBe('mailto:wren@rider.example');
  });

  it('is taken out again by the same UID with a higher SEQUENCE', () => {
    const asked = read(calendarText(appointment()));
    const gone = read(calendarText(appointment({ method: 'CANCEL', sequence: 1 })));
    expect(gone.calendar.getFirstPropertyValue('method')).toBe('CANCEL');
    expect(gone.component.getFirstPropertyValue('status')).toBe('CANCELLED');
    expect(gone.event.uid).toBe(asked.event.uid);
    expect(gone.event.sequence).toBeGreaterThan(asked.event.sequence);
  });

  it('keeps every text as it is, in lines of at most 75 octets that end with CR LF (RFC 5545, 3.1)', () => {
    const text = fc
      .string({ unit: 'binary', maxLength: 200 })
      .map((value) => value.replace(/\p{Cc}|\p{Cs}/gu, ''));
    fc.assert(
      fc.property(text, text, (summary, description) => {
        const written = calendarText(appointment({ summary, description }));
        expect(written.endsWith('\r\n')).toBe(true);
        for (const line of written.split('\r\n')) expect(Buffer.byteLength(line)).toBeLessThanOrEqual(75);
        const { event } = read(written);
        expect([event.summary, event.description]).toEqual([summary, description]);
      }),
      { seed: 5545 },
    );
  });

  it('lets no name start a line or a parameter of its own', () => {
    const name = 'Wren";X-EVIL=1:\r\nATTENDEE:mailto:crow@rider.example';
    const { component } = read(
      calendarText(appointment({ attendee: { name, email: 'wren@rider.example' } })),
    );
    expect(component.getAllProperties('attendee')).toHaveLength(1);
    expect(component.getFirstPropertyValue('attendee')).toBe('mailto:wren@rider.example');
  });
});
