import type { FrameRoom, Point, Reservoir } from '../facts.js';
import { drawnRoom } from '../clearance/drawn-room.js';
import { partMover, placed, shockMover, type SweptShock } from '../clearance/motion.js';
import { sweep } from '../clearance/sweep.js';
import { closestPoints } from './closest-points.js';

export interface DrawnOutline {
  name: string;
  polygon: readonly Point[];
}
/** Shock and moving parts at one shock travel, in the frame's plane, mm, y upwards. */
export interface SceneInstant {
  shockMm: number;
  body: readonly Point[];
  frameEye: Point;
  linkEye: Point;
  moving: readonly DrawnOutline[];
}
export interface ScenePosition {
  deg: number;
  /** The least distance that can be vouched for, mm, less the drawings' tolerance; null where none could be judged. */
  distanceMm: number | null;
  atShockMm: number;
  part: string;
  /** A part or table that is missing, so that the distance does not speak for everything. */
  incomplete: string | null;
  instants: readonly SceneInstant[];
  /** Where it is tightest: a point of the shock and one of the part, as they are drawn. */
  tight: { shock: Point; part: Point } | null;
}
export interface ClearanceScene {
  fixed: readonly DrawnOutline[];
  positions: readonly ScenePosition[];
}

const shares = [0, 0.25, 0.5, 0.75, 1];

/**
 * What a drawing of the sweep shows, for every position of the reservoir that is drawn: the shock at five points of
 * its stroke and where it is tightest. The same sweep as the reservoir's check.
 */
export function clearanceScene(
  room: FrameRoom,
  reservoir: Reservoir,
  shock: Omit<SweptShock, 'body'>,
): ClearanceScene {
  const { strokeMm, eyeToEyeMm } = shock;
  const usable = new Set(drawnRoom(room, strokeMm).parts.map(({ name }) => name));
  const outlines = room.outlines.filter(({ name }) => usable.has(name));
  const positions = reservoir.outlines.flatMap(({ positionDeg, polygon: body }): ScenePosition[] => {
    if (!Number.isFinite(positionDeg)) return [];
    const mover = shockMover(room, { ...shock, body });
    const result = sweep(room, { ...shock, body });
    if (result.distanceMm === null) return [];
    const instant = (shockMm: number): SceneInstant => {
      const pose = mover.poseAt(shockMm);
      const rad = (pose.deg * Math.PI) / 180;
      const length = eyeToEyeMm - shockMm;
      return {
        shockMm,
        body: placed(mover, pose),
        frameEye: [0, 0],
        linkEye: [length * Math.cos(rad), length * Math.sin(rad)],
        moving: outlines
          .filter(({ poses }) => poses)
          .map((part) => {
            const moved = partMover(part);
            return { name: part.name, polygon: placed(moved, moved.poseAt(shockMm)) };
          }),
      };
    };
    const at = result.atShockTravelMm;
    const tightest = instant(at);
    const fixedPart = outlines.find(({ name, poses }) => name === result.part && !poses)?.polygon;
    const part = fixedPart ?? tightest.moving.find(({ name }) => name === result.part)?.polygon ?? null;
    const pair = part && closestPoints(tightest.body, part);
    const travels = [...new Set([...shares.map((share) => share * strokeMm), at])].sort((p, q) => p - q);
    return [
      {
        deg: positionDeg,
        distanceMm: result.distanceMm,
        atShockMm: at,
        part: result.part,
        incomplete: result.incomplete,
        instants: travels.map(instant),
        tight: pair ? { shock: pair[0], part: pair[1] } : null,
      },
    ];
  });
  return {
    fixed: outlines.filter(({ poses }) => !poses).map(({ name, polygon }) => ({ name, polygon })),
    positions,
  };
}
