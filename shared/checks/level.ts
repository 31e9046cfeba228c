import type { ConfigurationResult } from '../schemas/analysis.ts';
import type { Estimate } from '../boundary/fitBoundary.ts';
import { acceleration, count, digits, percent, range } from './text.ts';
import type { Bound, Theory } from './theory.ts';

type Level = ConfigurationResult['level'];

/** A band edge: the bound, its uncertainty and the smaller of that and the tolerance. */
interface Edge {
  alpha: number;
  u: number | null;
  v: number;
}

function edge(bound: Bound | null, tolerance: number): Edge | null {
  if (bound === null) return null;
  const v = bound.uncertainty === null ? tolerance : Math.min(bound.uncertainty, tolerance);
  return { alpha: bound.alpha, u: bound.uncertainty, v };
}

const MORE_FRICTION = 'More friction tests, not more trials, will decide it';

/**
 * Does α₅₀ lie where theory puts it? Band from the holding bound (kinetic μ) to the letting-go
 * bound (static μ), each widened by v = min(u, tolerance). Null ends count as 0 and ∞.
 *
 * Each statement needs only the friction it names: "slips early" the kinetic, "holds longer" the
 * static one. Definitions: methods page, section 3.2.
 */
export function levelCheck(
  alpha50: Estimate,
  theory: Theory,
  tolerance: number,
  trials: number,
): Level {
  const { kinetic, static: still } = theory;
  if (kinetic === null && still === null) {
    return { state: 'not checked', reason: 'No friction tests or no seat torque to compare with.' };
  }
  let [holding, letting] = [edge(kinetic, tolerance), edge(still, tolerance)];
  const swapped = holding !== null && letting !== null && holding.alpha > letting.alpha;
  if (swapped) [holding, letting] = [letting, holding];
  const lower = alpha50.lower ?? 0;
  const upper = alpha50.upper ?? Infinity;
  const interval = `α₅₀ ${range(alpha50.lower, alpha50.upper)} rad/s²`;

  if (holding !== null && holding.u !== null && upper < holding.alpha * (1 - holding.u)) {
    return {
      state: 'slips early',
      reason: `${interval} lies below the holding bound ${digits(holding.alpha)} (± ${percent(holding.u)}).`,
    };
  }
  if (letting !== null && letting.u !== null && lower > letting.alpha * (1 + letting.u)) {
    return {
      state: 'holds longer',
      reason: `${interval} lies above the letting-go bound ${digits(letting.alpha)} (± ${percent(letting.u)}).`,
    };
  }
  const unknown = [holding, letting].some((e) => e !== null && e.u === null);
  if (unknown) {
    const reason = `Fewer than two friction tests of a kind: its uncertainty is unknown. ${MORE_FRICTION}.`;
    return { state: 'undecided', reason };
  }
  if (holding === null) {
    const reason = `Only static friction was tested: a slip too early cannot be seen. Test kinetic friction.`;
    return { state: 'undecided', reason };
  }
  const loose = [holding, letting].find((e) => e !== null && e.u! > tolerance);
  if (loose) {
    const reason = `Friction is known to ± ${percent(loose.u!)} only, the tolerance is ${percent(tolerance)}. ${MORE_FRICTION}.`;
    return { state: 'undecided', reason };
  }
  const low = holding.alpha * (1 - holding.v);
  const high = letting === null ? Infinity : letting.alpha * (1 + letting.v);
  if (lower >= low && upper <= high) {
    const where =
      letting === null ? `above ${digits(low)}` : `inside ${digits(low)}–${digits(high)}`;
    return { state: 'in line', reason: `${interval} lies ${where}.` };
  }
  return { state: 'undecided', reason: undecided(alpha50, low, high, trials) };
}

/**
 * Rough number of further trials until the interval fits between the edges: its half-widths in ln α
 * shrink with the square root of the number of trials.
 */
function undecided(alpha50: Estimate, low: number, high: number, trials: number): string {
  const { estimate, lower, upper } = alpha50;
  const band =
    high === Infinity ? `above ${digits(low)}` : `between ${digits(low)} and ${digits(high)}`;
  if (estimate === null) {
    const why =
      alpha50.absence === 'no slips'
        ? 'Nothing has slipped yet: go on upwards until something does.'
        : alpha50.absence === 'no holds'
          ? 'Nothing has held yet: go on downwards until something does.'
          : 'The trials do not tell yet where it lets go: try more accelerations on both sides.';
    return `${why} Theory expects it ${band} rad/s².`;
  }
  const x = Math.log(estimate);
  const down = lower === null ? Infinity : x - Math.log(lower);
  const up = upper === null ? Infinity : Math.log(upper) - x;
  if (down === Infinity || up === Infinity) {
    const side = down === Infinity ? 'below' : 'above';
    return `α₅₀ is not bounded ${side}: more trials on both sides of ${acceleration(estimate)}.`;
  }
  const [toLow, toHigh] = [x - Math.log(low), Math.log(high) - x];
  // inside the band the interval must fit in; outside, it must come free of the edge
  const ratios =
    toLow > 0 && toHigh > 0
      ? [down / toLow, up / toHigh]
      : toLow <= 0
        ? [up / -toLow]
        : [down / -toHigh];
  const factor = Math.max(...ratios) ** 2 - 1;
  const more = Math.max(1, Math.ceil(trials * factor));
  if (!(more <= 200)) {
    return `α₅₀ ${acceleration(estimate)} lies at an edge of the band (${band}): not by trials.`;
  }
  return `About ${count(more, 'more trial')} near ${acceleration(estimate)} should decide it.`;
}
