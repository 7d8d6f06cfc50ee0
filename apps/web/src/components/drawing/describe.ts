import { formatFigure, formatSize } from '../../lib/format-figure';
import type { MountFigure, ShockFigure } from './shock-figure';

const mountWords = (mount: MountFigure): string => {
  if (mount.kind === 'eyelet') return `eyelet with a ${formatFigure(mount.boreMm)} mm bore`;
  if (mount.kind === 'trunnion') return 'trunnion';
  return `bearing eye for a ${formatFigure(mount.boltMm)} mm bolt, ${formatFigure(mount.widthMm)} mm wide`;
};

const turnWords = (deg: number): string => {
  const turn = ((Math.round(deg) % 360) + 360) % 360;
  if (turn === 0) return 'above the body';
  if (turn === 180) return 'below the body';
  return `turned ${turn} degrees about the body`;
};

/** The drawing's name: "Air shock, 210 × 55 mm". */
export const shockTitle = (figure: ShockFigure): string =>
  `${figure.spring === 'air' ? 'Air' : 'Coil'} shock, ${formatSize(figure.eyeToEyeMm, figure.strokeMm)} mm`;

/** The drawing in words, with the figures that its dimensions show. */
export function describeShock(figure: ShockFigure, behind?: ShockFigure | null): string {
  const { strokeMm, diameterMm, reservoir } = figure;
  const parts = [
    `Eye-to-eye ${formatFigure(figure.eyeToEyeMm)} mm`,
    strokeMm === null ? 'stroke not known' : `stroke ${formatFigure(strokeMm)} mm`,
    `body end ${mountWords(figure.bodyEnd)}`,
    `shaft end ${mountWords(figure.shaftEnd)}`,
    ...(diameterMm === null
      ? []
      : [`${figure.spring === 'air' ? 'air can' : 'coil'} ${formatFigure(diameterMm)} mm in diameter`]),
    reservoir
      ? `reservoir ${formatFigure(reservoir.lengthMm)} mm long and ${formatFigure(reservoir.diameterMm)} mm in diameter, ${turnWords(reservoir.positionDeg)}`
      : 'no reservoir',
    figure.remote ? 'cable drum for a remote lever' : 'hand lever',
  ];
  const own = behind
    ? ` Grey behind it, your shock: ${formatSize(behind.eyeToEyeMm, behind.strokeMm)} mm.`
    : '';
  return `${parts.join(', ')}.${own}`;
}
