import {
  trialPageSchema,
  trialPatchSchema,
  trialQuerySchema,
  trialSchema,
} from '../../shared/schemas/trial.ts';
import { defineRoute } from '../http/defineRoute.ts';
import { changeTrial, listTrials } from '../services/trials.ts';

export const trialRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/fixtures/:id/trials',
    access: 'read',
    summary: 'Trials, filtered, sorted and paged',
    query: trialQuerySchema,
    answers: { 200: trialPageSchema },
    async handle({ params, query, deps }) {
      return { status: 200, body: await listTrials(deps, params.id, query) };
    },
  }),
  defineRoute({
    method: 'patch',
    path: '/api/trials/:id',
    access: 'excludeTrials',
    summary: 'Exclude or restore a trial with a reason',
    body: trialPatchSchema,
    answers: { 200: trialSchema },
    async handle({ params, body, user, deps }) {
      return { status: 200, body: await changeTrial(deps, params.id, body, user) };
    },
  }),
];
