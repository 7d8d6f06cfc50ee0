import { dayText, whenText } from './date-text.js';

describe('dates in mails', () => {
  it('say an instant as the workshop’s clock shows it, on both sides of a clock change', () => {
    expect(whenText(new Date('2026-03-27T09:30:00Z'), 'Europe/London')).toBe('Fri, 27 Mar 2026, 09:30');
    expect(whenText(new Date('2026-03-30T09:30:00Z'), 'Europe/London')).toBe('Mon, 30 Mar 2026, 10:30');
  });

  it('say a day as it is written, in every zone', () => {
    expect(dayText('2026-12-10')).toBe('Thu, 10 Dec 2026');
  });
});
