import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { Configuration } from '../../../shared/schemas/configuration.ts';
import type { Page } from '../../../shared/schemas/common.ts';
import type { Trial, TrialPatch } from '../../../shared/schemas/trial.ts';
import type {
  LogAnswer,
  LogMappingInput,
  TrialLog,
  TrialLogList,
} from '../../../shared/schemas/trialLog.ts';
import { api } from '../../lib/api.ts';
import { everyPage } from '../../lib/everyPage.ts';

const base = (id: number) => `/api/fixtures/${id}`;

/** A page of trials; the page before stays on the screen while the next one comes. */
export const trialPageQuery = (id: number, query: string) =>
  queryOptions({
    queryKey: ['fixture', id, 'trials', query],
    queryFn: ({ signal }) => api<Page<Trial>>(`${base(id)}/trials?${query}`, { signal }),
    placeholderData: (before) => before,
  });

/** Every trial, for the run-order picture. */
export const allTrialsQuery = (id: number) =>
  queryOptions({
    queryKey: ['fixture', id, 'trials', 'every'],
    queryFn: ({ signal }) => everyPage<Trial>(`${base(id)}/trials`, signal),
  });

/** Labels to filter by, in the order of the slide. */
export const labelsQuery = (id: number) =>
  queryOptions({
    queryKey: ['fixture', id, 'labels'],
    queryFn: async ({ signal }) => {
      const { items } = await api<{ items: Configuration[] }>(`${base(id)}/configurations`, {
        signal,
      });
      return items.map(({ label }) => label);
    },
  });

/** Uploaded logs, newest first. */
export const logsQuery = (id: number) =>
  queryOptions({
    queryKey: ['fixture', id, 'logs'],
    queryFn: ({ signal }) => api<TrialLogList>(`${base(id)}/logs`, { signal }),
  });

/** One log with its refused rows; it never changes. */
export const logQuery = (logId: number) =>
  queryOptions({
    queryKey: ['log', logId],
    queryFn: ({ signal }) => api<TrialLog>(`/api/logs/${logId}`, { signal }),
    staleTime: Number.POSITIVE_INFINITY,
  });

function formOf(file: File, mapping: LogMappingInput): FormData {
  const form = new FormData();
  form.set('mapping', JSON.stringify(mapping));
  form.set('file', file);
  return form;
}

/** What storing the file would do, under what was said about it so far. */
export const dryRunQuery = (id: number, file: File, taken: number, mapping: LogMappingInput) =>
  queryOptions({
    queryKey: ['dry run', id, taken, mapping],
    queryFn: ({ signal }) =>
      api<LogAnswer>(`${base(id)}/logs?dryRun=true`, {
        method: 'POST',
        body: formOf(file, mapping),
        signal,
      }),
    // the controls stay in place while a change of them is read
    placeholderData: (before) => before,
    staleTime: Number.POSITIVE_INFINITY,
    gcTime: 60_000,
  });

/** Everything that may say something else once trials have come or gone. */
function useForgetFixture(id: number) {
  const client = useQueryClient();
  return () =>
    Promise.all(
      [['fixture', id], ['fixtures'], ['overview']].map((queryKey) =>
        client.invalidateQueries({ queryKey }),
      ),
    );
}

export function useStoreLog(id: number) {
  const forget = useForgetFixture(id);
  return useMutation({
    mutationFn: ({ file, mapping }: { file: File; mapping: LogMappingInput }) =>
      api<LogAnswer>(`${base(id)}/logs`, { method: 'POST', body: formOf(file, mapping) }),
    onSuccess: forget,
  });
}

/** Excludes a trial or takes it back in. */
export function useChangeTrial(fixtureId: number) {
  const forget = useForgetFixture(fixtureId);
  return useMutation({
    mutationFn: ({ id, ...body }: TrialPatch & { id: number }) =>
      api<Trial>(`/api/trials/${id}`, { method: 'PATCH', body }),
    onSuccess: forget,
  });
}
