import type { ClearanceView } from '@linkfell/contracts';
import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, it, vi } from 'vitest';
import { answerWith } from '../../testing/answer-with';
import { pictureOf } from '../../testing/read-drawing';
import { renderRoutes, renderWithProviders } from '../../testing/render-page';
import { ClearancePage } from './clearance-page';
import { SweepDrawing } from './sweep-drawing';

type Position = ClearanceView['positions'][number];
const box = (x1: number, y1: number, x2: number, y2: number): [number, number][] => [
  [x1, y1],
  [x2, y1],
  [x2, y2],
  [x1, y2],
];
const instant = (shockMm: number): Position['instants'][number] => ({
  ...{ shockMm, body: box(-10, -20, 120, 25 + shockMm / 50), frameEye: [0, 0] },
  linkEye: [210 - shockMm, 0],
  moving: [{ name: 'rocker', polygon: box(190 - shockMm, 30, 215 - shockMm, 45) }],
});
const position = (deg: number, distanceMm: number): Position => ({
  ...{ deg, refused: false, distanceMm, atShockMm: 55, part: 'top tube', incomplete: null },
  instants: [0, 27.5, 55].map(instant),
  tight: { shock: [60, 26.1], part: [60, 26.1 + distanceMm] },
});
const view: ClearanceView = {
  ...{
    frameName: 'Frame One',
    shockName: 'Maker One 210x55',
    say: 'The reservoir keeps 8.2 mm free.',
    why: null,
  },
  ...{ eyeToEyeMm: 210, strokeMm: 55, wayRound: 'body-to-frame', chosenDeg: 180 },
  fixed: [{ name: 'top tube', polygon: box(-40, 36, 220, 60) }],
  positions: [position(0, 4.1), position(180, 8.2)],
};
const address = '/measure-up/m1/matches/one/clearance';
const show = (answer: ClearanceView) => {
  answerWith({ '/measure-ups/m1/matches/one/clearance': answer });
  renderRoutes([{ path: '/measure-up/:id/matches/:sizeId/clearance', element: <ClearancePage /> }], address);
};
afterEach(() => vi.unstubAllGlobals());

it('draws the position that the check chose, and another one on request', async () => {
  show(view);
  const drawing = await screen.findByRole('img', { name: /through its stroke in the Frame One/ });
  expect(drawing).toHaveAccessibleDescription(
    /Turned to 180 degrees.*top tube.*55 mm into.*8.2 mm stay free/,
  );
  expect(drawing.querySelector('[data-tight]')).toHaveTextContent('8.2 mm');
  await userEvent.click(screen.getByRole('radio', { name: /Up, 0°/ }));
  expect(drawing.querySelector('[data-tight]')).toHaveTextContent('4.1 mm');
});

it('says why nothing is drawn', async () => {
  show({ ...view, why: 'This shock has no reservoir.', positions: [], fixed: [] });
  expect(await screen.findByText('This shock has no reservoir.')).toBeVisible();
  expect(screen.queryByRole('img')).toBeNull();
});

const [one] = view.positions as [Position];
const draw = (change: Partial<ClearanceView>, of: Partial<Position> = {}): string => {
  const { container, unmount } = renderWithProviders(
    <SweepDrawing view={{ ...view, ...change }} position={{ ...one, ...of }} />,
  );
  const svg = container.querySelector('svg') as SVGElement;
  const picture =
    pictureOf(svg) + [...svg.querySelectorAll('text')].map((text) => text.textContent).join('|');
  unmount();
  return picture;
};
it.each<[string, Partial<ClearanceView>, Partial<Position>]>([
  ['a tube', { fixed: [{ name: 'top tube', polygon: box(-40, 37, 220, 60) }] }, {}],
  ['the name of a part', { fixed: [{ name: 'bottle', polygon: box(-40, 36, 220, 60) }] }, {}],
  ['the travel at which it is tightest', {}, { atShockMm: 27.5 }],
  ['the figure', {}, { distanceMm: 4.2 }],
  ['the tightest point', {}, { tight: { shock: [61, 26.1], part: [61, 30.2] } }],
  ['a place of the shock', {}, { instants: [instant(0), instant(30), instant(55)] }],
])('%s alone changes the drawing', (_what, change, of) => {
  expect(draw(change, of)).not.toBe(draw({}));
});
