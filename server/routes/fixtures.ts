import { z } from 'zod';
import {
  buildUpInputSchema,
  buildUpQuerySchema,
  buildUpSchema,
} from '../../shared/schemas/buildUp.ts';
import {
  fixtureInputSchema,
  fixturePageSchema,
  fixturePatchSchema,
  fixtureQuerySchema,
  fixtureSchema,
} from '../../shared/schemas/fixture.ts';
import { defineRoute } from '../http/defineRoute.ts';
import { getBuildUp, listBuildUps, reviseBuildUp } from '../services/buildUps.ts';
import { changeFixture, createFixture, getFixture } from '../services/fixtures.ts';
import { listFixtures } from '../services/listFixtures.ts';

export const fixtureRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/fixtures',
    access: 'read',
    summary: 'Fixtures, searched, filtered, sorted and paged',
    query: fixtureQuerySchema,
    answers: { 200: fixturePageSchema },
    async handle({ query, deps }) {
      return { status: 200, body: await listFixtures(deps, query) };
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/fixtures',
    access: 'editFixtures',
    summary: 'Create a fixture',
    body: fixtureInputSchema,
    answers: { 201: fixtureSchema },
    async handle({ body, user, deps }) {
      return { status: 201, body: await createFixture(deps, body, user) };
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/fixtures/:id',
    access: 'read',
    summary: 'One fixture',
    answers: { 200: fixtureSchema },
    async handle({ params, deps }) {
      return { status: 200, body: await getFixture(deps, params.id) };
    },
  }),
  defineRoute({
    method: 'patch',
    path: '/api/fixtures/:id',
    access: 'editFixtures',
    summary: 'Change a fixture',
    body: fixturePatchSchema,
    answers: { 200: fixtureSchema },
    async handle({ params, body, user, deps }) {
      return { status: 200, body: await changeFixture(deps, params.id, body, user) };
    },
  }),
  defineRoute({
    method: 'put',
    path: '/api/fixtures/:id/build-up',
    access: 'editFixtures',
    summary: 'Store the next revision of the build-up',
    body: buildUpInputSchema,
    answers: { 200: buildUpSchema },
    async handle({ params, body, user, deps }) {
      return { status: 200, body: await reviseBuildUp(deps, params.id, body, user) };
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/fixtures/:id/build-up',
    access: 'read',
    summary: 'The current build-up, or a named revision, with its inertia polynomial',
    query: buildUpQuerySchema,
    answers: { 200: buildUpSchema },
    async handle({ params, query, deps }) {
      return { status: 200, body: await getBuildUp(deps, params.id, query.revision) };
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/fixtures/:id/build-up/revisions',
    access: 'read',
    summary: 'Every revision of the build-up, newest first',
    answers: { 200: z.object({ items: z.array(buildUpSchema) }) },
    async handle({ params, deps }) {
      return { status: 200, body: { items: await listBuildUps(deps, params.id) } };
    },
  }),
];
