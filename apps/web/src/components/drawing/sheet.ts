import { shockDimensions, type Dimension, type DimensionKey } from './dimensions';
import { boxAround, type Box } from './shapes';
import type { ShockFigure } from './shock-figure';
import { centreLines, shockShapes } from './shock-shapes';

/** At the smallest scale, where 1 mm is about 1 px, a figure is as high as this in mm. */
const figureHeightMm = 15;
const beside: Record<Dimension['anchor'], readonly [number, number]> = {
  start: [0, 42],
  middle: [-18, 18],
  end: [-42, 0],
};

/** What a dimension covers together with its figure. */
export const roomOf = ({ x1, y1, x2, y2, textX, textY, anchor }: Dimension): Box => ({
  x1: Math.min(x1, x2, textX + beside[anchor][0]),
  x2: Math.max(x1, x2, textX + beside[anchor][1]),
  y1: Math.min(y1, y2, textY - figureHeightMm),
  y2: Math.max(y1, y2) + 5,
});

/** The smallest part of the plane that shows a shock with its dimensions, with a margin of 4 mm. */
export function sheetFor(figure: ShockFigure, keys: readonly DimensionKey[] = []): Box {
  const shapes = [...shockShapes(figure), ...centreLines(figure)].map(({ box }) => box);
  const box = boxAround([...shapes, ...shockDimensions(figure, keys).map(roomOf)]);
  return { x1: box.x1 - 4, y1: box.y1 - 4, x2: box.x2 + 4, y2: box.y2 + 4 };
}

/** One sheet for several shocks: drawn on it, all have the same origin and the same scale. */
export const commonSheet = (figures: readonly ShockFigure[], keys: readonly DimensionKey[] = []): Box =>
  boxAround(figures.map((figure) => sheetFor(figure, keys)));
