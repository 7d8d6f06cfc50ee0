import { formatFigure } from '../../lib/format-figure';
import { lying, standing, type Dimension } from './dimensions';
import type { HardwareFigure } from './hardware-shapes';
import type { Shape } from './shapes';

export type HardwareDimensionKey = 'width' | 'bolt' | 'bore';

/** The width across the sleeve, the bolt's diameter and the eye's bore, each at its own part of the exploded kit. */
export function hardwareDimensions(
  { widthMm, boltMm, boreMm }: HardwareFigure,
  shapes: readonly Shape[],
  keys: readonly HardwareDimensionKey[],
): Dimension<HardwareDimensionKey>[] {
  const left = (part: string): number =>
    Math.min(...shapes.filter((shape) => shape.part === part).map(({ box }) => box.x1));
  const foot = boreMm / 2 + 5.5;
  const make: Record<HardwareDimensionKey, () => Dimension<HardwareDimensionKey>> = {
    width: () => {
      const x = left('sleeve');
      return lying('width', x, x + widthMm, foot + 22, [boltMm / 2, boltMm / 2], formatFigure(widthMm));
    },
    bolt: () => ({
      ...standing('bolt', widthMm / 2, -boltMm / 2, boltMm / 2, `⌀ ${formatFigure(boltMm)}`),
      textX: widthMm / 2,
      textY: -boltMm / 2 - 5,
      anchor: 'middle',
    }),
    bore: () => ({
      ...standing('bore', left('eye') + 7, -boreMm / 2, boreMm / 2, `⌀ ${formatFigure(boreMm)}`),
      textX: left('eye') + 7,
      textY: -foot - 5,
      anchor: 'middle',
    }),
  };
  return keys.map((key) => make[key]());
}
