import { formatFigure } from '../../lib/format-figure';
import { lying, standing, type Dimension } from './dimensions';
import { boltOf, eyeRadius, widthOf, type FrameMountFigure, type MountDimensionKey } from './mount-figure';
import { lugMm } from './parts/lugs';

/** The dimensions of a mount that are known: between the cheeks, across the bolt or pin, across the eye's bore. */
export function mountDimensions(
  figure: FrameMountFigure,
  keys: readonly MountDimensionKey[],
): Dimension<MountDimensionKey>[] {
  if (figure.kind === 'trunnion') return [];
  const half = widthOf(figure) / 2;
  const foot = eyeRadius(figure);
  const r = boltOf(figure) / 2;
  const make: Record<MountDimensionKey, () => Dimension<MountDimensionKey> | null> = {
    width: () => lying('width', -half, half, foot + 30, [foot, foot], formatFigure(2 * half)),
    bolt: () => {
      const x = half + lugMm + 19;
      const from = half + lugMm + (figure.kind === 'pin' ? 4 : 9);
      return {
        ...standing('bolt', x, -r, r, `⌀ ${formatFigure(2 * r)}`),
        extensions: [-r, r].map((y) => ({ x1: from, x2: x + 3, y1: y, y2: y })),
        textX: x + 5,
        textY: -r - 3,
      };
    },
    bore: () => {
      if (figure.kind !== 'hardware') return null;
      const bore = (figure.boreMm ?? 15) / 2;
      const x = -half - lugMm - 14;
      return {
        ...standing('bore', x, -bore, bore, `⌀ ${formatFigure(2 * bore)}`),
        extensions: [-bore, bore].map((y) => ({ x1: -7, x2: x - 3, y1: y, y2: y })),
        textX: x - 4,
        textY: -bore - 3,
        anchor: 'end',
      };
    },
  };
  return keys.flatMap((key) => make[key]() ?? []);
}
