import { z } from 'zod';
import { slug } from '../common/primitives.schema.js';

/** GET /api/measure-ups/:id/matches/:sizeId/curves: the shock that the rider has now, where it is in our list. */
export const curvesQuery = z.object({ present: slug.optional() });
export type CurvesQuery = z.infer<typeof curvesQuery>;

/** One shock in one frame, at equal steps of wheel travel; lengths in mm, forces in N at the wheel. */
export const rideView = z.object({
  name: z.string(),
  sizeKey: z.string(),
  travelMm: z.number(),
  meanRatio: z.number(),
  progressionPercent: z.number().nullable(),
  points: z.array(
    z.object({
      wheelMm: z.number(),
      shockMm: z.number(),
      ratio: z.number(),
      forceN: z.number().nullable(),
      rateNPerMm: z.number().nullable(),
    }),
  ),
  spring: z
    .object({
      /** The fill or the spring in words. */
      text: z.string(),
      sagPercent: z.number(),
      sagMm: z.number(),
      sagWheelMm: z.number(),
      frequencyHz: z.number(),
      endToStatic: z.number(),
      energyJ: z.number(),
    })
    .nullable(),
});
export type RideView = z.infer<typeof rideView>;

export const curvesView = z.object({
  frameName: z.string(),
  shockName: z.string(),
  next: rideView.nullable(),
  present: rideView.nullable(),
  /** Static load on the rear wheel, N. */
  loadN: z.number().nullable(),
  /** What is not drawn, and why. */
  notDrawn: z.array(z.string()),
  assumed: z.array(z.string()),
  /** Shocks in our list of which the rider may have one now. */
  choices: z.array(z.object({ sizeId: z.string(), name: z.string() })),
  chosen: z.string().nullable(),
});
export type CurvesView = z.infer<typeof curvesView>;
