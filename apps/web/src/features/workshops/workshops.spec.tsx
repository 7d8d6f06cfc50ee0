import type { WorkshopPage as WorkshopView, WorkshopRow } from '@linkfell/contracts';
import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { answerWith } from '../../testing/answer-with';
import { setMedia } from '../../testing/browser-gaps';
import { renderRoutes } from '../../testing/render-page';
import { closureDays, isNear } from './closed-words';
import { flatten } from './place-map';
import { openDaysWords, weekOf } from './week';
import { WorkshopPage } from './workshop-page';
import { WorkshopsPage } from './workshops-page';

const routes = [
  { path: '/workshops', element: <WorkshopsPage /> },
  { path: '/workshops/:workshopId', element: <WorkshopPage /> },
];
const towns = [
  { id: 'skelhow', name: 'Skelhow', latitude: 54.902, longitude: -8.911 },
  { id: 'linnbeck', name: 'Linnbeck', latitude: 54.934, longitude: -9.021 },
];
const shed: WorkshopRow = {
  id: 'shed',
  name: 'The Shed',
  town: 'Linnbeck',
  about: 'Small and exact.',
  latitude: 54.936,
  longitude: -9.02,
  distanceKm: null,
  fitMinor: 4150,
  fitMinutes: 60,
  works: ['fit-shock'],
  openWeekdays: [1, 2, 3, 6],
  closure: { firstDay: '2027-02-15', lastDay: '2027-02-19', reason: 'Half-term week' },
};
const view: WorkshopView = {
  ...shed,
  ...{ street: 'Sawmill Track', postcode: 'QF5 3PG', phone: '01632 960116', email: 'post@shed.example' },
  ...{ vatNumber: 'GB 000 0000 00', timeZone: 'Europe/London', stands: 2 },
  hours: [
    { weekday: 1, opens: '08:30', closes: '12:30' },
    { weekday: 1, opens: '13:15', closes: '17:00' },
  ],
  closures: [
    { firstDay: '2026-12-24', lastDay: '2027-01-02', reason: 'Christmas and New Year' },
    { firstDay: '2027-02-15', lastDay: '2027-02-19', reason: 'Half-term week' },
  ],
  services: [{ workId: 'fit-shock', say: 'Fit the shock', minutes: 60, priceMinor: 4150 }],
};

beforeEach(() => setMedia());
afterEach(() => {
  vi.unstubAllGlobals();
  vi.useRealTimers();
});

describe('the directory', () => {
  it('shows price, days, what is not done there, and the map that numbers the list', async () => {
    answerWith({ '/workshops': { workshops: [shed], towns } });
    renderRoutes(routes, '/workshops');
    const line = within(await screen.findByRole('listitem'));
    expect(line.getByRole('link', { name: 'The Shed' })).toHaveAttribute('href', '/workshops/shed');
    expect(line.getByText('£41.50')).toBeInTheDocument();
    expect(
      line.getByText(/Open Mon to Wed, Sat\. Does not open dampers\. Next closed Mon 15 Feb to Fri 19 Feb\./),
    ).toBeInTheDocument();
    expect(screen.getByRole('img', { name: 'Where the workshops are' })).toHaveAccessibleDescription(
      /1: The Shed/,
    );
  });

  it('measures from the town that is chosen, and keeps it in the address', async () => {
    const asked = answerWith({ '/workshops': { workshops: [{ ...shed, distanceKm: 7.9 }], towns } });
    const { router } = renderRoutes(routes, '/workshops');
    await userEvent.selectOptions(await screen.findByRole('combobox', { name: 'Distances from' }), 'Skelhow');
    expect(router.state.location.search).toBe('?from=skelhow');
    expect(await screen.findByText('Linnbeck, 8 km as the crow flies')).toBeInTheDocument();
    expect(asked).toContain('/api/workshops?from=skelhow');
  });
});

describe('one workshop', () => {
  it('shows work with prices, a whole week of hours, closures and its address', async () => {
    vi.useFakeTimers({ now: new Date('2026-12-01T10:00:00Z'), toFake: ['Date'] });
    answerWith({ '/workshops/shed': view, '/workshops': { workshops: [shed], towns } });
    renderRoutes(routes, '/workshops/shed');
    expect(await screen.findByRole('heading', { level: 1, name: 'The Shed' })).toBeInTheDocument();
    expect(screen.getByRole('row', { name: 'Fit the shock 60 £41.50' })).toBeInTheDocument();
    expect(screen.getByRole('row', { name: /Monday 08:30 to 12:30\s*13:15 to 17:00/ })).toBeInTheDocument();
    expect(screen.getByRole('row', { name: 'Sunday closed' })).toBeInTheDocument();
    expect(within(screen.getByRole('table', { name: /Closures/ })).getAllByRole('row')).toHaveLength(2);
    expect(screen.getByText('Sawmill Track', { exact: false })).toBeInTheDocument();
    expect(screen.getByRole('link', { name: '01632 960116' })).toHaveAttribute('href', 'tel:01632960116');
    // Only what is near stands above everything else.
    expect(screen.getAllByText(/^Closed (Thursday|Monday)/)).toHaveLength(1);
    expect(await screen.findByText(/The Shed is number 1/)).toBeInTheDocument();
  });
});

describe('days in words', () => {
  it.each([
    [[1, 2, 3, 4, 5], 'Mon to Fri'],
    [[6, 1, 2], 'Mon, Tue, Sat'],
    [[2, 3, 4, 7], 'Tue to Thu, Sun'],
    [[], ''],
  ])('%j is %s', (days, words) => expect(openDaysWords(days)).toBe(words));

  it('has seven days in every week', () => {
    expect(weekOf([]).map(({ spans }) => spans.length)).toEqual([0, 0, 0, 0, 0, 0, 0]);
  });

  it('names one day once, and knows what is near', () => {
    const day = { firstDay: '2027-02-15', lastDay: '2027-02-15', reason: '' };
    expect(closureDays(day)).toBe('Monday 15 February 2027');
    expect(isNear(day, new Date('2027-02-15T12:00:00Z'))).toBe(true);
    expect(isNear(day, new Date('2027-01-17T00:00:00Z'))).toBe(true);
    expect(isNear(day, new Date('2027-01-15T00:00:00Z'))).toBe(false);
  });
});

it('draws the map in true kilometres', () => {
  const [a, b] = flatten(towns);
  const km = Math.hypot((a?.x ?? 0) - (b?.x ?? 0), (a?.y ?? 0) - (b?.y ?? 0));
  // Along the great circle by the haversine formula, worked out apart.
  const rad = Math.PI / 180;
  const [p, q] = [54.902 * rad, 54.934 * rad];
  const h = Math.sin((q - p) / 2) ** 2 + Math.cos(p) * Math.cos(q) * Math.sin((0.11 * rad) / 2) ** 2;
  expect(km).toBeCloseTo(2 * 6371.0088 * Math.asin(Math.sqrt(h)), 2);
});
