/** How a frame holds one end of a shock, mm: the four mounts of the trade, each direct or on a yoke. */
export type FrameMountFigure = (
  | { kind: 'hardware'; widthMm: number; boltMm: number; boreMm?: number }
  | { kind: 'pin'; diameterMm: number; widthMm: number }
  | { kind: 'bearing-bolt'; boltMm: number; widthMm: number }
  | { kind: 'trunnion' }
) & { yoke?: boolean };

export type MountDimensionKey = 'width' | 'bolt' | 'bore';

/** Between the lugs of a trunnion mount there is no figure to measure: this one is only drawn. */
export const trunnionWidthMm = 54;

export const widthOf = (figure: FrameMountFigure): number =>
  figure.kind === 'trunnion' ? trunnionWidthMm : figure.widthMm;

/** The diameter of what goes through the eye: the bolt, or the frame's own pin. */
export function boltOf(figure: FrameMountFigure): number {
  if (figure.kind === 'trunnion') return 10;
  return figure.kind === 'pin' ? figure.diameterMm : figure.boltMm;
}

/** Radius of the eye that is drawn. */
export function eyeRadius(figure: FrameMountFigure): number {
  if (figure.kind === 'trunnion') return 15;
  if (figure.kind === 'pin') return figure.diameterMm / 2 + 5.5;
  if (figure.kind === 'bearing-bolt') return figure.boltMm / 2 + 9.5;
  return (figure.boreMm ?? 15) / 2 + 5.5;
}

/** The eye itself is narrower than the place it stands in. */
export const eyeWidth = (figure: FrameMountFigure): number => Math.min(14, widthOf(figure) - 3);
