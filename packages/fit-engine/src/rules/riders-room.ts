import type { Figure } from '../answers.js';
import type { FrameFacts, Reservoir, Source } from '../facts.js';
import { figure } from './context.js';
import { known, slack } from './known.js';

/** Free on every side of a reservoir, mm (common practice); so twice of it across and along. */
const eachSideMm = 3;

export interface MeasuredRoom {
  state: 'fits' | 'too-small' | 'in-doubt';
  figures: Figure[];
}

/**
 * What the room that the rider measured says of a reservoir: it fits or is too small where two uncertainties either
 * way change nothing. Null where nothing was measured.
 */
export function ridersRoom(
  room: FrameFacts['reservoirRoom'],
  reservoir: Reservoir,
  shockSource: Source,
): MeasuredRoom | null {
  if (!room) return null;
  const { diameterMm, lengthMm, uncertaintyMm: u } = room.value;
  const figures = [
    figure('frame.roomDiameter', diameterMm, 'mm', room.source),
    figure('shock.reservoirDiameter', reservoir.diameterMm, 'mm', shockSource),
    figure('frame.roomLength', lengthMm, 'mm', room.source),
    figure('shock.reservoirLength', reservoir.lengthMm, 'mm', shockSource),
  ];
  const spare = Math.min(diameterMm - reservoir.diameterMm, lengthMm - reservoir.lengthMm) - 2 * eachSideMm;
  if (!known(spare) || !known(u) || u < 0) return { state: 'in-doubt', figures };
  if (spare >= 2 * u - slack) return { state: 'fits', figures };
  return { state: spare < -2 * u - slack ? 'too-small' : 'in-doubt', figures };
}
