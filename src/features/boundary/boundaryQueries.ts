import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type {
  Boundary,
  StoredAnalysis,
  StoredAnalysisInput,
  StoredAnalysisList,
} from '../../../shared/schemas/analysis.ts';
import type { Fixture } from '../../../shared/schemas/fixture.ts';
import type { FrictionTests } from '../../../shared/schemas/frictionTest.ts';
import type { Trial } from '../../../shared/schemas/trial.ts';
import { api } from '../../lib/api.ts';
import { everyPage } from '../../lib/everyPage.ts';

const base = (id: number) => `/api/fixtures/${id}`;

/** The analysis of the trials as they are now. */
export const boundaryQuery = (id: number) =>
  queryOptions({
    queryKey: ['fixture', id, 'boundary'],
    queryFn: ({ signal }) => api<Boundary>(`${base(id)}/boundary`, { signal }),
  });

/** Every trial of the fixture, excluded ones included. */
export const everyTrialQuery = (id: number) =>
  queryOptions({
    queryKey: ['fixture', id, 'trials', 'every'],
    queryFn: ({ signal }) => everyPage<Trial>(`${base(id)}/trials`, signal),
  });

/** The drive's highest acceleration, rad/s². */
export const driveLimitQuery = (id: number) =>
  queryOptions({
    queryKey: ['fixture', id, 'drive limit'],
    queryFn: async ({ signal }) => (await api<Fixture>(base(id), { signal })).drive.maxAcceleration,
  });

/** What the friction tests say together. */
export const benchFrictionQuery = (id: number) =>
  queryOptions({
    queryKey: ['fixture', id, 'bench friction'],
    queryFn: async ({ signal }) => {
      const tests = await api<FrictionTests>(`${base(id)}/friction-tests`, { signal });
      return { kinetic: tests.kinetic, static: tests.static };
    },
  });

/** Analyses that were kept, newest first. */
export const analysesQuery = (id: number) =>
  queryOptions({
    queryKey: ['fixture', id, 'analyses'],
    queryFn: ({ signal }) => api<StoredAnalysisList>(`${base(id)}/analyses`, { signal }),
  });

/** Keeps the analysis of the trials as they are now. */
export function useSaveAnalysis(id: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: StoredAnalysisInput) =>
      api<StoredAnalysis>(`${base(id)}/analyses`, { method: 'POST', body: input }),
    onSuccess: () => client.invalidateQueries({ queryKey: ['fixture', id] }),
  });
}
