import type { CoilOnSale } from '../facts.js';
import type { Curve } from '../kinematics/curve.js';
import { rateForSag, sagForRate } from './coil.js';
import type { SagState } from './equilibrium.js';
import type { SagWindow } from './load.js';

export interface CoilTried {
  coil: CoilOnSale;
  state: SagState;
  sagPercent: number | null;
}
export interface CoilChoice {
  wantedNPerMm: number | null;
  /** One spring of each of the two nearest rates, the nearest first. */
  nearest: CoilTried[];
  /** The spring whose sag is nearest to the middle of the window, or null where none is inside it. */
  best: CoilTried | null;
}

/**
 * Springs on sale for a load: the rate for the middle of the window, the two nearest rates and the sag each gives.
 * Springs of one rate count once (the first by id); every rate is tried for the window, so that uneven steps of
 * rate never hide one that lies inside.
 */
export function chooseCoil(
  coils: readonly CoilOnSale[],
  curve: Curve,
  loadN: number,
  window: SagWindow,
  preloadMm: number,
): CoilChoice {
  const target = (window.midPercent / 100) * curve.strokeMm;
  const wantedNPerMm = rateForSag(curve, loadN, target, preloadMm);
  if (wantedNPerMm === null) return { wantedNPerMm, nearest: [], best: null };
  const byRate = new Map<number, CoilOnSale>();
  for (const coil of [...coils].sort((a, b) => (a.id < b.id ? -1 : 1))) {
    if (!byRate.has(coil.rateNPerMm)) byRate.set(coil.rateNPerMm, coil);
  }
  const off = (coil: CoilOnSale): number => Math.abs(coil.rateNPerMm - wantedNPerMm);
  const tried = [...byRate.values()]
    .sort((a, b) => off(a) - off(b) || a.rateNPerMm - b.rateNPerMm)
    .map((coil): CoilTried => {
      const state = sagForRate(curve, loadN, coil.rateNPerMm, preloadMm);
      return { coil, state, sagPercent: state.state === 'ok' ? (100 * state.sagMm) / curve.strokeMm : null };
    });
  const fromMid = ({ sagPercent }: CoilTried): number => Math.abs((sagPercent ?? NaN) - window.midPercent);
  const [best = null] = tried
    .filter(({ sagPercent }) => sagPercent !== null && insideWindow(sagPercent, window))
    .sort((a, b) => fromMid(a) - fromMid(b));
  return { wantedNPerMm, nearest: tried.slice(0, 2), best };
}

const insideWindow = (percent: number, { lowPercent, highPercent }: SagWindow): boolean =>
  percent >= lowPercent - 1e-9 && percent <= highPercent + 1e-9;
