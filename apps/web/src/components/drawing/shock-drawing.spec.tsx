import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { airFigure, coilFigure, trunnionFigure } from '../../testing/figures';
import { middleOf, pictureOf, readDimensions } from '../../testing/read-drawing';
import { dimensionKeys } from './dimensions';
import { ShockDrawing, type ShockDrawingProps } from './shock-drawing';
import type { ShockFigure } from './shock-figure';

function draw(props: ShockDrawingProps): Element {
  const { container } = render(<ShockDrawing {...props} />);
  const svg = container.querySelector('svg');
  if (!svg) throw new Error('Nothing was drawn');
  return svg;
}

const sizes: [number, number][] = [
  [165, 38],
  [190, 50.8],
  [210, 52.5],
  [241.3, 76.2],
  [266.7, 88.9],
];

describe('dimension lines', () => {
  it.each([
    ['air', airFigure],
    ['coil', coilFigure],
    ['trunnion', trunnionFigure],
  ])('of the %s shock are as long as their data say, within 0.1 mm', (_name, figure) => {
    const drawn = readDimensions(draw({ figure, dimensions: dimensionKeys }));
    const data: Record<string, number | undefined> = {
      'eye-to-eye': figure.eyeToEyeMm,
      stroke: figure.strokeMm ?? undefined,
      diameter: figure.diameterMm ?? undefined,
      'body-bore':
        figure.bodyEnd.kind === 'eyelet'
          ? figure.bodyEnd.boreMm
          : figure.bodyEnd.kind === 'bearing-eye'
            ? figure.bodyEnd.boltMm
            : undefined,
      'shaft-bore': 15,
      'reservoir-length': figure.reservoir?.lengthMm,
      'reservoir-diameter': figure.reservoir?.diameterMm,
    };
    const known = Object.entries(data).filter(([, mm]) => mm !== undefined);
    expect(drawn.map(({ key }) => key).sort()).toEqual(known.map(([key]) => key).sort());
    for (const { key, mm, length, text } of drawn) {
      expect(mm).toBe(data[key]);
      expect(Math.abs(length - mm)).toBeLessThanOrEqual(0.1);
      expect(text).toContain(String(mm));
    }
  });

  it.each(sizes)('fit %d × %d, and the eyes lie where they say', (eyeToEyeMm, strokeMm) => {
    const svg = draw({
      figure: { ...airFigure, eyeToEyeMm, strokeMm },
      dimensions: ['eye-to-eye', 'stroke'],
    });
    const [length, stroke] = readDimensions(svg);
    expect(length?.length).toBeCloseTo(eyeToEyeMm, 1);
    expect(stroke?.length).toBeCloseTo(strokeMm, 1);
    expect(middleOf(svg, 'shaft-end-bore') - middleOf(svg, 'body-end-bore')).toBeCloseTo(eyeToEyeMm, 1);
  });

  it('follow the shock as it is pressed together', () => {
    const svg = draw({ figure: airFigure, dimensions: ['eye-to-eye'], compressedMm: 12.5 });
    expect(readDimensions(svg)[0]).toMatchObject({ mm: 197.5, text: '197.5' });
    expect(middleOf(svg, 'shaft-end-bore')).toBeCloseTo(197.5, 1);
  });

  it('leave out what is not known', () => {
    const figure = { ...airFigure, strokeMm: null, diameterMm: null, reservoir: null };
    const drawn = readDimensions(draw({ figure, dimensions: dimensionKeys }));
    expect(drawn.map(({ key }) => key)).toEqual(['eye-to-eye', 'body-bore', 'shaft-bore']);
  });

  it('mark the one that is asked for, with the figure as it was typed', () => {
    const svg = draw({
      figure: airFigure,
      dimensions: ['eye-to-eye', 'stroke'],
      asked: 'stroke',
      texts: { stroke: '?' },
    });
    expect(readDimensions(svg)).toMatchObject([
      { key: 'eye-to-eye', asked: false, text: '210' },
      { key: 'stroke', asked: true, text: '?' },
    ]);
  });
});

