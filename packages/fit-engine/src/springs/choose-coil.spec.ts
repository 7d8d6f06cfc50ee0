import { expect, it } from 'vitest';
import type { CoilOnSale } from '../facts.js';
import { makeCurve } from '../kinematics/leverage-curve.js';
import { chooseCoil } from './choose-coil.js';
import { sagWindow } from './load.js';

const made = makeCurve(null, 150, 60);
if (!made.ok) throw new Error(made.reason);
const { curve } = made;
const window = sagWindow('trail', 30);
if (!window) throw new Error('no window');
const coil = (id: string, rateNPerMm: number): CoilOnSale => ({
  id,
  name: id,
  rateNPerMm,
  rateLbPerIn: Math.round(rateNPerMm / 0.175126835),
  travelMm: 65,
  insideMm: 36,
  freeLengthMm: 140,
});
// At a ratio of 2.5 and no preload, 30 % of 60 mm asks for 720 x 2.5 / 18 = 100 N/mm.
const choose = (...coils: CoilOnSale[]) => chooseCoil(coils, curve, 720, window, 0);

it('shows the two nearest rates with their sag, the nearest first', () => {
  const { wantedNPerMm, nearest, best } = choose(
    coil('a', 80),
    coil('b', 96),
    coil('c', 103),
    coil('d', 120),
  );
  expect(wantedNPerMm).toBeCloseTo(100, 9);
  expect(nearest.map((one) => one.coil.id)).toEqual(['c', 'b']);
  expect(nearest[0]?.sagPercent).toBeCloseTo((100 * 720 * 2.5) / 103 / 60, 6);
  expect(best?.coil.id).toBe('c');
});

it('takes none where none gives a sag inside the window, but still shows what there is', () => {
  // 28 % asks for 107.1 N/mm, 32 % for 93.75.
  const { nearest, best } = choose(coil('soft', 93), coil('hard', 108));
  expect(best).toBeNull();
  expect(nearest).toHaveLength(2);
});

it('counts a rate at the very edge of the window as inside', () => {
  expect(choose(coil('edge', 93.75)).best?.coil.id).toBe('edge');
  expect(choose(coil('edge', 1800 / 16.8)).best?.coil.id).toBe('edge');
});

it('shows one spring of a rate, whatever the order they come in', () => {
  const twins = [coil('z', 100), coil('y', 100), coil('x', 110)];
  expect(choose(...twins).nearest.map((one) => one.coil.id)).toEqual(['y', 'x']);
  expect(choose(...[...twins].reverse())).toEqual(choose(...twins));
});

it('offers nothing for a load that is no number', () => {
  expect(chooseCoil([coil('a', 100)], curve, NaN, window, 0)).toEqual({
    wantedNPerMm: null,
    nearest: [],
    best: null,
  });
});
