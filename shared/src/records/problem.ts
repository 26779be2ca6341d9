import { z } from 'zod';

/** One thing that is wrong in a request: where (JSON pointer, RFC 6901) and how to mend it. */
export const ProblemError = z.object({ pointer: z.string(), detail: z.string() });

/** RFC 9457 problem details, with a stable `code` that programs may rely on. */
export const Problem = z.looseObject({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  code: z.string(),
  detail: z.string().optional(),
  errors: z.array(ProblemError).optional(),
});
export type Problem = z.infer<typeof Problem>;
