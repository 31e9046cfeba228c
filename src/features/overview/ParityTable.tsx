import { Link } from 'react-router';
import { type ParityPoint } from '../../../shared/schemas/overview.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';
import { formatRange } from '../../charts/formatRange.ts';

/** The parity picture's numbers. */
export function ParityTable({ points }: { points: readonly ParityPoint[] }) {
  return (
    <table className="w-full text-sm">
      <thead>
        <tr>
          <th scope="col" className="text-left">
            Fixture
          </th>
          <th scope="col" className="text-left">
            Configuration
          </th>
          <th scope="col" className="text-right">
            Theory, rad/s²
          </th>
          <th scope="col" className="text-right">
            Fitted, rad/s²
          </th>
          <th scope="col" className="pl-3 text-left">
            Verdict
          </th>
        </tr>
      </thead>
      <tbody>
        {points.map((point) => (
          <tr key={`${point.fixtureId} ${point.label}`} className="border-t border-line">
            <td className="py-1">
              <Link
                to={`/fixtures/${point.fixtureId}/boundary?position=${encodeURIComponent(point.label)}`}
              >
                {point.code}
              </Link>
            </td>
            <td className="py-1">{point.label}</td>
            <td className="py-1 text-right tabular-nums">{formatQuantity(point.theory)}</td>
            <td className="py-1 text-right tabular-nums">{formatRange(point.fitted)}</td>
            <td className="py-1 pl-3">{point.verdict}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
