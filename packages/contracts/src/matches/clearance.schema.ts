import { z } from 'zod';

const point = z.tuple([z.number(), z.number()]);
const outline = z.object({ name: z.string(), polygon: z.array(point) });

/**
 * GET /api/measure-ups/:id/matches/:sizeId/clearance: the sweep in the frame's plane, mm, origin at the frame-side
 * pivot, x to the link-side eye at full extension, y upwards, seen from the drive side.
 */
export const clearanceView = z.object({
  frameName: z.string(),
  shockName: z.string(),
  /** What the reservoir's check says. */
  say: z.string(),
  /** Why nothing is drawn, or null. */
  why: z.string().nullable(),
  eyeToEyeMm: z.number(),
  strokeMm: z.number(),
  wayRound: z.enum(['body-to-frame', 'body-to-link']),
  /** The position that the check chose; null where none has been. */
  chosenDeg: z.number().nullable(),
  fixed: z.array(outline),
  positions: z.array(
    z.object({
      deg: z.number(),
      /** The frame's maker refuses it. */
      refused: z.boolean(),
      /** Least distance, mm, rounded down. */
      distanceMm: z.number(),
      atShockMm: z.number(),
      part: z.string(),
      incomplete: z.string().nullable(),
      instants: z.array(
        z.object({
          shockMm: z.number(),
          body: z.array(point),
          frameEye: point,
          linkEye: point,
          moving: z.array(outline),
        }),
      ),
      tight: z.object({ shock: point, part: point }).nullable(),
    }),
  ),
});
export type ClearanceView = z.infer<typeof clearanceView>;
