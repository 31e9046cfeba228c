import { chiSquareUpper } from '../numeric/distributions.ts';
import { withShifts, type Cells } from './cells.ts';
import { shiftedBy } from './constraint.ts';
import { fitCommonSlope, maximiseUnder, type CommonSlopeFit } from './fitCommonSlope.ts';
import type { LinkFunction } from './link.ts';
import { mlSupremum } from './mlSupremum.ts';
import type { Basis } from './profileInterval.ts';

/** Step-down search for configurations that are not on the common curve. */
export interface ShiftSearch {
  /** Set apart, in the order found. */
  found: number[];
  /** More than the search can tell apart: no common curve for those not set apart. */
  noCommonCurve: boolean;
  /** p per configuration: of the step at which it was set apart, else of the last step. */
  p: (number | null)[];
  /** Scaled with the found shifts kept in: group 0 the common curve, then one per found shift. */
  common: CommonSlopeFit;
  /** The same with a shift of its own (the last group) for each configuration not set apart. */
  own: (CommonSlopeFit | null)[];
}

/** Likelihood-ratio statistic of "group `group` is on group 0's curve" inside `fit`. */
export function shiftDeviance(fit: CommonSlopeFit, group: number, basis: Basis): number {
  const { model, penalised, supremum } = fit;
  const onCurve = shiftedBy(model.groups, group, 0);
  let plain = Infinity;
  if (basis !== 'penalised') {
    const start = new Float64Array(onCurve.reps + 1);
    onCurve.rep.forEach((r, g) => (start[r] = penalised.a[g]!));
    start[onCurve.reps] = penalised.b;
    plain = Math.max(0, 2 * (supremum.logLik - mlSupremum(model, onCurve, start).logLik));
    if (basis === 'plain') return plain;
  }
  const drop = 2 * (penalised.value - maximiseUnder(model, onCurve, 'common').value);
  return Math.min(Math.max(0, drop), plain);
}

/**
 * Each round tests, for every configuration not yet set apart, the found shifts plus its own
 * against the found shifts only, by the smaller of the penalised and the unpenalised likelihood
 * ratio. The smallest p is set apart while p × (number remaining) < 1 − confidence. When two
 * remain, or half or more would be set apart, there is no common curve.
 *
 * @param factor - heterogeneity factor ≥ 1 by which statistics are divided (Finney 1971)
 * @param better - order of two configurations whose p tie: the larger |δ|, then the label
 * @source step-down: Holm 1979, Scand. J. Stat. 6:65; guard: methods page, section 3
 */
export function shiftSearch(
  cells: Cells,
  link: LinkFunction,
  basis: Basis,
  confidence: number,
  factor: number,
  labels: readonly string[],
): ShiftSearch {
  const count = cells.configurations;
  const found: number[] = [];
  const p: (number | null)[] = labels.map(() => null);
  let common = fitCommonSlope(cells, withShifts(count, found), link);
  if (count === 1) return { found, noCommonCurve: false, p, common, own: [null] };
  for (;;) {
    const remaining = labels.map((_, c) => c).filter((c) => !found.includes(c));
    const own: (CommonSlopeFit | null)[] = labels.map(() => null);
    for (const c of remaining) {
      const fit = fitCommonSlope(cells, withShifts(count, [...found, c]), link, common);
      own[c] = fit;
      const deviance = shiftDeviance(fit, found.length + 1, basis) / factor;
      p[c] = Number.isFinite(deviance) ? chiSquareUpper(deviance, 1) : null;
    }
    const delta = (c: number) => {
      const { a, b } = own[c]!.penalised;
      return Math.abs((a[0] - a[found.length + 1]) / b);
    };
    const tested = remaining.filter((c) => p[c] !== null);
    const worst = tested.reduce<number | null>((best, c) => {
      if (best === null) return c;
      const [mine, its] = [p[c]!, p[best]!];
      if (Math.abs(mine - its) > 1e-9 * Math.max(mine, its)) return mine < its ? c : best;
      const [mineDelta, itsDelta] = [delta(c), delta(best)];
      if (Math.abs(mineDelta - itsDelta) > 1e-9 * Math.max(mineDelta, itsDelta)) {
        return mineDelta > itsDelta ? c : best;
      }
      return labels[c] < labels[best] ? c : best;
    }, null);
    const significant = worst !== null && p[worst]! * remaining.length < 1 - confidence;
    if (!significant) return { found, noCommonCurve: false, p, common, own };
    if (remaining.length === 2 || 2 * (found.length + 1) >= count) {
      return { found, noCommonCurve: true, p, common, own };
    }
    found.push(worst);
    common = own[worst]!;
  }
}
