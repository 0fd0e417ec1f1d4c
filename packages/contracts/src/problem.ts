import { z } from 'zod';

/** An error as every answer gives it, RFC 9457. `type` is `/problems/<slug>`. */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  detail: z.string(),
  instance: z.string(),
  requestId: z.string(),
  errors: z.array(z.object({ pointer: z.string(), code: z.string(), message: z.string() })).optional(),
});
export type ProblemBody = z.infer<typeof problemSchema>;
