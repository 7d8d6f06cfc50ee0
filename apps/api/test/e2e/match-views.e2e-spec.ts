import type { ClearanceView, CurvesView, MatchesView } from '@linkfell/contracts';

import { startTestApp, type TestApp } from '../support/app.js';
import { RiderJourney, usualAnswers } from '../support/journey.js';

type Point = [number, number];
const g0 = 9.80665;

describe('curves and clearance of a match', () => {
  let app: TestApp;
  let rider: RiderJourney;
  let id: string;
  let view: MatchesView;
  beforeAll(async () => {
    app = await startTestApp();
    rider = new RiderJourney(app);
    id = await rider.measureUp({
      ...usualAnswers('ullscar-withen-140'),
      'printed-size': { text: '210x50', sizeKey: '210x50' },
    });
    view = await rider.matches(id, '?wontFit=shown');
  });
  afterAll(() => app.close());

  const get = async <T>(sizeId: string, what: string, query = ''): Promise<T> =>
    (await rider.browser.get(`/api/measure-ups/${id}/matches/${sizeId}/${what}${query}`).expect(200))
      .body as T;
  const fitting = () => view.rows.filter(({ cells }) => cells.stroke.answer === 'pass');

  it('draws both shocks on one grid of wheel travel, by the plain formulas of virtual work', async () => {
    let [springs, pairs] = [0, 0];
    for (const { sizeId } of fitting().slice(0, 8)) {
      const first = await get<CurvesView>(sizeId, 'curves');
      const present = first.choices[0]?.sizeId;
      const curves = present ? await get<CurvesView>(sizeId, 'curves', `?present=${present}`) : first;
      // 80 kg and 3 kg of kit, 0.6 of a 14.5 kg bike, 0.6 of all that on the rear wheel.
      expect(curves.loadN).toBeCloseTo(g0 * (80 + 3 + 0.6 * 14.5) * 0.6, 6);
      const sides = [curves.next, curves.present].filter((side) => side !== null);
      expect(sides.length).toBeGreaterThan(0);
      if (curves.next && curves.present && curves.next.sizeKey === curves.present.sizeKey) {
        pairs += 1;
        expect(curves.next.points.map(({ wheelMm }) => wheelMm)).toEqual(
          curves.present.points.map(({ wheelMm }) => wheelMm),
        );
      }
      for (const { points, spring, travelMm } of sides) {
        expect(points[0]).toMatchObject({ wheelMm: 0, shockMm: 0 });
        expect(points.at(-1)?.wheelMm).toBeCloseTo(travelMm, 6);
        // Wheel travel is the sum of leverage times shock travel.
        points.slice(1).forEach((point, i) => {
          const before = points[i] as (typeof points)[number];
          const mean = (point.ratio + before.ratio) / 2;
          expect(point.wheelMm - before.wheelMm).toBeCloseTo(mean * (point.shockMm - before.shockMm), 2);
          if (!spring) return;
          // The rate at the wheel is how fast the force at the wheel grows.
          const grown = (point.forceN ?? NaN) - (before.forceN ?? NaN);
          const rate = ((point.rateNPerMm ?? NaN) + (before.rateNPerMm ?? NaN)) / 2;
          expect(Math.abs(grown / (point.wheelMm - before.wheelMm) / rate - 1)).toBeLessThan(0.02);
        });
        if (!spring) continue;
        springs += 1;
        const over = points.findIndex(({ wheelMm }) => wheelMm >= spring.sagWheelMm);
        const [p, q] = [points[over - 1], points[over]];
        expect(p?.forceN).toBeLessThanOrEqual((curves.loadN ?? 0) + 1e-6);
        expect(q?.forceN).toBeGreaterThanOrEqual((curves.loadN ?? 0) - 1e-6);
        expect(spring.endToStatic).toBeCloseTo((points.at(-1)?.forceN ?? 0) / (curves.loadN ?? 1), 6);
        const joules = points.slice(over + 1).reduce((sum, point, i) => {
          const before = points[over + i] as (typeof points)[number];
          return (
            sum + (((point.forceN ?? 0) + (before.forceN ?? 0)) / 2000) * (point.wheelMm - before.wheelMm)
          );
        }, 0);
        const rest =
          (((q?.wheelMm ?? 0) - spring.sagWheelMm) * ((q?.forceN ?? 0) + (curves.loadN ?? 0))) / 2000;
        expect(Math.abs((joules + rest) / spring.energyJ - 1)).toBeLessThan(0.01);
      }
    }
    expect(springs).toBeGreaterThan(3);
    expect(pairs).toBeGreaterThan(0);
  });

  it('says what is not drawn and why, and never draws a spring nobody knows', async () => {
    const [row] = fitting();
    const curves = await get<CurvesView>(String(row?.sizeId), 'curves');
    expect(curves.present?.spring ?? null).toBeNull();
    expect(curves.notDrawn.join(' ')).toMatch(/your present shock/i);
    expect(curves.assumed.join(' ')).toMatch(/friction/i);
    const other = view.rows.find(({ cells }) => cells.eyeToEye.answer === 'fail');
    const refused = await get<CurvesView>(String(other?.sizeId), 'curves');
    expect(refused.next).toBeNull();
    expect(refused.notDrawn.join(' ')).toMatch(/does not take its size/);
    const unknown = await get<CurvesView>(String(row?.sizeId), 'curves', '?present=no-such-shock');
    expect(unknown.chosen).toBeNull();
    await rider.browser.get(`/api/measure-ups/${id}/matches/no-such-shock/curves`).expect(404);
  });

  it('draws the sweep of every reservoir that goes through this frame, with the figure of the check', async () => {
    let drawn = 0;
    for (const { sizeId, drawing } of fitting()) {
      const sweep = await get<ClearanceView>(sizeId, 'clearance');
      expect(sweep.positions.length > 0).toBe(sweep.why === null);
      if (drawing.reservoir === null) expect(sweep.why).toMatch(/no reservoir/);
      for (const position of sweep.positions) {
        drawn += 1;
        const travels = position.instants.map(({ shockMm }) => shockMm);
        expect(travels).toContain(0);
        expect(travels).toContain(sweep.strokeMm);
        expect(travels).toContain(position.atShockMm);
        for (const { shockMm, linkEye } of position.instants) {
          expect(Math.hypot(...linkEye)).toBeCloseTo(sweep.eyeToEyeMm - shockMm, 6);
        }
        if (position.distanceMm > 0 && position.tight) {
          const [[ax, ay], [bx, by]] = [position.tight.shock, position.tight.part] as [Point, Point];
          expect(Math.hypot(bx - ax, by - ay)).toBeGreaterThanOrEqual(position.distanceMm);
        }
      }
    }
    expect(drawn).toBeGreaterThan(0);
  });
});
