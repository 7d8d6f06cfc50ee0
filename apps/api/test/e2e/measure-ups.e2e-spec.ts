import type { MeasureUpView } from '@linkfell/contracts';

import { startTestApp, type TestApp } from '../support/app.js';
import { RiderJourney, usualAnswers } from '../support/journey.js';

describe('measure-ups', () => {
  let app: TestApp;
  beforeAll(async () => {
    app = await startTestApp();
  });
  afterAll(() => app.close());

  it('finds frames by maker, model and year, and shows a sheet with its sources', async () => {
    const browser = app.client();
    const found = await browser.get('/api/frames?q=withen%202023').expect(200);
    expect(found.body.frames.map(({ id }: { id: string }) => id)).toContain('ullscar-withen-140');
    const sheet = await browser.get('/api/frames/ullscar-withen-140').expect(200);
    expect(sheet.body.entries.length).toBeGreaterThan(0);
    expect(sheet.body.entries[0].source.label).toBeTruthy();
    await browser.get('/api/frames/no-such-frame').expect(404);
  });

  it('refuses answers that cannot be, with pointers, and keeps what was there', async () => {
    const rider = new RiderJourney(app);
    const id = await rider.measureUp(usualAnswers('ullscar-withen-140'));
    const at = `/api/measure-ups/${id}/answers`;
    const wrong = await rider.browser
      .put(`${at}/weight`)
      .send({ state: 'known', value: { riderKg: 900, kitKg: 3 } })
      .expect(422);
    expect(wrong.body.errors[0].pointer).toBe('/value/riderKg');
    const frame = await rider.browser
      .put(`${at}/frame`)
      .send({
        state: 'known',
        value: { kind: 'listed', frameId: 'none-such', modelYear: null, frameSize: null, chip: null },
      })
      .expect(422);
    expect(frame.body.errors[0].pointer).toBe('/value/frameId');
    await rider.browser
      .put(`${at}/printed-size`)
      .send({ state: 'known', value: { text: '212x99', sizeKey: '210x55' } })
      .expect(422);
    await rider.browser.put(`${at}/no-such-question`).send({ state: 'unknown' }).expect(404);
    const view = (await rider.browser.get(`/api/measure-ups/${id}`).expect(200)).body as MeasureUpView;
    expect(view.answers.weight).toEqual({ state: 'known', value: { riderKg: 80, kitKg: 3 } });
  });

  it('recognises a swapped size, and takes the key from the text, not from the client', async () => {
    const rider = new RiderJourney(app);
    const id = await rider.measureUp({
      ...usualAnswers('ullscar-withen-140'),
      'printed-size': { text: '50 x 210', sizeKey: '250x75' },
    });
    const view = (await rider.browser.get(`/api/measure-ups/${id}`).expect(200)).body as MeasureUpView;
    expect(view.size).toMatchObject({ state: 'settled', sizeKey: '210x50' });
  });

  it('asks a described frame everything the engine reads, and judges nothing as "bolts straight in"', async () => {
    const rider = new RiderJourney(app);
    const { frame: _listed, ...rest } = usualAnswers('ullscar-withen-140');
    const end = { kind: 'hardware', widthMm: 30, boltMm: 8, tool: 'caliper' };
    const id = await rider.measureUp({
      frame: { kind: 'described', name: 'An old friend' },
      ...rest,
      'frame-travel': { mm: 145 },
      'frame-yoke': { yoke: 'none' },
      'frame-end': end,
      'link-end': end,
      'tunnel-width': { mm: 75, tool: 'caliper' },
      'e-bike': { eBike: false },
      'printed-size': { text: '210x55', sizeKey: '210x55' },
      'sold-with-bike': { soldWithBike: 'yes' },
    });
    const view = await rider.matches(id, '?wontFit=shown');
    expect(view.counts['bolts-straight-in']).toBe(0);
    expect(view.counts['fits-with-work'] + view.counts['needs-an-answer']).toBeGreaterThan(0);
    await rider.browser
      .put(`/api/measure-ups/${id}/answers/sold-with-bike`)
      .send({ state: 'unknown' })
      .expect(200);
    const unsure = await rider.matches(id, '?wontFit=shown');
    expect(unsure.counts['fits-with-work']).toBe(0);
  });

  it('asks about a reading that contradicts the sheet, and lets nothing fit until it is settled', async () => {
    const rider = new RiderJourney(app);
    const id = await rider.measureUp({
      ...usualAnswers('ullscar-withen-140'),
      'printed-size': { text: '230x60', sizeKey: '230x60' },
    });
    const view = (await rider.browser.get(`/api/measure-ups/${id}`).expect(200)).body as MeasureUpView;
    expect(view.questions.map(({ key }) => key)).toContain('size-confirm');
    const before = await rider.matches(id);
    expect(before.counts['bolts-straight-in'] + before.counts['fits-with-work']).toBe(0);
    await rider.browser
      .put(`/api/measure-ups/${id}/answers/size-confirm`)
      .send({ state: 'known', value: { confirmsSheetSize: true } })
      .expect(200);
    expect((await rider.matches(id)).counts['bolts-straight-in']).toBeGreaterThan(0);
  });

  it('opens by the rider’s own link until it is revoked', async () => {
    const rider = new RiderJourney(app);
    const id = await rider.measureUp(usualAnswers('ullscar-withen-140'));
    const { url } = (await rider.browser.post(`/api/measure-ups/${id}/links`).send({}).expect(201)).body as {
      url: string;
    };
    const token = new URL(url).hash.slice(1);
    const friend = app.client();
    await friend.get(`/api/measure-ups/${id}`).expect(404);
    await friend.post('/api/measure-ups/open').send({ token }).expect(200);
    await friend.get(`/api/measure-ups/${id}`).expect(200);
    await rider.browser.delete(`/api/measure-ups/${id}/links`).expect(204);
    await app.client().post('/api/measure-ups/open').send({ token }).expect(404);
  });

  it('keeps every answer when two tabs answer at once', async () => {
    const rider = new RiderJourney(app);
    const id = await rider.measureUp({});
    const answers = Object.entries(usualAnswers('ullscar-withen-140'));
    await Promise.all(
      answers.map(([question, value]) =>
        rider.browser
          .put(`/api/measure-ups/${id}/answers/${question}`)
          .send({ state: 'known', value })
          .expect(200),
      ),
    );
    const view = (await rider.browser.get(`/api/measure-ups/${id}`).expect(200)).body as MeasureUpView;
    expect(Object.keys(view.answers).sort()).toEqual(answers.map(([question]) => question).sort());
    expect(view.revision).toBe(answers.length);
  });
});
