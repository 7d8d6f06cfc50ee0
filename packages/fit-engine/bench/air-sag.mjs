// A table of air-sag solutions, timed here and in SciPy where Python has it.
import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';

import { makeCurve } from '../dist/kinematics/leverage-curve.js';
import { sagForFill } from '../dist/springs/air.js';
import { bike } from './bike.mjs';
import { timed } from './timing.mjs';

const strokeMm = 55;
const patmKPa = 101.325;
const chambers = { areaMm2: 1100, negativeAreaMm2: 950, volumeMm3: 105000, negativeVolumeMm3: 16000 };
const [{ curve: table, travelMm }] = bike.frame.entries;

/** Loads and fills of riders from light to heavy; every one has its sag inside the stroke. */
export function airSagTable() {
  const rows = [];
  for (let loadN = 300; loadN <= 900; loadN += 20) {
    for (let gaugeKPa = 700; gaugeKPa <= 1700; gaugeKPa += 100) rows.push({ loadN, gaugeKPa });
  }
  const { curve } = makeCurve(table, travelMm, strokeMm);
  const solve = () =>
    rows.map(({ loadN, gaugeKPa }) => sagForFill(chambers, curve, loadN, gaugeKPa, patmKPa));
  const solved = solve();
  const { medianMs, leastMs } = timed(60, solve);
  const us = (ms) => (1000 * ms) / rows.length;
  console.log(
    `air sag, ${rows.length} solutions: median ${us(medianMs).toFixed(2)} µs each, least ${us(leastMs).toFixed(2)} µs`,
  );
  const byWheel = makeCurve(wheelTable(curve), curve.totalTravelMm, strokeMm).curve;
  const slow = timed(5, () =>
    rows.map(({ loadN, gaugeKPa }) => sagForFill(chambers, byWheel, loadN, gaugeKPa, patmKPa)),
  );
  console.log(
    `  with leverage by wheel travel, integrated and inverted at each step: median ${us(slow.medianMs).toFixed(1)} µs`,
  );
  return { rows, solved, medianUs: us(medianMs) };
}

/** The same leverage told by wheel travel. */
const wheelTable = (curve) => ({
  by: 'wheel-travel',
  points: table.points.map(([s, ratio]) => [curve.wheelTravelAt(s), ratio]),
});

/** The same table by SciPy's PchipInterpolator and brentq, as a ratio; says so where there is no Python or no SciPy. */
export function benchScipy({ rows, solved, medianUs }) {
  const python = spawnSync('python3', [fileURLToPath(new URL('air_sag.py', import.meta.url))], {
    input: JSON.stringify({ points: table.points, strokeMm, patmKPa, chambers, rows }),
    encoding: 'utf8',
    timeout: 120_000,
  });
  if (python.error || python.status !== 0) {
    const why = python.error
      ? 'there is no python3 here'
      : (python.stderr.trim().split('\n').at(-1) ?? 'it failed');
    console.log(`air sag in SciPy: not compared (${why})`);
    return;
  }
  const { version, sagMm, usEach } = JSON.parse(python.stdout);
  const apart = solved.map((state, i) =>
    state.state === 'ok' && sagMm[i] !== null
      ? Math.abs(state.sagMm - sagMm[i])
      : state.state === 'ok' || sagMm[i] !== null
        ? Infinity
        : 0,
  );
  console.log(
    `air sag in SciPy ${version}: ${usEach.toFixed(1)} µs each, ${(usEach / medianUs).toFixed(0)} times as long; ` +
      `answers at most ${Math.max(...apart).toExponential(1)} mm apart`,
  );
}
