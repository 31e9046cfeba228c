import { useQuery } from '@tanstack/react-query';
import type { AnalysisResult } from '../../../shared/schemas/analysis.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';
import { formatRange } from '../../charts/formatRange.ts';
import { benchFrictionQuery } from './boundaryQueries.ts';

/** The friction that the trials ask for beside the friction that the bench measured. */
export function FrictionLine({ fixtureId, result }: { fixtureId: number; result: AnalysisResult }) {
  const bench = useQuery(benchFrictionQuery(fixtureId)).data;
  return (
    <dl className="flex flex-wrap gap-x-8 gap-y-2">
      <Term name="μ fitted to the trials" value={formatRange(result.mu50)} />
      <Term name="μ kinetic, bench" value={sample(bench?.kinetic)} />
      <Term name="μ static, bench" value={sample(bench?.static)} />
      <Term name="Torque at half slip, N·m" value={formatRange(result.commonTorque50)} />
      <Term
        name="Torque of the limit function, N·m"
        value={formatQuantity(result.limitFunction?.torque, { rounding: 'down' })}
      />
    </dl>
  );
}

function sample(of: { mean: number; n: number } | null | undefined): string {
  return of === null || of === undefined
    ? 'not tested'
    : `${formatQuantity(of.mean)} (${of.n} readings)`;
}

function Term({ name, value }: { name: string; value: string }) {
  return (
    <div>
      <dt className="text-sm text-muted">{name}</dt>
      <dd className="font-bold tabular-nums">{value}</dd>
    </div>
  );
}
