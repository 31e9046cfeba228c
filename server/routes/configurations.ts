import { z } from 'zod';
import {
  configurationInputSchema,
  configurationPatchSchema,
  configurationSchema,
} from '../../shared/schemas/configuration.ts';
import { defineRoute } from '../http/defineRoute.ts';
import {
  addConfiguration,
  changeConfiguration,
  listConfigurations,
} from '../services/configurations.ts';

export const configurationRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/fixtures/:id/configurations',
    access: 'read',
    summary: 'Mass positions with their inertia',
    answers: { 200: z.object({ items: z.array(configurationSchema) }) },
    async handle({ params, deps }) {
      const items = await listConfigurations(deps.dataSource.manager, params.id);
      return { status: 200, body: { items } };
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/fixtures/:id/configurations',
    access: 'editFixtures',
    summary: 'Add a mass position',
    body: configurationInputSchema,
    answers: { 201: configurationSchema },
    async handle({ params, body, user, deps }) {
      return { status: 201, body: await addConfiguration(deps, params.id, body, user) };
    },
  }),
  defineRoute({
    method: 'patch',
    path: '/api/configurations/:id',
    access: 'editFixtures',
    summary: 'Change a mass position or its measured inertia',
    body: configurationPatchSchema,
    answers: { 200: configurationSchema },
    async handle({ params, body, user, deps }) {
      return { status: 200, body: await changeConfiguration(deps, params.id, body, user) };
    },
  }),
];
