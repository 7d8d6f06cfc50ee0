/** Exact by definition (NIST SP 811): everything else is derived from these four. */
export const mmPerIn = 25.4;
export const kgPerLb = 0.45359237;
/** Standard acceleration of gravity, m/s2. */
export const g0 = 9.80665;
export const kPaPerBar = 100;

export const kgPerStone = 14 * kgPerLb;
/** Pound-force per square inch in kPa: lb x g0 / in2. */
export const kPaPerPsi = (kgPerLb * g0 * 1000) / (mmPerIn * mmPerIn);
/** A spring rate of 1 lb/in in N/mm. */
export const nPerMmPerLbPerIn = (kgPerLb * g0) / mmPerIn;
