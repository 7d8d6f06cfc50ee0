import type { ShockFigure } from '../components/drawing/shock-figure';

const eyelet = { kind: 'eyelet', boreMm: 15 } as const;

/** An air shock with everything a drawing can show; for tests, which change one property at a time. */
export const airFigure: ShockFigure = {
  eyeToEyeMm: 210,
  strokeMm: 55,
  bodyEnd: eyelet,
  shaftEnd: eyelet,
  spring: 'air',
  diameterMm: 54,
  reservoir: { lengthMm: 92, diameterMm: 38, positionDeg: 0 },
  remote: false,
  usedStrokeMm: 30,
};

export const coilFigure: ShockFigure = {
  ...airFigure,
  eyeToEyeMm: 230,
  strokeMm: 60,
  spring: 'coil',
  diameterMm: 62,
  bodyEnd: { kind: 'bearing-eye', boltMm: 8, widthMm: 20 },
  reservoir: null,
  springFreeLengthMm: 120,
};

export const trunnionFigure: ShockFigure = {
  ...airFigure,
  eyeToEyeMm: 185,
  strokeMm: 52.5,
  bodyEnd: { kind: 'trunnion' },
  reservoir: null,
  remote: true,
};
