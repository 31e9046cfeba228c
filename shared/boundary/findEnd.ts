/** Twice the drop of a profile (penalised) log-likelihood along one quantity. */
export interface Profile {
  /** Deviance D ≥ 0 at x and its derivative. */
  at: (x: number) => { deviance: number; slope: number };
  /** D, sure to be from the best of several local maxima; later calls of `at` start from it. */
  surely: (x: number) => number;
  /** Whether `surely` can differ from `at`. */
  careful: boolean;
}

export interface EndSearch {
  /** Where the search starts; one of the profiles is at or below `crit` there. */
  from: number;
  direction: 1 | -1;
  crit: number;
  /** Where the end is expected, as a distance from the start: √crit standard errors. */
  scale: number;
  /**
   * The range in which trials lie, if the profile can be bumpy there: steps stay short, so that no
   * bump is stepped over. Null for a smooth one.
   */
  bumpy: readonly [number, number] | null;
}

/** ln of the largest acceleration or torque that a double holds, with room to spare. */
const LN_MAX = 690;

/**
 * End of the connected part of { x : min over profiles of D(x) ≤ crit } that holds `from`, or null
 * when the set does not end on that side (as far as double precision reaches).
 *
 * One profile is followed to its crossing; if another is still inside there, it is followed on.
 */
export function findEnd(profiles: readonly Profile[], search: EndSearch): number | null {
  let from = search.from;
  // the estimate lies inside by definition
  let inside = profiles[0];
  for (let round = 0; round < 50; round++) {
    const end = follow(inside, { ...search, from });
    if (end === null) return null;
    const stuck = round > 0 && Math.abs(end - from) <= 1e-12 * (1 + Math.abs(end));
    if (stuck) return end;
    const followed = inside;
    let lowest = Infinity;
    for (const profile of profiles) {
      const known = profile === followed && !profile.careful;
      const deviance = known ? search.crit : profile.surely(end);
      if (deviance < lowest) {
        lowest = deviance;
        inside = profile;
      }
    }
    if (lowest >= search.crit - 1e-7) return end;
    from = end;
  }
  return from;
}

/** Follows one profile outwards to where it crosses `crit`. */
function follow(profile: Profile, search: EndSearch): number | null {
  const { direction, crit, bumpy } = search;
  const root = Math.sqrt(crit);
  let inside = search.from;
  let at = profile.at(inside);
  let outside: number | null = null;
  let step = search.scale;
  const longest = bumpy ? (bumpy[1] - bumpy[0]) / 16 : Infinity;
  while (outside === null) {
    // √D is nearly straight: its tangent says how far the crossing is
    const r = Math.sqrt(Math.max(at.deviance, 0));
    const rate = (direction * at.slope) / (2 * r);
    if (r > 0.05 * root && rate > 0) {
      const expected = ((root - r) / rate) * 1.02 + 1e-9;
      step = Math.min(Math.max(expected, step / 8), step * 3);
    } else if (inside !== search.from) step *= 2;
    if (bumpy) {
      const within = inside > bumpy[0] - longest && inside < bumpy[1] + longest;
      // from outside the range, halt where it begins
      const ahead = direction * (bumpy[direction > 0 ? 0 : 1] - inside);
      if (within) step = Math.min(step, longest);
      else if (ahead > 0) step = Math.min(step, ahead);
    }
    const next = inside + direction * step;
    if (Math.abs(next) > LN_MAX) return null;
    const there = profile.at(next);
    if (there.deviance > crit) outside = next;
    else inside = next;
    at = there;
  }
  // at belongs to `outside`; Newton on √D, kept inside the bracket
  let x = outside;
  for (let i = 0; i < 100; i++) {
    const miss = Math.abs(at.deviance - crit);
    if (miss < 1e-10 * (1 + crit)) return x;
    if (Math.abs(outside - inside) <= 4e-16 * (1 + Math.abs(outside))) return inside;
    const r = Math.sqrt(Math.max(at.deviance, 0));
    const newton = x + ((root - r) * 2 * r) / at.slope;
    // so near that the next step is exact to double precision's need: its error is of second order
    if (miss < 1e-6 * crit && Math.abs(newton - x) < 1e-5 * search.scale) return newton;
    const [low, high] = inside < outside ? [inside, outside] : [outside, inside];
    const width = high - low;
    const usable = i < 30 && newton > low + 1e-3 * width * (i > 8 ? 1 : 0) && newton < high;
    x = usable ? newton : low + width / 2;
    at = profile.at(x);
    if (at.deviance > crit) outside = x;
    else inside = x;
  }
  return inside;
}
