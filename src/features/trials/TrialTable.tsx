import { useState } from 'react';
import type { Trial } from '../../../shared/schemas/trial.ts';
import { MarkGlyph } from '../../charts/MarkGlyph.tsx';
import { outcomeMarks } from '../../charts/outcomeMarks.ts';
import { trialWords } from '../../charts/trialWords.ts';
import { type Column, DataTable } from '../../ui/DataTable.tsx';
import { ExcludeDialog } from './ExcludeDialog.tsx';
import { SortHead } from './SortHead.tsx';
import { sortState, trialColumns } from './trialColumns.ts';
import type { TrialSearch } from './trialSearch.ts';

interface TrialTableProps {
  trials: readonly Trial[];
  sort: TrialSearch['sort'];
  setSort: (sort: TrialSearch['sort']) => void;
  mayExclude: boolean;
}

/** Trials as they were stored; the heads sort, the last column excludes and restores. */
export function TrialTable({ trials, sort, setSort, mayExclude }: TrialTableProps) {
  const [asked, setAsked] = useState<Trial | null>(null);
  const sorted = trialColumns.find((column) => sortState(sort, column.sort) !== 'none');
  const direction = sort.startsWith('-') ? 'descending' : 'ascending';
  const plain = trialColumns.map(({ title, unit, sort: by, number, text }): Column<Trial> => ({
    key: title,
    title: <SortHead title={title} by={by} sort={sort} setSort={setSort} />,
    ...(unit === undefined ? {} : { unit }),
    numeric: number,
    cell: text,
  }));
  const outcome: Column<Trial> = {
    key: 'Outcome',
    title: <SortHead title="Outcome" by="outcome" sort={sort} setSort={setSort} />,
    cell: (trial) => <OutcomeCell trial={trial} />,
  };
  const action: Column<Trial> = {
    key: 'action',
    title: <span className="sr-only">Exclude or restore</span>,
    cell: (trial) => (
      <button
        type="button"
        className="cursor-pointer rounded px-1.5 py-0.5 font-bold whitespace-nowrap text-accent hover:underline print:hidden"
        aria-label={`${trial.excluded ? 'Restore' : 'Exclude'} ${trialWords(trial)}`}
        onClick={() => setAsked(trial)}
      >
        {trial.excluded ? 'Restore…' : 'Exclude…'}
      </button>
    ),
  };
  return (
    <>
      <DataTable
        caption="Trials"
        columns={[
          ...plain.slice(0, 3),
          outcome,
          ...plain.slice(3),
          ...(mayExclude ? [action] : []),
        ]}
        rows={trials}
        rowKey={({ id }) => id}
        sorted={{ key: sorted?.title ?? 'Outcome', direction }}
      />
      {asked !== null && <ExcludeDialog trial={asked} close={() => setAsked(null)} />}
    </>
  );
}

function OutcomeCell({ trial }: { trial: Trial }) {
  const { symbol, excludedSymbol, word } = outcomeMarks[trial.outcome];
  if (!trial.excluded) {
    return (
      <span className="whitespace-nowrap">
        <MarkGlyph shape={symbol} className={outcomeMarks[trial.outcome].textClass} /> {word}
      </span>
    );
  }
  return (
    <span>
      <span className="whitespace-nowrap text-muted">
        <MarkGlyph shape={excludedSymbol} /> {word}, excluded
      </span>
      <span className="block max-w-56 text-muted">
        {trial.excludedReason} ({trial.excludedBy})
      </span>
    </span>
  );
}