describe('every property alone changes the picture', () => {
  const changes: [string, ShockFigure, Partial<ShockFigure>][] = [
    ['eye-to-eye', airFigure, { eyeToEyeMm: 211 }],
    ['stroke', airFigure, { strokeMm: 52.5 }],
    ['stroke not known', airFigure, { strokeMm: null }],
    ['kind of body end', airFigure, { bodyEnd: { kind: 'trunnion' } }],
    ['kind of shaft end', airFigure, { shaftEnd: { kind: 'bearing-eye', boltMm: 8, widthMm: 20 } }],
    ['bore of the body end', airFigure, { bodyEnd: { kind: 'eyelet', boreMm: 14 } }],
    ['bore of the shaft end', airFigure, { shaftEnd: { kind: 'eyelet', boreMm: 14 } }],
    ['bolt of a bearing eye', coilFigure, { bodyEnd: { kind: 'bearing-eye', boltMm: 10, widthMm: 20 } }],
    ['width of a bearing eye', coilFigure, { bodyEnd: { kind: 'bearing-eye', boltMm: 8, widthMm: 30 } }],
    ['spring', airFigure, { spring: 'coil' }],
    ['diameter of the can', airFigure, { diameterMm: 50 }],
    ['diameter of the coil', coilFigure, { diameterMm: 66 }],
    ['free length of the coil', coilFigure, { springFreeLengthMm: 110 }],
    ['reservoir', airFigure, { reservoir: null }],
    ['length of the reservoir', airFigure, { reservoir: { lengthMm: 96, diameterMm: 38, positionDeg: 0 } }],
    ['diameter of the reservoir', airFigure, { reservoir: { lengthMm: 92, diameterMm: 42, positionDeg: 0 } }],
    ['reservoir turned down', airFigure, { reservoir: { lengthMm: 92, diameterMm: 38, positionDeg: 180 } }],
    ['reservoir turned aside', airFigure, { reservoir: { lengthMm: 92, diameterMm: 38, positionDeg: 40 } }],
    ['remote', airFigure, { remote: true }],
    ['used stroke', airFigure, { usedStrokeMm: 40 }],
  ];

  it.each(changes)('%s', (_name, figure, change) => {
    const sheet = { x1: -40, y1: -100, x2: 280, y2: 100 };
    const before = pictureOf(draw({ figure, sheet }));
    const after = pictureOf(draw({ figure: { ...figure, ...change }, sheet }));
    expect(after).not.toBe(before);
  });

  it('tells a reservoir before the body from one behind it', () => {
    const turned = (positionDeg: number) => ({ lengthMm: 92, diameterMm: 38, positionDeg });
    const near = draw({ figure: { ...airFigure, reservoir: turned(60) } });
    const far = draw({ figure: { ...airFigure, reservoir: turned(300) } });
    expect(pictureOf(near)).not.toBe(pictureOf(far));
  });
});

describe('what is drawn besides', () => {
  it('has the grey outline of the own shock behind, at the same origin', () => {
    const svg = draw({ figure: airFigure, behind: trunnionFigure });
    const paths = [...svg.querySelectorAll('path')];
    expect(paths[0]?.getAttribute('data-part')).toBe('behind');
    expect(svg.querySelector('desc')?.textContent).toContain('your shock: 185 × 52.5 mm');
  });

  it('shows where the shaft end comes to at full stroke', () => {
    const without = pictureOf(draw({ figure: airFigure }));
    const withGhost = pictureOf(draw({ figure: airFigure, ghost: true }));
    expect(withGhost).toContain('9 2.5 1.5 2.5 1.5 2.5');
    expect(without).not.toContain('9 2.5 1.5 2.5 1.5 2.5');
  });

  it('says in words what the dimensions say', () => {
    draw({ figure: airFigure, dimensions: dimensionKeys });
    const image = screen.getByRole('img', { name: 'Air shock, 210 × 55 mm' });
    expect(image).toHaveAccessibleDescription(
      'Eye-to-eye 210 mm, stroke 55 mm, body end eyelet with a 15 mm bore, shaft end eyelet with a 15 mm bore, ' +
        'air can 54 mm in diameter, reservoir 92 mm long and 38 mm in diameter, above the body, hand lever.',
    );
  });

  it('puts shocks on one sheet at one scale', () => {
    const sheet = { x1: -30, y1: -60, x2: 260, y2: 60 };
    const boxes = [airFigure, coilFigure].map((figure) => draw({ figure, sheet }).getAttribute('viewBox'));
    expect(boxes).toEqual(['-30 -60 290 120', '-30 -60 290 120']);
  });
});
