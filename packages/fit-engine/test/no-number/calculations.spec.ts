import { readdirSync } from 'node:fs';
import { describe, expect, it } from 'vitest';

import { calculations } from './calculations.js';

const bad = [NaN, Infinity, -Infinity] as const;
const source = new URL('../../src/', import.meta.url);

/** Parts of a calculation that never see a figure of their own: what they are part of is listed. */
const inner: Readonly<Record<string, readonly string[]>> = {
  'kinematics/curve': ['inverseBySlope'],
  'kinematics/pchip': ['pchipSlopes', 'pchipPieces', 'pieceAt', 'valueOf', 'slopeOf', 'integralOf'],
  'kinematics/wheel-travel-curve': ['wheelTravelCurve'],
  'kinematics/shock-travel-curve': ['shockTravelCurve'],
  'kinematics/table-problem': ['tableProblem'],
};
/** The parts of the sweep, which is called by itself. */
const ofTheSweep = ['clearance/motion', 'clearance/nearest', 'clearance/drawn-room'];

const modules = ['springs', 'kinematics', 'clearance'].flatMap((folder) =>
  readdirSync(new URL(folder, source))
    .filter((name) => name.endsWith('.ts') && !name.endsWith('.spec.ts'))
    .map((name) => `${folder}/${name.slice(0, -3)}`),
);

describe('a calculation given NaN or Infinity', () => {
  it.each(modules.filter((name) => !ofTheSweep.includes(name)))('is listed: %s', async (name) => {
    const found = (await import(new URL(`${name}.ts`, source).href)) as Record<string, unknown>;
    const functions = Object.keys(found).filter((key) => typeof found[key] === 'function');
    const listed = [...Object.keys(calculations[name] ?? {}), ...(inner[name] ?? [])];
    // The buffers that polygons are put into for the sweep are read by the distances only.
    const buffers = name === 'clearance/polygon-distance' ? ['cornersOf', 'cornersDistance'] : [];
    expect(functions.filter((key) => !listed.includes(key) && !buffers.includes(key))).toEqual([]);
  });

  it.each(
    Object.entries(calculations).flatMap(([module, byName]) =>
      Object.entries(byName).map(([name, complaints]) => [module, name, complaints] as const),
    ),
  )('%s: %s gives no number', (_module, _name, complaints) => {
    for (const by of bad) expect(complaints(by), String(by)).toEqual([]);
  });
});
