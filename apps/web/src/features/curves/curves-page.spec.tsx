import type { CurvesView, RideView } from '@linkfell/contracts';
import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, it, vi } from 'vitest';
import { answerWith } from '../../testing/answer-with';
import { renderRoutes } from '../../testing/render-page';
import { CurvesPage } from './curves-page';

const ride = (name: string, endN: number): RideView => ({
  ...{ name, sizeKey: '210x50', travelMm: 120, meanRatio: 2.4, progressionPercent: 18 },
  points: [0, 30, 60, 90, 120].map((wheelMm) => ({
    ...{
      wheelMm,
      shockMm: wheelMm / 2.4,
      ratio: 2.4,
      forceN: (endN * wheelMm) / 120,
      rateNPerMm: endN / 120,
    },
  })),
  spring: {
    ...{ text: 'air at 190 psi, 27.5 % sag', sagPercent: 27.5, sagMm: 13.75, sagWheelMm: 33 },
    ...{ frequencyHz: 2.1, endToStatic: 4.2, energyJ: 118 },
  },
});
const view: CurvesView = {
  frameName: 'Frame One',
  shockName: 'Maker One 210x50',
  next: ride('Maker One 210x50', 2400),
  present: ride('Maker Two 210x50', 2000),
  loadN: 540,
  notDrawn: [],
  assumed: ['Friction is left out.'],
  choices: [{ sizeId: 'maker-two-210x50', name: 'Maker Two 210x50' }],
  chosen: 'maker-two-210x50',
};
const path = '/measure-ups/m1/matches/maker-one-210x50/curves';
const show = (answer: CurvesView) => {
  const asked = answerWith({ [path]: answer });
  renderRoutes(
    [{ path: '/measure-up/:id/matches/:sizeId/curves', element: <CurvesPage /> }],
    '/measure-up/m1/matches/maker-one-210x50/curves',
  );
  return asked;
};
afterEach(() => vi.unstubAllGlobals());

it('shows each quantity as a chart with its words, and the same figures in a table', async () => {
  show(view);
  const chart = await screen.findByRole('img', { name: 'Force at the wheel against wheel travel' });
  expect(chart).toHaveAccessibleDescription(
    /Maker One 210x50: 0 N at the top, 660 N at sag, 2,400 N at 120 mm/,
  );
  const table = screen.getByRole('table', { name: 'Force at the wheel, N' });
  const last = within(table).getAllByRole('row').at(-1);
  expect(last).toHaveTextContent('1202,4002,000');
  expect(screen.getAllByRole('img', { name: /against wheel travel$/ })).toHaveLength(3);
  // The frame's leverage is the same line for both.
  const leverage = screen.getByRole('img', { name: 'Leverage against wheel travel' });
  expect(leverage.querySelectorAll('[data-series]')).toHaveLength(1);
  expect(leverage).toHaveTextContent('Both');
  expect(screen.getByText('Friction is left out.')).toBeVisible();
});

it('says what is not drawn, and draws the leverage alone', async () => {
  const bare = ride('Your present shock', 2000);
  const without = bare.points.map((point) => ({ ...point, forceN: null, rateNPerMm: null }));
  show({
    ...view,
    next: null,
    present: { ...bare, points: without, spring: null },
    notDrawn: ['The spring of your present shock is not drawn.'],
    chosen: null,
  });
  expect(await screen.findByText('The spring of your present shock is not drawn.')).toBeVisible();
  expect(screen.getAllByRole('img', { name: /against wheel travel$/ })).toHaveLength(1);
});

it('asks anew when the rider says which shock is on the bike', async () => {
  const asked = show({ ...view, chosen: null });
  await userEvent.selectOptions(
    await screen.findByLabelText('Which shock is on the bike now?'),
    'maker-two-210x50',
  );
  await vi.waitFor(() => expect(asked.at(-1)).toMatch(/curves\?present=maker-two-210x50$/));
});
