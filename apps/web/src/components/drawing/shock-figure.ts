/** A mount of a shock, mm. The same words as the API's `drawnMount`. */
export type MountFigure =
  | { kind: 'eyelet'; boreMm: number }
  | { kind: 'bearing-eye'; boltMm: number; widthMm: number }
  | { kind: 'trunnion' };

/**
 * A shock as it is drawn, mm; the API's `drawnShock` can be handed in as it is. What is null is not known and drawn
 * with usual proportions, never with a figure.
 */
export interface ShockFigure {
  eyeToEyeMm: number;
  strokeMm: number | null;
  bodyEnd: MountFigure;
  shaftEnd: MountFigure;
  spring: 'air' | 'coil';
  /** Of the air can, or outside the coil. */
  diameterMm: number | null;
  /** `positionDeg` turns the reservoir about the shock's axis: 0 up, 90 towards the viewer, 180 down, 270 away. */
  reservoir: { lengthMm: number; diameterMm: number; positionDeg: number } | null;
  /** A cable drum in place of the hand lever. */
  remote: boolean;
  /** Of the coil, unloaded. */
  springFreeLengthMm?: number | null;
  /** How far the ring on the shaft was pushed: the stroke used on the last ride. Air only. */
  usedStrokeMm?: number | null;
}
