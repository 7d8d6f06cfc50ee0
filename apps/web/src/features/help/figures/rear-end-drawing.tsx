import { DimensionLine } from '../../../components/drawing/dimension-line';
import { shockDimensions, standing } from '../../../components/drawing/dimensions';
import { DrawingFrame } from '../../../components/drawing/drawing-frame';
import { capsule, circle, line, outline } from '../../../components/drawing/primitives';
import { Shapes } from '../../../components/drawing/shape-view';
import { shockShapes } from '../../../components/drawing/shock-shapes';
import type { Shape } from '../../../components/drawing/shapes';
import { formatFigure } from '../../../lib/format-figure';
import { inlineAir } from './example-shocks';
import { rearEndPose, travelMm, wheelRadiusMm, type RearEndPose } from './rear-end';

/** How far beside the shock its dimension stands: clear of the valve. */
const high = -62;
const box = { x1: -612, y1: -330, x2: 372, y2: 180 };
const thin = { width: 'narrow', fill: 'none' } as const;

/** Seat tube, down tube and the place of the cranks: enough of a frame to know where one is. */
function frameShapes({ mount }: RearEndPose): Shape[] {
  return [
    capsule('seat-tube', [2, 46], [-84, -420], 34),
    capsule('down-tube', [26, 58], [mount.x + 236, mount.y - 196], 46),
    circle('bottom-bracket', 22, 66, 32),
    outline(
      'shock-mount',
      [
        [mount.x - 12, mount.y + 34],
        [mount.x - 12, mount.y - 12],
        [mount.x + 14, mount.y - 12],
        [mount.x + 30, mount.y + 4],
      ],
      8,
    ),
  ];
}

function swingarm({ axle, lever }: RearEndPose): Shape[] {
  return [
    outline(
      'swingarm',
      [
        [axle.x, axle.y - 15],
        [-30, -26],
        [lever.x - 17, lever.y - 4],
        [lever.x, lever.y - 16],
        [lever.x + 17, lever.y + 4],
        [28, 8],
        [6, 28],
        [-40, 18],
        [axle.x, axle.y + 15],
        [axle.x - 16, axle.y],
      ],
      14,
    ),
    circle('pivot', 0, 0, 15),
    circle('pivot', 0, 0, 6, thin),
  ];
}

function wheel({ axle }: RearEndPose): Shape[] {
  return [
    circle('tyre', axle.x, axle.y, wheelRadiusMm, { fill: 'none' }),
    circle('tyre', axle.x, axle.y, wheelRadiusMm - 58, thin),
    circle('hub', axle.x, axle.y, 27),
    circle('axle', axle.x, axle.y, 7),
  ];
}

/** How wheel and shock move together, for one moment. @param wheelMm how far the wheel has come up */
export function RearEndDrawing({ wheelMm }: { wheelMm: number }) {
  const start = rearEndPose(0);
  const pose = rearEndPose(wheelMm);
  const { axle, lever, mount, strokeMm } = pose;
  const turn = (Math.atan2(mount.y - lever.y, mount.x - lever.x) * 180) / Math.PI;
  const rail = -512;
  const travel = {
    ...standing('travel', rail, start.axle.y - travelMm, start.axle.y, formatFigure(travelMm)),
    extensions: [start.axle.y - travelMm, start.axle.y].map((y) => ({
      x1: rail - 6,
      y1: y,
      x2: -330,
      y2: y,
    })),
    textX: rail - 8,
    anchor: 'end' as const,
  };
  return (
    <DrawingFrame
      box={box}
      title="The rear of a bike: wheel, swingarm and shock"
      description={`The wheel has come up ${formatFigure(wheelMm)} of ${formatFigure(travelMm)} mm; the shock has shortened by ${formatFigure(strokeMm, 1)} mm, from 210 to ${formatFigure(pose.shockMm, 1)} mm.`}
    >
      <Shapes shapes={[...wheel(pose), ...frameShapes(pose), ...swingarm(pose)]} />
      <Shapes
        shapes={[
          line('at-rest', start.axle.x - 40, start.axle.y, start.axle.x + 40, start.axle.y, {
            line: 'chain',
          }),
        ]}
      />
      <g transform={`translate(${lever.x} ${lever.y}) rotate(${turn})`}>
        <Shapes shapes={shockShapes({ ...inlineAir, usedStrokeMm: 55 }, strokeMm)} />
        {shockDimensions(inlineAir, ['eye-to-eye'], strokeMm).map((dimension) => (
          <DimensionLine
            key={dimension.key}
            asked
            dimension={{
              ...dimension,
              y1: high,
              y2: high,
              textY: high - 6,
              extensions: [0, dimension.x2].map((x) => ({ x1: x, x2: x, y1: -16, y2: high - 5 })),
            }}
          />
        ))}
      </g>
      <DimensionLine dimension={travel} />
      <Shapes shapes={[circle('axle', axle.x, axle.y, 7)]} />
    </DrawingFrame>
  );
}
