import type { ShockLayout } from '../layout';
import { line, outline, turned } from '../primitives';
import type { Shape } from '../shapes';
import type { ShockFigure } from '../shock-figure';

export interface ReservoirPlace {
  x1: number;
  x2: number;
  cy: number;
  r: number;
  /** Towards the viewer, or in the plane of the drawing: drawn over the body. */
  inFront: boolean;
}

const gapMm = 5;

/** Where the reservoir lies in the side view when it is turned about the shock's axis. */
export function placeReservoir(
  layout: ShockLayout,
  reservoir: NonNullable<ShockFigure['reservoir']>,
): ReservoirPlace {
  const r = reservoir.diameterMm / 2;
  const widest = layout.coil ? layout.coil.outerR + 1 : layout.bodyR;
  const turn = (reservoir.positionDeg * Math.PI) / 180;
  const x1 = layout.bodyStart - 6;
  return {
    x1,
    x2: x1 + reservoir.lengthMm,
    cy: -(widest + gapMm + r) * Math.cos(turn),
    r,
    inFront: Math.sin(turn) > -1e-9,
  };
}

/** The oil reservoir with its bridge to the body, its adjuster towards the eye and its gas cap at the far end. */
export function reservoirShapes(layout: ShockLayout, place: ReservoirPlace): Shape[] {
  const { x1, x2, cy, r } = place;
  const side = cy <= 0 ? -1 : 1;
  const foot = side * layout.bodyR * 0.5;
  const top = cy - side * r * 0.6;
  const bridged = Math.abs(cy) > r * 0.8;
  const bridge = outline(
    'bridge',
    [
      [x1 + 7, foot],
      [x1 + 9, top],
      [x1 + 22, top],
      [x1 + 24, foot],
    ],
    2,
  );
  return [
    ...(bridged ? [bridge] : []),
    turned(
      'adjuster',
      [
        [x1 - 6, r * 0.34],
        [x1, r * 0.38],
      ],
      { cy, radius: 1 },
    ),
    turned(
      'gas-cap',
      [
        [x2 - 1, r * 0.3],
        [x2 + 3, r * 0.26],
      ],
      { cy, radius: 1 },
    ),
    turned(
      'reservoir',
      [
        [x1, r * 0.78],
        [x1 + 3, r],
        [x2 - 4, r],
        [x2, r * 0.8],
      ],
      { cy, radius: 2 },
    ),
    line('reservoir', x1 + 9, cy - r, x1 + 9, cy + r),
    line('reservoir', x2 - 8, cy - r, x2 - 8, cy + r),
    line('reservoir', x2 - 11, cy - r, x2 - 11, cy + r),
    line('reservoir-centre', x1 - 11, cy, x2 + 9, cy, { line: 'chain' }),
  ];
}
