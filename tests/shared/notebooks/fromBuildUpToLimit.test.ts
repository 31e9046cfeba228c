import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { turnoverTable } from '../../../server/demo/plans/valveBodies.ts';
import { bodyInertia } from '../../../shared/physics/bodyInertia.ts';
import { fixtureTheory } from '../../../shared/physics/fixtureTheory.ts';
import {
  inertiaAt,
  inertiaPolynomial,
  totalMass,
} from '../../../shared/physics/inertiaPolynomial.ts';
import { standardGravity } from '../../../shared/physics/gravity.ts';
import { roundToDecimals } from '../../../shared/units/roundToDecimals.ts';

const text = readFileSync('notebooks-md/from-build-up-to-limit.md', 'utf8');

/** The cells behind a row's first one. */
function row(name: string): string[] {
  const line = text.split('\n').find((one) => one.startsWith(`| ${name} |`));
  if (line === undefined) throw new Error(`the notebook has no row ${name}`);
  return line
    .split('|')
    .slice(2, -1)
    .map((cell) => cell.trim());
}

/** A printed number stands for the computed one when rounding to its decimals gives it. */
function expectPrinted(printed: string | undefined, value: number): void {
  const decimals = printed?.split('.')[1]?.length ?? 0;
  expect(value.toFixed(decimals)).toBe(Number(printed).toFixed(decimals));
}

const { fixture, buildUp } = turnoverTable;
const [body, bar, masses] = buildUp.bodies;
const polynomial = inertiaPolynomial(buildUp.bodies);
const theory = fixtureTheory(fixture, buildUp, turnoverTable.configurations, []);
const perMu = theory.torquePerMu ?? Number.NaN;

describe('the notebook from build-up to limit', () => {
  it('prints the inertia of each body', () => {
    if (!body || !bar || !masses) throw new Error('the plan has three bodies');
    expectPrinted(row('valve body')[2], bodyInertia(body.shape, body.mass));
    expectPrinted(row('cross bar')[2], bodyInertia(bar.shape, bar.mass));
    expectPrinted(row('two trim masses, own')[2], 2 * bodyInertia(masses.shape, masses.mass));
  });

  it('prints I(x) and the mass', () => {
    expectPrinted(row('I₀, kg·m²')[0], polynomial[0]);
    expectPrinted(row('m_s, kg')[0], polynomial[2]);
    expectPrinted(row('total mass, kg')[0], totalMass(buildUp.bodies));
    for (const position of [20, 70, 120]) {
      expectPrinted(row(`I at ${position} mm, kg·m²`)[0], inertiaAt(polynomial, position));
    }
    const growth = (from: number, to: number) =>
      (100 * (inertiaAt(polynomial, to) / inertiaAt(polynomial, from) - 1)).toFixed(0);
    expect(text).toContain(`from 20 to 70 mm it grows by ${growth(20, 70)} %`);
    expect(text).toContain(`from 70 to 120 mm by ${growth(70, 120)} %`);
  });

  it('prints what friction carries and both bounds', () => {
    expectPrinted(row('N, N')[0], totalMass(buildUp.bodies) * standardGravity);
    expectPrinted(row('torque per unit of μ, N·m')[0], perMu);
    expectPrinted(row('torque at μ = 0.31, N·m')[0], 0.31 * perMu);
    expectPrinted(row('torque at μ = 0.375, N·m')[0], 0.375 * perMu);
    for (const position of [20, 70, 120]) {
      const [holding, lettingGo] = row(`${position} mm`);
      const inertia = inertiaAt(polynomial, position);
      expectPrinted(holding, (0.31 * perMu) / inertia);
      expectPrinted(lettingGo, (0.375 * perMu) / inertia);
    }
    const limit = roundToDecimals((0.7 * 0.31 * perMu) / inertiaAt(polynomial, 70), 1, 'down');
    expect(text).toContain(`at 70 mm is ${limit} rad/s²`);
  });

  it('prints the facts of the trade', () => {
    const weight = 0.1625 * standardGravity;
    expectPrinted(row('weight of 0.1625 kg, N')[0], weight);
    expectPrinted(row('carried by friction at μ = 0.21, N')[0], 0.21 * weight);
    expectPrinted(row('torque at 26 mm, N·m')[0], 0.21 * weight * 0.026);
    expectPrinted(row('left by a margin of 40 %, N·m')[0], 0.6 * 0.21 * weight * 0.026);
  });
});
