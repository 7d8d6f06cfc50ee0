import { render } from '@testing-library/react';
import { expect, it } from 'vitest';
import { LineChart, type LineChartProps } from './line-chart';

const points = Array.from({ length: 25 }, (_, i) => [i * 5, 500 + 3 * i ** 2] as const);
const props: LineChartProps = {
  title: 'Force against wheel travel',
  description: 'In words.',
  yLabel: 'Force, N',
  level: { at: 700, label: 'you: 700 N' },
  lines: [
    { who: 'next', label: 'New', points, sag: [40, 692] },
    { who: 'present', label: 'Yours', points: points.map(([x, y]) => [x, y * 0.8] as const), sag: null },
  ],
};
const draw = (change: Partial<LineChartProps> = {}) => {
  const { container } = render(<LineChart {...props} {...change} />);
  return container;
};

/** The figure that a height stands for, read off the ticks as with a ruler. */
function reader(container: HTMLElement): (y: number) => number {
  const ticks = [...container.querySelectorAll('text[text-anchor="end"]')].flatMap((text) => {
    const value = Number((text.textContent ?? '').replace(',', '').replace('−', '-'));
    const line = text.parentElement?.querySelector('line');
    return Number.isFinite(value) && line ? [[value, Number(line.getAttribute('y1'))] as const] : [];
  });
  const [low, high] = [ticks[0], ticks.at(-1)];
  if (!low || !high || low === high) throw new Error('an axis needs two figures');
  return (y) => low[0] + ((y - low[1]) / (high[1] - low[1])) * (high[0] - low[0]);
}

it('draws what the data say, to a thousandth of the axis', () => {
  const container = draw();
  const valueAt = reader(container);
  for (const { who, points: wanted } of props.lines) {
    const d = container.querySelector(`[data-series="${who}"] path`)?.getAttribute('d') ?? '';
    const drawn = [...d.matchAll(/[ML]([\d.]+) ([\d.]+)/g)].map(
      ([, x, y]) => [Number(x), Number(y)] as const,
    );
    expect(drawn).toHaveLength(wanted.length);
    const [x0, x1] = [drawn[0]?.[0] ?? 0, drawn.at(-1)?.[0] ?? 0];
    drawn.forEach(([x, y], i) => {
      expect(Math.abs(valueAt(y) - (wanted[i]?.[1] ?? NaN))).toBeLessThan(2.5);
      expect(((x - x0) / (x1 - x0)) * 120).toBeCloseTo(wanted[i]?.[0] ?? NaN, 1);
    });
  }
  const sag = container.querySelector('[data-sag]');
  expect(Math.abs(valueAt(Number(sag?.getAttribute('cy'))) - 692)).toBeLessThan(2.5);
  expect(
    Math.abs(valueAt(Number(container.querySelector('[data-level]')?.getAttribute('y1'))) - 700),
  ).toBeLessThan(2.5);
});

it('tells the two lines apart without colour, and keeps their labels apart', () => {
  const container = draw();
  const dash = (who: string) =>
    container.querySelector(`[data-series="${who}"] path`)?.getAttribute('stroke-dasharray');
  expect(dash('next')).not.toBe(dash('present'));
  const close = draw({
    lines: props.lines.map((line, i) => ({ ...line, points: points.map(([x, y]) => [x, y + i] as const) })),
  });
  const ys = ['next', 'present'].map((who) =>
    Number(close.querySelector(`[data-series="${who}"] > text`)?.getAttribute('y')),
  );
  expect(Math.abs((ys[0] ?? 0) - (ys[1] ?? 0))).toBeGreaterThanOrEqual(16);
});

const [next, present] = props.lines as [LineChartProps['lines'][0], LineChartProps['lines'][0]];
it.each<[string, Partial<LineChartProps>]>([
  ['one figure of a line', { lines: [{ ...next, points: points.with(10, [50, 900]) }, present] }],
  ['the sag', { lines: [{ ...next, sag: [45, 743] }, present] }],
  ['a label', { lines: [{ ...next, label: 'Both' }, present] }],
  ['a line less', { lines: [next] }],
  ['the level', { level: { at: 800, label: 'you: 700 N' } }],
  ['the name of the axis', { yLabel: 'Rate, N/mm' }],
  ['where the axis begins', { fromZero: false }],
])('%s alone changes the picture', (_what, change) => {
  const picture = (container: HTMLElement) => container.innerHTML.replace(/_r_\w+_/g, '');
  expect(picture(draw(change))).not.toBe(picture(draw()));
});
