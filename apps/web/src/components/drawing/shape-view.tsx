import { memo } from 'react';
import type { Fill, LineKind, LineWidth, Shape } from './shapes';

/** Dashes in screen pixels: lines keep their width and rhythm at every scale. */
const dashes: Record<LineKind, string | undefined> = {
  full: undefined,
  chain: '13 3 2 3',
  hidden: '5 3',
  phantom: '9 2.5 1.5 2.5 1.5 2.5',
};

/** Two to one, a little finer where the drawing is small. */
const widths: Record<LineWidth, { strokeWidth: string }> = {
  wide: { strokeWidth: 'clamp(1.25px, 0.36cqw, 1.9px)' },
  narrow: { strokeWidth: 'clamp(0.65px, 0.18cqw, 0.95px)' },
};

const fills: Record<Fill, string> = {
  none: 'none',
  paper: 'var(--drawing-fill, var(--lf-colors-paper))',
  metal: 'var(--lf-colors-slate)',
  shade: 'var(--lf-colors-shade)',
};

export interface ShapesProps {
  shapes: readonly Shape[];
  /** Of the outlines; narrow lines are always slate. */
  colour?: string;
  /** Below 1 the fills let through what stands behind. */
  fillOpacity?: number;
}

/** Outlines of one group: wide and narrow lines two to one, as ISO 128 has them. */
export const Shapes = memo(function Shapes({ shapes, colour, fillOpacity }: ShapesProps) {
  return (
    <g fillOpacity={fillOpacity} strokeLinejoin="round" strokeLinecap="round">
      {shapes.map((shape, index) => (
        <path
          key={index}
          d={shape.d}
          data-part={shape.part}
          fill={fills[shape.fill]}
          stroke={shape.fill === 'shade' ? fills.shade : (colour ?? strokeOf(shape))}
          style={widths[shape.width]}
          strokeDasharray={dashes[shape.line]}
          strokeLinecap={shape.line === 'full' ? undefined : 'butt'}
          vectorEffect="non-scaling-stroke"
        />
      ))}
    </g>
  );
});

const strokeOf = ({ width }: Shape): string =>
  width === 'wide' ? 'var(--lf-colors-ink)' : 'var(--lf-colors-slate)';
