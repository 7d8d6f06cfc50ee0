import { useMemo } from 'react';
import { DimensionLine } from './dimension-line';
import { shockDimensions, type DimensionKey } from './dimensions';
import { describeShock, shockTitle } from './describe';
import { DrawingFrame } from './drawing-frame';
import { Shapes } from './shape-view';
import type { Box } from './shapes';
import { sheetFor } from './sheet';
import type { ShockFigure } from './shock-figure';
import { centreLines, ghostShapes, shockShapes, silhouetteShapes } from './shock-shapes';

export interface ShockDrawingProps {
  figure: ShockFigure;
  /** Which dimensions are drawn; what is not known is left out. */
  dimensions?: readonly DimensionKey[];
  /** The dimension that the page asks for. */
  asked?: DimensionKey;
  /** Figures shown in place of the computed ones: exactly what was typed, or "?". */
  texts?: Partial<Record<DimensionKey, string>>;
  /** How far the shock is pressed together, mm. */
  compressedMm?: number;
  /** Shows where the shaft end comes to at full stroke. */
  ghost?: boolean;
  /** The rider's own shock in grey behind, at the same origin and scale. */
  behind?: ShockFigure | null;
  /** The part of the plane to show: the same for several drawings puts them on one scale (see commonSheet). */
  sheet?: Box;
  /** Of the outlines, a CSS colour; ink if nothing is said. */
  colour?: string;
  title?: string;
}

const none: readonly DimensionKey[] = [];

/** A shock drawn to scale from its own data. */
export function ShockDrawing(props: ShockDrawingProps) {
  const {
    figure,
    dimensions = none,
    asked,
    texts = {},
    compressedMm = 0,
    ghost,
    behind,
    sheet,
    colour,
  } = props;
  const box = useMemo(() => sheet ?? sheetFor(figure, dimensions), [sheet, figure, dimensions]);
  const shapes = useMemo(() => shockShapes(figure, compressedMm), [figure, compressedMm]);
  const silhouette = useMemo(() => (behind ? silhouetteShapes(behind) : []), [behind]);
  const phantom = useMemo(() => (ghost ? ghostShapes(figure) : []), [ghost, figure]);
  return (
    <DrawingFrame
      box={box}
      title={props.title ?? shockTitle(figure)}
      description={describeShock(figure, behind)}
    >
      {silhouette.length > 0 ? <Shapes shapes={silhouette} /> : null}
      <Shapes shapes={shapes} colour={colour} fillOpacity={behind ? 0.35 : undefined} />
      {phantom.length > 0 ? <Shapes shapes={phantom} /> : null}
      <Shapes shapes={centreLines(figure, compressedMm)} />
      {shockDimensions(figure, dimensions, compressedMm).map((dimension) => (
        <DimensionLine
          key={dimension.key}
          dimension={dimension}
          asked={dimension.key === asked}
          text={texts[dimension.key]}
        />
      ))}
    </DrawingFrame>
  );
}
