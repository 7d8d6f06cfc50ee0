import { z } from 'zod';
import { drawnShock, frameSheetView } from '../catalogue/catalogue.schema.js';
import {
  questionKeys,
  questionSchemas,
  steps,
  type QuestionKey,
  type StoredAnswer,
} from './answers.schema.js';

export const questionKey = z.enum(questionKeys as [QuestionKey, ...QuestionKey[]]);

/** PUT /api/measure-ups/:id/answers/:question: the value is checked against the question's own schema. */
export const putAnswerBody = (key: QuestionKey) =>
  z.discriminatedUnion('state', [
    z.strictObject({ state: z.literal('known'), value: questionSchemas[key] }),
    z.strictObject({ state: z.literal('unknown') }),
  ]);

/** What the size resolver makes of the present shock so far, told in words. */
export const sizeView = z.object({
  state: z.enum(['settled', 'measure-again', 'no-such-size', 'nothing-yet']),
  sizeKey: z.string().nullable(),
  /** 0..1 for the leading size. */
  sureness: z.number().nullable(),
  candidates: z.array(z.object({ sizeKey: z.string(), share: z.number() })),
  measureNext: z.enum(['eye-to-eye', 'stroke-shaft', 'stroke-compressed']).nullable(),
  /** One sentence for the rider. */
  say: z.string(),
  conflicts: z.array(z.object({ question: questionKey, say: z.string() })),
  /** The mounts that are known, which rule sizes out: what is typed is read against the same sizes. */
  family: z.enum(['eyelet', 'trunnion']).nullable(),
});
export type SizeView = z.infer<typeof sizeView>;

/** GET /api/measure-ups/:id; also the answer to POST /api/measure-ups and to every PUT of an answer. */
export const measureUpView = z.object({
  id: z.string(),
  revision: z.int(),
  createdAt: z.string(),
  updatedAt: z.string(),
  /** Keyed by question. */
  answers: z.record(
    z.string(),
    z.custom<StoredAnswer>((value) => typeof value === 'object' && value !== null),
  ),
  /** The questions that this bike and these answers make necessary, in order. */
  questions: z.array(
    z.object({
      key: questionKey,
      step: z.enum(steps),
      state: z.enum(['open', 'known', 'unknown']),
      optional: z.boolean(),
    }),
  ),
  /** First open question, or null when all are answered. */
  next: questionKey.nullable(),
  title: z.string(),
  sheet: frameSheetView.nullable(),
  size: sizeView,
  drawing: drawnShock.nullable(),
  readyForMatches: z.boolean(),
});
export type MeasureUpView = z.infer<typeof measureUpView>;

/** POST /api/measure-ups/:id/links → a link with the token in the fragment; DELETE …/links revokes all. */
export const linkView = z.object({ url: z.string() });
export type LinkView = z.infer<typeof linkView>;
/** POST /api/measure-ups/open {token} → exchanges the fragment's token for the session's grant. */
export const openLinkBody = z.strictObject({ token: z.string().min(20).max(100) });
export const openLinkView = z.object({ id: z.string() });
