import type { FitQuestion, Reading } from '../../src/facts.js';
import type { Random } from '../judging/seeded.js';
import { change as set } from './change.js';
import { matching } from './question.js';
import { rows } from './sizes.js';

/** Readings of one shock with every tool, sometimes against the sheet, sometimes of no size at all. */
export function drawReadings(r: Random): FitQuestion {
  const [label, family, eye, stroke] = r.pick(rows);
  const wild = r.chance(0.1) ? r.between(-6, 6) : 0;
  const read = (mm: number): Reading => {
    const tool = r.pick(['caliper', 'ruler', 'tape', 'print'] as const);
    const spread = { print: 0.5, caliper: 0.4, ruler: 1.2, tape: 2 }[tool];
    return { mm: mm + wild + r.between(-spread, spread), tool, awkward: r.chance(0.3) };
  };
  let q = set(matching, 'frame.entries.0.sizeKey', r.pick([label, r.pick(rows)[0]]));
  if (r.chance(0.2)) q = set(set(q, 'frame.origin', 'described'), 'frame.entries.0.sizeKey', null);
  q = set(q, 'present.bodyEndKind', r.chance(0.3) ? null : family);
  q = set(q, 'present.shaftEndKind', r.chance(0.3) ? null : 'eyelet');
  if (r.chance(0.1)) q = set(q, 'present.printedSizeKey', label);
  if (r.chance(0.85)) q = set(q, 'present.eyeToEye', read(eye));
  if (r.chance(0.7)) q = set(q, 'present.compressed', read(eye - stroke + r.between(0, 2)));
  return r.chance(0.5) ? set(q, 'present.shaftTravel', read(stroke - r.between(0, 2))) : q;
}
