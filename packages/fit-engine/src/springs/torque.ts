/** Stress areas of coarse threads, mm2 (ISO 898-1). */
const stressAreaMm2: Readonly<Record<string, number>> = { M6: 20.1, M8: 36.6, M10: 58.0 };

/**
 * Bounds against slips of the pen for a typed torque, N m: class 8.8 at 0.75 x proof stress 580 MPa, T = 0.2 F d;
 * warn above that or below a twentieth. Null for a thread we have no figure for: then nothing is said.
 * @param thread as the sheet prints it, "M8"; never the hardware's bolt diameter
 */
export function torqueSlipRange(thread: string | null): { lowNm: number; highNm: number } | null {
  if (thread === null || !Object.hasOwn(stressAreaMm2, thread)) return null;
  const area = stressAreaMm2[thread] ?? NaN;
  const highNm = (0.2 * 0.75 * 580 * area * Number(thread.slice(1))) / 1000;
  return { lowNm: 0.05 * highNm, highNm };
}
