import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router';
import { useMay } from '../../lib/session.ts';
import { EmptyState } from '../../ui/EmptyState.tsx';
import { ErrorState } from '../../ui/ErrorState.tsx';
import { Loading } from '../../ui/Loading.tsx';
import { Pager } from '../../ui/Pager.tsx';
import { TrialFilters } from './TrialFilters.tsx';
import { trialPageQuery } from './trialQueries.ts';
import {
  changeTrialSearch,
  readTrialSearch,
  trialPageSize,
  trialQueryString,
} from './trialSearch.ts';
import { TrialTable } from './TrialTable.tsx';

/** The trial table with its filters and pages, all of it in the URL. */
export function TrialBrowser({ fixtureId }: { fixtureId: number }) {
  const [params, setParams] = useSearchParams();
  const mayExclude = useMay('excludeTrials');
  const search = readTrialSearch(params);
  const page = useQuery(trialPageQuery(fixtureId, trialQueryString(search)));
  const change = (next: Parameters<typeof changeTrialSearch>[1]) => {
    setParams(changeTrialSearch(params, next), { preventScrollReset: true });
  };
  return (
    <>
      <TrialFilters fixtureId={fixtureId} search={search} change={change} />
      {page.isPending && <Loading />}
      {page.isError && <ErrorState error={page.error} retry={() => void page.refetch()} />}
      {page.data?.total === 0 && (
        <EmptyState title="No trial is like that">
          <button
            type="button"
            className="cursor-pointer text-accent underline"
            onClick={() => setParams({}, { preventScrollReset: true })}
          >
            Show all trials
          </button>
        </EmptyState>
      )}
      {page.data !== undefined && page.data.total > 0 && (
        <>
          <p className="mb-2 text-sm text-muted" role="status">
            {page.data.total} {page.data.total === 1 ? 'trial' : 'trials'}
          </p>
          <TrialTable
            trials={page.data.items}
            sort={search.sort}
            setSort={(sort) => change({ sort })}
            mayExclude={mayExclude}
          />
          <Pager
            page={search.page}
            pageSize={trialPageSize}
            total={page.data.total}
            go={(next) => change({ page: String(next) })}
          />
        </>
      )}
    </>
  );
}
