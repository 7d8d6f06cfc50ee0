import type { Tool } from '@linkfell/fit-engine';

/** One standard uncertainty of a length read off a frame, mm (common practice); printed figures count as exact. */
export function frameReadingUncertainty(tool: Tool): number {
  const across = { print: 0, caliper: 0.25, ruler: 0.7, tape: 1.2 }[tool];
  // In the frame there is no straight line of sight to both edges: 0.5 mm more, in quadrature.
  return tool === 'print' ? 0 : Math.hypot(across, 0.5);
}
