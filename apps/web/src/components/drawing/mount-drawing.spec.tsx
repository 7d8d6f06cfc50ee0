import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { pictureOf, readDimensions } from '../../testing/read-drawing';
import { HardwareDrawing } from './hardware-drawing';
import { MountDrawing, type MountDrawingProps } from './mount-drawing';
import type { FrameMountFigure } from './mount-figure';

const svgOf = (container: HTMLElement): Element => {
  const svg = container.querySelector('svg');
  if (!svg) throw new Error('Nothing was drawn');
  return svg;
};
const draw = (props: MountDrawingProps): Element => svgOf(render(<MountDrawing {...props} />).container);

const hardware: FrameMountFigure = { kind: 'hardware', widthMm: 30, boltMm: 8, boreMm: 15 };
const pin: FrameMountFigure = { kind: 'pin', diameterMm: 15, widthMm: 40 };
const bearing: FrameMountFigure = { kind: 'bearing-bolt', boltMm: 8, widthMm: 25 };

describe('frame mounts', () => {
  it.each([
    [hardware, { width: 30, bolt: 8, bore: 15 }],
    [pin, { width: 40, bolt: 15 }],
    [bearing, { width: 25, bolt: 8 }],
    [{ kind: 'trunnion' } as const, {}],
  ])('are dimensioned to scale: %o', (figure, data: Record<string, number>) => {
    const drawn = readDimensions(draw({ figure, dimensions: ['width', 'bolt', 'bore'] }));
    expect(Object.fromEntries(drawn.map(({ key, mm }) => [key, mm]))).toEqual(data);
    for (const { mm, length } of drawn) expect(Math.abs(length - mm)).toBeLessThanOrEqual(0.1);
  });

  it.each<[string, FrameMountFigure, FrameMountFigure]>([
    ['width of hardware', hardware, { ...hardware, widthMm: 34 }],
    ['bolt of hardware', hardware, { ...hardware, boltMm: 10 }],
    ['bore of the eye', hardware, { ...hardware, boreMm: 16 }],
    ['diameter of a pin', pin, { ...pin, diameterMm: 14 }],
    ['width of a pin', pin, { ...pin, widthMm: 44 }],
    ['bolt of a bearing eye', bearing, { ...bearing, boltMm: 10 }],
    ['width of a bearing eye', bearing, { ...bearing, widthMm: 30 }],
    ['yoke', hardware, { ...hardware, yoke: true }],
    ['kind', hardware, { kind: 'trunnion' }],
  ])('show a change of %s alone', (_name, before, after) => {
    expect(pictureOf(draw({ figure: after }))).not.toBe(pictureOf(draw({ figure: before })));
  });

  it('are told in words', () => {
    draw({ figure: { ...pin, yoke: true } });
    expect(screen.getByRole('img', { name: 'Pin through the open eye' })).toHaveAccessibleDescription(
      'Cut along the pin: 40 mm wide between the cheeks, for a 15 mm pin, held by the fork of a yoke.',
    );
  });
});

describe('a hardware kit', () => {
  const figure = { widthMm: 30, boltMm: 8, boreMm: 15 };
  const drawKit = (kit: typeof figure) => svgOf(render(<HardwareDrawing figure={kit} />).container);

  it('is dimensioned to scale', () => {
    const drawn = readDimensions(drawKit(figure));
    expect(drawn.map(({ key, mm }) => [key, mm])).toEqual([
      ['width', 30],
      ['bolt', 8],
      ['bore', 15],
    ]);
    for (const { mm, length } of drawn) expect(Math.abs(length - mm)).toBeLessThanOrEqual(0.1);
  });

  it.each([{ widthMm: 32 }, { boltMm: 6 }, { boreMm: 16 }])('shows %o', (change) => {
    expect(pictureOf(drawKit({ ...figure, ...change }))).not.toBe(pictureOf(drawKit(figure)));
  });
});
