import type { ClearanceView } from '@linkfell/contracts';
import type { CSSProperties } from 'react';
import { DrawingFrame } from '../../components/drawing/drawing-frame';
import { circle, line, outline } from '../../components/drawing/primitives';
import { Shapes } from '../../components/drawing/shape-view';
import { boxAround, type Box, type Shape } from '../../components/drawing/shapes';
import { middleOf, seenIn } from './visible';
import { formatFigure } from '../../lib/format-figure';

export type SweptPosition = ClearanceView['positions'][number];
type Point = readonly [number, number];
type Instant = SweptPosition['instants'][number];

/** The frame's plane has y upwards, the screen downwards. */
const flip = ([x, y]: Point): Point => [x, -y];
const aroundMm = 74;
const edgeMm = 10;
const eyeMm = 8;
const unscaled: CSSProperties = { transform: 'scale(var(--drawing-px, 0.8))' };
const halo = {
  stroke: 'var(--lf-colors-paper)',
  strokeWidth: 4,
  strokeLinejoin: 'round',
  paintOrder: 'stroke',
} as const;

const ghost = { width: 'narrow', line: 'phantom', fill: 'none' } as const;
const bodyOf = ({ body }: Instant, style = {}): Shape => outline('body', body.map(flip), 2, style);
const partsOf = ({ moving }: Instant, style = {}): Shape[] =>
  moving.map(({ name, polygon }) => outline(name, polygon.map(flip), 2, style));

function linkEyeOf({ linkEye }: Instant, style = {}): Shape {
  const [x, y] = flip(linkEye);
  return circle('link-eye', x, y, eyeMm, style);
}

/** Eyes and axis of the shock at one travel. */
function axisOf(instant: Instant): Shape[] {
  const [a, b] = [flip(instant.frameEye), flip(instant.linkEye)];
  return [
    line('axis', a[0], a[1], b[0], b[1], { line: 'chain' }),
    circle('frame-eye', a[0], a[1], eyeMm),
    linkEyeOf(instant),
  ];
}

/** What is shown: the shock in all its places with as much of the frame as lies about it. */
function boxOf({ instants }: SweptPosition, fixed: ClearanceView['fixed']): Box {
  const shock = boxAround(
    instants.flatMap((one) => [...[bodyOf(one), ...axisOf(one), ...partsOf(one)].map(({ box }) => box)]),
  );
  const all = boxAround([shock, ...fixed.map(({ polygon }) => outline('', polygon.map(flip)).box)]);
  return {
    x1: Math.max(shock.x1 - aroundMm, all.x1 - edgeMm),
    y1: Math.max(shock.y1 - aroundMm, all.y1 - edgeMm),
    x2: Math.min(shock.x2 + aroundMm, all.x2 + edgeMm),
    y2: Math.min(shock.y2 + aroundMm, all.y2 + edgeMm),
  };
}

/** Where the name of a part stands: in the middle of what is seen of it, a moving part's above it. */
function labelAt(polygon: readonly Point[], box: Box, moving: boolean): Point | null {
  const inner = { x1: box.x1 + 8, y1: box.y1 + 4, x2: box.x2 - 8, y2: box.y2 - 4 };
  const seen = seenIn(polygon.map(flip), inner);
  if (seen.length === 0) return null;
  const [x, y] = middleOf(seen);
  return moving ? [x, Math.min(...seen.map(([, top]) => top)) - 5] : [x, y + 3];
}

/** In words what the drawing shows. */
export const tellSweep = (view: ClearanceView, { distanceMm, atShockMm, part, deg }: SweptPosition): string =>
  `Turned to ${deg} degrees, the reservoir comes nearest to the ${part} when the shock is ${formatFigure(atShockMm, 1)} mm into its ${formatFigure(view.strokeMm, 1)} mm stroke. ${
    distanceMm > 0 ? `${formatFigure(distanceMm, 1)} mm stay free.` : 'There they touch.'
  }`;

export interface SweepDrawingProps {
  view: ClearanceView;
  position: SweptPosition;
}

