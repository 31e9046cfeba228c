import { type ConfigurationResult, type Interval } from '../../../shared/schemas/analysis.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';
import { formatRange } from '../../charts/formatRange.ts';
import { percent } from './percent.ts';

interface NumbersTableProps {
  configurations: readonly ConfigurationResult[];
  /** fraction that slips at the target acceleration */
  target: number;
}

/** Every configuration's numbers; limits are rounded down. */
export function NumbersTable({ configurations, target }: NumbersTableProps) {
  const column = (of: (one: ConfigurationResult) => number | null, down = false) =>
    configurations.map((one) => formatQuantity(of(one), { rounding: down ? 'down' : 'nearest' }));
  const holding = column(({ theory }) => theory.holding);
  const lettingGo = column(({ theory }) => theory.lettingGo);
  const demonstrated = column((one) => one.demonstrated, true);
  const working = column((one) => one.workingLimit, true);
  const highest = column((one) => one.highestHeld);
  const lowest = column((one) => one.lowestSlipped);
  return (
    <table className="w-full text-sm print:text-[0.55rem]">
      <caption className="pb-2 text-left text-muted">
        Accelerations in rad/s², intervals in brackets; “–” means these trials give none.
      </caption>
      <thead>
        <tr>
          {[
            'Configuration',
            'Inertia, kg·m²',
            'Slips / trials',
            'Highest held',
            'Lowest slipped',
            'Holding bound',
            'Letting-go bound',
            'Half slip, own fit',
            'Half slip, one torque',
            `${percent(target, 4)} slip`,
            'Demonstrated',
            'Working limit',
          ].map((title, i) => (
            <th
              key={title}
              scope="col"
              className={`border-b border-line px-2 py-1 print:px-0.5 align-bottom font-bold ${i === 0 ? 'text-left' : 'text-right'}`}
            >
              {title}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {configurations.map((one, i) => (
          <tr key={one.label} className="border-b border-line">
            <th
              scope="row"
              className="px-2 py-1 print:px-0.5 text-left font-bold whitespace-nowrap"
            >
              {one.label}
            </th>
            {[
              formatQuantity(one.inertia),
              `${one.slips} / ${one.trials}`,
              highest[i],
              lowest[i],
              holding[i],
              lettingGo[i],
              range(one.alpha50.offsets),
              range(one.alpha50.scaled),
              range(one.alphaTarget),
              demonstrated[i],
              working[i],
            ].map((value, at) => (
              <td
                key={at}
                className="px-2 py-1 print:px-0.5 text-right whitespace-nowrap tabular-nums"
              >
                {value}
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function range(interval: Interval): string {
  return formatRange({
    estimate: interval.estimate,
    lower: interval.lower,
    upper: interval.upper,
  });
}
