import type { AskNeed, CheckAnswer } from '../answers.js';
import { sweep, type SweepResult } from '../clearance/sweep.js';
import { sizeOf } from '../sizing/sizes.js';
import { answer, computed, figure, type Trial } from './context.js';

/** This must stay free, mm; 5 mm is comfortable (common practice). */
const mustBeFreeMm = 3;
const comfortableMm = 5;

export interface ReservoirAnswer {
  answer: CheckAnswer;
  positionDeg: number | null;
}

const measure: AskNeed = { fact: 'frame.reservoirRoom', whom: 'rider' };
const askMaker: AskNeed = { fact: 'frame.reservoirStatement', whom: 'frame-maker' };

/** Room for a reservoir: prohibition first, then what can be computed, then the maker's word, then the rider's room. */
export function reservoirCheck(trial: Trial): ReservoirAnswer {
  const { shock, frame } = trial;
  const { reservoir } = shock;
  if (!reservoir) return { answer: answer('reservoir', 'pass', 'reservoir-inline'), positionDeg: null };
  const word = frame.reservoirStatement;
  const said = word && figure('frame.reservoir', word.value, null, word.source);
  if (word?.value === 'inline-only') {
    return {
      answer: answer('reservoir', 'fail', 'reservoir-refused', { figures: [said] }),
      positionDeg: null,
    };
  }
  const refused = frame.refusedPositions?.value ?? [];
  const positions = reservoir.positionsDeg.filter((position) => !refused.includes(position));
  if (positions.length === 0) {
    return {
      answer: answer('reservoir', 'fail', 'reservoir-no-position-left', { figures: [said] }),
      positionDeg: null,
    };
  }
  const swept = bestPosition(trial, positions);
  if (swept) {
    const { result, positionDeg } = swept;
    const figures = [
      said,
      figure('computed.clearance', result.distanceMm, 'mm', computed),
      figure('computed.tightestPart', result.part, null, computed),
      figure('computed.tightestAt', result.atShockTravelMm, 'mm', computed),
    ];
    if (result.distanceMm < mustBeFreeMm) {
      // A permission never overrides a computed collision: somebody has to look.
      return word?.value === 'fits'
        ? {
            answer: answer('reservoir', 'unknown', 'reservoir-word-against-drawing', {
              figures,
              ask: [askMaker],
            }),
            positionDeg,
          }
        : { answer: answer('reservoir', 'fail', 'reservoir-touches', { figures }), positionDeg: null };
    }
    const snug = result.distanceMm < comfortableMm;
    return {
      answer: answer('reservoir', 'pass', snug ? 'reservoir-clears-narrowly' : 'reservoir-clears', {
        figures,
        remark: snug,
      }),
      positionDeg,
    };
  }
  const positionDeg = positions[0] ?? null;
  // A part that moves in a way nobody has drawn may meet the reservoir, whatever is said.
  if (frame.room?.outlines.some((part) => part.moves && !part.poses)) {
    return {
      answer: answer('reservoir', 'unknown', 'reservoir-movement-not-drawn', {
        figures: [said],
        ask: [askMaker],
      }),
      positionDeg,
    };
  }
  if (word)
    return { answer: answer('reservoir', 'pass', 'reservoir-stated', { figures: [said] }), positionDeg };
  return { answer: byRidersRoom(trial), positionDeg };
}

/** The position with the most room, or null where it cannot be computed. */
function bestPosition(
  { frame, shock, entry, wayRound }: Trial,
  positions: readonly number[],
): { result: SweepResult & { state: 'known' }; positionDeg: number } | null {
  const size = sizeOf(entry.sizeKey ?? shock.sizeKey);
  if (!frame.room || !shock.reservoir || !size) return null;
  let best: { result: SweepResult & { state: 'known' }; positionDeg: number } | null = null;
  for (const positionDeg of positions) {
    const body = shock.reservoir.outlines.find((outline) => outline.positionDeg === positionDeg)?.polygon;
    if (!body) continue;
    const result = sweep(frame.room, {
      body,
      eyeToEyeMm: size.eyeToEyeMm,
      strokeMm: size.strokeMm,
      wayRound,
    });
    if (result.state === 'known' && (!best || result.distanceMm > best.result.distanceMm))
      best = { result, positionDeg };
  }
  return best;
}

function byRidersRoom({ frame, shock }: Trial): CheckAnswer {
  const { reservoir } = shock;
  const room = frame.reservoirRoom;
  if (!room || !reservoir)
    return answer('reservoir', 'unknown', 'reservoir-not-stated', { ask: [measure, askMaker] });
  const { diameterMm, lengthMm, uncertaintyMm: u } = room.value;
  const figures = [
    figure('frame.roomDiameter', diameterMm, 'mm', room.source),
    figure('shock.reservoirDiameter', reservoir.diameterMm, 'mm', shock.source),
    figure('frame.roomLength', lengthMm, 'mm', room.source),
    figure('shock.reservoirLength', reservoir.lengthMm, 'mm', shock.source),
  ];
  const spare = Math.min(diameterMm - reservoir.diameterMm, lengthMm - reservoir.lengthMm) - mustBeFreeMm;
  if (spare >= 2 * u) return answer('reservoir', 'pass', 'reservoir-room-measured', { figures });
  if (spare < -2 * u) return answer('reservoir', 'fail', 'reservoir-room-too-small', { figures });
  return answer('reservoir', 'unknown', 'reservoir-room-in-doubt', { figures, ask: [measure] });
}
