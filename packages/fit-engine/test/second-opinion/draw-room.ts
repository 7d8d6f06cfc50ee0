import type { FitQuestion, FrameOutline, Point } from '../../src/facts.js';
import type { Random } from '../judging/seeded.js';
import { change as set } from './change.js';
import { fact } from './question.js';

const box = (x0: number, y0: number, x1: number, y1: number): Point[] => [
  [x0, y0],
  [x1, y0],
  [x1, y1],
  [x0, y1],
];

/** A reservoir with what is said, drawn and measured of its room; all drawings are upright boxes. */
export function drawRoom(q: FitQuestion, r: Random): FitQuestion {
  const below = { positionDeg: 0, polygon: box(-18, -46, 120, 26) };
  const above = { positionDeg: 180, polygon: box(-18, -26, 120, 46) };
  const turns = r.chance(0.4) ? [0, 180] : [0];
  const outlines = r.pick([[], [below], [below, above]]);
  let done = set(q, 'shock.reservoir', { lengthMm: 90, diameterMm: 40, positionsDeg: turns, outlines });
  done = set(done, 'frame.reservoirStatement', r.pick([null, null, fact('fits'), fact('inline-only')]));
  done = set(done, 'frame.refusedPositions', r.pick([null, null, null, fact([180]), fact([0])]));
  const room = {
    diameterMm: r.pick([44, 46.4, 48, 52]),
    lengthMm: r.pick([95, 110]),
    uncertaintyMm: r.pick([0.25, 0.86]),
  };
  done = set(done, 'frame.reservoirRoom', r.pick([null, fact(room)]));
  if (r.chance(0.4)) return done;
  const top = -r.pick([47, 49, 50.2, 55, 70]);
  const parts: FrameOutline[] = [
    { name: 'tube', polygon: box(-60, top - 40, 320, top), toleranceMm: 0.5, poses: null, moves: false },
  ];
  if (r.chance(0.3)) {
    // A gusset behind the frame-side pivot: free only of a body at the link, and nearest when the shock is closed.
    const gusset = box(-60, -10, r.pick([10, 30, 33.2]), 10);
    parts.push({ name: 'gusset', polygon: gusset, toleranceMm: 0, poses: null, moves: false });
  }
  if (r.chance(0.5)) {
    // A link that comes down on the shock as it closes, or one whose movement nobody has drawn.
    const drop = r.pick([0, 10, 25, 40]);
    const poses = r.chance(0.8)
      ? ([
          [0, 0, 0, 0],
          [60, r.pick([0, -30]), -drop, 0],
        ] as const)
      : null;
    parts.push({ name: 'link', polygon: box(150, 75, 210, 95), toleranceMm: 1, poses, moves: true });
  }
  return set(done, 'frame.room', {
    outlines: parts,
    swing: [
      [0, 0],
      [80, 0],
    ],
  });
}
