import type { Reading, Tool } from '../facts.js';

/** Standard uncertainty by tool, mm (common practice); print: half a millimetre of rounding in the label. */
const byTool: Record<Tool, number> = { print: 0.5, caliper: 0.25, ruler: 0.7, tape: 1.2 };

/** One standard uncertainty of a reading, mm; 0.5 more in quadrature in the frame or across turned eyes. */
export const readingUncertaintyMm = ({ tool, awkward }: Reading): number =>
  awkward ? Math.hypot(byTool[tool], 0.5) : byTool[tool];
