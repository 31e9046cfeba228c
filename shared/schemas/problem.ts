import { z } from 'zod';

/** RFC 9457 problem document; `errors` names the field or the row and the remedy. */
export const problemSchema = z
  .object({
    type: z.string(),
    title: z.string(),
    status: z.number().int(),
    detail: z.string().optional(),
    errors: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
    current: z.unknown().optional().describe('the present state, with 409 on a stale version'),
  })
  .meta({ id: 'Problem' });

export type Problem = z.infer<typeof problemSchema>;
