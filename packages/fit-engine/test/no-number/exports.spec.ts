import { expect, it } from 'vitest';

import * as engine from '../../src/index.js';
import { exported } from './exports.js';

const bad = [NaN, Infinity, -Infinity] as const;
const functions = Object.entries(engine).flatMap(([name, value]) =>
  typeof value === 'function' ? name : [],
);

it('every function that the package exports is listed, and nothing else', () => {
  expect(Object.keys(exported).toSorted()).toEqual(functions.toSorted());
  expect(functions.length).toBeGreaterThan(20);
});

it.each(Object.entries(exported))('%s makes no number out of NaN or Infinity', (_name, complaints) => {
  for (const by of bad) expect(complaints(by), String(by)).toEqual([]);
});
