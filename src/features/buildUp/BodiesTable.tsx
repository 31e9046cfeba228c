import type { Body } from '../../../shared/schemas/buildUp.ts';
import { plainNumber } from '../../lib/plainNumber.ts';
import { DataTable } from '../../ui/DataTable.tsx';
import { shapeWords } from './shapes.ts';

/** The bodies of a revision, to read. */
export function BodiesTable({ bodies }: { bodies: readonly Body[] }) {
  return (
    <DataTable
      caption="Bodies that turn with the part"
      rows={bodies.map((body, index) => ({ ...body, index }))}
      rowKey={(row) => row.index}
      columns={[
        { key: 'name', title: 'Body', cell: ({ name }) => name },
        { key: 'shape', title: 'Shape', cell: ({ shape }) => shapeWords(shape) },
        { key: 'count', title: 'Count', numeric: true, cell: ({ count }) => count },
        {
          key: 'mass',
          title: 'Mass, each',
          unit: 'kg',
          numeric: true,
          cell: ({ mass }) => plainNumber(mass),
        },
        {
          key: 'place',
          title: 'Place',
          cell: ({ placement, offsetMm }) =>
            placement === 'fixed'
              ? offsetMm === 0
                ? 'on the axis'
                : `${offsetMm} mm off the axis`
              : `on the slide${offsetMm === 0 ? '' : `, ${offsetMm > 0 ? '+' : '−'}${Math.abs(offsetMm)} mm`}`,
        },
      ]}
    />
  );
}
