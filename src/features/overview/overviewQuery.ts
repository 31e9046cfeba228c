import { queryOptions } from '@tanstack/react-query';
import type { Overview } from '../../../shared/schemas/overview.ts';
import { api } from '../../lib/api.ts';

export const overviewQuery = queryOptions({
  queryKey: ['overview'],
  queryFn: ({ signal }) => api<Overview>('/api/overview', { signal }),
});
