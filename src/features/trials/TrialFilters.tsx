import { useQuery } from '@tanstack/react-query';
import { outcomes } from '../../../shared/schemas/trial.ts';
import { SelectField } from '../../ui/SelectField.tsx';
import { labelsQuery, logsQuery } from './trialQueries.ts';
import type { TrialSearch } from './trialSearch.ts';

interface TrialFiltersProps {
  fixtureId: number;
  search: TrialSearch;
  change: (change: Partial<Record<keyof TrialSearch, string | null>>) => void;
}

/** What of the trials is shown; every choice is kept in the URL. */
export function TrialFilters({ fixtureId, search, change }: TrialFiltersProps) {
  const labels = useQuery(labelsQuery(fixtureId)).data ?? [];
  const logs = useQuery(logsQuery(fixtureId)).data?.items ?? [];
  const all = { value: '', text: 'all' };
  return (
    <div className="mb-3 grid gap-3 sm:grid-cols-2 lg:grid-cols-4 print:hidden">
      <SelectField
        label="Configuration"
        value={search.configuration ?? ''}
        options={[all, ...labels]}
        onChange={(event) => change({ configuration: event.target.value })}
      />
      <SelectField
        label="Outcome"
        value={search.outcome ?? ''}
        options={[all, ...outcomes]}
        onChange={(event) => change({ outcome: event.target.value })}
      />
      <SelectField
        label="Excluded"
        value={search.excluded ?? ''}
        options={[
          { value: '', text: 'shown too' },
          { value: 'false', text: 'left out' },
          { value: 'true', text: 'only these' },
        ]}
        onChange={(event) => change({ excluded: event.target.value })}
      />
      <SelectField
        label="Log"
        value={search.log ?? ''}
        options={[all, ...logs.map(({ id, fileName }) => ({ value: String(id), text: fileName }))]}
        onChange={(event) => change({ log: event.target.value })}
      />
    </div>
  );
}
