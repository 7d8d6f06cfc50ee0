import { layoutShock, type ShockLayout } from './layout';
import { airBody, coilBody } from './parts/body';
import { coilShapes } from './parts/coil';
import { lockout, valve } from './parts/fittings';
import { mountShapes } from './parts/mount';
import { placeReservoir, reservoirShapes } from './parts/reservoir';
import { shaft, shaftHead, travelRing } from './parts/shaft';
import { line } from './primitives';
import type { Shape } from './shapes';
import type { ShockFigure } from './shock-figure';

/** The shaft's head with its eye, wherever the shock now is. */
function movingEnd(figure: ShockFigure, layout: ShockLayout, compressedMm: number): Shape[] {
  const eyeX = figure.eyeToEyeMm - compressedMm;
  return [
    ...shaftHead(layout, layout.headStart - compressedMm, eyeX),
    ...mountShapes('shaft-end', figure.shaftEnd, eyeX, -1),
  ];
}

/** All outlines of a shock, back to front, compressed by a part of its stroke (mm). */
export function shockShapes(figure: ShockFigure, compressedMm = 0): Shape[] {
  const layout = layoutShock(figure);
  const trunnion = figure.bodyEnd.kind === 'trunnion';
  const { back, front } = coilShapes(layout, compressedMm);
  const place = figure.reservoir ? placeReservoir(layout, figure.reservoir) : null;
  const reservoir = place ? reservoirShapes(layout, place) : [];
  const valveSide = place && place.cy < 0 ? 1 : -1;
  return [
    ...(place?.inFront ? [] : reservoir),
    ...back,
    ...shaft(layout, compressedMm),
    ...(figure.spring === 'air' && figure.strokeMm !== null
      ? travelRing(layout, figure.usedStrokeMm ?? layout.strokeMm * 0.8, compressedMm)
      : []),
    ...(figure.spring === 'coil' ? coilBody(layout, trunnion) : airBody(layout, trunnion)),
    ...movingEnd(figure, layout, compressedMm),
    ...front,
    ...mountShapes('body-end', figure.bodyEnd, 0, 1),
    ...(figure.spring === 'air' ? valve(layout, valveSide) : []),
    ...(place?.inFront ? reservoir : []),
    ...lockout(layout, figure.remote),
  ];
}

/** The shaft end where it comes to at full stroke, as another position of a moving part: long dash, two dots. */
export function ghostShapes(figure: ShockFigure): Shape[] {
  if (figure.strokeMm === null) return [];
  const layout = layoutShock(figure);
  return movingEnd(figure, layout, figure.strokeMm)
    .filter(({ part, width }) => width === 'wide' && part !== 'bumper')
    .map((shape) => ({ ...shape, width: 'narrow', line: 'phantom', fill: 'none' }));
}

/** What of another shock is shown behind this one: its mass in grey, without inner lines. */
export function silhouetteShapes(figure: ShockFigure): Shape[] {
  return shockShapes(figure)
    .filter(({ width, line: kind, fill }) => width === 'wide' && kind === 'full' && fill !== 'none')
    .map((shape) => ({ ...shape, part: 'behind', fill: 'shade', width: 'narrow' }));
}

/** Chain lines through the axis and both bolts. */
export function centreLines(figure: ShockFigure, compressedMm = 0): Shape[] {
  const { bodyEyeR, shaftEyeR } = layoutShock(figure);
  const end = figure.eyeToEyeMm - compressedMm;
  const chain = { line: 'chain' } as const;
  return [
    line('centre', -bodyEyeR - 9, 0, end + shaftEyeR + 9, 0, chain),
    line('centre', 0, -bodyEyeR - 7, 0, bodyEyeR + 7, chain),
    line('centre', end, -shaftEyeR - 7, end, shaftEyeR + 7, chain),
  ];
}
