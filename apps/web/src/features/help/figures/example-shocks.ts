import type { ShockFigure } from '../../../components/drawing/shock-figure';

const eyelet = { kind: 'eyelet', boreMm: 15 } as const;

/** Shocks to explain with: usual proportions, nobody's product. */
export const inlineAir: ShockFigure = {
  eyeToEyeMm: 210,
  strokeMm: 55,
  bodyEnd: eyelet,
  shaftEnd: eyelet,
  spring: 'air',
  diameterMm: 50,
  reservoir: null,
  remote: false,
  usedStrokeMm: 46,
};

export const withReservoir: ShockFigure = {
  ...inlineAir,
  diameterMm: 54,
  reservoir: { lengthMm: 96, diameterMm: 38, positionDeg: 0 },
};

export const coil: ShockFigure = { ...inlineAir, spring: 'coil', diameterMm: 62, springFreeLengthMm: 116 };

export const trunnion: ShockFigure = { ...inlineAir, eyeToEyeMm: 185, bodyEnd: { kind: 'trunnion' } };

export const withRemote: ShockFigure = {
  ...inlineAir,
  eyeToEyeMm: 190,
  strokeMm: 45,
  diameterMm: 46,
  remote: true,
  usedStrokeMm: 38,
};
