/** How the ends of a wound spring are made: closed on themselves (squared) or not, ground flat or not. */
export type SpringEnds = 'squared-ground' | 'squared' | 'plain' | 'plain-ground';

/** Turns that lie on something and do not give, and wire diameters that the ends add to the solid length (Shigley). */
const deadTurns: Record<SpringEnds, number> = {
  'squared-ground': 2,
  squared: 2,
  plain: 0,
  'plain-ground': 1,
};
const addedWires: Record<SpringEnds, number> = {
  'squared-ground': 0,
  squared: 1,
  plain: 1,
  'plain-ground': 0,
};

const positive = (...values: number[]): boolean =>
  values.every((value) => value > 0 && Number.isFinite(value));

/** Turns that give, of all turns. */
export const activeCoils = (totalCoils: number, ends: SpringEnds): number => totalCoils - deadTurns[ends];

/**
 * Rate of a round-wire compression spring, N/mm: G d^4 / (8 D^3 n) (EN 13906-1; Shigley). Lengths in mm, G in N/mm2.
 * NaN for dimensions that no spring has.
 */
export const helicalRateNPerMm = (
  wireMm: number,
  meanDiameterMm: number,
  activeCoilCount: number,
  shearModulus: number,
): number =>
  positive(wireMm, meanDiameterMm, activeCoilCount, shearModulus) && meanDiameterMm > wireMm
    ? (shearModulus * wireMm ** 4) / (8 * meanDiameterMm ** 3 * activeCoilCount)
    : NaN;

/** Correction for the wire's curve, (C + 0.5) / (C - 0.75) with C = D/d (EN 13906-1). */
export function curvatureFactor(wireMm: number, meanDiameterMm: number): number {
  const c = meanDiameterMm / wireMm;
  return c > 1 && Number.isFinite(c) ? (c + 0.5) / (c - 0.75) : NaN;
}

/** Corrected shear stress in the wire, N/mm2. */
export const helicalStressNPerMm2 = (wireMm: number, meanDiameterMm: number, forceN: number): number =>
  (curvatureFactor(wireMm, meanDiameterMm) * 8 * forceN * meanDiameterMm) / (Math.PI * wireMm ** 3);

/** Length with all turns touching, mm. */
export const solidLengthMm = (wireMm: number, totalCoils: number, ends: SpringEnds): number =>
  positive(wireMm, totalCoils) ? (totalCoils + addedWires[ends]) * wireMm : NaN;

/** Mass, kg, of the wire taken as turns without pitch. @param densityKgPerMm3 about 7.85e-6 for steel */
export const springMassKg = (
  wireMm: number,
  meanDiameterMm: number,
  totalCoils: number,
  densityKgPerMm3: number,
): number =>
  positive(wireMm, meanDiameterMm, totalCoils, densityKgPerMm3)
    ? densityKgPerMm3 * (Math.PI / 4) * wireMm ** 2 * Math.PI * meanDiameterMm * totalCoils
    : NaN;
