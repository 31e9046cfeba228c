import type { ReactNode } from 'react';

export type Column<Row> = {
  key: string;
  title: ReactNode;
  /** Shown under the title, such as "rad/s²". */
  unit?: string;
  numeric?: boolean;
  cell: (row: Row) => ReactNode;
};

type DataTableProps<Row> = {
  caption: string;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string | number;
  /** How the table is ordered, by column key. */
  sorted?: { key: string; direction: 'ascending' | 'descending' };
};

/** A table that scrolls within its own region on narrow screens. Numbers stand right-aligned. */
export function DataTable<Row>({ caption, columns, rows, rowKey, sorted }: DataTableProps<Row>) {
  return (
    <div className="relative overflow-x-auto" tabIndex={0} role="region" aria-label={caption}>
      <table className="w-full border-collapse text-sm">
        <caption className="sr-only">{caption}</caption>
        <thead>
          <tr className="border-b border-control">
            {columns.map(({ key, title, unit, numeric }) => (
              <th
                key={key}
                scope="col"
                aria-sort={sorted?.key === key ? sorted.direction : undefined}
                className={`px-2 py-1.5 align-bottom font-bold ${numeric ? 'text-right' : 'text-left'}`}
              >
                {title}
                {unit !== undefined && <span className="block font-normal text-muted">{unit}</span>}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={rowKey(row)} className="border-b border-line hover:bg-hover">
              {columns.map(({ key, numeric, cell }) => (
                <td key={key} className={`px-2 py-1.5 align-top ${numeric ? 'text-right' : ''}`}>
                  {cell(row)}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
