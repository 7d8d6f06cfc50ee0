import { DimensionLine } from '../../../components/drawing/dimension-line';
import { laneMm, lying } from '../../../components/drawing/dimensions';
import { DrawingFrame } from '../../../components/drawing/drawing-frame';
import { layoutShock } from '../../../components/drawing/layout';
import { Shapes } from '../../../components/drawing/shape-view';
import { sheetFor } from '../../../components/drawing/sheet';
import { centreLines, shockShapes } from '../../../components/drawing/shock-shapes';
import { inlineAir } from './example-shocks';

/** Two ways round a caliper's limits: the same edge of both holes, and outside to outside less two half eyes. */
export function SameEdgeDrawing() {
  const { bodyEyeR, shaftEyeR } = layoutShock(inlineAir);
  const end = inlineAir.eyeToEyeMm;
  const bore = 7.5;
  const low = bodyEyeR + 20 + laneMm;
  const edge = lying('same-edge', -bore, end - bore, low, [0, 0], '210');
  const outside = lying('outside', -bodyEyeR, end + shaftEyeR, low + 30, [0, 0], '236 − 13 − 13');
  const sheet = sheetFor(inlineAir);
  return (
    <DrawingFrame
      box={{ ...sheet, x1: sheet.x1 - 6, x2: sheet.x2 + 6, y2: low + 40 }}
      title="Measuring without finding the centres"
      description="From the left edge of one hole to the left edge of the other it is 210 mm, the same as between the centres. Outside to outside it is 236 mm, less half of each eye, 13 mm twice, again 210 mm."
    >
      <Shapes shapes={shockShapes(inlineAir)} />
      <Shapes shapes={centreLines(inlineAir)} />
      <DimensionLine dimension={edge} asked />
      <DimensionLine dimension={outside} />
    </DrawingFrame>
  );
}
