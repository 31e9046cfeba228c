import { requireNonNegative } from './requireRange.ts';

/** An input of a model: standard uncertainty, degrees of freedom (infinite when left out). */
export type UncertainInput = {
  name: string;
  value: number;
  uncertainty: number;
  degrees?: number;
};

/** What one input adds: ∂y/∂x and its share of the variance, 0 … 1. */
type Contribution = { name: string; sensitivity: number; share: number };

export type UncertaintyBudget = {
  value: number;
  /** Standard uncertainty of the value. */
  uncertainty: number;
  /** Standard uncertainty of its logarithm, i.e. relative. */
  relative: number;
  /** Effective degrees of freedom; Infinity when every input is known that well. */
  degrees: number;
  contributions: Contribution[];
};

/**
 * First-order propagation of uncertainty through a model of independent inputs. It differentiates
 * the whole model, so quantities computed from a common input (normal force and inertia from the
 * same masses) are correlated as they should be.
 *
 * @param model - of the inputs' values, in the order given; positive and smooth
 * @throws RangeError if an input or the model's value is out of range
 * @source JCGM 100:2008, 5.1.2 and G.4 (Welch–Satterthwaite, equation G.2b)
 */
export function propagateUncertainty(
  inputs: readonly UncertainInput[],
  model: (values: readonly number[]) => number,
): UncertaintyBudget {
  const values = inputs.map(({ name, value, uncertainty }) => {
    if (!Number.isFinite(value)) throw new RangeError(`${name} must be a finite number`);
    requireNonNegative(`uncertainty of ${name}`, uncertainty);
    return value;
  });
  const value = model(values);
  if (!(value > 0 && Number.isFinite(value))) {
    throw new RangeError('the model must give a finite value above 0');
  }
  const parts = inputs.map((input, index) => {
    const sensitivity = derivative(model, values, index);
    return { input, sensitivity, variance: (sensitivity * input.uncertainty) ** 2 };
  });
  const variance = parts.reduce((sum, part) => sum + part.variance, 0);
  const inverseDegrees = parts.reduce(
    (sum, { input, variance: part }) => sum + part ** 2 / (input.degrees ?? Infinity),
    0,
  );
  return {
    value,
    uncertainty: Math.sqrt(variance),
    relative: Math.sqrt(variance) / value,
    degrees: inverseDegrees === 0 ? Infinity : variance ** 2 / inverseDegrees,
    contributions: parts.map(({ input, sensitivity, variance: part }) => ({
      name: input.name,
      sensitivity,
      share: variance === 0 ? 0 : part / variance,
    })),
  };
}

/** Central difference with one Richardson step: error of order h⁴. */
function derivative(
  model: (values: readonly number[]) => number,
  values: readonly number[],
  index: number,
): number {
  const centre = values[index] ?? 0;
  const step = 1e-3 * (Math.abs(centre) || 1);
  const slope = (h: number): number =>
    (model(values.with(index, centre + h)) - model(values.with(index, centre - h))) / (2 * h);
  return (4 * slope(step / 2) - slope(step)) / 3;
}
