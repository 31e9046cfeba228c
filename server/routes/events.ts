import { eventPageSchema, eventQuerySchema } from '../../shared/schemas/event.ts';
import { defineRoute } from '../http/defineRoute.ts';
import { listEvents } from '../services/listEvents.ts';

export const eventRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/fixtures/:id/events',
    access: 'read',
    summary: "A fixture's event log, newest first",
    query: eventQuerySchema,
    answers: { 200: eventPageSchema },
    async handle({ params, query, deps }) {
      return { status: 200, body: await listEvents(deps.dataSource, params.id, query) };
    },
  }),
];
