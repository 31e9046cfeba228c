import {
  frictionTestInputSchema,
  frictionTestPatchSchema,
  frictionTestSchema,
  frictionTestsSchema,
} from '../../shared/schemas/frictionTest.ts';
import { defineRoute } from '../http/defineRoute.ts';
import {
  addFrictionTest,
  changeFrictionTest,
  listFrictionTests,
} from '../services/frictionTests.ts';

export const frictionTestRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/fixtures/:id/friction-tests',
    access: 'read',
    summary: 'Friction tests, and what they say together',
    answers: { 200: frictionTestsSchema },
    async handle({ params, deps }) {
      return { status: 200, body: await listFrictionTests(deps, params.id) };
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/fixtures/:id/friction-tests',
    access: 'editFixtures',
    summary: 'Enter incline readings',
    body: frictionTestInputSchema,
    answers: { 201: frictionTestSchema },
    async handle({ params, body, user, deps }) {
      return { status: 201, body: await addFrictionTest(deps, params.id, body, user) };
    },
  }),
  defineRoute({
    method: 'patch',
    path: '/api/friction-tests/:id',
    access: 'editFixtures',
    summary: 'Exclude or restore a friction test with a reason',
    body: frictionTestPatchSchema,
    answers: { 200: frictionTestSchema },
    async handle({ params, body, user, deps }) {
      return { status: 200, body: await changeFrictionTest(deps, params.id, body, user) };
    },
  }),
];
