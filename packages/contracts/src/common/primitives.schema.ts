import { z } from 'zod';

/** Money is integer minor units (pence), VAT included. */
export const minor = z.int().min(0).max(100_000_00);
export const isoInstant = z.iso.datetime({ offset: true });
export const isoDay = z.iso.date();
export const uuid = z.uuid();
/** Ids of catalogue things are slugs. */
export const slug = z
  .string()
  .regex(/^[a-z0-9][a-z0-9.-]{0,79}$/, 'Use small letters, digits, dots and hyphens');
export const email = z
  .string()
  .trim()
  .toLowerCase()
  .max(254)
  .pipe(z.email('Enter an e-mail address like name@example.com'));
export const line = (max: number, what: string) =>
  z
    .string()
    .trim()
    .min(1, `Enter ${what}`)
    .max(max, `Use ${max} characters or fewer`)
    .regex(/^[^\p{Cc}]*$/u, 'Leave out line breaks and control characters');
export const checkIds = [
  'eye-to-eye',
  'stroke',
  'mounts',
  'hardware',
  'spring-type',
  'coil-on-yoke',
  'spring-rate',
  'pressure',
  'rider-weight',
  'reservoir',
  'diameter',
  'remote',
  'position',
  'e-bike',
  'notices',
  'reading-conflict',
] as const;
export const checkId = z.enum(checkIds);
export const answerKind = z.enum(['pass', 'work', 'unknown', 'fail']);
export type AnswerKind = z.infer<typeof answerKind>;
export const verdict = z.enum(['bolts-straight-in', 'fits-with-work', 'needs-an-answer', 'wont-fit']);
export type Verdict = z.infer<typeof verdict>;
export const workId = z.enum([
  'press-in-kit',
  'press-in-reuse',
  'travel-spacer',
  'fit-coil',
  'fit-remote',
  'route-external',
  'hold-open-part',
  'fit-shock',
]);
export type WorkId = z.infer<typeof workId>;
