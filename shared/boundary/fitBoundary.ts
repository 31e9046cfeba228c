import type { AnalysisRequest, AnalysisResult, Link } from '../schemas/analysis.ts';
import { chiSquareQuantile } from '../numeric/distributions.ts';
import { apart, withShifts } from './cells.ts';
import { collect, isFailure, withTrials, type BoundaryData } from './collect.ts';
import { unfitted } from './modelFit.ts';
import { compareModels, powerAgainstOffsets, type Comparison } from './compareModels.ts';
import { drift, heterogeneity, type Heterogeneity } from './diagnostics.ts';
import { fitCommonSlope, type CommonSlopeFit } from './fitCommonSlope.ts';
import { linkFunction } from './link.ts';
import { describeModels, fitModels } from './models.ts';
import { exponentInterval } from './powerModel.ts';
import {
  quantileInterval,
  shiftInterval,
  type Absence,
  type Basis,
  type ProfileInterval,
} from './profileInterval.ts';
import { separation, type SeparationKind } from './separation.ts';
import { shiftSearch } from './shiftSearch.ts';

/** What the fit depends on; anything else of a request is judged without fitting again. */
export type FitRequest = Pick<
  AnalysisRequest,
  | 'trials'
  | 'torquePerMu'
  | 'inertiaRelativeUncertainty'
  | 'estimator'
  | 'link'
  | 'failure'
  | 'confidence'
  | 'target'
>;

/** Interval of an acceleration, torque or ratio in its own unit. */
export interface Estimate {
  estimate: number | null;
  lower: number | null;
  upper: number | null;
  absence: Absence | null;
}

/** Which model a configuration's quantiles come from. */
export type Source = 'scaled' | 'shifted' | 'offsets';

export interface ConfigurationFit {
  alpha50: { scaled: Estimate; offsets: Estimate };
  source: Source;
  /** α₅₀ at `confidence` from `source`. */
  level50: Estimate;
  /** α at the target, two-sided 2·confidence − 1, from `source`. */
  target: Estimate;
  /** Shift ratio e^δ at `confidence` and at 2·confidence − 1. */
  ratio: Estimate;
  ratioNarrow: Estimate;
  p: number | null;
  /** Set apart by the step-down search. */
  setApart: 'early' | 'late' | null;
  /** Lower bound of α at the target for the demonstrated limit, rad/s², before any discount. */
  demonstrated: number | null;
}

/** Everything that depends on the trials, computed once. */
export interface BoundaryFit {
  data: BoundaryData;
  settings: Pick<AnalysisRequest, 'estimator' | 'link' | 'failure' | 'confidence' | 'target'>;
  separation: { overall: SeparationKind; configurations: SeparationKind[] };
  models: AnalysisResult['models'];
  comparisons: Comparison[];
  /** power against offsets, for the sentence of a torque that changes along the positions. */
  powerAgainstOffsets: Comparison | null;
  exponentAbsence: Absence | null;
  torque50: Estimate;
  commonTorque50: Estimate;
  noCommonCurve: boolean;
  configurations: ConfigurationFit[];
  heterogeneity: Heterogeneity;
  drift: { change: number | null; p: number | null; note: string | null };
}

const NO_ESTIMATE: Estimate = { estimate: null, lower: null, upper: null, absence: 'not fitted' };

/** A configuration none of whose trials is in the fit. */
const UNFITTED: ConfigurationFit = {
  alpha50: { scaled: NO_ESTIMATE, offsets: NO_ESTIMATE },
  source: 'scaled',
  level50: NO_ESTIMATE,
  target: NO_ESTIMATE,
  ratio: NO_ESTIMATE,
  ratioNarrow: NO_ESTIMATE,
  p: null,
  setApart: null,
  demonstrated: null,
};

