import { setFlagsFromString } from 'node:v8';
import { runInNewContext } from 'node:vm';

const cpuMs = () => {
  const { user, system } = process.cpuUsage();
  return (user + system) / 1000;
};
const median = (list) => [...list].sort((a, b) => a - b)[Math.floor(list.length / 2)];

/** Runs something often: the least and the median time by the clock, and the median of the processor's time, ms. */
export function timed(runs, work) {
  // As many runs again beforehand, so that the code is compiled.
  for (let i = 0; i < runs; i += 1) work();
  const [clock, cpu] = [[], []];
  for (let i = 0; i < runs; i += 1) {
    const [start, used] = [performance.now(), cpuMs()];
    work();
    clock.push(performance.now() - start);
    cpu.push(cpuMs() - used);
  }
  return { medianMs: median(clock), leastMs: Math.min(...clock), cpuMs: median(cpu) };
}

export function report(name, { medianMs, leastMs, cpuMs: cpu }, unit) {
  const shown = (value) => value.toFixed(2);
  console.log(
    `${name}: median ${shown(medianMs)} ${unit}, least ${shown(leastMs)} ${unit}, processor ${shown(cpu)} ${unit}`,
  );
}

/** Bytes that one run leaves behind on a heap that was just cleared; the median of some, since a collection may come between. */
export function allocatedBy(work) {
  setFlagsFromString('--expose-gc');
  const collect = runInNewContext('gc');
  const left = Array.from({ length: 9 }, () => {
    collect();
    const before = process.memoryUsage().heapUsed;
    work();
    return process.memoryUsage().heapUsed - before;
  });
  return median(left);
}
