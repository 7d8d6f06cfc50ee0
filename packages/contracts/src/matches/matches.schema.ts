import { z } from 'zod';
import { drawnShock, sourceView } from '../catalogue/catalogue.schema.js';
import { answerKind, checkId, minor, uuid, verdict, workId } from '../common/primitives.schema.js';

/** GET /api/measure-ups/:id/matches: what the editable sentence says; all optional. */
export const matchesQuery = z.object({
  spring: z.enum(['air', 'coil', 'either']).optional(),
  reservoir: z.enum(['with', 'without', 'either']).optional(),
  maxMinor: z.coerce.number().int().min(0).optional(),
  order: z.enum(['cheapest', 'earliest', 'lightest']).default('cheapest'),
  wontFit: z.enum(['shown', 'hidden']).default('hidden'),
  /** So many rows from the top; the order is over all. */
  limit: z.coerce.number().int().min(1).max(1000).default(60),
});
export type MatchesQuery = z.infer<typeof matchesQuery>;

export const cellView = z.object({ text: z.string(), sub: z.string().nullable(), answer: answerKind });
export type CellView = z.infer<typeof cellView>;

export const matchRow = z.object({
  sizeId: z.string(),
  makerName: z.string(),
  modelName: z.string(),
  spring: z.enum(['air', 'coil']),
  massG: z.number(),
  sizeKey: z.string(),
  verdict,
  drawing: drawnShock,
  cells: z.object({
    eyeToEye: cellView,
    stroke: cellView,
    mounts: cellView,
    hardware: cellView,
    spring: cellView,
    reservoir: cellView,
    remote: cellView,
    /** Checks without a column of their own that did not simply pass. */
    others: z.array(cellView.extend({ check: checkId })),
  }),
  /** The sentence of the answer that decided, null for "Bolts straight in". */
  reason: z.string().nullable(),
  price: z.object({
    fittedMinor: minor.nullable(),
    selfFitMinor: minor.nullable(),
    /** Shock and parts with carriage, before any fitting; null when something is out of stock. */
    partsMinor: minor.nullable(),
  }),
  earliest: z
    .object({ day: z.string(), workshopName: z.string(), distanceKm: z.number().nullable() })
    .nullable(),
});
export type MatchRow = z.infer<typeof matchRow>;

export const matchesView = z.object({
  measureUpId: uuid,
  revision: z.int(),
  title: z.string(),
  sheetNote: z.string(),
  own: z
    .object({
      drawing: drawnShock,
      sizeText: z.string(),
      mounts: z.string(),
      spring: z.string(),
      remote: z.string(),
    })
    .nullable(),
  rider: z.object({ kg: z.number().nullable(), sagWindow: z.string().nullable() }),
  applied: z.object({
    spring: z.enum(['air', 'coil', 'either']),
    reservoir: z.enum(['with', 'without', 'either']),
    maxMinor: minor.nullable(),
    order: z.enum(['cheapest', 'earliest', 'lightest']),
    wontFit: z.enum(['shown', 'hidden']),
  }),
  /** Over all sizes on sale, before the sentence narrows them. */
  counts: z.record(verdict, z.int()),
  /** Left out by spring, reservoir or budget. */
  leftOut: z.int(),
  /** Ordered by verdict, then as asked; the first of them, see `limit`. */
  rows: z.array(matchRow),
  /** How many more there are below the last row. */
  more: z.int(),
});
export type MatchesView = z.infer<typeof matchesView>;

export const checkView = z.object({
  check: checkId,
  answer: answerKind,
  code: z.string(),
  remark: z.boolean(),
  /** One plain sentence. */
  say: z.string(),
  figures: z.array(z.object({ label: z.string(), text: z.string(), source: sourceView })),
  ask: z.array(
    z.object({
      whom: z.enum(['rider', 'frame-maker', 'shock-maker', 'workshop']),
      question: z.string().nullable(),
      say: z.string(),
    }),
  ),
});
export type CheckView = z.infer<typeof checkView>;

/** GET /api/measure-ups/:id/matches/:sizeId */
export const matchDetail = z.object({
  row: matchRow,
  entryText: z.string(),
  wayRound: z.enum(['body-to-frame', 'body-to-link']).nullable(),
  checks: z.array(checkView),
  parts: z.array(
    z.object({
      name: z.string(),
      end: z.enum(['frame', 'link']).nullable(),
      quantity: z.int(),
      confirmAtFitting: z.boolean(),
    }),
  ),
  work: z.array(z.object({ id: workId, say: z.string(), workshopOnly: z.boolean() })),
  instead: z.array(z.string()),
  advice: z.array(z.string()),
  selfFitAllowed: z.boolean(),
});
export type MatchDetail = z.infer<typeof matchDetail>;
