import type { Dimension } from './dimensions';

/** Keeps what is written at its own size in screen pixels, whatever the scale of the drawing. */
const unscaled = { transform: 'scale(var(--drawing-px, 0.8))' };

// In the style, because the page's reset of fonts outranks attributes.
const figure = { ...unscaled, fontSize: '14px', fontWeight: 600, fontVariantNumeric: 'tabular-nums' };
const askedFigure = { ...figure, fontSize: '19px', fontWeight: 800 };

const Arrow = ({ x, y, degrees }: { x: number; y: number; degrees: number }) => (
  <g transform={`translate(${x} ${y}) rotate(${degrees})`}>
    <path d="M0 0 10 -1.9 10 1.9Z" style={unscaled} stroke="none" fill="currentColor" />
  </g>
);

export interface DimensionLineProps {
  dimension: Dimension;
  /** The one that the page asks for: in bracken, larger. */
  asked?: boolean;
  /** Shown in place of the figure, "?" while it is not known. */
  text?: string;
}

/** Extension lines, the line with its filled arrowheads, the figure upright above it (ISO 129). */
export function DimensionLine({ dimension, asked = false, text }: DimensionLineProps) {
  const { key, mm, x1, y1, x2, y2, extensions, textX, textY, anchor } = dimension;
  const turn = (Math.atan2(y2 - y1, x2 - x1) * 180) / Math.PI;
  const short = Math.hypot(x2 - x1, y2 - y1) < 26;
  return (
    <g
      data-dim={key}
      data-mm={mm}
      data-asked={asked ? '' : undefined}
      style={{ color: `var(--lf-colors-${asked ? 'bracken' : 'slate'})` }}
      stroke="currentColor"
      strokeWidth={asked ? 1.4 : 0.9}
    >
      {extensions.map((line, index) => (
        <line key={index} {...line} strokeWidth={0.9} vectorEffect="non-scaling-stroke" />
      ))}
      <line data-line="" {...{ x1, y1, x2, y2 }} vectorEffect="non-scaling-stroke" />
      <Arrow x={x1} y={y1} degrees={short ? turn + 180 : turn} />
      <Arrow x={x2} y={y2} degrees={short ? turn : turn + 180} />
      <g transform={`translate(${textX} ${textY})`}>
        <text
          style={asked ? askedFigure : figure}
          textAnchor={anchor}
          fill="currentColor"
          stroke="var(--drawing-ground, var(--lf-colors-paper))"
          strokeWidth={4}
          strokeLinejoin="round"
          paintOrder="stroke"
        >
          {text ?? dimension.text}
        </text>
      </g>
    </g>
  );
}
