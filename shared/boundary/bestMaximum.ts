import type { CommonSlope, Penalty } from './commonSlope.ts';
import type { Constraint } from './constraint.ts';
import { maximise, type Maximum, type MaximiseOptions } from './maximise.ts';

/** Slopes worth trying: both signs, from a tenth over the whole range to forty per smallest step. */
export function slopeGrid(model: CommonSlope): number[] {
  const levels = [...new Set(model.cells.z)].sort((x, y) => x - y);
  const span = levels[levels.length - 1] - levels[0];
  if (!(span > 0)) return [0];
  let gap = span;
  for (let i = 1; i < levels.length; i++) {
    const step = levels[i] - levels[i - 1];
    if (step > 1e-3 * span) gap = Math.min(gap, step);
  }
  const grid = [0];
  for (let b = 0.25 / span; b < 40 / gap; b *= 2) grid.push(b, -b);
  return grid.sort((x, y) => x - y);
}

/**
 * Best of the local maxima of a penalised likelihood: walks a grid of slopes from the start's own
 * in both directions, each with its best intercepts, and refines from every local best.
 *
 * The penalised likelihood of separated trials can have several maxima: at most two per gap
 * between levels (steeper or flatter than the gap).
 */
export function bestMaximum(
  model: CommonSlope,
  constraint: Constraint,
  penalty: Penalty,
  start: Float64Array,
  options: MaximiseOptions = {},
): Maximum {
  let best = maximise(model, constraint, penalty, start, options);
  if (constraint.fixedSlope !== null || constraint.onExtra !== null) return best;
  const slopes = slopeGrid(model);
  const origin = best.status === 'singular' ? start : best.free;
  const b0 = origin[constraint.reps];
  const split = slopes.findIndex((b) => b > b0);
  const cut = split < 0 ? slopes.length : split;
  for (const side of [slopes.slice(cut), slopes.slice(0, cut).reverse()]) {
    let reps: Float64Array = origin.slice(0, constraint.reps);
    let slope = b0;
    const walked: { value: number; reps: Float64Array; slope: number }[] = [];
    for (const b of side) {
      const turned = turn(model, constraint, reps, slope, b);
      const there = maximise(model, { ...constraint, fixedSlope: b }, penalty, turned, {
        tolerance: 1e-4,
        iterations: 30,
      });
      if (!Number.isFinite(there.value)) break;
      reps = there.free;
      slope = b;
      walked.push({ value: there.value, reps, slope });
    }
    walked.forEach((point, i) => {
      const before = walked[i - 1]?.value ?? -Infinity;
      const after = walked[i + 1]?.value ?? -Infinity;
      if (point.value < before || point.value < after) return;
      const from = Float64Array.from([...point.reps, point.slope]);
      const local = maximise(model, constraint, penalty, from, options);
      if (local.status !== 'singular' && local.value > best.value + 1e-9) best = local;
    });
  }
  return best;
}

/** Free intercepts that keep each group's η at its weighted mean while the slope changes. */
function turn(
  model: CommonSlope,
  constraint: Constraint,
  reps: Float64Array,
  from: number,
  to: number,
): Float64Array {
  const weight = new Float64Array(constraint.reps);
  const moment = new Float64Array(constraint.reps);
  for (let g = 0; g < model.groups; g++) {
    const r = constraint.rep[g];
    if (r < 0) continue;
    weight[r] += model.infoAA[g];
    moment[r] += model.infoAB[g] + constraint.onSlope[g] * model.infoAA[g];
  }
  return reps.map((a, r) => (weight[r] > 0 ? a + ((from - to) * moment[r]) / weight[r] : a));
}
