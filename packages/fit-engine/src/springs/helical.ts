/** Rate of a round-wire compression spring, N/mm (EN 13906-1; Shigley): G d^4 / (8 D^3 n). Lengths mm, G N/mm2. */
export const helicalRateNPerMm = (
  wireMm: number,
  meanDiameterMm: number,
  activeCoils: number,
  shearModulus: number,
): number => (shearModulus * wireMm ** 4) / (8 * meanDiameterMm ** 3 * activeCoils);

/** Corrected shear stress, N/mm2, with (C + 0.5) / (C - 0.75). */
export function helicalStressNPerMm2(wireMm: number, meanDiameterMm: number, forceN: number): number {
  const c = meanDiameterMm / wireMm;
  return (((c + 0.5) / (c - 0.75)) * 8 * forceN * meanDiameterMm) / (Math.PI * wireMm ** 3);
}
