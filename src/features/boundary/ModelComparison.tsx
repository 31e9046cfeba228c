import { torqueCurve } from '../../../shared/boundary/torqueCurve.ts';
import { type AnalysisResult, type ModelFit } from '../../../shared/schemas/analysis.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';
import { formatRange } from '../../charts/formatRange.ts';
import { comparisonWords, modelTitles } from './comparisonWords.ts';

const statusWords: Record<ModelFit['status'], string> = {
  converged: 'converged',
  separated: 'slips and holds separate: no finite fit',
  iterationLimit: 'did not settle',
  singular: 'too few trials for it',
};

/** Whether one torque is enough, or the trials ask for more. */
export function ModelComparison({
  result,
  confidence,
}: {
  result: AnalysisResult;
  confidence: number;
}) {
  const { exponent } = result.models.power;
  const curve = torqueCurve(
    result.configurations.flatMap(({ inertia, alpha50 }) =>
      alpha50.offsets.estimate === null ? [] : [{ inertia, alpha50: alpha50.offsets.estimate }],
    ),
  );
  return (
    <div className="space-y-3">
      <ul className="max-w-prose list-disc space-y-1 pl-5">
        {result.comparisons.map((comparison) => (
          <li key={`${comparison.simpler} ${comparison.fuller}`}>
            {comparisonWords(comparison, confidence)}
          </li>
        ))}
        {exponent.estimate !== null && (
          <li>
            The half-slip acceleration falls with inertia to the power {formatRange(exponent)};
            theory says 1.
          </li>
        )}
        {curve !== null && (
          <li>
            A straight line through the positions’ own half-slip points, each counted once, has the
            slope {formatQuantity(curve.slope)} in the log–log map; τ/I has −1.
          </li>
        )}
      </ul>
      <table className="w-full max-w-3xl text-sm">
        <thead>
          <tr>
            <Head left>Model</Head>
            <Head left>Fit</Head>
            <Head>Log-likelihood</Head>
            <Head>Penalised</Head>
            <Head>AICc</Head>
          </tr>
        </thead>
        <tbody>
          {Object.entries(result.models).map(([name, fit]) => (
            <tr key={name} className="border-b border-line">
              <th scope="row" className="px-2 py-1 text-left font-normal">
                {modelTitles[name] ?? name}
              </th>
              <td className="px-2 py-1">{statusWords[fit.status]}</td>
              <Cell value={fit.logLik} />
              <Cell value={fit.penalisedLogLik} />
              <Cell value={fit.aicc} />
            </tr>
          ))}
        </tbody>
      </table>
      <p className="text-sm text-muted">
        Lower AICc means a better description for the number of its parameters.
      </p>
    </div>
  );
}

function Head({ children, left = false }: { children: string; left?: boolean }) {
  return (
    <th
      scope="col"
      className={`border-b border-line px-2 py-1 font-bold ${left ? 'text-left' : 'text-right'}`}
    >
      {children}
    </th>
  );
}

function Cell({ value }: { value: number | null }) {
  return (
    <td className="px-2 py-1 text-right tabular-nums">{formatQuantity(value, { decimals: 1 })}</td>
  );
}
