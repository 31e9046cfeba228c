import { outcomes, type Outcome, trialSorts } from '../../../shared/schemas/trial.ts';

/** What the trial table shows, as it stands in the URL. */
export interface TrialSearch {
  configuration: string | null;
  outcome: Outcome | null;
  excluded: 'true' | 'false' | null;
  log: string | null;
  sort: (typeof trialSorts)[number];
  page: number;
}

export const trialPageSize = 50;

const oneOf = <T extends string>(allowed: readonly T[], value: string | null): T | null =>
  allowed.find((one) => one === value) ?? null;

/** Reads the URL; what makes no sense there is left out, as if it had not been written. */
export function readTrialSearch(params: URLSearchParams): TrialSearch {
  const page = params.get('page') ?? '';
  return {
    configuration: params.get('configuration') ?? null,
    outcome: oneOf(outcomes, params.get('outcome')),
    excluded: oneOf(['true', 'false'] as const, params.get('excluded')),
    log: /^[1-9][0-9]{0,14}$/.test(params.get('log') ?? '') ? params.get('log') : null,
    sort: oneOf(trialSorts, params.get('sort')) ?? 'id',
    page: /^[1-9][0-9]{0,6}$/.test(page) ? Number(page) : 1,
  };
}

/** The query of `GET …/trials` for what is shown. */
export function trialQueryString(search: TrialSearch): string {
  const query = new URLSearchParams();
  if (search.configuration !== null) query.set('configuration', search.configuration);
  if (search.outcome !== null) query.set('outcome', search.outcome);
  if (search.excluded !== null) query.set('excluded', search.excluded);
  if (search.log !== null) query.set('log', search.log);
  query.set('sort', search.sort);
  query.set('page', String(search.page));
  query.set('pageSize', String(trialPageSize));
  return query.toString();
}

/** The URL with one thing changed; any change but that of the page starts again at page 1. */
export function changeTrialSearch(
  params: URLSearchParams,
  change: Partial<Record<keyof TrialSearch, string | null>>,
): URLSearchParams {
  const next = new URLSearchParams(params);
  if (!('page' in change)) next.delete('page');
  for (const [name, value] of Object.entries(change)) {
    if (value === null || value === '') next.delete(name);
    else next.set(name, value);
  }
  return next;
}
