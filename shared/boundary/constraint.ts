/**
 * A linear constraint on a common-slope model. With intercepts a_g and slope b,
 * a_g = γ[rep] + constant[g] + onSlope[g]·b + onExtra[g]·θ, where rep −1 stands for "no free
 * intercept". The free parameters are γ, then b (unless the slope is fixed), then θ (if any).
 */
export interface Constraint {
  reps: number;
  rep: Int32Array;
  constant: Float64Array;
  onSlope: Float64Array;
  onExtra: Float64Array | null;
  fixedSlope: number | null;
}

/** Every group its own intercept, slope free. */
export function unconstrained(groups: number): Constraint {
  return {
    reps: groups,
    rep: Int32Array.from({ length: groups }, (_, i) => i),
    constant: new Float64Array(groups),
    onSlope: new Float64Array(groups),
    onExtra: null,
    fixedSlope: null,
  };
}

/** Every group its own intercept, slope fixed at 0: the limit of every profile at infinity. */
export function flat(groups: number): Constraint {
  return { ...unconstrained(groups), fixedSlope: 0 };
}

/** η of group `group` equals `eta` at z = x: a_g = η − b·x. */
export function quantileAt(groups: number, group: number, eta: number, x: number): Constraint {
  const free = unconstrained(groups);
  free.reps = groups - 1;
  for (let g = 0; g < groups; g++) free.rep[g] = g === group ? -1 : g > group ? g - 1 : g;
  free.constant[group] = eta;
  free.onSlope[group] = -x;
  return free;
}

/** Group `group` is group 0 shifted by δ in ln τ: a_g = a₀ − b·δ. */
export function shiftedBy(groups: number, group: number, delta: number): Constraint {
  const free = unconstrained(groups);
  free.reps = groups - 1;
  for (let g = 0; g < groups; g++) free.rep[g] = g === group ? 0 : g > group ? g - 1 : g;
  free.onSlope[group] = -delta;
  return free;
}

/** All groups on one curve. */
export function merged(groups: number): Constraint {
  return { ...unconstrained(groups), reps: 1, rep: new Int32Array(groups) };
}

/** All groups on one curve but for a term θ·ln J: the power model inside the offsets model. */
export function mergedPower(groups: number, lnInertia: Float64Array): Constraint {
  return { ...merged(groups), onExtra: lnInertia };
}
