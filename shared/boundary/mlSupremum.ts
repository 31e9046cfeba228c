import type { CommonSlope } from './commonSlope.ts';
import type { Constraint } from './constraint.ts';
import { addToOrder, emptyOrder, hasBoth, TIE, weaklyOrdered } from './order.ts';
import { maximise } from './maximise.ts';

export interface Supremum {
  /** Supremum of the unpenalised log-likelihood. */
  logLik: number;
  /** Whether finite parameters reach it; if not, it is the limit along a direction of separation. */
  attained: boolean;
  status: 'converged' | 'iterationLimit' | 'singular';
  free: Float64Array | null;
  a: Float64Array | null;
  b: number | null;
  /** By each group's intercept, 0 where a group has dropped out. */
  gradA: Float64Array | null;
}

/**
 * Exact supremum of the unpenalised likelihood of a common-slope model under a constraint,
 * separated or not. The likelihood is concave, so it is either attained or the limit along a
 * direction of recession, and with one slope these are known from the order of the trials alone:
 *
 * 1. a free intercept whose trials all held (or all slipped) runs off by itself and leaves 0;
 * 2. if all that remains is ordered the same way (no hold above a slip; a group anchored at x has
 *    its holds at or below x and its slips at or above), the slope runs to infinity and only trials
 *    tied on the dividing line keep a likelihood: their own binomial one, or that of the anchor;
 * 3. otherwise the maximum over what remains is finite and Newton finds it.
 *
 * @source Albert & Anderson 1984, Biometrika 71:1 (existence); Geyer 2009, Electron. J. Stat. 3:259
 * (the limiting model)
 */
export function mlSupremum(
  model: CommonSlope,
  constraint: Constraint,
  start: Float64Array,
  tolerance = 1e-20,
): Supremum {
  const { cells, groupOf, link } = model;
  const { reps, rep, constant, onSlope } = constraint;
  const orders = Array.from({ length: reps }, emptyOrder);
  const anchored = emptyOrder();
  let hasAnchor = false;
  for (let i = 0; i < cells.size; i++) {
    const g = groupOf[cells.configuration[i]];
    const r = rep[g];
    if (r < 0) hasAnchor = true;
    const order = r < 0 ? anchored : orders[r];
    addToOrder(order, cells.z[i] + onSlope[g], cells.k[i], cells.n[i] - cells.k[i]);
  }
  const remains = orders.map(hasBoth);

  if (constraint.fixedSlope === null) {
    for (const direction of [1, -1] as const) {
      const ordered =
        orders.every((order, r) => !remains[r] || weaklyOrdered(order, direction)) &&
        (!hasAnchor || anchorOrdered(direction));
      if (ordered) {
        const limit = limitAlong(direction);
        return {
          logLik: limit,
          attained: false,
          status: 'converged',
          free: null,
          a: null,
          b: null,
          gradA: null,
        };
      }
    }
  }
  return interior();

  function anchorOrdered(direction: 1 | -1): boolean {
    return direction > 0
      ? anchored.highestHeld <= TIE && anchored.lowestSlipped >= -TIE
      : anchored.lowestHeld >= -TIE && anchored.highestSlipped <= TIE;
  }

  /** What the trials tied on each dividing line still weigh. */
  function limitAlong(direction: 1 | -1): number {
    const tied = orders.map((order) => (direction > 0 ? order.lowestSlipped : order.lowestHeld));
    const slips = new Float64Array(reps);
    const holds = new Float64Array(reps);
    let sum = 0;
    const out = new Float64Array(7);
    for (let i = 0; i < cells.size; i++) {
      const g = groupOf[cells.configuration[i]];
      const r = rep[g];
      const t = cells.z[i] + onSlope[g];
      const k = cells.k[i];
      const h = cells.n[i] - k;
      if (r < 0) {
        if (Math.abs(t) > TIE) continue;
        link.at(constant[g], out);
        sum += (k > 0 ? k * out[0] : 0) + (h > 0 ? h * out[1] : 0);
      } else if (remains[r] && Math.abs(t - tied[r]) <= TIE) {
        slips[r] += k;
        holds[r] += h;
      }
    }
    for (let r = 0; r < reps; r++) sum += binomialLogLik(slips[r], holds[r]);
    return sum;
  }

  function interior(): Supremum {
    if (remains.every(Boolean)) {
      const fit = maximise(model, constraint, 'none', start, { tolerance });
      return { ...fit, logLik: fit.value, attained: fit.status === 'converged' };
    }
    // the groups that ran off stay out
    const place = new Int32Array(reps);
    let left = 0;
    remains.forEach((stays, r) => (place[r] = stays ? left++ : -1));
    const reduced: Constraint = {
      ...constraint,
      reps: left,
      rep: Int32Array.from(rep, (r) => (r < 0 ? -1 : place[r])),
    };
    const from = start.filter((_, i) => i >= reps || remains[i]);
    model.leaveOut((g) => rep[g] >= 0 && !remains[rep[g]]);
    const fit = maximise(model, reduced, 'none', from, { tolerance });
    model.leaveOut(() => false);
    const free = Float64Array.from(start);
    for (let r = 0; r < reps; r++) if (remains[r]) free[r] = fit.free[place[r]]!;
    free.set(fit.free.subarray(left), reps);
    return { ...fit, free, logLik: fit.value, attained: false };
  }
}

function binomialLogLik(slips: number, holds: number): number {
  if (slips === 0 || holds === 0) return 0;
  const n = slips + holds;
  return slips * Math.log(slips / n) + holds * Math.log(holds / n);
}
