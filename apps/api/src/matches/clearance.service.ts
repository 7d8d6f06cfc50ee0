import type { ClearanceView } from '@linkfell/contracts';
import { clearanceScene, sizeOf, tell, type Point } from '@linkfell/fit-engine';
import { Injectable } from '@nestjs/common';

import { shockName } from './curves-words.js';
import { JudgingService } from './judging.service.js';

const plain = (points: readonly Point[]): [number, number][] => points.map(plainPoint);
const plainPoint = ([x, y]: Point): [number, number] => [x, y];
const aroundDeg = (deg: number): number => ((deg % 360) + 360) % 360;
/** Rounded down: room on screen must not look like enough where it is not. */
const tenthsDown = (mm: number): number => Math.floor(mm * 10 + 1e-6) / 10;

/** The sweep that the reservoir's check judges, as a drawing. */
@Injectable()
export class ClearanceService {
  constructor(private readonly judging: JudgingService) {}

  async clearance(measureUpId: string, sizeId: string): Promise<ClearanceView> {
    const { open, shock, judgement, entry } = await this.judging.judgeOne(measureUpId, sizeId);
    const { frame } = open.side;
    const { reservoir } = shock;
    const size = sizeOf(entry?.sizeKey ?? shock.sizeKey);
    const check = judgement.answers.find((one) => one.check === 'reservoir');
    const wayRound = judgement.wayRound ?? 'body-to-frame';
    const nothing: ClearanceView = {
      frameName: frame.name,
      shockName: shockName(shock),
      say: check ? tell(check).short : '',
      why: null,
      eyeToEyeMm: size?.eyeToEyeMm ?? 0,
      strokeMm: size?.strokeMm ?? 0,
      wayRound,
      chosenDeg: judgement.reservoirPositionDeg,
      fixed: [],
      positions: [],
    };
    const sizeFails = judgement.answers.some(
      (one) => (one.check === 'eye-to-eye' || one.check === 'stroke') && one.answer === 'fail',
    );
    if (!reservoir)
      return { ...nothing, why: 'This shock has no reservoir, so there is nothing to swing past the frame.' };
    if (sizeFails || !size)
      return {
        ...nothing,
        why: 'The frame does not take this size, so its way through the stroke is not drawn.',
      };
    if (!frame.room)
      return {
        ...nothing,
        why: 'Nobody has drawn the tubes around the shock of this frame yet, so the way of the reservoir cannot be drawn.',
      };
    const { eyeToEyeMm, strokeMm } = size;
    const scene = clearanceScene(frame.room, reservoir, { eyeToEyeMm, strokeMm, wayRound });
    const refused = (frame.refusedPositions?.value ?? []).map(aroundDeg);
    const positions = scene.positions.flatMap((one) =>
      one.distanceMm === null
        ? []
        : {
            deg: one.deg,
            refused: refused.includes(aroundDeg(one.deg)),
            distanceMm: tenthsDown(one.distanceMm),
            atShockMm: one.atShockMm,
            part: one.part,
            incomplete: one.incomplete,
            instants: one.instants.map(({ shockMm, body, frameEye, linkEye, moving }) => ({
              shockMm,
              body: plain(body),
              frameEye: plainPoint(frameEye),
              linkEye: plainPoint(linkEye),
              moving: moving.map(({ name, polygon }) => ({ name, polygon: plain(polygon) })),
            })),
            tight: one.tight && { shock: plainPoint(one.tight.shock), part: plainPoint(one.tight.part) },
          },
    );
    if (positions.length === 0)
      return { ...nothing, why: 'The drawings of frame or shock have gaps, so the sweep cannot be drawn.' };
    return {
      ...nothing,
      fixed: scene.fixed.map(({ name, polygon }) => ({ name, polygon: plain(polygon) })),
      positions,
    };
  }
}
