import { z } from 'zod';
import { isoDay } from '../common/primitives.schema.js';

export const sourceView = z.object({
  kind: z.enum(['maker', 'print', 'rider', 'curator', 'practice', 'computed']),
  label: z.string(),
  date: isoDay.nullable(),
});
export type SourceView = z.infer<typeof sourceView>;

/** GET /api/frames?q=&maker= → frames for the finder, at most 50 */
export const frameSummary = z.object({
  id: z.string(),
  makerId: z.string(),
  makerName: z.string(),
  model: z.string(),
  yearFrom: z.int(),
  yearTo: z.int(),
  travelMm: z.array(z.number()),
  sizes: z.array(z.string()),
});
export type FrameSummary = z.infer<typeof frameSummary>;
export const frameList = z.object({
  makers: z.array(z.object({ id: z.string(), name: z.string(), frames: z.int() })),
  frames: z.array(frameSummary),
});
export type FrameList = z.infer<typeof frameList>;

/** One named figure of a sheet for people, with its source. */
export const sheetFigure = z.object({ label: z.string(), text: z.string(), source: sourceView.nullable() });

/** GET /api/frames/:frameId → the frame sheet in force */
export const frameSheetView = z.object({
  frame: frameSummary,
  version: z.int(),
  publishedAt: z.string(),
  entries: z.array(
    z.object({
      id: z.string(),
      sizeKey: z.string(),
      travelMm: z.number().nullable(),
      yearFrom: z.int().nullable(),
      yearTo: z.int().nullable(),
      frameSizes: z.array(z.string()).nullable(),
      chip: z.string().nullable(),
      frameEnd: z.string(),
      linkEnd: z.string(),
      source: sourceView,
    }),
  ),
  figures: z.array(sheetFigure),
  /** Which measure-up questions the sheet leaves open, by question key. */
  leavesOpen: z.array(z.string()),
});
export type FrameSheetView = z.infer<typeof frameSheetView>;

/** GET /api/towns */
export const townList = z.object({
  towns: z.array(z.object({ id: z.string(), name: z.string(), latitude: z.number(), longitude: z.number() })),
});
export type TownList = z.infer<typeof townList>;

/** What the drawing needs to show a shock to scale, mm. null = not known, drawn dashed or left out. */
export const drawnMount = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('eyelet'), boreMm: z.number() }),
  z.object({ kind: z.literal('bearing-eye'), boltMm: z.number(), widthMm: z.number() }),
  z.object({ kind: z.literal('trunnion') }),
]);
export const drawnShock = z.object({
  eyeToEyeMm: z.number(),
  strokeMm: z.number().nullable(),
  bodyEnd: drawnMount,
  shaftEnd: drawnMount,
  spring: z.enum(['air', 'coil']),
  diameterMm: z.number().nullable(),
  reservoir: z.object({ lengthMm: z.number(), diameterMm: z.number(), positionDeg: z.number() }).nullable(),
  remote: z.boolean(),
});
export type DrawnShock = z.infer<typeof drawnShock>;
