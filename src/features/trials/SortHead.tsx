import { nextSort, sortState, type TrialColumn } from './trialColumns.ts';
import type { TrialSearch } from './trialSearch.ts';

interface SortHeadProps {
  title: string;
  by: TrialColumn['sort'];
  sort: TrialSearch['sort'];
  setSort: (sort: TrialSearch['sort']) => void;
}

const arrows = { ascending: ' ↑', descending: ' ↓', none: '' } as const;

/** A column's head; where the server can sort by the column it is a button. */
export function SortHead({ title, by, sort, setSort }: SortHeadProps) {
  if (by === null) return title;
  return (
    <button
      type="button"
      className="cursor-pointer font-bold underline decoration-line decoration-dotted underline-offset-4 hover:decoration-ink"
      onClick={() => setSort(nextSort(sort, by))}
    >
      {title}
      <span aria-hidden="true">{arrows[sortState(sort, by)]}</span>
    </button>
  );
}
