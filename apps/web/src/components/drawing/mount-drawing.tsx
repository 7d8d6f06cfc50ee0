import { useMemo } from 'react';
import { formatFigure } from '../../lib/format-figure';
import { DimensionLine } from './dimension-line';
import { DrawingFrame } from './drawing-frame';
import { mountDimensions } from './mount-dimensions';
import { boltOf, widthOf, type FrameMountFigure, type MountDimensionKey } from './mount-figure';
import { mountSectionShapes } from './mount-shapes';
import { Shapes } from './shape-view';
import { roomOf } from './sheet';
import { boxAround } from './shapes';

const names: Record<FrameMountFigure['kind'], string> = {
  hardware: 'Eyelet with mounting hardware',
  pin: 'Pin through the open eye',
  'bearing-bolt': 'Bolt through a bearing eye',
  trunnion: 'Trunnion: two bolts into the shock’s body',
};

/** The mount in words, with the figures that its dimensions show. */
export function describeMount(figure: FrameMountFigure): string {
  const held = figure.yoke ? 'held by the fork of a yoke' : 'held by the frame itself';
  if (figure.kind === 'trunnion') return `Cut along the bolts, ${held}.`;
  const through = figure.kind === 'pin' ? 'pin' : 'bolt';
  return `Cut along the ${through}: ${formatFigure(widthOf(figure))} mm wide between the cheeks, for a ${formatFigure(boltOf(figure))} mm ${through}, ${held}.`;
}

export interface MountDrawingProps {
  figure: FrameMountFigure;
  dimensions?: readonly MountDimensionKey[];
  asked?: MountDimensionKey;
  /** Figures shown in place of the computed ones: exactly what was typed, or "?". */
  texts?: Partial<Record<MountDimensionKey, string>>;
}

const none: readonly MountDimensionKey[] = [];

/** How a frame holds one end of the shock, cut along the bolt and to scale. */
export function MountDrawing({ figure, dimensions = none, asked, texts = {} }: MountDrawingProps) {
  const shapes = useMemo(() => mountSectionShapes(figure), [figure]);
  const lines = mountDimensions(figure, dimensions);
  const bare = boxAround([...shapes.map(({ box }) => box), ...lines.map(roomOf)]);
  const box = { x1: bare.x1 - 4, y1: bare.y1 - 4, x2: bare.x2 + 4, y2: bare.y2 + 4 };
  return (
    <DrawingFrame box={box} title={names[figure.kind]} description={describeMount(figure)}>
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