/** Only step-up series were sent: nothing is fitted, everything says so. */
function nothingToFit(request: FitRequest, data: BoundaryData): BoundaryFit {
  const { estimator, link, failure, confidence, target } = request;
  const none = { estimate: null, lower: null, upper: null };
  return {
    data,
    settings: { estimator, link, failure, confidence, target },
    separation: separation(data.cells),
    models: {
      scaled: unfitted('singular', ['intercept', 'slope']),
      power: {
        ...unfitted('singular', ['intercept', 'lnAcceleration', 'lnInertia']),
        exponent: none,
      },
      offsets: unfitted('singular', []),
      separate: unfitted('singular', []),
    },
    comparisons: [],
    powerAgainstOffsets: null,
    exponentAbsence: 'not fitted',
    torque50: NO_ESTIMATE,
    commonTorque50: NO_ESTIMATE,
    noCommonCurve: false,
    configurations: data.configurations.map(() => UNFITTED),
    heterogeneity: { ratio: null, p: null, factor: 1, between: null, clusters: 0 },
    drift: { change: null, p: null, note: 'Drift is not judged: no trial is left in the fit.' },
  };
}

const EMPTY: ProfileInterval = { estimate: null, lower: null, upper: null, absence: 'not fitted' };

function toEstimate(interval: ProfileInterval, convert: (x: number) => number): Estimate {
  const turn = (x: number | null) => {
    if (x === null) return null;
    const value = convert(x);
    return Number.isFinite(value) && value > 0 ? value : null;
  };
  return {
    estimate: turn(interval.estimate),
    lower: turn(interval.lower),
    upper: turn(interval.upper),
    absence: interval.absence,
  };
}

/**
 * Fits everything the checks rest on: the four models, their comparisons, the shift search and the
 * quantiles with their profile intervals. Definitions: methods page, sections 2 to 4.
 *
 * @returns numbers in SI on the request's own accelerations and inertias
 */
