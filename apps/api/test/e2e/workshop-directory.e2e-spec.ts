import type { WorkshopList, WorkshopPage } from '@linkfell/contracts';

import { WorkshopClosure } from '../../src/workshops/workshop-closure.entity.js';
import { createShop, createWorkshop } from '../factories/organisation.factory.js';
import { startTestApp, type TestApp } from '../support/app.js';

const shed = 'tin-shed';

describe('the workshop directory', () => {
  let app: TestApp;
  beforeAll(async () => {
    app = await startTestApp();
  });
  afterAll(() => app.close());

  const list = async (query = ''): Promise<WorkshopList> =>
    (await app.client().get(`/api/workshops${query}`).expect(200)).body as WorkshopList;
  const page = async (id: string): Promise<WorkshopPage> =>
    (await app.client().get(`/api/workshops/${id}`).expect(200)).body as WorkshopPage;

  it('lists every workshop and no shop that is none, by name', async () => {
    const shop = await createShop(app.manager);
    const { workshops, towns } = await list();
    const names = workshops.map(({ name }) => name);
    expect(names).toEqual([...names].sort());
    expect(workshops.map(({ id }) => id)).toContain(shed);
    expect(workshops.map(({ id }) => id)).not.toContain(shop.id);
    expect(workshops.every(({ distanceKm }) => distanceKm === null)).toBe(true);
    expect(towns.map(({ id }) => id)).toContain('skelhow');
  });

  it('puts the nearest first from a town, and knows no other places', async () => {
    const { workshops } = await list('?from=quarrowby');
    const distances = workshops.map(({ distanceKm }) => distanceKm ?? Number.NaN);
    expect(distances.length).toBeGreaterThan(1);
    expect(distances).toEqual([...distances].sort((a, b) => a - b));
    expect(distances[0]).toBeGreaterThanOrEqual(0);
    await app.client().get('/api/workshops?from=nowhere').expect(404);
    await app.client().get('/api/workshops?from=No+Where').expect(422);
  });

  it('shows work with price and minutes, hours in two parts of a day, address and stands', async () => {
    const workshop = await page(shed);
    expect(workshop).toMatchObject({ fitMinor: 4150, fitMinutes: 60, stands: 2, timeZone: 'Europe/London' });
    expect(workshop.services).toContainEqual({
      workId: 'travel-spacer',
      say: 'Fit a travel spacer inside the damper',
      minutes: 60,
      priceMinor: 4400,
    });
    expect(workshop.hours.slice(0, 2)).toEqual([
      { weekday: 1, opens: '08:30', closes: '12:30' },
      { weekday: 1, opens: '13:15', closes: '17:00' },
    ]);
    expect(workshop.openWeekdays).toEqual([1, 2, 3, 4, 5, 6]);
    expect(workshop.street).not.toBe('');
    await app.client().get('/api/workshops/fellside-parts').expect(404);
    await app.client().get('/api/workshops/nobody').expect(404);
  });

  it('counts a closure until its last day has ended where the workshop is', async () => {
    const { id } = await createWorkshop(app.manager);
    await app.manager.insert(WorkshopClosure, {
      organisationId: id,
      firstDay: '2027-07-05',
      lastDay: '2027-07-07',
      reason: 'Stocktaking',
    });
    const closure = { firstDay: '2027-07-05', lastDay: '2027-07-07', reason: 'Stocktaking' };
    // 23:30 on the 7th in summer time.
    app.clock.set('2027-07-07T22:30:00Z');
    expect((await page(id)).closures).toEqual([closure]);
    expect((await list()).workshops.find((each) => each.id === id)?.closure).toEqual(closure);
    app.clock.set('2027-07-07T23:30:00Z');
    expect((await page(id)).closures).toEqual([]);
    expect((await list()).workshops.find((each) => each.id === id)?.closure).toBeNull();
  });
});
