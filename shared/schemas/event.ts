import { z } from 'zod';
import { idSchema, instantSchema, pageOf, pageQuery } from './common.ts';

/** One line of the append-only event log. */
export const eventSchema = z
  .object({
    id: idSchema,
    at: instantSchema,
    actor: z.string().nullable().describe('name of the person; null = the system'),
    action: z.string().describe("what was done, such as 'trial excluded'"),
    objectType: z.string(),
    objectId: idSchema.nullable(),
    fixtureId: idSchema.nullable(),
    outcome: z.enum(['done', 'refused']),
    summary: z.string(),
    before: z.unknown(),
    after: z.unknown(),
  })
  .meta({ id: 'Event' });

export const eventQuerySchema = z.strictObject({
  action: z.string().max(60).optional(),
  ...pageQuery,
});

export const eventPageSchema = pageOf(eventSchema).meta({ id: 'EventPage' });

export type EventEntry = z.infer<typeof eventSchema>;
