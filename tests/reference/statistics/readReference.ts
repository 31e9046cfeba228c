import { readFileSync } from 'node:fs';
import { linkFunction } from '../../../shared/boundary/link.ts';
import type { Cells } from '../../../shared/boundary/cells.ts';
import type { LinearProblem } from '../../../shared/boundary/fitLinear.ts';
import type { Link } from '../../../shared/schemas/analysis.ts';

export interface ReferenceProfile {
  name: string;
  lower: number | string;
  upper: number | string;
  deviance_at_zero: number;
}

export interface ReferenceQuantile {
  group: string;
  p: number;
  x_p: number;
  se_delta: number;
  profile?: { lower: number; upper: number; deviance_limit_slope_zero: number };
}

export interface ReferenceFit {
  exists: boolean;
  coefficients: number[];
  standard_errors: number[];
  vcov: number[][];
  loglik_bernoulli: number;
  penalized_loglik: number;
  loglik_supremum?: number;
  profile_95_coefficients?: ReferenceProfile[];
  quantiles?: ReferenceQuantile[];
}

export interface ReferenceModel {
  coefficient_names: string[];
  ml: ReferenceFit;
  firth: ReferenceFit;
}

function text(file: string): string {
  return readFileSync(new URL(file, import.meta.url), 'utf8');
}

/** The rows of a reference table, by column name. */
export function readTable(file: string): Record<string, string>[] {
  const [head, ...lines] = text(file).trim().split('\n');
  const names = head.split(',');
  return lines.map((line) => {
    const values = line.split(',');
    return Object.fromEntries(names.map((name, i) => [name, values[i]]));
  });
}

/** A file of reference values. */
export function readJson<T>(file: string): T {
  return JSON.parse(text(file)) as T;
}

/** The recomputed values of a data set. */
export function readExpected<T>(dataset: string): T {
  return readJson<T>(`${dataset}.expected.json`);
}

/** A regression problem from rows of columns, trials and events. */
export function problemOf(
  rows: readonly (readonly number[])[],
  n: readonly number[],
  k: readonly number[],
  link: Link = 'logit',
): LinearProblem {
  return {
    columns: rows[0].length,
    design: Float64Array.from(rows.flat()),
    n: Float64Array.from(n),
    k: Float64Array.from(k),
    link: linkFunction(link),
  };
}

/** Cells of a common-slope model: one predictor, groups from 0. */
export function cellsOf(
  z: readonly number[],
  n: readonly number[],
  k: readonly number[],
  group: readonly number[] = z.map(() => 0),
): Cells {
  return {
    size: z.length,
    configurations: Math.max(...group) + 1,
    configuration: Int32Array.from(group),
    z: Float64Array.from(z),
    n: Float64Array.from(n),
    k: Float64Array.from(k),
  };
}
