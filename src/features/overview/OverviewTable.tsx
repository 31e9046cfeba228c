import { Link } from 'react-router';
import type { OverviewRow } from '../../../shared/schemas/overview.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';
import { VerdictWord } from '../../charts/VerdictWord.tsx';
import { DataTable } from '../../ui/DataTable.tsx';
import { partsChange } from './partsChange.ts';

/** One row a fixture, the worst verdict first. */
export function OverviewTable({ rows }: { rows: readonly OverviewRow[] }) {
  return (
    <DataTable
      caption="Fixtures, the worst verdict first"
      rows={rows}
      rowKey={({ fixtureId }) => fixtureId}
      columns={[
        { key: 'fixture', title: 'Fixture', cell: (row) => <FixtureCell row={row} /> },
        { key: 'line', title: 'Line', cell: ({ line }) => line },
        {
          key: 'verdict',
          title: 'Verdict',
          cell: ({ verdict }) => <VerdictWord verdict={verdict} />,
        },
        {
          key: 'position',
          title: 'Tightest',
          cell: ({ fixtureId, tightest }) =>
            tightest === null ? (
              '–'
            ) : (
              <Link to={positionOf(fixtureId, tightest.label)}>{tightest.label}</Link>
            ),
        },
        {
          key: 'limit',
          title: 'Limit',
          unit: 'rad/s²',
          numeric: true,
          cell: ({ tightest }) => formatQuantity(tightest?.limit, { rounding: 'down' }),
        },
        {
          key: 'mu50',
          title: 'μ fitted',
          numeric: true,
          cell: ({ mu50 }) => formatQuantity(mu50.estimate, { decimals: 3 }),
        },
        {
          key: 'bench',
          title: 'μ bench',
          numeric: true,
          cell: ({ benchMu }) => formatQuantity(benchMu, { decimals: 3 }),
        },
        { key: 'margin', title: 'Margin', cell: ({ margin }) => margin },
        { key: 'rate', title: 'Parts/h', numeric: true, cell: (row) => partsChange(row).rate },
        { key: 'change', title: 'Δ theory', numeric: true, cell: (row) => partsChange(row).change },
      ]}
    />
  );
}

/** The same rows for a narrow screen: one card each, nothing to scroll sideways. */
export function OverviewCards({ rows }: { rows: readonly OverviewRow[] }) {
  return (
    <ul className="divide-y divide-line">
      {rows.map((row) => {
        return (
          <li key={row.fixtureId} className="py-3 first:pt-0 last:pb-0">
            <div className="flex flex-wrap items-baseline justify-between gap-x-3">
              <FixtureCell row={row} />
              <VerdictWord verdict={row.verdict} />
            </div>
            <p className="mt-1 text-sm text-muted">{facts(row).join(' · ')}</p>
          </li>
        );
      })}
    </ul>
  );
}

/** What is known of a fixture, in few words; what is not known is left out. */
function facts(row: OverviewRow): string[] {
  const { rate, change } = partsChange(row);
  const mu = (value: number | null) => formatQuantity(value, { decimals: 3 });
  return [
    row.line,
    row.tightest === null
      ? 'no limit yet'
      : `tightest ${row.tightest.label} at ${formatQuantity(row.tightest.limit, { rounding: 'down' })} rad/s²`,
    ...(row.mu50.estimate === null ? [] : [`μ fitted ${mu(row.mu50.estimate)}`]),
    ...(row.benchMu === null ? [] : [`μ bench ${mu(row.benchMu)}`]),
    `margin: ${row.margin}`,
    ...(rate === '–' ? [] : [`${rate} parts/h (${change} against theory)`]),
  ];
}

function FixtureCell({ row }: { row: OverviewRow }) {
  return (
    <span>
      <Link to={`/fixtures/${row.fixtureId}/boundary`} className="font-bold underline">
        {row.code}
      </Link>{' '}
      <span className="text-muted">{row.name}</span>
    </span>
  );
}

function positionOf(fixtureId: number, label: string): string {
  return `/fixtures/${fixtureId}/boundary?position=${encodeURIComponent(label)}`;
}
