import type { AnalysisTrial } from '../../../shared/schemas/analysis.ts';

export interface Simulated {
  /** kg·m² per configuration. */
  inertias: number[];
  trials: number;
  /** Common holding torque, N·m. */
  torque: number;
  slope: number;
  /** Relative shift of the torque per configuration. */
  shifts?: number[];
  /** Accelerations relative to the boundary of each configuration. */
  from?: number;
  to?: number;
  seed: number;
}

/** Trials of the scaled model, evenly spread on ln α, outcomes drawn with a seeded generator. */
export function simulate(design: Simulated): AnalysisTrial[] {
  let state = design.seed >>> 0;
  const random = () => {
    state = (state + 0x6d2b79f5) | 0;
    let t = Math.imul(state ^ (state >>> 15), 1 | state);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 2 ** 32;
  };
  const { from = 0.75, to = 1.3 } = design;
  return design.inertias.flatMap((inertia, c) => {
    const boundary = (design.torque / inertia) * (1 + (design.shifts?.[c] ?? 0));
    return Array.from({ length: design.trials }, (_, i): AnalysisTrial => {
      const ratio = from * (to / from) ** (i / Math.max(1, design.trials - 1));
      const slips = random() < 1 / (1 + Math.exp(-design.slope * Math.log(ratio)));
      return {
        configuration: `${20 + 25 * c} mm`,
        inertia,
        acceleration: boundary * ratio,
        outcome: slips ? 'slipped' : 'held',
      };
    });
  });
}
