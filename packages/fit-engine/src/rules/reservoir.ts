import type { AskNeed, CheckAnswer, Figure } from '../answers.js';
import type { Reservoir } from '../facts.js';
import { sweep, type SweepResult } from '../clearance/sweep.js';
import { sizeOf } from '../sizing/sizes.js';
import { answer, computed, figure, type Trial } from './context.js';
import { slack } from './known.js';
import { ridersRoom } from './riders-room.js';

/** This must stay free, mm; 5 mm is comfortable (common practice). */
const mustBeFreeMm = 3;
const comfortableMm = 5;

export interface ReservoirAnswer {
  answer: CheckAnswer;
  positionDeg: number | null;
}

const measure: AskNeed = { fact: 'frame.reservoirRoom', whom: 'rider' };
const askMaker: AskNeed = { fact: 'frame.reservoirStatement', whom: 'frame-maker' };
const only = (given: CheckAnswer, positionDeg: number | null = null): ReservoirAnswer => ({
  answer: given,
  positionDeg,
});

/**
 * Room for a reservoir. A prohibition comes first; then what the drawings say; then the maker's word; then the room
 * the rider measured. A permission never overrides a collision that was computed or measured: then it is not known.
 */
export function reservoirCheck(trial: Trial): ReservoirAnswer {
  const { reservoir } = trial.shock;
  if (!reservoir) return only(answer('reservoir', 'pass', 'reservoir-inline'));
  const word = trial.frame.reservoirStatement;
  const said = word && figure('frame.reservoir', word.value, null, word.source);
  if (word?.value === 'inline-only') {
    return only(answer('reservoir', 'fail', 'reservoir-refused', { figures: [said] }));
  }
  const refused = (trial.frame.refusedPositions?.value ?? []).map(aroundDeg);
  const positions = reservoir.positionsDeg.filter((position) => !refused.includes(aroundDeg(position)));
  if (positions.length === 0) {
    const rule = trial.frame.refusedPositions;
    const figures = [rule && figure('frame.refusedPositions', rule.value.join(', '), 'deg', rule.source)];
    return only(answer('reservoir', 'fail', 'reservoir-no-position-left', { figures }));
  }
  return byDrawing(trial, reservoir, positions, said) ?? byWordOrRoom(trial, positions[0] ?? null, said);
}

/** A turned position is the same a full turn on. */
const aroundDeg = (deg: number): number => ((deg % 360) + 360) % 360;

interface Swept {
  positionDeg: number;
  result: SweepResult & { distanceMm: number };
}

/** What the outlines say, or null where they say nothing final and the maker's word or the rider's room may. */
function byDrawing(
  trial: Trial,
  reservoir: Reservoir,
  positions: readonly number[],
  said: Figure | null,
): ReservoirAnswer | null {
  const size = sizeOf(trial.entry.sizeKey ?? trial.shock.sizeKey);
  const { room, reservoirStatement: word } = trial.frame;
  if (!room || !size) return null;
  // A position is looked at only as closely as it takes to know that another one has more room.
  let floorMm = 0;
  const results = positions.map((positionDeg) => {
    const body = reservoir.outlines.find((outline) => outline.positionDeg === positionDeg)?.polygon ?? [];
    const { eyeToEyeMm, strokeMm } = size;
    const result = sweep(room, { body, eyeToEyeMm, strokeMm, wayRound: trial.wayRound }, floorMm);
    floorMm = Math.max(floorMm, result.distanceMm ?? 0);
    return { positionDeg, result };
  });
  const judged = results.filter((one): one is Swept => one.result.distanceMm !== null);
  const [first, ...others] = judged;
  if (!first) return incomplete(word?.value === 'fits', results[0]?.result, said);
  const rank = ({ result }: Swept): number => result.distanceMm + (result.incomplete === null ? 0 : -1e6);
  const { positionDeg, result } = others.reduce((best, one) => (rank(one) > rank(best) ? one : best), first);
  const figures = [said, ...drawnFigures(result)];
  if (result.distanceMm < mustBeFreeMm - slack) {
    if (word) {
      return only(
        answer('reservoir', 'unknown', 'reservoir-word-against-drawing', { figures, ask: [askMaker] }),
      );
    }
    // Another position that nobody has drawn may have the room that this one lacks.
    return judged.length < positions.length
      ? only(answer('reservoir', 'unknown', 'reservoir-drawing-incomplete', { figures, ask: [askMaker] }))
      : only(answer('reservoir', 'fail', 'reservoir-touches', { figures }));
  }
  if (result.incomplete !== null) return incomplete(word?.value === 'fits', result, said);
  const measured = ridersRoom(trial.frame.reservoirRoom, reservoir, trial.shock.source);
  if (measured?.state === 'too-small') {
    return only(
      answer('reservoir', 'unknown', 'reservoir-drawing-against-your-room', {
        figures: [...figures, ...measured.figures],
        ask: [measure, askMaker],
      }),
    );
  }
  const snug = result.distanceMm < comfortableMm - slack;
  const code = snug ? 'reservoir-clears-narrowly' : 'reservoir-clears';
  return only(answer('reservoir', 'pass', code, { figures, remark: snug }), positionDeg);
}

/** Room shown rounded down: a figure on screen must not look like enough where it is not. */
const drawnFigures = ({ distanceMm, part, atShockTravelMm }: Swept['result']): Figure[] => [
  figure('computed.clearance', Math.floor(distanceMm * 10 + slack) / 10, 'mm', computed),
  figure('computed.tightestPart', part, null, computed),
  figure('computed.tightestAt', atShockTravelMm, 'mm', computed),
];

/**
 * Drawings with a gap decide nothing by themselves. A part that moves in a way nobody has drawn may meet the
 * reservoir, whatever is said; of a part that stands still, or a position not drawn, the maker's word may speak.
 */
function incomplete(
  makerSaysFits: boolean,
  result: SweepResult | undefined,
  said: Figure | null,
): ReservoirAnswer | null {
  if (!result || result.incomplete === null) return null;
  const figures = [said, figure('room.missing', result.incomplete, null, computed)];
  if (result.movementNotDrawn) {
    return only(answer('reservoir', 'unknown', 'reservoir-movement-not-drawn', { figures, ask: [askMaker] }));
  }
  if (makerSaysFits) return null;
  return only(answer('reservoir', 'unknown', 'reservoir-drawing-incomplete', { figures, ask: [askMaker] }));
}

function byWordOrRoom(trial: Trial, positionDeg: number | null, said: Figure | null): ReservoirAnswer {
  const { frame, shock } = trial;
  const measured = shock.reservoir && ridersRoom(frame.reservoirRoom, shock.reservoir, shock.source);
  const figures = [said, ...(measured?.figures ?? [])];
  if (frame.reservoirStatement) {
    return measured?.state === 'too-small'
      ? only(
          answer('reservoir', 'unknown', 'reservoir-word-against-your-room', {
            figures,
            ask: [measure, askMaker],
          }),
        )
      : only(answer('reservoir', 'pass', 'reservoir-stated', { figures }), positionDeg);
  }
  if (!measured)
    return only(answer('reservoir', 'unknown', 'reservoir-not-stated', { ask: [measure, askMaker] }));
  switch (measured.state) {
    case 'fits':
      return only(answer('reservoir', 'pass', 'reservoir-room-measured', { figures }), positionDeg);
    case 'too-small':
      return only(answer('reservoir', 'fail', 'reservoir-room-too-small', { figures }));
    case 'in-doubt':
      return only(answer('reservoir', 'unknown', 'reservoir-room-in-doubt', { figures, ask: [measure] }));
  }
}
