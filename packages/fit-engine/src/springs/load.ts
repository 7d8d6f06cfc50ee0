import type { RidingStyle } from '../facts.js';
import { g0 } from '../units/factors.js';

export interface LoadShares {
  /** Part of the weight on the rear wheel; 0.60, between 0.50 and 0.70 (common practice). */
  rearShare: number;
  /** Part of the bike's mass that the suspension carries; 0.6, between 0.5 and 0.75 (common practice). */
  sprungShare: number;
}
export const usualShares: LoadShares = { rearShare: 0.6, sprungShare: 0.6 };

/** Static vertical load on the rear wheel, N. A share that is not given is the usual one. */
export function wheelLoadN(
  riderKg: number,
  kitKg: number,
  bikeKg: number,
  shares: Partial<LoadShares> = {},
): number {
  const { rearShare, sprungShare } = { ...usualShares, ...shares };
  return g0 * (riderKg + kitKg + sprungShare * bikeKg) * rearShare;
}

export interface SagWindow {
  lowPercent: number;
  highPercent: number;
  midPercent: number;
  /** From the frame's sheet, not from the style. */
  printed: boolean;
}

/** Sag at the shock by style (common practice). */
const windows: Record<RidingStyle, readonly [number, number]> = {
  'cross-country': [20, 25],
  trail: [25, 30],
  enduro: [28, 33],
  downhill: [30, 35],
};

/**
 * The sag to aim for, % of stroke at the shock; a printed target wins and means +/- 2 points. A target that no
 * suspension has (outside 5 to 60 %) is a slip and counts as not printed. Null where the style is not known.
 */
export function sagWindow(style: RidingStyle | null, printedPercent: number | null): SagWindow | null {
  if (printedPercent !== null && printedPercent >= 5 && printedPercent <= 60) {
    return {
      lowPercent: printedPercent - 2,
      highPercent: printedPercent + 2,
      midPercent: printedPercent,
      printed: true,
    };
  }
  if (!style) return null;
  const [lowPercent, highPercent] = windows[style];
  return { lowPercent, highPercent, midPercent: (lowPercent + highPercent) / 2, printed: false };
}
