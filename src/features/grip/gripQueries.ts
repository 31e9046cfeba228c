import { queryOptions } from '@tanstack/react-query';
import type { FrictionTests } from '../../../shared/schemas/frictionTest.ts';
import { api } from '../../lib/api.ts';

export const gripQuery = (id: number) =>
  queryOptions({
    queryKey: ['fixture', id, 'friction tests'],
    queryFn: ({ signal }) => api<FrictionTests>(`/api/fixtures/${id}/friction-tests`, { signal }),
  });
