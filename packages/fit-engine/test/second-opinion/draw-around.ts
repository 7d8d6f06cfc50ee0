import type { FitQuestion, FrameMount, Reading, ShockMount } from '../../src/facts.js';
import type { Random } from '../judging/seeded.js';
import { change as set } from './change.js';
import { fact, frameEnd } from './question.js';

export type Draw = (q: FitQuestion, r: Random) => FitQuestion;
export const read = (r: Random, mm: number): Reading => ({
  mm: mm + r.between(-0.3, 0.3),
  tool: r.pick(['caliper', 'caliper', 'ruler', 'tape']),
  awkward: r.chance(0.2),
});
export const measured = (q: FitQuestion, r: Random, eye: number, stroke: number): FitQuestion => {
  const closed = set(
    q,
    'present.compressed',
    r.chance(0.9) ? read(r, eye - stroke + r.between(0, 1.6)) : null,
  );
  const open = set(closed, 'present.eyeToEye', r.chance(0.9) ? read(r, eye) : null);
  return r.chance(0.3) ? set(open, 'present.shaftTravel', read(r, stroke - r.between(0, 1.8))) : open;
};
export const coil: Draw = (q, r) =>
  set(
    set(q, 'shock.spring', {
      kind: 'coil',
      springInsideMm: r.chance(0.95) ? 36 : 38,
      maxFreeLengthMm: 170,
      collarPitchMm: r.pick([null, 1, 1.5]),
    }),
    'shock.diameterMm',
    64,
  );
export const ends: readonly [FrameMount, ShockMount][] = [
  [
    { kind: 'pin', diameterMm: 15, widthMm: 24 },
    { kind: 'eyelet', boreMm: 15 },
  ],
  [
    { kind: 'pin', diameterMm: 14, widthMm: 24 },
    { kind: 'eyelet', boreMm: 14 },
  ],
  [{ kind: 'trunnion' }, { kind: 'trunnion' }],
  [
    { kind: 'bearing-bolt', boltMm: 8, widthMm: 30 },
    { kind: 'bearing-eye', boltMm: 8, widthMm: 30 },
  ],
  [
    { kind: 'hardware', widthMm: 30, boltMm: 8 },
    { kind: 'eyelet', boreMm: 15 },
  ],
];
/** A second entry, a described frame, a curve, another rider: things that change what the checks start from. */
export const around: readonly Draw[] = [
  (q, r) => {
    const [first] = q.frame.entries;
    if (!first || q.frame.origin === 'described') return q;
    const second = {
      ...first,
      id: r.pick(['b', '0']),
      sizeKey: r.pick(['210x50', '210x52.5']),
      travelMm: r.pick([null, 140]),
    };
    const years = [
      { from: 2019, to: 2022 },
      { from: 2023, to: 2026 },
    ] as const;
    const apart = r.chance(0.5)
      ? [
          { ...first, modelYears: years[0] },
          { ...second, modelYears: years[1] },
        ]
      : [
          { ...first, chip: 'high' },
          { ...second, chip: r.pick(['low', null]) },
        ];
    const told = set(
      set(q, 'rider.modelYear', r.pick([null, 2021, 2024, 2030])),
      'rider.chip',
      r.pick([null, 'high', 'low']),
    );
    return set(told, 'frame.entries', r.chance(0.6) ? apart : [first, second]);
  },
  (q, r) => {
    // A described frame has one entry, and no size of its own.
    const one = set(q, 'frame.entries', q.frame.entries.slice(0, 1));
    const described = set(set(one, 'frame.origin', 'described'), 'frame.entries.0.sizeKey', null);
    const sold = set(described, 'present.soldWithBike', r.pick(['yes', 'yes', 'yes', 'no', 'unsure', null]));
    return r.chance(0.2)
      ? set(sold, 'present.printedSizeKey', r.pick(['210x55', '210x50']))
      : measured(sold, r, 210, r.pick([55, 55, 52.5]));
  },
  (q, r) => {
    const points = r.pick([
      [
        [0, 3],
        [55, 2.4],
      ],
      [
        [0, 3.1],
        [30, 2.8],
      ],
      [
        [0, 3.4],
        [55, 3],
      ],
    ]);
    return set(q, 'frame.entries.0.curve', { by: 'shock-travel', points });
  },
  (q, r) =>
    set(
      set(q, 'rider.riderKg', r.pick([60, 70, 95])),
      'rider.style',
      r.pick([null, 'cross-country', 'enduro', 'downhill']),
    ),
  (q, r) =>
    set(q, r.pick(['rider.kitKg', 'rider.bikeKg', 'frame.entries.0.travelMm', 'frame.coilOnYoke']), null),
  (q, r) => set(q, 'frame.sagTargetPercent', fact(r.pick([20, 28, 33]))),
  (q, r) => coil(q, r),
  (q, r) => {
    const [a, b] = [r.pick(ends), r.pick(ends)];
    const framed = set(
      set(q, 'frame.entries.0.frameEnd', frameEnd(a[0])),
      'frame.entries.0.linkEnd',
      frameEnd(b[0]),
    );
    const turned = r.chance(0.5) ? [a, b] : [b, a];
    return set(set(framed, 'shock.bodyEnd', turned[0]?.[1]), 'shock.shaftEnd', turned[1]?.[1]);
  },
];
