import { Link, useParams } from 'react-router';
import type { Boundary, ConfigurationResult } from '../../../shared/schemas/analysis.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';
import { VerdictMark } from '../../charts/VerdictMark.tsx';
import { DataTable, type Column } from '../../ui/DataTable.tsx';

type Row = Boundary['positions'][number] & { result: ConfigurationResult | null };

const down = { rounding: 'down' } as const;

/** Every mass position with its inertia, what theory and trials say, and its verdict. */
export function ConfigurationTable({ boundary }: { boundary: Boundary }) {
  const { id = '' } = useParams();
  const results = new Map(boundary.result?.configurations.map((one) => [one.label, one]));
  const rows: Row[] = boundary.positions.map((position) => ({
    ...position,
    result: results.get(position.label) ?? null,
  }));
  if (rows.length === 0) {
    return (
      <p>
        No positions yet.{' '}
        <Link to={`/fixtures/${id}/build-up`}>Enter the build-up and its positions</Link>.
      </p>
    );
  }
  return (
    <DataTable caption="Positions" columns={columns(id)} rows={rows} rowKey={(row) => row.label} />
  );
}

function columns(id: string): Column<Row>[] {
  return [
    {
      key: 'label',
      title: 'Position',
      cell: ({ label }) => (
        <Link
          to={`/fixtures/${id}/boundary?position=${encodeURIComponent(label)}`}
          className="font-bold underline"
        >
          {label}
        </Link>
      ),
    },
    {
      key: 'verdict',
      title: 'Verdict',
      cell: ({ result }) =>
        result === null ? 'no trials' : <VerdictMark verdict={result.verdict} />,
    },
    {
      key: 'inertia',
      title: 'Inertia',
      unit: 'kg·m²',
      numeric: true,
      cell: ({ inertia }) => formatQuantity(inertia),
    },
    {
      key: 'holding',
      title: 'Holding bound',
      unit: 'rad/s²',
      numeric: true,
      cell: ({ result }) => formatQuantity(result?.theory.holding),
    },
    {
      key: 'lettingGo',
      title: 'Letting-go bound',
      unit: 'rad/s²',
      numeric: true,
      cell: ({ result }) => formatQuantity(result?.theory.lettingGo),
    },
    {
      key: 'limit',
      title: 'Working limit',
      unit: 'rad/s²',
      numeric: true,
      cell: ({ result }) => formatQuantity(result?.workingLimit, down),
    },
    {
      key: 'trials',
      title: 'Slips of trials',
      numeric: true,
      cell: ({ result }) => (result === null ? '–' : `${result.slips} of ${result.trials}`),
    },
  ];
}
