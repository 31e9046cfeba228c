import { findEnd, type Profile } from './findEnd.ts';
import {
  fitLinear,
  withCoefficient,
  type LinearConstraint,
  type LinearFit,
  type LinearProblem,
} from './fitLinear.ts';

/** A quantity x of a binomial regression that a linear constraint fixes. */
export interface LinearQuantity {
  constraintAt: (x: number) => LinearConstraint;
  /** Free parameters to start from, near the unconstrained estimate and elsewhere. */
  starts: Float64Array[];
  /** d objective / dx at a constrained maximum (envelope theorem). */
  slopeOf: (there: LinearFit) => number;
}

/** Profile (penalised) likelihood of a quantity; the penalty is that of all columns. */
export function linearProfile(
  problem: LinearProblem,
  fit: LinearFit,
  penalised: boolean,
  { constraintAt, starts, slopeOf }: LinearQuantity,
): Profile {
  let warm = starts[0];
  const deviance = (there: LinearFit) => Math.max(0, 2 * (fit.value - there.value));
  return {
    careful: starts.length > 1,
    at(x) {
      const there = fitLinear(problem, penalised, constraintAt(x), warm);
      if (there.status === 'converged') warm = there.free;
      return { deviance: deviance(there), slope: -2 * slopeOf(there) };
    },
    surely(x) {
      const constraint = constraintAt(x);
      let best = fitLinear(problem, penalised, constraint, warm);
      for (const start of starts) {
        const there = fitLinear(problem, penalised, constraint, start);
        if (there.status === 'converged' && there.value > best.value + 1e-9) best = there;
      }
      warm = best.free;
      return deviance(best);
    },
  };
}

/**
 * Profile interval of one coefficient, { β_j : D(β_j) ≤ crit }, the part that holds the estimate.
 *
 * @source Heinze & Schemper 2002, Stat. Med. 21:2409
 */
export function coefficientInterval(
  problem: LinearProblem,
  fit: LinearFit,
  penalised: boolean,
  index: number,
  crit: number,
): { lower: number | null; upper: number | null } {
  const { columns } = problem;
  const profile = linearProfile(problem, fit, penalised, {
    constraintAt: (value) => withCoefficient(columns, index, value),
    starts: [fit.beta.filter((_, j) => j !== index)],
    slopeOf: (there) => there.gradient[index],
  });
  const se = Math.sqrt(fit.covariance![index * columns + index]);
  const estimate = fit.beta[index];
  const bumpy = [estimate - 8 * se, estimate + 8 * se] as const;
  const search = { from: estimate, crit, scale: Math.sqrt(crit) * se, bumpy };
  return {
    lower: findEnd([profile], { ...search, direction: -1 }),
    upper: findEnd([profile], { ...search, direction: 1 }),
  };
}
