import { useMemo } from 'react';
import { formatFigure } from '../../lib/format-figure';
import { DimensionLine } from './dimension-line';
import { DrawingFrame } from './drawing-frame';
import { hardwareDimensions, type HardwareDimensionKey } from './hardware-dimensions';
import { hardwareShapes, type HardwareFigure } from './hardware-shapes';
import { Shapes } from './shape-view';
import { boxAround } from './shapes';
import { roomOf } from './sheet';

const all: readonly HardwareDimensionKey[] = ['width', 'bolt', 'bore'];

/** The kit in words, with the figures that its dimensions show. */
export const describeHardware = ({ widthMm, boltMm, boreMm }: HardwareFigure): string =>
  `Taken apart along the bolt, from left to right: ${formatFigure(boltMm)} mm bolt, spacer, bush, eye with a ` +
  `${formatFigure(boreMm)} mm bore, sleeve ${formatFigure(widthMm)} mm wide, spacer, nut.`;

export interface HardwareDrawingProps {
  figure: HardwareFigure;
  dimensions?: readonly HardwareDimensionKey[];
  asked?: HardwareDimensionKey;
  texts?: Partial<Record<HardwareDimensionKey, string>>;
}

/** A hardware kit, exploded and cut, to scale. */
export function HardwareDrawing({ figure, dimensions = all, asked, texts = {} }: HardwareDrawingProps) {
  const shapes = useMemo(() => hardwareShapes(figure), [figure]);
  const lines = hardwareDimensions(figure, shapes, dimensions);
  const bare = boxAround([...shapes.map(({ box }) => box), ...lines.map(roomOf)]);
  const box = { x1: bare.x1 - 4, y1: bare.y1 - 4, x2: bare.x2 + 4, y2: bare.y2 + 4 };
  const title = `Mounting hardware ${formatFigure(figure.widthMm)} × ${formatFigure(figure.boltMm)} mm`;
  return (
    <DrawingFrame box={box} title={title} description={describeHardware(figure)}>
      <Shapes shapes={shapes} />
      {lines.map((dimension) => (
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
