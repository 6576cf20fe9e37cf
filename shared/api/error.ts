import { z } from 'zod';

/** The one error shape of every answer that is not a success. `fields` ties sentences to request paths. */
export const errorAnswer = z.object({
  error: z.object({
    code: z.string(),
    message: z.string(),
    fields: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
  }),
});
export type ErrorAnswer = z.infer<typeof errorAnswer>;
