import type { Advice } from './answers.js';
import { makeCurve } from './kinematics/leverage-curve.js';
import type { ReasonCode } from './messages/reason-codes.js';
import { computed, figure, type Trial } from './rules/context.js';
import { sizeOf } from './sizing/sizes.js';

/** Reasons for and against that never touch the verdict; the weight orders them. Thresholds: common practice. */
export function advise({ entry, shock }: Trial): Advice[] {
  const found: Advice[] = [];
  const size = sizeOf(entry.sizeKey ?? shock.sizeKey);
  const made = size ? makeCurve(entry.curve, entry.travelMm, size.strokeMm) : null;
  const progression = made?.ok && made.curve.usableForAdvice ? made.curve.progressionPercent : null;
  if (progression !== null && shock.spring.kind === 'coil') {
    found.push({
      code: progressionCode(progression),
      figures: [figure('computed.progression', progression, '%', computed)],
      weight: 3,
    });
  }
  if (shock.reservoir) found.push({ code: 'advice-heat', figures: [], weight: 1 });
  if (shock.serviceHours !== null && shock.serviceHours < 80) {
    found.push({
      code: 'advice-service-short',
      figures: [figure('shock.service', shock.serviceHours, 'h', shock.source)],
      weight: 2,
    });
  }
  found.push({ code: 'advice-service-yours', figures: [], weight: 0 });
  return found.sort((a, b) => b.weight - a.weight);
}

function progressionCode(percent: number): ReasonCode {
  if (percent >= 20) return 'advice-progression-suits-coil';
  if (percent >= 10) return 'advice-progression-either';
  return percent >= 0 ? 'advice-progression-linear' : 'advice-progression-regressive';
}
