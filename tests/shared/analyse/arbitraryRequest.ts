import fc from 'fast-check';
import {
  analysisRequestSchema,
  estimators,
  failures,
  links,
  rules,
  type AnalysisRequest,
} from '../../../shared/schemas/analysis.ts';

/** Requests of every kind a bench may send: few trials, one level, all held, seatings, series … */
export const arbitraryRequest: fc.Arbitrary<AnalysisRequest> = fc
  .record({
    configurations: fc.integer({ min: 1, max: 4 }),
    size: fc.integer({ min: 1, max: 30 }),
    seed: fc.integer({ min: 1, max: 2 ** 30 }),
    slope: fc.constantFrom(1.5, 8, 25, 60, 1e4, -5),
    scale: fc.constantFrom(1e-3, 1, 1e4),
    inertia: fc.constantFrom(1e-6, 1e-3, 10),
    levels: fc.constantFrom(1, 2, 5, 1000),
    lost: fc.boolean(),
    named: fc.boolean(),
    friction: fc.constantFrom('none', 'kinetic', 'static', 'both'),
    estimator: fc.constantFrom(...estimators),
    link: fc.constantFrom(...links),
    failure: fc.constantFrom(...failures),
    rule: fc.constantFrom(...rules),
    target: fc.constantFrom(1e-4, 0.01, 0.1, 0.5),
    confidence: fc.constantFrom(0.6, 0.95, 0.999),
    torque: fc.constantFrom('none', 'common', 'own'),
  })
  .map((shape) => {
    let state = shape.seed;
    const random = () => {
      state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
      return state / 2 ** 32;
    };
    const label = (c: number) => 'ABCD'[c];
    const trials = Array.from({ length: shape.size }, (_, i) => {
      const c = Math.floor(random() * shape.configurations);
      const inertia = shape.inertia * (1 + c);
      const step = Math.floor(random() * shape.levels) / shape.levels;
      const ratio = 0.7 + 0.6 * step;
      const slips = random() < 1 / (1 + Math.exp(-shape.slope * Math.log(ratio)));
      return {
        configuration: label(c),
        inertia,
        acceleration: (shape.scale * ratio * shape.inertia) / inertia,
        outcome: slips ? (shape.lost && random() < 0.4 ? 'lost' : 'slipped') : 'held',
        ...(shape.named
          ? { order: i, seating: `s${i % 6}`, series: `r${i % 9}`, judgedBy: 'end mark' }
          : {}),
      };
    });
    const labels = [...new Set(trials.map((trial) => trial.configuration))];
    const torque = shape.scale * shape.inertia * 3;
    const sample = { mean: 0.3, sd: 0.02, n: 5 };
    return analysisRequestSchema.parse({
      trials,
      ...(shape.torque === 'common' ? { torquePerMu: torque } : {}),
      ...(shape.torque === 'own'
        ? {
            torquePerMu: Object.fromEntries(
              labels.map((l, i) => [
                l,
                { value: torque * (1 + 0.1 * i), relativeUncertainty: 0.02 },
              ]),
            ),
          }
        : {}),
      ...(shape.friction === 'none'
        ? {}
        : {
            friction: {
              ...(shape.friction !== 'static' ? { kinetic: sample } : {}),
              ...(shape.friction !== 'kinetic' ? { static: { ...sample, mean: 0.36 } } : {}),
            },
          }),
      moveAngle: 3.1,
      smallestVisibleSlip: 0.01,
      drive: { maxAcceleration: shape.scale, resolution: shape.scale / 100 },
      rule: shape.rule,
      estimator: shape.estimator,
      link: shape.link,
      failure: shape.failure,
      target: shape.target,
      confidence: shape.confidence,
    });
  });
