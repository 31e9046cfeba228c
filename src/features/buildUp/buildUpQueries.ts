import { queryOptions } from '@tanstack/react-query';
import type { BuildUp } from '../../../shared/schemas/buildUp.ts';
import type { Configuration } from '../../../shared/schemas/configuration.ts';
import { api } from '../../lib/api.ts';

/** Every revision, newest first; empty before the first. */
export const buildUpsQuery = (id: number) =>
  queryOptions({
    queryKey: ['fixture', id, 'build-ups'],
    queryFn: ({ signal }) =>
      api<{ items: BuildUp[] }>(`/api/fixtures/${id}/build-up/revisions`, { signal }),
  });

/** Mass positions in order, with the inertia in force. */
export const positionsQuery = (id: number) =>
  queryOptions({
    queryKey: ['fixture', id, 'configurations'],
    queryFn: ({ signal }) =>
      api<{ items: Configuration[] }>(`/api/fixtures/${id}/configurations`, { signal }),
  });
