import { clearanceScene, sizeOf } from '@linkfell/fit-engine';
import { expect, it } from 'vitest';

import { frameFacts } from '../src/seed/demo-pairs.js';
import { readScenario } from '../src/seed/scenario.js';

const s = readScenario();
const withReservoir = s.shockSizes.filter(({ facts }) => facts.reservoir);

it('outlines are there for every position of every reservoir, with the room that the positions need', () => {
  expect(withReservoir.length).toBeGreaterThan(5);
  for (const { sizeKey, facts } of withReservoir) {
    const { positionsDeg, outlines } = facts.reservoir ?? { positionsDeg: [], outlines: [] };
    expect(outlines.map(({ positionDeg }) => positionDeg).toSorted(), sizeKey).toEqual(
      [...positionsDeg].toSorted(),
    );
    for (const { polygon } of outlines) expect(polygon.length).toBeGreaterThanOrEqual(3);
  }
});

it('every drawn frame can be swept by each reservoir of its sizes, at least twelve of them', () => {
  const swept = s.frames.filter(({ id }) => {
    const { room, entries, ...frame } = frameFacts(s, id);
    if (!room) return false;
    const pairs = entries.flatMap((entry) =>
      withReservoir
        .filter(({ sizeKey }) => sizeKey === entry.sizeKey)
        .map(({ facts }) => ({ facts, size: sizeOf(entry.sizeKey ?? '') })),
    );
    const drawn = pairs.filter(({ facts, size }) => {
      if (!facts.reservoir || !size) return false;
      const wayRound = frame.wayRound?.value ?? 'body-to-frame';
      const { eyeToEyeMm, strokeMm } = size;
      return clearanceScene(room, facts.reservoir, { eyeToEyeMm, strokeMm, wayRound }).positions.length > 0;
    });
    return drawn.length > 0;
  });
  expect(swept.length).toBeGreaterThanOrEqual(12);
});

it('at least thirty frames have points of their leverage', () => {
  const known = s.frames.filter(({ id }) => frameFacts(s, id).entries.some(({ curve }) => curve));
  expect(known.length).toBeGreaterThanOrEqual(30);
});
