/** An air spring of usual proportions for a 55 mm stroke: areas mm2, volumes mm3, pressures kPa. */
const air = { areaMm2: 1450, volumeMm3: 112_000, negativeAreaMm2: 1250, negativeVolumeMm3: 19_500 };
const outsideKPa = 101.325;
const fillKPa = 1500;
export const strokeMm = 55;
export const sagMm = 16.5;

/**
 * Slow force of a two-chamber air spring, N: p V constant in each chamber, filled to the same pressure at full
 * extension, F = A (pp - patm) - An (pn - patm).
 */
export function airForceN(shockMm: number): number {
  const positive = fillKPa / (1 - (air.areaMm2 * shockMm) / air.volumeMm3);
  const negative = fillKPa / (1 + (air.negativeAreaMm2 * shockMm) / air.negativeVolumeMm3);
  return (air.areaMm2 * (positive - outsideKPa) - air.negativeAreaMm2 * (negative - outsideKPa)) / 1000;
}

/** The coil that carries the same load at the same sag, one turn of 1 mm preload: N. */
const preloadMm = 1;
const rateNPerMm = airForceN(sagMm) / (sagMm + preloadMm);
export const coilForceN = (shockMm: number): number => rateNPerMm * (shockMm + preloadMm);

/** Points of a curve, a millimetre apart, both ends included. */
export const samples = (force: (shockMm: number) => number): [number, number][] =>
  Array.from({ length: strokeMm + 1 }, (_, mm) => [mm, force(mm)]);
