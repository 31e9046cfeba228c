import { inertiaAt } from '../../../shared/physics/inertiaPolynomial.ts';
import { formatColumn, formatQuantity } from '../../../shared/units/formatQuantity.ts';
import { plainNumber } from '../../lib/plainNumber.ts';
import { DataTable } from '../../ui/DataTable.tsx';
import { InertiaCurve } from './InertiaCurve.tsx';

type InertiaViewProps = {
  /** I(x) = Σ cₖ xᵏ, x in m, kg·m² */
  polynomial: readonly number[];
  slide: { minMm: number; maxMm: number };
  /** Positions to mark: those of the configurations. */
  marks: readonly { label: string; positionMm: number; inertia: number | null }[];
};

/** I(x) as formula, curve and table. */
export function InertiaView({ polynomial, slide, marks }: InertiaViewProps) {
  const positions = [0, 0.25, 0.5, 0.75, 1].map(
    (share) => slide.minMm + share * (slide.maxMm - slide.minMm),
  );
  const inertias = formatColumn(
    positions.map((position) => inertiaAt(polynomial, position)),
    { digits: 4 },
  );
  const rows = positions.map((position, i) => ({ position, inertia: inertias[i] ?? '' }));
  return (
    <div className="space-y-3">
      <p className="text-lg">
        I(x) = {formula(polynomial)} <span className="text-muted">kg·m², x in m</span>
      </p>
      <div className="grid gap-4 md:grid-cols-[3fr_2fr]">
        <InertiaCurve polynomial={polynomial} slide={slide} marks={marks} />
        <DataTable
          caption="Inertia along the slide"
          columns={[
            {
              key: 'position',
              title: 'Position',
              unit: 'mm',
              numeric: true,
              cell: ({ position }) => plainNumber(position),
            },
            {
              key: 'inertia',
              title: 'Inertia',
              unit: 'kg·m²',
              numeric: true,
              cell: ({ inertia }) => inertia,
            },
          ]}
          rows={rows}
          rowKey={(row) => row.position}
        />
      </div>
    </div>
  );
}

function formula(polynomial: readonly number[]): string {
  const powers = ['', ' x', ' x²'];
  const terms = polynomial
    .map((value, power) => ({ value, power }))
    .filter(({ value, power }) => value !== 0 || power === 0);
  return terms
    .map(({ value, power }, i) => {
      const text = formatQuantity(Math.abs(value), { digits: 4 }) + (powers[power] ?? '');
      if (i === 0) return value < 0 ? `−${text}` : text;
      return value < 0 ? `− ${text}` : `+ ${text}`;
    })
    .join(' ');
}
