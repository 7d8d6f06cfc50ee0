import type { RiderSide } from '../measure-ups/facts-from-answers.js';

const byStyle = {
  'cross-country': '20–25 %',
  trail: '25–30 %',
  enduro: '28–33 %',
  downhill: '30–35 %',
} as const;

/** The sag window for the sentence above the fitting sheet; a printed target wins over the style's. */
export function sagText({ frame, rider }: RiderSide): string | null {
  const printed = frame.sagTargetPercent?.value;
  if (printed !== undefined) return `${printed - 2}–${printed + 2} %`;
  return rider.style && byStyle[rider.style];
}
