/** A torque limit for positions in between, α_lim(x) = τ_lim / J(x). */
export interface LimitFunction {
  /** N·m on the equivalent inertias. */
  torque: number;
  from: string;
}

/**
 * τ_lim = min over all configurations of f_c·J_c, set-apart ones included; none if any f_c is
 * missing.
 *
 * @param limits - f_c by the rule, before drive cap and rounding, rad/s², with J_c in kg·m²
 */
export function limitFunction(
  limits: readonly { byRule: number | null; equivalentInertia: number }[],
): LimitFunction | null {
  let torque = Infinity;
  for (const { byRule, equivalentInertia } of limits) {
    if (byRule === null) return null;
    torque = Math.min(torque, byRule * equivalentInertia);
  }
  return Number.isFinite(torque) ? { torque, from: 'min over configurations' } : null;
}
