import { describe, expect, it } from 'vitest';
import {
  combineFriction,
  frictionStatistics,
  inclineMu,
  inclineUncertainty,
  poolFrictionTests,
} from '../../../shared/physics/frictionTest.ts';
import { toRadians } from '../../../shared/units/angle.ts';
import { expectCheckValue } from '../../reference/checkValue.ts';

const repeats = [19.2, 20.1, 19.6, 20.8, 19.9].map((angleDeg) => ({ angleDeg }));

describe('friction from an incline', () => {
  it('is the tangent of the angle, or height over base', () => {
    expectCheckValue('incline.tan20', inclineMu({ angleDeg: 20 }));
    expect(inclineMu({ heightMm: 120, baseMm: 300 })).toBe(0.4);
    expectCheckValue('incline.u_mu', inclineUncertainty(Math.tan(toRadians(20)), toRadians(0.5)));
  });

  it('summarises five repeats as the handbook does', () => {
    // mean 0.3624256, s 0.0118136 (handbook, derived)
    const { mean, sd, n } = frictionStatistics(repeats.map(inclineMu));
    expect(mean).toBeCloseTo(0.3624256, 7);
    expect(sd).toBeCloseTo(0.0118136, 7);
    expect(n).toBe(5);
  });

  it('has no scatter with one reading', () => {
    expect(frictionStatistics([0.3])).toEqual({ mean: 0.3, sd: null, n: 1 });
  });

  it('pools the tests that are not excluded, with the larger gauge uncertainty', () => {
    const pooled = poolFrictionTests([
      { readings: repeats.slice(0, 2), readingUncertainty: 0.002 },
      { readings: repeats.slice(2), readingUncertainty: 0.004 },
      { readings: [{ angleDeg: 45 }], readingUncertainty: 0.5, excluded: true },
    ]);
    expect(pooled).toEqual({
      ...frictionStatistics(repeats.map(inclineMu)),
      readingUncertainty: 0.004,
    });
    expect(poolFrictionTests([{ readings: repeats, readingUncertainty: 0, excluded: true }])).toBe(
      null,
    );
  });

  it('keeps a single source without gauge uncertainty as it is', () => {
    const sample = combineFriction([
      { mean: 0.36, sd: 0.0118, n: 5, readingUncertainty: 0, weight: 3 },
    ]);
    expect(sample.n).toBe(5);
    expect(sample.mean).toBeCloseTo(0.36, 14);
    expect(sample.sd).toBeCloseTo(0.0118, 14);
  });

  it('adds the gauge to the standard uncertainty and its degrees of freedom', () => {
    const source = { mean: 0.36, sd: 0.01, n: 4, readingUncertainty: 0.005, weight: 1 };
    const { sd, n } = combineFriction([source]);
    const variance = 0.01 ** 2 / 4 + 0.005 ** 2;
    expect(sd / Math.sqrt(n)).toBeCloseTo(Math.sqrt(variance), 12);
    // ν = u⁴/((s²/n)²/3) = (5e-5)²/((2.5e-5)²/3) = 12
    expect(n).toBe(13);
  });

  it('weights faces by the torque they carry; independent scatter, common gauge', () => {
    const face = { sd: 0.02, n: 9, readingUncertainty: 0.003 };
    const { mean, sd, n } = combineFriction([
      { ...face, mean: 0.2, weight: 1 },
      { ...face, mean: 0.4, weight: 3 },
    ]);
    expect(mean).toBeCloseTo(0.35, 14);
    const scatter = [(0.25 * 0.02) ** 2 / 9, (0.75 * 0.02) ** 2 / 9];
    const variance = scatter.reduce((sum, v) => sum + v, 0) + 0.003 ** 2;
    const degrees = variance ** 2 / scatter.reduce((sum, v) => sum + v ** 2 / 8, 0);
    expect(sd / Math.sqrt(n)).toBeCloseTo(Math.sqrt(variance), 12);
    expect(n).toBe(Math.floor(degrees) + 1);
  });

  it('knows no scatter when one source has a single reading', () => {
    const one = { mean: 0.3, sd: null, n: 1, readingUncertainty: 0.01, weight: 1 };
    expect(combineFriction([one])).toEqual({ mean: 0.3, sd: 0, n: 1 });
  });

  it('refuses an angle of 90° and a base of 0', () => {
    expect(() => inclineMu({ angleDeg: 90 })).toThrow(/^angleDeg must be/);
    expect(() => inclineMu({ heightMm: 1, baseMm: 0 })).toThrow(/^baseMm must be/);
  });
});
