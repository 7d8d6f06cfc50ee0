import { describe, expect, it } from 'vitest';
import { torqueSlipRange } from '../../src/springs/torque.js';
import { expectNear } from './near.js';
import vectors from './vectors/bolts.json' with { type: 'json' };

const known = ['M6', 'M8', 'M10'];
const usualFriction = 0.2;
const diameterM = (thread: string): number => Number(thread.slice(1)) / 1000;

describe('torque of class 8.8 bolts', () => {
  it.each(vectors.iso898.filter(({ thread }) => known.includes(thread)))(
    '$thread: stress area of the ISO 898-1 table',
    (row) => {
      const range = torqueSlipRange(row.thread);
      const force = (range?.highNm ?? NaN) / (usualFriction * diameterM(row.thread));
      const area = force / (0.75 * vectors.Sp_nominal_MPa['8.8']);
      expectNear(area, row.As_table, { rel: 1e-12 });
      // The table rounds to three digits.
      expectNear(area, Number(row.As_calc), { rel: 0.005 });
      expectNear(range?.lowNm ?? null, (range?.highNm ?? NaN) / 20, { rel: 1e-12 });
    },
  );

  const rows = vectors.vectors.filter((row) => row.class === '8.8' && known.includes(row.thread));
  it.each(rows)('$thread: three quarters of the printed proof load', ({ thread, K, T_Nm }) => {
    const highNm = torqueSlipRange(thread)?.highNm ?? null;
    // The standard rounds its proof loads; area times stress agrees to 1.1 %, as the vectors note.
    expectNear(highNm, (Number(T_Nm) * usualFriction) / K, { rel: 0.011 });
  });

  it('covers the three threads, and no other', () => {
    expect(rows).toHaveLength(3);
    for (const { thread } of vectors.iso898) {
      expect(torqueSlipRange(thread) !== null).toBe(known.includes(thread));
    }
  });
});
