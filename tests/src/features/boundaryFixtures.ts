import {
  type AnalysisResult,
  type Boundary,
  type ConfigurationResult,
} from '../../../shared/schemas/analysis.ts';

const none = { estimate: null, lower: null, upper: null };

/** A configuration in line, to be changed where a test needs it. */
export function configurationResult(over: Partial<ConfigurationResult> = {}): ConfigurationResult {
  const alpha50 = { estimate: 20, lower: 19, upper: 21 };
  return {
    label: '45 mm',
    inertia: 1e-3,
    trials: 16,
    slips: 7,
    highestHeld: 21,
    lowestSlipped: 19.5,
    alpha50: { scaled: alpha50, offsets: { estimate: 19.6, lower: 18, upper: 21.4 } },
    alphaTarget: { estimate: 15, lower: 13, upper: 16, model: 'scaled' },
    theory: { holding: 18, lettingGo: 23, holdingUncertainty: 0.04, lettingGoUncertainty: 0.05 },
    demonstrated: 13,
    workingLimit: 12.6,
    binds: 'theory',
    shape: { ratio: 0.98, lower: 0.92, upper: 1.05, p: 0.4, state: 'on curve' },
    level: { state: 'in line', reason: 'half slip between the bounds' },
    margin: {
      state: 'shown',
      judged: 12.6,
      slipsAtOrBelow: 0,
      trialsAtOrBelow: 6,
      upperBound: 0.393,
    },
    verdict: 'in line',
    sentence: '45 mm is in line.',
    ...over,
  };
}

/** An analysis result around the given configurations. */
export function analysisResult(configurations: ConfigurationResult[]): AnalysisResult {
  const fit = {
    status: 'converged' as const,
    coefficients: [],
    covariance: [],
    logLik: -10,
    penalisedLogLik: -8,
    aicc: 24,
  };
  return {
    engine: 'test',
    status: 'converged',
    estimator: 'firth',
    link: 'logit',
    counts: { trials: 16, held: 9, slipped: 6, lost: 1, levels: 8 },
    separation: { overall: 'none', configurations: {} },
    models: { scaled: fit, power: { ...fit, exponent: none }, offsets: fit, separate: fit },
    comparisons: [],
    torque50: { estimate: 0.02, lower: 0.019, upper: 0.021 },
    commonTorque50: { estimate: 0.02, lower: 0.019, upper: 0.021 },
    mu50: none,
    configurations,
    verdict: 'in line',
    sentence: 'All configurations are in line.',
    diagnostics: { drift: { change: null, p: null }, heterogeneity: { ratio: null, p: null } },
    limitFunction: { torque: 0.0126, from: 'min over configurations' },
    notes: [],
  };
}

export function boundaryOf(result: AnalysisResult | null): Boundary {
  return {
    fixtureId: 1,
    digest: 'd'.repeat(64),
    buildUpRevision: 1,
    result,
    reason: result === null ? 'There are no trials yet.' : null,
    options: {
      rule: 'lower of both',
      margin: 0.3,
      target: 0.01,
      tolerance: 0.15,
      confidence: 0.95,
      estimator: 'firth',
      link: 'logit',
      failure: 'slipped',
    },
    polynomial: [5e-4, 0, 0.25],
    positions: [{ label: '45 mm', positionMm: 45, inertia: 1e-3 }],
    excluded: 0,
    torquePerMu: 0.06,
    lastSaved: null,
  };
}