export function fitBoundary(request: FitRequest): BoundaryFit {
  const { estimator, failure, confidence, target } = request;
  const penalised = estimator === 'firth';
  const plainBasis: Basis = penalised ? 'penalised' : 'plain';
  const checkBasis: Basis = penalised ? 'guarded' : 'plain';
  const link = linkFunction(request.link);
  const failed = isFailure(failure);
  const whole = collect(request);
  const { data, places } = withTrials(whole);
  if (places.length === 0) return nothingToFit(request, whole);
  const { cells, centre, configurations } = data;
  const count = configurations.length;
  const labels = configurations.map((c) => c.label);

  const models = fitModels(data, link, penalised);
  const scatter = heterogeneity(data, models.offsets, failed);
  const critWide = chiSquareQuantile(confidence, 1) * scatter.factor;
  const critNarrow = chiSquareQuantile(2 * confidence - 1, 1) * scatter.factor;

  const search = shiftSearch(cells, link, checkBasis, confidence, scatter.factor, labels);
  const { found, noCommonCurve, common } = search;
  // without found shifts the common model is the plain scaled one, which needs no guard
  const commonBasis = found.length > 0 ? checkBasis : plainBasis;
  const torque = (interval: ProfileInterval) => toEstimate(interval, (z) => Math.exp(z + centre));
  const alpha = (interval: ProfileInterval, c: number) =>
    toEstimate(interval, (z) =>
      Math.exp(z + centre - Math.log(configurations[c].equivalentInertia)),
    );

  const eta50 = link.eta(0.5);
  const etaTarget = link.eta(target);
  const scaled50 = quantileInterval(models.scaled, 0, eta50, plainBasis, critWide, false);
  const common50 =
    found.length > 0 ? quantileInterval(common, 0, eta50, commonBasis, critWide, false) : scaled50;
  const commonTarget = quantileInterval(common, 0, etaTarget, commonBasis, critNarrow, false);
  const offsets50 = labels.map((_, c) =>
    quantileInterval(models.offsets, c, eta50, checkBasis, critWide, true),
  );
  const links: Link[] =
    target <= 0.01 ? [...new Set([request.link, 'logit', 'cloglog'] as const)] : [request.link];
  const demonstrated = demonstratedLimits();
  const exponent = exponentInterval(models.power, penalised, critWide);

  const fitted = labels.map((_, c) => configurationFit(c));
  return {
    data: whole,
    settings: { estimator, link: request.link, failure, confidence, target },
    separation: separation(whole.cells),
    models: withExponent(describeModels(data, models, penalised)),
    comparisons: compareModels(data, models, penalised),
    powerAgainstOffsets: powerAgainstOffsets(data, models, penalised),
    exponentAbsence: exponent.absence,
    torque50: torque(scaled50),
    commonTorque50: noCommonCurve ? torque(EMPTY) : torque(common50),
    noCommonCurve,
    configurations: whole.configurations.map((_, c) => fitted[places.indexOf(c)] ?? UNFITTED),
    heterogeneity: scatter,
    drift: drift(data, link, penalised, failed),
  };

  function withExponent(described: ReturnType<typeof describeModels>): AnalysisResult['models'] {
    const { estimate, lower, upper } = exponent;
    return { ...described, power: { ...described.power, exponent: { estimate, lower, upper } } };
  }

  function configurationFit(c: number): ConfigurationFit {
    const place = found.indexOf(c);
    const source: Source = place >= 0 ? 'shifted' : noCommonCurve ? 'offsets' : 'scaled';
    const quantile = (eta: number, crit: number) =>
      place >= 0
        ? quantileInterval(common, place + 1, eta, checkBasis, crit, true)
        : quantileInterval(models.offsets, c, eta, checkBasis, crit, true);
    const shiftFit = place >= 0 ? common : search.own[c];
    const group = place >= 0 ? place + 1 : found.length + 1;
    const shift = (crit: number) =>
      toEstimate(shiftFit ? shiftInterval(shiftFit, group, checkBasis, crit) : EMPTY, Math.exp);
    const own = configurations[c];
    const early =
      own.slips === 0
        ? false
        : own.slips === own.trials.length
          ? true
          : place >= 0 && isLow(common, place + 1);
    return {
      alpha50: { scaled: alpha(scaled50, c), offsets: alpha(offsets50[c], c) },
      source,
      level50: alpha(
        source === 'scaled'
          ? common50
          : source === 'offsets'
            ? offsets50[c]
            : quantile(eta50, critWide),
        c,
      ),
      target: alpha(source === 'scaled' ? commonTarget : quantile(etaTarget, critNarrow), c),
      ratio: shift(critWide),
      ratioNarrow: shift(critNarrow),
      p: search.p[c]!,
      setApart: place < 0 ? null : early ? 'early' : 'late',
      demonstrated: demonstrated[c]!,
    };
  }

  /**
   * The lower of the bounds from the common curve with the found shifts and from the same with the
   * configuration's own shift, under every link; null as soon as one of them does not exist.
   */
  function demonstratedLimits(): (number | null)[] {
    const lowest: (number | null)[] = labels.map(() => Infinity);
    for (const name of links) {
      const other = linkFunction(name);
      const same = name === request.link;
      const eta = other.eta(target);
      const commonFit = same ? common : fitCommonSlope(cells, withShifts(count, found), other);
      const offsetsFit =
        !noCommonCurve || same ? models.offsets : fitCommonSlope(cells, apart(count), other);
      const bound = (fit: CommonSlopeFit, group: number, basis: Basis, own: boolean) =>
        quantileInterval(fit, group, eta, basis, critNarrow, own).lower;
      const shared = noCommonCurve
        ? null
        : same
          ? commonTarget.lower
          : bound(commonFit, 0, commonBasis, false);
      labels.forEach((_, c) => {
        const place = found.indexOf(c);
        const bounds: (number | null)[] = [];
        if (place >= 0) bounds.push(bound(commonFit, place + 1, checkBasis, true));
        else if (noCommonCurve) bounds.push(bound(offsetsFit, c, checkBasis, true));
        else {
          bounds.push(shared);
          if (count > 1) {
            const own = same
              ? search.own[c]!
              : fitCommonSlope(cells, withShifts(count, [...found, c]), other, commonFit);
            bounds.push(bound(own, found.length + 1, checkBasis, true));
          }
        }
        for (const z of bounds) {
          const best = lowest[c]!;
          lowest[c] = z === null || best === null ? null : Math.min(best, z);
        }
      });
    }
    return lowest.map((z, c) => {
      if (z === null || z === Infinity) return null;
      const value = Math.exp(z + centre - Math.log(configurations[c].equivalentInertia));
      return Number.isFinite(value) && value > 0 ? value : null;
    });
  }
}

/** Whether a set-apart group slips at a lower torque than the common curve. */
function isLow(fit: CommonSlopeFit, group: number): boolean {
  const { a, b } = fit.penalised;
  return (a[0] - a[group]) / b < 0;
}
