/**
 * Trials collapsed to binomial counts: one cell per distinct configuration and acceleration.
 * `z` is the predictor shared by all common-slope models, ln α + ln J − `centre`.
 */
export interface Cells {
  size: number;
  configurations: number;
  configuration: Int32Array;
  z: Float64Array;
  /** Trials in the cell. */
  n: Float64Array;
  /** Slips among them. */
  k: Float64Array;
}

/** Which configurations share an intercept: `groupOf[configuration]` from 0 to `groups` − 1. */
export interface Partition {
  groups: number;
  groupOf: Int32Array;
}

/** All configurations on one curve. */
export function together(configurations: number): Partition {
  return { groups: 1, groupOf: new Int32Array(configurations) };
}

/** Every configuration its own intercept. */
export function apart(configurations: number): Partition {
  return {
    groups: configurations,
    groupOf: Int32Array.from({ length: configurations }, (_, i) => i),
  };
}

/** One curve, except the configurations listed: group 0 is the common curve, then one each. */
export function withShifts(configurations: number, shifted: readonly number[]): Partition {
  const groupOf = new Int32Array(configurations);
  shifted.forEach((configuration, i) => (groupOf[configuration] = i + 1));
  return { groups: shifted.length + 1, groupOf };
}
