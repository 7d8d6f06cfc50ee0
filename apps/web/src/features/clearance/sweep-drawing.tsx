import type { ClearanceView } from '@linkfell/contracts';
import type { CSSProperties } from 'react';
import { DrawingFrame } from '../../components/drawing/drawing-frame';
import { circle, line, outline } from '../../components/drawing/primitives';
import { Shapes } from '../../components/drawing/shape-view';
import { boxAround, type Box, type Shape } from '../../components/drawing/shapes';
import { formatFigure } from '../../lib/format-figure';

export type SweptPosition = ClearanceView['positions'][number];
type Point = readonly [number, number];
type Instant = SweptPosition['instants'][number];

/** The frame's plane has y upwards, the screen downwards. */
const flip = ([x, y]: Point): Point => [x, -y];
const marginMm = 34;
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

/** Eyes and axis of the shock at one travel. */
function axisOf({ frameEye, linkEye }: Instant): Shape[] {
  const [a, b] = [flip(frameEye), flip(linkEye)];
  return [
    line('axis', a[0], a[1], b[0], b[1], { line: 'chain' }),
    circle('frame-eye', a[0], a[1], eyeMm),
    circle('link-eye', b[0], b[1], eyeMm),
  ];
}

/** What is shown: the shock in all its places with some of the frame around it. */
function boxOf({ instants }: SweptPosition): Box {
  const box = boxAround(
    instants.flatMap((one) => [bodyOf(one).box, ...axisOf(one).map((shape) => shape.box)]),
  );
  return {
    x1: box.x1 - marginMm,
    y1: box.y1 - marginMm,
    x2: box.x2 + marginMm,
    y2: box.y2 + marginMm,
  };
}

/** A place inside the box for the name of a part: the middle of what is seen of it. */
function labelAt(polygon: readonly Point[], box: Box): Point {
  const held = polygon
    .map(flip)
    .map(([x, y]): Point => [
      Math.min(box.x2 - 26, Math.max(box.x1 + 26, x)),
      Math.min(box.y2 - 8, Math.max(box.y1 + 12, y)),
    ]);
  const sum = held.reduce(([sx, sy], [x, y]) => [sx + x, sy + y], [0, 0]);
  return [sum[0] / held.length, sum[1] / held.length];
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
  const box = boxOf(position);
  const tightest = instants.find(({ shockMm }) => shockMm === atShockMm) ?? instants[0];
  const others = instants.filter((one) => one !== tightest);
  const named = [...view.fixed, ...(tightest?.moving ?? [])];
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
      <Shapes shapes={others.flatMap((one) => [...partsOf(one, ghost), bodyOf(one, ghost)])} />
      {tightest ? (
        <>
          <Shapes shapes={partsOf(tightest)} />
          <Shapes shapes={[bodyOf(tightest)]} colour="var(--lf-colors-tarn)" fillOpacity={0.82} />
          <Shapes shapes={axisOf(tightest)} />
        </>
      ) : null}
      {named.map(({ name, polygon }) => {
        const [x, y] = labelAt(polygon, box);
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
      {tight ? <Tight from={flip(tight.shock)} to={flip(tight.part)} mm={distanceMm} box={box} /> : null}
    </DrawingFrame>
  );
}

/** A ring around the tightest point and its figure on a leader that runs away from the shock. */
function Tight({ from, to, mm, box }: { from: Point; to: Point; mm: number; box: Box }) {
  const colour = 'var(--lf-colors-bracken)';
  const middle: Point = [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2];
  const side = middle[0] > (box.x1 + box.x2) / 2 ? -1 : 1;
  const up = middle[1] > (box.y1 + box.y2) / 2 ? -1 : 1;
  const radius = Math.hypot(to[0] - from[0], to[1] - from[1]) / 2 + 4;
  const start: Point = [middle[0] + side * radius * 0.7, middle[1] + up * radius * 0.7];
  const end: Point = [start[0] + side * 16, start[1] + up * 16];
  return (
    <g data-tight={mm} stroke={colour} fill="none">
      <circle cx={middle[0]} cy={middle[1]} r={radius} strokeWidth={2} vectorEffect="non-scaling-stroke" />
      <path
        d={`M${from[0]} ${from[1]}L${to[0]} ${to[1]}M${start[0]} ${start[1]}L${end[0]} ${end[1]}`}
        strokeWidth={1.4}
        vectorEffect="non-scaling-stroke"
      />
      <g transform={`translate(${end[0] + side * 2} ${end[1] + up * 2})`}>
        <text
          textAnchor={side > 0 ? 'start' : 'end'}
          dominantBaseline="central"
          fill={colour}
          style={{ ...unscaled, fontSize: '19px', fontWeight: 800, fontVariantNumeric: 'tabular-nums' }}
          {...halo}
        >
          {mm > 0 ? `${formatFigure(mm, 1)} mm` : 'touches'}
        </text>
      </g>
    </g>
  );
}
