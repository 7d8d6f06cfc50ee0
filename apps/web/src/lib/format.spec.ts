import { describe, expect, it } from 'vitest';
import { formatDateTime, formatDay, formatDayShort, formatTime } from './format-date';
import { formatFigure, formatSize, formatWithUnit } from './format-figure';
import { formatMoney, formatMoneyExact } from './format-money';

describe('money', () => {
  it.each([
    [43800, '£438'],
    [43850, '£438.50'],
    [123456, '£1,234.56'],
    [0, '£0'],
    [-1250, '−£12.50'],
  ])('%d pence is %s', (minor, text) => expect(formatMoney(minor)).toBe(text));

  it('keeps the pence in columns', () => expect(formatMoneyExact(43800)).toBe('£438.00'));
  it('refuses parts of a penny', () => expect(() => formatMoney(0.5)).toThrow(RangeError));
});

describe('days and times', () => {
  it('names a day', () => {
    expect(formatDay('2026-12-10')).toBe('Thursday 10 December 2026');
    expect(formatDayShort('2026-12-10')).toBe('Thu 10 Dec');
  });

  it('tells the time where the workshop is, summer and winter', () => {
    expect(formatTime('2026-07-01T09:00:00Z')).toBe('10:00');
    expect(formatTime('2026-12-01T09:00:00Z')).toBe('09:00');
    expect(formatDateTime('2026-06-30T23:30:00Z')).toBe('Wednesday 1 July 2026 at 00:30');
    expect(formatDateTime('2026-06-30T23:30:00Z', 'UTC')).toBe('Tuesday 30 June 2026 at 23:30');
  });
});

describe('figures', () => {
  it('writes no trailing noughts and a true minus', () => {
    expect(formatFigure(52.5)).toBe('52.5');
    expect(formatFigure(55)).toBe('55');
    expect(formatFigure(-0.25)).toBe('−0.25');
    expect(formatFigure(27.449, 1)).toBe('27.4');
  });

  it('joins unit and size', () => {
    expect(formatWithUnit(52.5, 'mm')).toBe('52.5\u00a0mm');
    expect(formatSize(230, 57.5)).toBe('230 × 57.5');
    expect(formatSize(230, null)).toBe('230 × ?');
  });
});
