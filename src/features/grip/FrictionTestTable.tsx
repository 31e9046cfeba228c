import { useState } from 'react';
import type { FrictionTest } from '../../../shared/schemas/frictionTest.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';
import { formatDay } from '../../lib/formatDate.ts';
import { Button } from '../../ui/Button.tsx';
import { DataTable, type Column } from '../../ui/DataTable.tsx';
import { ExcludeTestDialog } from './ExcludeTestDialog.tsx';

/** The friction tests, each with its readings as coefficients. */
export function FrictionTestTable({
  tests,
  mayEdit,
}: {
  tests: readonly FrictionTest[];
  mayEdit: boolean;
}) {
  const [chosen, setChosen] = useState<FrictionTest | null>(null);
  const columns: Column<FrictionTest>[] = [
    {
      key: 'day',
      title: 'Tested',
      cell: (test) => <span className="whitespace-nowrap">{formatDay(test.testedOn)}</span>,
    },
    { key: 'kind', title: 'Kind', cell: (test) => test.kind },
    { key: 'face', title: 'Face', cell: (test) => test.face ?? 'all' },
    {
      key: 'surfaces',
      title: 'Surfaces',
      cell: (test) => (
        <>
          {test.surfaces}
          {test.batch !== null && <span className="text-muted">, batch {test.batch}</span>}
          {test.excluded && (
            <span className="block font-bold">Excluded: {test.excludedReason}</span>
          )}
        </>
      ),
    },
    { key: 'mean', title: 'μ', numeric: true, cell: (test) => formatQuantity(test.mean) },
    {
      key: 'sd',
      title: 's',
      numeric: true,
      cell: (test) => formatQuantity(test.sd, { digits: 2 }),
    },
    { key: 'n', title: 'n', numeric: true, cell: (test) => test.n },
    {
      key: 'each',
      title: 'Each reading as μ',
      cell: (test) => test.mu.map((mu) => formatQuantity(mu)).join(' · '),
    },
  ];
  if (mayEdit) {
    columns.push({
      key: 'exclude',
      title: <span className="sr-only">Exclude or restore</span>,
      cell: (test) => (
        <Button look="quiet" onClick={() => setChosen(test)}>
          {test.excluded ? 'Restore' : 'Exclude'}
        </Button>
      ),
    });
  }
  return (
    <>
      <DataTable
        caption="Friction tests"
        columns={columns}
        rows={tests}
        rowKey={(test) => test.id}
      />
      {chosen !== null && <ExcludeTestDialog test={chosen} close={() => setChosen(null)} />}
    </>
  );
}
