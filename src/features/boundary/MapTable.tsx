import { type ConfigurationResult } from '../../../shared/schemas/analysis.ts';
import { type Trial } from '../../../shared/schemas/trial.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';

/** The map's marks as numbers: each configuration's trials by acceleration. */
export function MapTable({
  configurations,
  trials,
}: {
  configurations: readonly ConfigurationResult[];
  trials: readonly Trial[];
}) {
  return (
    <table className="w-full text-sm">
      <thead>
        <tr>
          <th scope="col" className="pr-3 text-left">
            Configuration
          </th>
          <th scope="col" className="pr-3 text-left">
            Held at, rad/s²
          </th>
          <th scope="col" className="pr-3 text-left">
            Slipped at, rad/s²
          </th>
          <th scope="col" className="pr-3 text-left">
            Lost at, rad/s²
          </th>
        </tr>
      </thead>
      <tbody>
        {configurations.map(({ label }) => (
          <tr key={label} className="border-t border-line align-top">
            <th scope="row" className="py-1 pr-3 text-left whitespace-nowrap">
              {label}
            </th>
            {(['held', 'slipped', 'lost'] as const).map((outcome) => (
              <td key={outcome} className="py-1 pr-3 tabular-nums">
                {listed(
                  trials.filter(
                    (trial) => trial.configuration === label && trial.outcome === outcome,
                  ),
                )}
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function listed(trials: readonly Trial[]): string {
  if (trials.length === 0) return '–';
  return [...trials]
    .sort((a, b) => a.acceleration - b.acceleration)
    .map(({ acceleration, excluded }) =>
      excluded ? `(${formatQuantity(acceleration)})` : formatQuantity(acceleration),
    )
    .join(', ');
}
