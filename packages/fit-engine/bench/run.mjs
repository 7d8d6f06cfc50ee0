// What the engine costs, on one core of this machine. `npm run bench` starts it first; alone, with built packages:
// node packages/fit-engine/bench/run.mjs. Where the time goes: node --cpu-prof packages/fit-engine/bench/run.mjs
import { cpus, loadavg } from 'node:os';

import { isJudged, judge, judgeAll, screenAll } from '../dist/index.js';
import { sweep } from '../dist/clearance/sweep.js';
import { airSagTable, benchScipy } from './air-sag.mjs';
import { bike } from './bike.mjs';
import { drawCatalogue } from './catalogue.mjs';
import { allocatedBy, report, timed } from './timing.mjs';

const seed = 20261201;
const shocks = drawCatalogue(5000, seed);

function benchCatalogue() {
  const screened = screenAll(bike, shocks);
  const of = (keep) => shocks.filter((shock, i) => keep(screened[i], shock));
  const refused = of((one) => !isJudged(one));
  const inline = of((one, { reservoir }) => isJudged(one) && !reservoir);
  const cans = of((one, { reservoir }) => isJudged(one) && reservoir);
  console.log(
    `catalogue: ${shocks.length} different sizes (seed ${seed}), one bike with two entries and drawings; ` +
      `${refused.length} refused by cheap checks, ${inline.length} inline and ${cans.length} with a reservoir judged in full`,
  );
  const whole = timed(60, () => screenAll(bike, shocks));
  report('the whole catalogue, sweeps included', whole, 'ms');
  report(
    '  refused ones alone',
    timed(60, () => screenAll(bike, refused)),
    'ms',
  );
  report(
    '  inline ones that may fit',
    timed(60, () => screenAll(bike, inline)),
    'ms',
  );
  report(
    '  reservoirs that may fit, swept in both positions',
    timed(60, () => screenAll(bike, cans)),
    'ms',
  );
  report(
    '  the bike alone',
    timed(60, () => screenAll(bike, [])),
    'ms',
  );
  report(
    'every size with all its figures (judgeAll)',
    timed(15, () => judgeAll(bike, shocks)),
    'ms',
  );
  const kB = (bytes) => (bytes / 1024).toFixed(0);
  console.log(`  allocated: ${kB(allocatedBy(() => screenAll(bike, shocks)))} kB for the whole catalogue`);

  // Sixteen checks, or fifteen without the reservoir, in each entry both ways round.
  const answers = shocks.length * 15 * bike.frame.entries.length * 2;
  console.log(
    `  ${perSecond(answers, whole.medianMs)} checks per second and core, gone through by their codes`,
  );
  const some = shocks.filter((_, i) => i % 25 === 0);
  const full = timed(30, () => some.forEach((shock) => judge({ ...bike, shock }, { full: true })));
  const told = some.length * 16 * bike.frame.entries.length * 2;
  console.log(
    `  ${perSecond(told, full.medianMs)} checks per second and core, one shock at a time with all figures`,
  );
}

const perSecond = (count, ms) => Math.round((1000 * count) / ms).toLocaleString('en-GB');

function benchSweep() {
  const shock = shocks.find(({ sizeKey, reservoir }) => sizeKey === '210x55' && reservoir);
  const [{ polygon }] = shock.reservoir.outlines;
  const swept = { body: polygon, eyeToEyeMm: 210, strokeMm: 55, wayRound: 'body-to-frame' };
  const many = timed(40, () => {
    for (let i = 0; i < 50; i += 1) sweep(bike.frame.room, swept);
  });
  report(
    'one clearance sweep: nine corners, four parts, 55 mm of stroke',
    { medianMs: many.medianMs * 20, leastMs: many.leastMs * 20, cpuMs: many.cpuMs * 20 },
    'µs',
  );
}

console.log(
  `engine on ${cpus()[0]?.model ?? 'an unknown processor'}, Node ${process.version}, ` +
    `load ${loadavg()[0]?.toFixed(1)} on ${cpus().length} cores`,
);
benchCatalogue();
benchSweep();
benchScipy(airSagTable());
