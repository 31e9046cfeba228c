import { useState } from 'react';
import type { Configuration } from '../../../shared/schemas/configuration.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';
import { plainNumber } from '../../lib/plainNumber.ts';
import { Button } from '../../ui/Button.tsx';
import { DataTable, type Column } from '../../ui/DataTable.tsx';
import { Panel } from '../../ui/Panel.tsx';
import { PositionDialog } from './PositionDialog.tsx';

type PositionsPanelProps = {
  fixtureId: number;
  positions: readonly Configuration[];
  mayEdit: boolean;
};

/** The mass positions: computed and measured inertia side by side, and their difference. */
export function PositionsPanel({ fixtureId, positions, mayEdit }: PositionsPanelProps) {
  const [editing, setEditing] = useState<Configuration | 'new' | null>(null);
  const columns = columnsOf();
  if (mayEdit) {
    columns.push({
      key: 'edit',
      title: <span className="sr-only">Change</span>,
      cell: (row) => (
        <Button look="quiet" onClick={() => setEditing(row)}>
          Change<span className="sr-only"> {row.label}</span>
        </Button>
      ),
    });
  }
  return (
    <Panel
      title="Positions"
      actions={mayEdit && <Button onClick={() => setEditing('new')}>Add a position</Button>}
    >
      {positions.length === 0 ? (
        <p className="text-muted">
          No positions yet. Trials are made at positions, so add those you will try.
        </p>
      ) : (
        <DataTable
          caption="Positions of the mass"
          columns={columns}
          rows={positions}
          rowKey={(row) => row.id}
        />
      )}
      {editing !== null && (
        <PositionDialog
          fixtureId={fixtureId}
          position={editing === 'new' ? null : editing}
          close={() => setEditing(null)}
        />
      )}
    </Panel>
  );
}

function columnsOf(): Column<Configuration>[] {
  const digits = { digits: 4 };
  return [
    {
      key: 'label',
      title: 'Label',
      cell: ({ label }) => <span className="font-bold whitespace-nowrap">{label}</span>,
    },
    {
      key: 'position',
      title: 'Position',
      unit: 'mm',
      numeric: true,
      cell: ({ positionMm }) => plainNumber(positionMm),
    },
    {
      key: 'computed',
      title: 'Computed',
      unit: 'kg·m²',
      numeric: true,
      cell: ({ computedInertia }) => formatQuantity(computedInertia, digits),
    },
    {
      key: 'measured',
      title: 'Measured',
      unit: 'kg·m²',
      numeric: true,
      cell: ({ measuredInertia }) => formatQuantity(measuredInertia?.value, digits),
    },
    {
      key: 'difference',
      title: 'Difference',
      unit: '%',
      numeric: true,
      cell: ({ computedInertia, measuredInertia }) =>
        computedInertia === null || measuredInertia === null
          ? '–'
          : formatQuantity(100 * (measuredInertia.value / computedInertia - 1), { digits: 2 }),
    },
    { key: 'trials', title: 'Trials', numeric: true, cell: ({ trials }) => trials },
  ];
}
