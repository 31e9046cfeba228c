import { type AnalysisOptions, type AnalysisResult } from '../../../shared/schemas/analysis.ts';
import { percent } from './percent.ts';

/** The methods behind the screen, each with its source, and what tuned them this time. */
export function HowComputed({
  result,
  options,
  digest,
}: {
  result: AnalysisResult;
  options: AnalysisOptions;
  digest: string;
}) {
  return (
    <div className="max-w-prose space-y-3">
      <p>
        Each trial is a yes or a no at an acceleration. The probability of a slip is modelled as a
        logistic curve in the logarithm of acceleration times inertia, so that half slip lies at one
        torque over the inertia, as theory has it.
      </p>
      <ul className="list-disc space-y-1 pl-5">
        <li>
          Theory: torque capacity of the seat over the moment of inertia; an off-centre part on the
          limit-surface ellipse (Goyal, Ruina and Papadopoulos 1991; Howe and Cutkosky 1996), which
          overstates the capacity by up to 18 %. Its uncertainty: first-order propagation (JCGM
          100:2008), Student t on the friction tests.
        </li>
        <li>
          {result.estimator === 'firth'
            ? 'Fit: penalised likelihood (Firth 1993; Heinze and Schemper 2002), which stays finite when slips and holds separate perfectly, as small series mostly do.'
            : 'Fit: plain maximum likelihood, refused where slips and holds separate perfectly.'}
        </li>
        <li>
          Intervals: profile likelihood of the acceleration itself at{' '}
          {percent(options.confidence, 4)}. An end that the trials do not bound is shown as open.
        </li>
        <li>
          Shape: step-down search. Of all configurations the one that departs most is set apart
          first, tested with the number of those remaining, then the next. Its trials still inform
          the steepness.
        </li>
        <li>
          Level: the interval of half slip against the holding bound (kinetic friction) and the
          letting-go bound (static friction), practical tolerance {percent(options.tolerance, 4)}.
        </li>
        <li>
          Margin: the limit judged is theory less {percent(options.margin, 4)}; exact binomial count
          of slips at or below it (Clopper and Pearson 1934) and the one-sided bound of the
          acceleration at which {percent(options.target, 4)} slip.
        </li>
        <li>
          Working limit: {options.rule}, capped by the drive and rounded down to its resolution.
          Demonstrated: the lower of the bound on the common curve and the configuration’s own.
        </li>
      </ul>
      <p className="text-sm break-all text-muted">
        Engine {result.engine}. Digest of trials, build-up, friction tests and options:{' '}
        <code>{digest}</code>
      </p>
    </div>
  );
}
