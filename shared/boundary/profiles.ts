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
  const path = createPath();
  const deviance = (maximum: Maximum) => Math.max(0, 2 * (penalised.value - maximum.value));
  return {
    careful: model.careful,
    at(x) {
      const constraint = quantity.constraintAt(x);
      const start = path.at(x) ?? startFrom(fit, constraint);
      const options = { tolerance: TOLERANCE };
      const there = maximise(model, constraint, 'common', start, options);
      if (there.status === 'converged') path.add(x, there.free);
      return { deviance: deviance(there), slope: 2 * there.b * there.gradA[quantity.group] };
    },
    surely(x) {
      const constraint = quantity.constraintAt(x);
      const start = path.at(x) ?? startFrom(fit, constraint);
      const there = bestMaximum(model, constraint, 'common', start, { tolerance: TOLERANCE });
      path.restart(x, there.free);
      return deviance(there);
    },
  };
}

/** The last two points of a profile's path, to foresee the next one on their line. */
function createPath() {
  let last: { x: number; free: Float64Array } | null = null;
  let before: { x: number; free: Float64Array } | null = null;
  return {
    at(x: number): Float64Array | null {
      if (last === null || before === null || last.x === before.x) return last?.free ?? null;
      const ahead = (x - last.x) / (last.x - before.x);
      const [from, to] = [before.free, last.free];
      return Math.abs(ahead) < 3 ? to.map((value, i) => value + ahead * (value - from[i])) : to;
    },
    add(x: number, free: Float64Array): void {
      if (last !== null && last.x !== x) before = last;
      last = { x, free };
    },
    restart(x: number, free: Float64Array): void {
      before = null;
      last = { x, free };
    },
  };
}

/** Free parameters of a constraint at the unconstrained estimate. */
function startFrom({ model, penalised }: CommonSlopeFit, constraint: Constraint): Float64Array {
  const start = new Float64Array(constraint.reps + 1);
  for (let g = 0; g < model.groups; g++) {
    if (constraint.rep[g] >= 0) start[constraint.rep[g]] = penalised.a[g];
  }
  start[constraint.reps] = penalised.b;
  return start;
}

/** Profile of the unpenalised likelihood, suprema where the trials separate. */
export function plainProfile(fit: CommonSlopeFit, quantity: Quantity): Profile {
  const { model, supremum } = fit;
  const path = createPath();
  const at = (x: number) => {
    const constraint = quantity.constraintAt(x);
    const start = path.at(x) ?? startFrom(fit, constraint);
    const there = mlSupremum(model, constraint, start, TOLERANCE);
    if (there.free && there.status === 'converged') path.add(x, there.free);
    const deviance = Math.max(0, 2 * (supremum.logLik - there.logLik));
    const slope = there.gradA && there.b !== null ? 2 * there.b * there.gradA[quantity.group] : NaN;
    return { deviance, slope };
  };
  return { careful: false, at, surely: (x) => at(x).deviance };
}
