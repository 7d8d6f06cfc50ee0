import type { FitQuestion, SheetEntry } from '../../src/facts.js';
import type { Kind } from './kinds.js';

const g = 9.80665;

interface Given {
  stroke: number;
  /** Wheel load, N; sag window, %. */
  load: number;
  low: number;
  high: number;
  ratio(s: number): number;
}

/** What both springs need, or null where something is not known. Tables of the tests are straight lines. */
function given({ rider, frame }: FitQuestion, entry: SheetEntry, stroke: number): Given | null {
  const { riderKg, kitKg, bikeKg, style } = rider;
  const windows = { 'cross-country': [20, 25], trail: [25, 30], enduro: [28, 33], downhill: [30, 35] };
  const printed = frame.sagTargetPercent?.value;
  const [low, high] = printed ? [printed - 2, printed + 2] : style ? (windows[style] ?? []) : [];
  const points = entry.curve?.points;
  const [first, last] = [points?.[0]?.[1], points?.at(-1)?.[1]];
  const reaches = points && Math.abs((points.at(-1)?.[0] ?? 0) - stroke) <= 0.5;
  const { travelMm } = entry;
  let ratio: ((s: number) => number) | null = null;
  if (reaches && first && last) {
    const mean = (first + last) / 2;
    const ends = points.at(-1)?.[0] ?? stroke;
    const sound = travelMm === null || Math.abs(mean * ends - travelMm) <= 0.03 * travelMm;
    if (sound) ratio = (s) => first + ((last - first) * s) / ends;
  }
  if (!ratio && travelMm) ratio = () => travelMm / stroke;
  if (riderKg === null || kitKg === null || bikeKg === null || low === undefined || high === undefined)
    return null;
  return ratio && { stroke, load: g * 0.6 * (riderKg + kitKg + 0.6 * bikeKg), low, high, ratio };
}

/** Sag in percent with a coil, by walking down the stroke, coarsely and then finely; null outside the stroke. */
function coilSag(rate: number, preload: number, { stroke, load, ratio }: Given): number | null {
  const surplus = (s: number): number => rate * (s + preload) - load * ratio(s);
  if (surplus(0) >= 0 || surplus(stroke) < 0) return null;
  let s = 0;
  while (surplus(s + 0.5) < 0) s += 0.5;
  while (surplus(s) < 0) s += 0.005;
  return (100 * s) / stroke;
}

export function coilKind(q: FitQuestion, entry: SheetEntry, stroke: number): Kind | 'close' {
  const { spring } = q.shock;
  if (spring.kind !== 'coil') return 'pass';
  const known = given(q, entry, stroke);
  if (!known) return 'unknown';
  const preload = spring.collarPitchMm ?? 1;
  const goes = q.sale.coils.filter(
    (coil) =>
      coil.insideMm === spring.springInsideMm &&
      coil.freeLengthMm <= spring.maxFreeLengthMm &&
      coil.travelMm >= known.stroke + preload,
  );
  if (goes.length === 0) return 'unknown';
  const sags = goes.map((coil) => coilSag(coil.rateNPerMm, preload, known));
  const edge = (sag: number | null): boolean =>
    sag !== null && Math.min(Math.abs(sag - known.low), Math.abs(sag - known.high)) < 0.05;
  if (sags.some((sag) => sag !== null && !edge(sag) && sag > known.low && sag < known.high)) return 'work';
  return sags.some(edge) ? 'close' : 'fail';
}

export function airKind(q: FitQuestion, entry: SheetEntry, stroke: number): Kind | 'close' {
  const { spring, diameterMm } = q.shock;
  if (spring.kind !== 'air') return 'pass';
  const known = given(q, entry, stroke);
  const { minGaugeKPa: min, maxGaugeKPa: max } = spring;
  if (!known || min === null || max === null) return 'unknown';
  const height = q.rider.fillingHeightM;
  const patm = 101.325 * (1 - (0.0065 * height) / 288.15) ** 5.25588;
  const { load, low, high, ratio } = known;
  if (!spring.chambers) {
    const f = high / 100;
    const area = (Math.PI / 4) * (diameterMm - 4) ** 2;
    const least = ((load * ratio(f * known.stroke) * 1000) / area + patm) * (1 - 0.75 * f) - patm;
    if (Math.abs(least - max) < 0.05) return 'close';
    return least > max ? 'fail' : 'pass';
  }
  const c = spring.chambers.value;
  const s = ((low + high) / 200) * known.stroke;
  // Force at the sag for a fill of 0 and of 1000 kPa absolute; it is linear in the fill.
  const force = (p0: number): number =>
    (c.areaMm2 * ((p0 * c.volumeMm3) / (c.volumeMm3 - c.areaMm2 * s) - patm) -
      c.negativeAreaMm2 *
        ((p0 * c.negativeVolumeMm3) / (c.negativeVolumeMm3 + c.negativeAreaMm2 * s) - patm)) /
    1000;
  const fill = (1000 * (load * ratio(s) - force(0))) / (force(1000) - force(0)) - patm;
  if (Math.min(Math.abs(fill - min), Math.abs(fill - max)) < 0.05) return 'close';
  return fill > max || fill < min ? 'fail' : 'pass';
}
