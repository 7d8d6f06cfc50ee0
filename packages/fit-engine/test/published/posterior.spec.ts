import { describe, it } from 'vitest';
import { logNormal, sharesFromLogs } from '../../src/sizing/posterior.js';
import { expectNear } from './near.js';
import vectors from './vectors/posterior.json' with { type: 'json' };

const shares = (candidates: readonly number[], measured: number, u: number, prior: readonly number[]) =>
  sharesFromLogs(candidates.map((size, i) => Math.log(prior[i] ?? NaN) + logNormal(measured - size, u)));

describe('shares of the sizes after a reading', () => {
  it.each(vectors.cases)('$name', ({ candidates, measured, u = NaN, prior, posterior }) => {
    const found = shares(candidates, measured, u, prior);
    posterior.forEach((share, i) => {
      expectNear(found[i] ?? NaN, share, { abs: vectors.tolerance_abs }, `size ${candidates[i]}`);
    });
  });

  it.each(vectors.published)('$name ($source)', (row) => {
    const even = row.candidates.map(() => 1);
    const found = shares(row.candidates, Number(row.measured), row.u, even);
    row.published.forEach((share, i) => {
      // The last printed digit is rounded.
      expectNear(found[i] ?? NaN, share, { abs: 0.501 * 10 ** -row.published_decimals });
      expectNear(found[i] ?? NaN, Number(row.computed_10[i]), { rel: 1e-9 });
    });
  });
});
