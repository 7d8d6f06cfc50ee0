import type { MountFigure, ShockFigure } from './shock-figure';

/** Where the parts of a shock begin and end along its axis, mm from the body-side bolt, and how thick they are. */
export interface ShockLayout {
  strokeMm: number;
  bodyEyeR: number;
  shaftEyeR: number;
  bodyStart: number;
  bodyEnd: number;
  bodyR: number;
  shaftR: number;
  /** Where the shaft's head begins, at full extension. */
  headStart: number;
  coil: { outerR: number; wire: number; collarX: number; perchX: number; turns: number } | null;
}

const bumperMm = 4;

/** Outer radius of an end, seen from the side. */
export function mountRadius(mount: MountFigure): number {
  if (mount.kind === 'eyelet') return mount.boreMm / 2 + 5.5;
  if (mount.kind === 'bearing-eye') return mount.boltMm / 2 + 9.5;
  return 11;
}

function coilLayout(figure: ShockFigure, bodyStart: number, headStart: number, strokeMm: number) {
  const outerR = (figure.diameterMm ?? 62) / 2;
  const wire = Math.min(11, Math.max(6, outerR * 0.29));
  const perchX = headStart - 2;
  const room = perchX - (bodyStart + 16);
  const length = Math.min(figure.springFreeLengthMm ?? room - 6, room);
  const turns = Math.max(4, Math.floor(((length - strokeMm) * 0.92) / wire));
  return { outerR, wire, perchX, collarX: perchX - length, turns };
}

/**
 * Lays a shock out so that, wholly compressed, its can just meets the bumper: the free shaft that is drawn is the
 * stroke and nothing else.
 */
export function layoutShock(figure: ShockFigure): ShockLayout {
  const { eyeToEyeMm, bodyEnd: bodyMount, shaftEnd, spring } = figure;
  const strokeMm = figure.strokeMm ?? eyeToEyeMm * 0.26;
  const bodyEyeR = mountRadius(bodyMount);
  const shaftEyeR = mountRadius(shaftEnd);
  const bodyStart = bodyMount.kind === 'trunnion' ? 17 : bodyEyeR + 12;
  const headStart = Math.max(bodyStart + 34, eyeToEyeMm - shaftEyeR - 9);
  const bodyEnd = Math.max(bodyStart + 24, headStart - bumperMm - strokeMm);
  const coil = spring === 'coil' ? coilLayout(figure, bodyStart, headStart, strokeMm) : null;
  const bodyR = coil ? Math.min(19, coil.outerR - coil.wire - 2) : (figure.diameterMm ?? 54) / 2;
  return {
    strokeMm,
    bodyEyeR,
    shaftEyeR,
    bodyStart,
    bodyEnd,
    bodyR,
    shaftR: coil ? 6.5 : 5,
    headStart,
    coil,
  };
}
