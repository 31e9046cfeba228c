import { queryOptions, useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router';
import type { Page } from '../../../shared/schemas/common.ts';
import type { EventEntry } from '../../../shared/schemas/event.ts';
import { api } from '../../lib/api.ts';
import { formatMinute } from '../../lib/formatDate.ts';
import { EmptyState } from '../../ui/EmptyState.tsx';
import { ErrorState } from '../../ui/ErrorState.tsx';
import { Loading } from '../../ui/Loading.tsx';
import { Pager } from '../../ui/Pager.tsx';
import { SelectField } from '../../ui/SelectField.tsx';
import { EventChange } from './EventChange.tsx';

/** What a fixture's events are called. */
const actions = [
  'fixture created',
  'fixture changed',
  'build-up revised',
  'configuration added',
  'configuration changed',
  'friction test added',
  'friction test excluded',
  'friction test restored',
  'log stored',
  'trial excluded',
  'trial restored',
  'analysis saved',
];

const eventsQuery = (id: number, search: string) =>
  queryOptions({
    queryKey: ['fixture', id, 'events', search],
    queryFn: ({ signal }) =>
      api<Page<EventEntry>>(`/api/fixtures/${id}/events?${search}`, { signal }),
    placeholderData: (before) => before,
  });

/** The event log of a fixture, newest first. */
export function EventList({ fixtureId }: { fixtureId: number }) {
  const [search, setSearch] = useSearchParams();
  const { data, error, refetch } = useQuery(eventsQuery(fixtureId, search.toString()));
  const change = (key: string, value: string) => {
    const next = new URLSearchParams(search);
    if (value === '') next.delete(key);
    else next.set(key, value);
    if (key !== 'page') next.delete('page');
    setSearch(next, { replace: key !== 'page' });
  };
  return (
    <>
      <SelectField
        label="What was done"
        className="mb-4 max-w-xs print:hidden"
        value={search.get('action') ?? ''}
        onChange={(event) => change('action', event.target.value)}
        options={[{ value: '', text: 'Everything' }, ...actions]}
      />
      {error !== null && <ErrorState error={error} retry={() => void refetch()} />}
      {error === null && data === undefined && <Loading />}
      {data?.total === 0 && <EmptyState title="Nothing of the kind has happened yet." />}
      {data !== undefined && data.total > 0 && (
        <>
          <ol className="divide-y divide-line border-y border-line">
            {data.items.map((event) => (
              <li
                key={event.id}
                className="grid gap-x-4 gap-y-0.5 py-2.5 sm:grid-cols-[11rem_11rem_1fr]"
              >
                <time dateTime={event.at} className="text-sm text-muted">
                  {formatMinute(event.at)}
                </time>
                <span className="text-sm">{event.actor ?? 'the system'}</span>
                <div className="min-w-0">
                  <p>
                    <span className="font-bold">{event.action}</span> {event.summary}
                  </p>
                  <EventChange before={event.before} after={event.after} />
                </div>
              </li>
            ))}
          </ol>
          <Pager
            page={data.page}
            pageSize={data.pageSize}
            total={data.total}
            go={(page) => change('page', String(page))}
          />
        </>
      )}
    </>
  );
}
