import type { Advice } from './answers.js';
import { makeCurve } from './kinematics/leverage-curve.js';
import type { ReasonCode } from './messages/reason-codes.js';
import { computed, figure, type Trial } from './rules/context.js';
import { sizeOf } from './sizing/sizes.js';

/** Reasons for and against that never touch the verdict; the weight orders them. Thresholds: common practice. */
export function advise(trial: Trial): Advice[] {
  const { shock } = trial;
  const found: Advice[] = [];
  const progression = progressionOf(trial);
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

/** Progression of the entry's own curve with the entry's own stroke; null where there is no curve to trust. */
function progressionOf({ entry, shock, shared }: Trial): number | null {
  const before = shared.progressions.get(entry);
  if (before !== undefined) return before;
  const size = sizeOf(entry.sizeKey ?? shock.sizeKey);
  const made = size ? makeCurve(entry.curve, entry.travelMm, size.strokeMm) : null;
  const found = made?.ok && made.curve.usableForAdvice ? made.curve.progressionPercent : null;
  if (entry.sizeKey !== null) shared.progressions.set(entry, found);
  return found;
}

function progressionCode(percent: number): ReasonCode {
  if (percent >= 20) return 'advice-progression-suits-coil';
  if (percent >= 10) return 'advice-progression-either';
  return percent >= 0 ? 'advice-progression-linear' : 'advice-progression-regressive';
}
