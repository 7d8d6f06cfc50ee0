import { z } from 'zod';

/** RFC 9457 problem details; `errors` carries JSON pointers into the request body. */
export const problem = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string().optional(),
  instance: z.string().optional(),
  /** Closed per feature, e.g. "stock-gone". */
  code: z.string().optional(),
  errors: z.array(z.object({ pointer: z.string(), detail: z.string() })).optional(),
});
export type Problem = z.infer<typeof problem>;
