/** Free on each side across the tunnel, mm (common practice). */
const sideMm = 2;

/** Whether a can or coil has its room across; exactly 2 mm each side passes, whatever binary fractions say. */
export const lateralOk = (diameterMm: number, tunnelMm: number, marginMm = sideMm): boolean =>
  Number.isFinite(tunnelMm) &&
  Number.isFinite(diameterMm) &&
  Math.round((tunnelMm - diameterMm - 2 * marginMm) * 1000) >= 0;
