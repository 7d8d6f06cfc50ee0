import type { Curve } from '../../src/kinematics/curve.js';
import { makeCurve } from '../../src/kinematics/leverage-curve.js';

interface Link {
  from: number;
  wheel: number;
  curve: Curve;
}

/**
 * A leverage curve that is linear between its points, as the reference vectors have it: one two-point curve of the
 * engine per interval (two points make a straight line), laid end to end.
 */
export function linearCurve(x: readonly number[], ratios: readonly number[], strokeMm: number): Curve {
  const links: Link[] = [];
  let wheel = 0;
  for (let i = 1; i < x.length; i += 1) {
    const [x0 = NaN, x1 = NaN, y0 = NaN, y1 = NaN] = [x[i - 1], x[i], ratios[i - 1], ratios[i]];
    const points = [
      [0, y0],
      [x1 - x0, y1],
    ] as const;
    const made = makeCurve({ by: 'shock-travel', points }, null, x1 - x0);
    if (!made.ok) throw new Error(made.reason);
    links.push({ from: x0, wheel, curve: made.curve });
    wheel += made.curve.totalTravelMm;
  }
  const linkAt = (holds: (link: Link) => boolean): Link => {
    const found = links.findLast(holds) ?? links[0];
    if (!found) throw new Error('at least two points are needed');
    return found;
  };
  const at = (s: number): Link => linkAt(({ from }) => from <= s);
  const wheelTravelAt = (s: number): number => at(s).wheel + at(s).curve.wheelTravelAt(s - at(s).from);
  const totalTravelMm = wheelTravelAt(strokeMm);
  return {
    strokeMm,
    ratioAt: (s) => at(s).curve.ratioAt(s - at(s).from),
    slopeAt: (s) => at(s).curve.slopeAt(s - at(s).from),
    wheelTravelAt,
    shockTravelAt: (w) => {
      const link = linkAt((one) => one.wheel <= w);
      return link.from + link.curve.shockTravelAt(w - link.wheel);
    },
    totalTravelMm,
    meanRatio: totalTravelMm / strokeMm,
    progressionPercent: null,
    progressionToLowestPercent: null,
    constant: false,
    usableForAdvice: true,
  };
}
