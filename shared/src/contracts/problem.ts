import { z } from 'zod/mini';

/** RFC 9457 problem details; the body of every answer that is not 2xx. */
export const problemSchema = z.looseObject({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  /** What happened, what is kept, what to do: a sentence for a person. */
  detail: z.string(),
  instance: z.string(),
  requestId: z.string(),
  /** Every fault of a 422, never only the first. */
  errors: z.optional(z.array(z.strictObject({ pointer: z.string(), code: z.string(), message: z.string() }))),
});
export type Problem = z.infer<typeof problemSchema>;
