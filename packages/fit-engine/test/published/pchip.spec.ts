import { describe, expect, it } from 'vitest';
import {
  integralOf,
  pchipPieces,
  pchipSlopes,
  pieceAt,
  slopeOf,
  valueOf,
} from '../../src/kinematics/pchip.js';
import { expectNear } from './near.js';
import vectors from './vectors/pchip.json' with { type: 'json' };

const abs = vectors.tolerance_abs;

describe.each(Object.entries(vectors.sets))('monotone cubic %s', (_, set) => {
  const pieces = pchipPieces(set.x, set.y);
  const piece = (x: number) => {
    const found = pieces[pieceAt(pieces, x)];
    if (!found) throw new Error('no piece');
    return found;
  };
  const integral = (x: number): number =>
    pieces.filter((one) => one.x0 < x).reduce((sum, one) => sum + integralOf(one, Math.min(one.x1, x)), 0);

  it('has the slopes at its points', () => {
    const slopes = pchipSlopes(set.x, set.y);
    expect(slopes).toHaveLength(set.node_slopes.length);
    set.node_slopes.forEach((slope, i) => expectNear(slopes[i] ?? NaN, slope, { abs }, `slope ${i}`));
  });

  it.each(set.eval)('value, slope and integral at $x', ({ x, y, dydx, integral_from_x0 }) => {
    expectNear(valueOf(piece(x), x), y, { abs });
    expectNear(slopeOf(piece(x), x), dydx, { abs });
    expectNear(integral(x), integral_from_x0, { abs });
  });

  it('integral over all', () => {
    expectNear(integral(set.x.at(-1) ?? NaN), set.integral_total, { abs });
  });
});