/** The shock at several points of its stroke among the frame's outlines, the tightest point with its figure. */
export function SweepDrawing({ view, position }: SweepDrawingProps) {
  const { instants, atShockMm, tight, distanceMm } = position;
  const box = boxOf(position, view.fixed);
  const tightest = instants.find(({ shockMm }) => shockMm === atShockMm) ?? instants[0];
  const others = instants.filter((one) => one !== tightest);
  const named = [
    ...view.fixed.map((part) => ({ ...part, moving: false })),
    ...(tightest?.moving ?? []).map((part) => ({ ...part, moving: true })),
  ];
  return (
    <DrawingFrame
      box={box}
      title={`The ${view.shockName} through its stroke in the ${view.frameName}`}
      description={tellSweep(view, position)}
    >
      <Shapes
        shapes={view.fixed.map(({ name, polygon }) => outline(name, polygon.map(flip), 2, { fill: 'shade' }))}
      />
      <Shapes
        shapes={view.fixed.map(({ name, polygon }) => outline(name, polygon.map(flip), 2, { fill: 'none' }))}
      />
      <Shapes
        shapes={others.flatMap((one) => [...partsOf(one, ghost), bodyOf(one, ghost), linkEyeOf(one, ghost)])}
      />
      {tightest ? (
        <>
          <Shapes shapes={partsOf(tightest)} />
          <Shapes shapes={[bodyOf(tightest)]} colour="var(--lf-colors-tarn)" fillOpacity={0.82} />
          <Shapes shapes={axisOf(tightest)} />
        </>
      ) : null}
      {named.map(({ name, polygon, moving }) => {
        const at = labelAt(polygon, box, moving);
        if (!at) return null;
        const [x, y] = at;
        return (
          <g key={name} transform={`translate(${x} ${y})`}>
            <text
              textAnchor="middle"
              fill="var(--lf-colors-slate)"
              style={{ ...unscaled, fontSize: '13px', fontWeight: 600 }}
              {...halo}
            >
              {name}
            </text>
          </g>
        );
      })}
      {tight ? <Tight from={flip(tight.shock)} to={flip(tight.part)} mm={distanceMm} /> : null}
    </DrawingFrame>
  );
}

/** The gap with a dot at either end, ringed where it is too small to be seen, its figure beside it. */
function Tight({ from, to, mm }: { from: Point; to: Point; mm: number }) {
  const colour = 'var(--lf-colors-bracken)';
  const middle: Point = [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2];
  const gap = Math.hypot(to[0] - from[0], to[1] - from[1]);
  const radius = gap < 14 ? gap / 2 + 5 : 0;
  // The figure goes to the side that runs along the gap's own right angle, upright and clear of ring or line.
  const along: Point = gap === 0 ? [0, 1] : [(to[0] - from[0]) / gap, (to[1] - from[1]) / gap];
  const side = along[1] >= 0 ? 1 : -1;
  const off = radius + 4;
  const text: Point = [middle[0] + side * along[1] * off, middle[1] - side * along[0] * off];
  return (
    <g data-tight={mm} stroke={colour} fill="none">
      <path
        d={`M${from[0]} ${from[1]}L${to[0]} ${to[1]}`}
        strokeWidth={2}
        vectorEffect="non-scaling-stroke"
      />
      {[from, to].map(([x, y], index) => (
        <circle key={index} cx={x} cy={y} r={1.6} fill={colour} stroke="none" />
      ))}
      {radius > 0 ? (
        <circle cx={middle[0]} cy={middle[1]} r={radius} strokeWidth={2} vectorEffect="non-scaling-stroke" />
      ) : null}
      <g transform={`translate(${text[0]} ${text[1]})`}>
        <text
          textAnchor={Math.abs(along[1]) < 0.4 ? 'middle' : 'start'}
          dominantBaseline={Math.abs(along[1]) < 0.4 ? 'auto' : 'central'}
          fill={colour}
          style={{ ...unscaled, fontSize: '17px', fontWeight: 800, fontVariantNumeric: 'tabular-nums' }}
          {...halo}
        >
          {mm > 0 ? `${formatFigure(mm, 1)} mm` : 'touches'}
        </text>
      </g>
    </g>
  );
}
