import { bestMaximum } from './bestMaximum.ts';
import type { Constraint } from './constraint.ts';
import type { Profile } from './findEnd.ts';
import type { CommonSlopeFit } from './fitCommonSlope.ts';
import { maximise, type Maximum } from './maximise.ts';
import { mlSupremum } from './mlSupremum.ts';

/** A quantity fixed by a linear constraint that ties group `group`: a_g = … − b·x. */
export interface Quantity {
  group: number;
  constraintAt: (x: number) => Constraint;
}

/**
 * Newton decrement at which a profile point is done: the last step's gain is added to the value,
 * whose error is then of the order of the decrement to the power 3/2.
 */
const TOLERANCE = 1e-10;

/**
 * Profile penalised likelihood of a quantity; the penalty always uses the full model's information.
 *
 * @source Heinze & Schemper 2002, Stat. Med. 21:2409; Venzon & Moolgavkar 1988, Appl. Stat. 37:87
 */
export function penalisedProfile(fit: CommonSlopeFit, quantity: Quantity): Profile {
  const { model, penalised } = fit;
  let warm: Float64Array | null = null;
  let last = { x: NaN, deviance: NaN };
  const deviance = (maximum: Maximum) => Math.max(0, 2 * (penalised.value - maximum.value));
  const first = (constraint: Constraint) => {
    const start = new Float64Array(constraint.reps + 1);
    constraint.rep.forEach((r, g) => {
      if (r >= 0) start[r] = penalised.a[g]!;
    });
    start[constraint.reps] = penalised.b;
    return start;
  };
  return {
    at(x) {
      const constraint = quantity.constraintAt(x);
      const there = maximise(model, constraint, 'common', warm ?? first(constraint), {
        tolerance: TOLERANCE,
      });
      if (there.status === 'converged') warm = there.free;
      last = { x, deviance: deviance(there) };
      return { deviance: last.deviance, slope: 2 * there.b * there.gradA[quantity.group] };
    },
    surely(x) {
      if (!model.careful && x === last.x) return last.deviance;
      const constraint = quantity.constraintAt(x);
      const there = bestMaximum(model, constraint, 'common', warm ?? first(constraint), {
        tolerance: TOLERANCE,
      });
      warm = there.free;
      return deviance(there);
    },
  };
}

/** Profile of the unpenalised likelihood, suprema where the trials separate. */
export function plainProfile(fit: CommonSlopeFit, quantity: Quantity): Profile {
  const { model, penalised, supremum } = fit;
  let warm: Float64Array | null = null;
  const at = (x: number) => {
    const constraint = quantity.constraintAt(x);
    if (warm === null) {
      warm = new Float64Array(constraint.reps + 1);
      for (let g = 0; g < model.groups; g++) {
        const r = constraint.rep[g];
        if (r >= 0) warm[r] = penalised.a[g]!;
      }
      warm[constraint.reps] = penalised.b;
    }
    const there = mlSupremum(model, constraint, warm, TOLERANCE);
    if (there.free && there.status === 'converged') warm = there.free;
    const deviance = Math.max(0, 2 * (supremum.logLik - there.logLik));
    const slope = there.gradA && there.b !== null ? 2 * there.b * there.gradA[quantity.group] : NaN;
    return { deviance, slope };
  };
  return { at, surely: (x) => at(x).deviance };
}
