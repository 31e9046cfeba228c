import { quantileAt, shiftedBy } from './constraint.ts';
import { findEnd, type Profile } from './findEnd.ts';
import type { CommonSlopeFit, Information } from './fitCommonSlope.ts';
import { addToOrder, emptyOrder } from './order.ts';
import { penalisedProfile, plainProfile, type Quantity } from './profiles.ts';

/**
 * Which likelihood an interval rests on: the penalised one, the plain one, or whichever of the two
 * falls less (the guard against the penalty).
 */
export type Basis = 'penalised' | 'guarded' | 'plain';

/** Why there is no estimate. */
export type Absence = 'not fitted' | 'separated' | 'falling' | 'flat' | 'no slips' | 'no holds';

/** A quantity on its internal scale; null ends do not exist. */
export interface ProfileInterval {
  estimate: number | null;
  lower: number | null;
  upper: number | null;
  absence: Absence | null;
}

export const NO_SLOPE = 1e-8;

function nothing(absence: Absence): ProfileInterval {
  return { estimate: null, lower: null, upper: null, absence };
}

/** Whether a group has slips and holds. */
function outcomesOf(fit: CommonSlopeFit, group: number): { slips: boolean; holds: boolean } {
  const { cells, groupOf } = fit.model;
  const order = emptyOrder();
  for (let i = 0; i < cells.size; i++) {
    if (groupOf[cells.configuration[i]] !== group) continue;
    addToOrder(order, cells.z[i], cells.k[i], cells.n[i] - cells.k[i]);
  }
  return { slips: order.highestSlipped > -Infinity, holds: order.highestHeld > -Infinity };
}

/** Deviance of slope 0, the value every profile tends to. */
export function flatDeviance(fit: CommonSlopeFit, basis: Basis): number {
  const penalised = 2 * (fit.penalised.value - fit.flat().penalised);
  const plain = 2 * (fit.supremum.logLik - fit.flat().logLik);
  return basis === 'penalised' ? penalised : basis === 'plain' ? plain : Math.min(penalised, plain);
}

interface Ask {
  fit: CommonSlopeFit;
  quantity: Quantity;
  /** From intercepts and slope. */
  estimateOf: (a: Float64Array, b: number) => number;
  basis: Basis;
  crit: number;
  /** A difference of two z rather than a z. */
  difference: boolean;
  /** First-order variance of the quantity at its estimate. */
  varianceOf: (information: Information, estimate: number, slope: number) => number;
  /** Ends that do not exist whatever the likelihood says, and why there is no estimate. */
  open: { lower: boolean; upper: boolean; absence: Absence | null };
}

function total(values: Float64Array): number {
  return values.reduce((sum, value) => sum + value, 0);
}

/** Where trials lie: lowest and highest z, or the same for differences of z. */
function rangeOf(z: Float64Array, difference: boolean): readonly [number, number] {
  const low = z.reduce((least, value) => Math.min(least, value), Infinity);
  const high = z.reduce((most, value) => Math.max(most, value), -Infinity);
  return difference ? [low - high, high - low] : [low, high];
}

function intervalOf(ask: Ask): ProfileInterval {
  const { fit, basis, crit, open } = ask;
  const { penalised, supremum, model } = fit;
  if (penalised.status === 'singular') return nothing('not fitted');
  if (basis === 'plain' && !supremum.attained) return nothing('separated');
  const [a, b] = basis === 'plain' ? [supremum.a!, supremum.b!] : [penalised.a, penalised.b];
  if (!(b > NO_SLOPE)) return nothing('falling');
  const from = ask.estimateOf(a, b);
  const profiles: Profile[] = [];
  if (basis !== 'plain') profiles.push(penalisedProfile(fit, ask.quantity));
  if (basis !== 'penalised') profiles.push(plainProfile(fit, ask.quantity));
  const search = {
    from,
    crit,
    scale: Math.sqrt(crit * Math.max(ask.varianceOf(fit.information, from, b), 1e-30)),
    bumpy: model.careful ? rangeOf(model.cells.z, ask.difference) : null,
  };
  const absence = open.absence ?? (flatDeviance(fit, basis) <= crit ? 'flat' : null);
  return {
    estimate: absence === null ? from : null,
    lower: open.lower ? null : findEnd(profiles, { ...search, direction: -1 }),
    upper: open.upper ? null : findEnd(profiles, { ...search, direction: 1 }),
    absence,
  };
}

/**
 * Quantile z_p of one group with its profile interval { z : D(z) ≤ crit }, the connected part that
 * holds the estimate.
 *
 * @param own - the group is one configuration with an intercept of its own: without slips or
 * without holds its estimate is the penalty's alone and is withheld
 * @source Heinze & Schemper 2002 (profile penalised likelihood); methods page, section 2
 */
export function quantileInterval(
  fit: CommonSlopeFit,
  group: number,
  eta: number,
  basis: Basis,
  crit: number,
  own: boolean,
): ProfileInterval {
  const { slips, holds } = outcomesOf(fit, group);
  const guarded = basis === 'guarded';
  return intervalOf({
    fit,
    quantity: {
      group,
      constraintAt: (x) => quantileAt(fit.model.groups, group, eta, x),
    },
    estimateOf: (a, b) => (eta - a[group]) / b,
    difference: false,
    varianceOf: ({ weight, mean, spread }, x, b) =>
      (1 / weight[group] + (x - mean[group]) ** 2 / total(spread)) / (b * b),
    basis,
    crit,
    open: {
      lower: guarded && !holds,
      upper: guarded && !slips,
      absence: own && !slips ? 'no slips' : own && !holds ? 'no holds' : null,
    },
  });
}

/** Shift δ in ln τ of group `group` against group 0, with its profile interval. */
export function shiftInterval(
  fit: CommonSlopeFit,
  group: number,
  basis: Basis,
  crit: number,
): ProfileInterval {
  const own = outcomesOf(fit, group);
  const rest = outcomesOf(fit, 0);
  return intervalOf({
    fit,
    quantity: {
      group,
      constraintAt: (delta) => shiftedBy(fit.model.groups, group, delta),
    },
    estimateOf: (a, b) => (a[0] - a[group]) / b,
    difference: true,
    varianceOf: ({ weight, mean, spread }, delta, b) =>
      (1 / weight[0] + 1 / weight[group] + (mean[group] - mean[0] - delta) ** 2 / total(spread)) /
      (b * b),
    basis,
    crit,
    open: {
      lower: basis === 'guarded' && (!own.holds || !rest.slips),
      upper: basis === 'guarded' && (!own.slips || !rest.holds),
      absence:
        !own.slips || !rest.slips ? 'no slips' : !own.holds || !rest.holds ? 'no holds' : null,
    },
  });
}
