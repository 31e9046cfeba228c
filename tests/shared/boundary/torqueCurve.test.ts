import { expect, it } from 'vitest';
import { torqueCurve } from '../../../shared/boundary/torqueCurve.ts';

it('gives slope −1 and the torque itself when the data are τ/I', () => {
  const points = [0.005, 0.009, 0.017, 0.03].map((inertia) => ({
    inertia,
    alpha50: 0.5 / inertia,
  }));
  const curve = torqueCurve(points);
  expect(curve?.slope).toBeCloseTo(-1, 12);
  expect(curve?.torque).toBeCloseTo(0.5, 12);
});

it("agrees with R's lm on logarithms", () => {
  // R 4.2.2: x <- c(.00576,.00706,.00936,.0127,.017); y <- c(83.6,70.5,44.1,40.6,30.3)
  //          coef(lm(log(y) ~ log(x)))
  const inertias = [0.00576, 0.00706, 0.00936, 0.0127, 0.017];
  const alphas = [83.6, 70.5, 44.1, 40.6, 30.3];
  const curve = torqueCurve(
    inertias.map((inertia, i) => ({ inertia, alpha50: alphas[i] ?? Number.NaN })),
  );
  expect(Math.log(curve?.torque ?? 0)).toBeCloseTo(-0.414349254162986, 9);
  expect(curve?.slope).toBeCloseTo(-0.932505977717771, 9);
});

it('has no slope from one inertia, and refuses what is not above 0', () => {
  expect(torqueCurve([{ inertia: 0.01, alpha50: 40 }])).toBeNull();
  expect(() => torqueCurve([{ inertia: 0, alpha50: 40 }])).toThrow(RangeError);
});
