import type { CommonSlope, Penalty } from './commonSlope.ts';
import type { Constraint } from './constraint.ts';
import { maximise, type Maximum, type MaximiseOptions } from './maximise.ts';

/** Slopes to try, and the most that the penalty can add: both are fixed by the trials. */
interface Landscape {
  slopes: number[];
  bound: number;
}

const landscapes = new WeakMap<CommonSlope, Landscape>();

/**
 * Slopes of both signs, from a quarter over the whole range of levels to forty per smallest step
 * between them. The penalty ½ ln det I is at most that of the largest weights (2/3 a trial bounds
 * all three links).
 */
function landscapeOf(model: CommonSlope): Landscape {
  const known = landscapes.get(model);
  if (known) return known;
  const { cells, groupOf, groups } = model;
  const levels = [...new Set(cells.z)].sort((x, y) => x - y);
  const span = levels[levels.length - 1] - levels[0];
  const slopes = [0];
  let gap = span;
  for (let i = 1; i < levels.length; i++) {
    const step = levels[i] - levels[i - 1];
    if (step > 1e-3 * span) gap = Math.min(gap, step);
  }
  if (span > 0) for (let b = 0.25 / span; b < 40 / gap; b *= 2) slopes.push(b, -b);
  const top = model.link.name === 'logit' ? 0.25 : 2 / 3;
  const trials = new Float64Array(groups);
  const mean = new Float64Array(groups);
  for (let i = 0; i < cells.size; i++) {
    const g = groupOf[cells.configuration[i]];
    trials[g] += cells.n[i];
    mean[g] += (cells.n[i] * (cells.z[i] - mean[g])) / trials[g];
  }
  let spread = 0;
  for (let i = 0; i < cells.size; i++) {
    spread += cells.n[i] * (cells.z[i] - mean[groupOf[cells.configuration[i]]]) ** 2;
  }
  const bound =
    0.5 * (trials.reduce((sum, n) => sum + Math.log(top * n), 0) + Math.log(top * spread));
  const landscape = { slopes: slopes.sort((x, y) => x - y), bound };
  landscapes.set(model, landscape);
  return landscape;
}

/**
 * Best of the local maxima of a penalised likelihood: walks a grid of slopes from the start's own
 * in both directions, each with its best intercepts, and refines from every local best.
 *
 * The penalised likelihood of separated trials can have several maxima: at most two per gap
 * between levels (steeper or flatter than the gap). Where the slope is well determined
 * (`model.careful` false) the one that the start leads to is the only one. The walk ends where the
 * falling likelihood plus the largest possible penalty cannot reach the best value any more.
 */
export function bestMaximum(
  model: CommonSlope,
  constraint: Constraint,
  penalty: Penalty,
  start: Float64Array,
  options: MaximiseOptions = {},
): Maximum {
  let best = maximise(model, constraint, penalty, start, options);
  const several = model.careful && constraint.fixedSlope === null && constraint.onExtra === null;
  if (!several && best.status === 'converged') return best;
  if (constraint.fixedSlope !== null || constraint.onExtra !== null) return best;
  const { slopes, bound } = landscapeOf(model);
  const origin = best.status === 'singular' ? start : best.free;
  const b0 = origin[constraint.reps];
  const split = slopes.findIndex((b) => b > b0);
  const cut = split < 0 ? slopes.length : split;
  for (const side of [slopes.slice(cut), slopes.slice(0, cut).reverse()]) {
    let reps: Float64Array = origin.slice(0, constraint.reps);
    let slope = b0;
    let before = Infinity;
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
      const hopeless = penalty === 'common' && there.logLik + bound + 2 < best.value;
      if (hopeless && there.logLik < before) break;
      before = there.logLik;
    }
    walked.forEach((point, i) => {
      const nearer = walked[i - 1]?.value ?? -Infinity;
      const farther = walked[i + 1]?.value ?? -Infinity;
      if (point.value < nearer || point.value < farther) return;
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
