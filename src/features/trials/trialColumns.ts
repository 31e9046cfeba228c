import { type Trial, type trialSorts } from '../../../shared/schemas/trial.ts';
import { fromRadians } from '../../../shared/units/angle.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';

type Sort = (typeof trialSorts)[number];

type SortKey = 'id' | 'acceleration' | 'configuration' | 'order' | 'outcome';

/** One column of the trial table. */
export interface TrialColumn {
  title: string;
  unit?: string;
  /** the sort key of the server, where it can sort by it */
  sort: SortKey | null;
  number: boolean;
  text: (trial: Trial) => string;
}

export const trialColumns: readonly TrialColumn[] = [
  { title: 'Row', sort: 'id', number: true, text: ({ row }) => String(row) },
  {
    title: 'Configuration',
    sort: 'configuration',
    number: false,
    text: ({ configuration }) => configuration,
  },
  {
    title: 'Acceleration',
    unit: 'rad/s²',
    sort: 'acceleration',
    number: true,
    text: ({ acceleration }) => formatQuantity(acceleration, { digits: 4 }),
  },
  {
    title: 'Order',
    sort: 'order',
    number: true,
    text: ({ order }) => formatQuantity(order, { digits: 6, decimals: 0 }),
  },
  {
    title: 'Slip',
    unit: '°',
    sort: null,
    number: true,
    text: ({ slipAngle }) => (slipAngle === null ? '–' : formatQuantity(fromRadians(slipAngle))),
  },
  { title: 'Judged by', sort: null, number: false, text: ({ judgedBy }) => judgedBy ?? '–' },
  { title: 'Part', sort: null, number: false, text: ({ part }) => part ?? '–' },
  { title: 'Seating', sort: null, number: false, text: ({ seating }) => seating ?? '–' },
  { title: 'Batch', sort: null, number: false, text: ({ batch }) => batch ?? '–' },
];

/** The sort after pressing a column's head: up first, then down. */
export function nextSort(current: Sort, column: SortKey): Sort {
  return current === column ? `-${column}` : column;
}

/** `aria-sort` of a column under the present sort. */
export function sortState(
  current: Sort,
  column: TrialColumn['sort'],
): 'ascending' | 'descending' | 'none' {
  if (current === column) return 'ascending';
  return current === `-${column ?? ''}` ? 'descending' : 'none';
}
