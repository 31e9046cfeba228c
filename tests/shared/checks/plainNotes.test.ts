import { expect, it } from 'vitest';
import { analyse } from '../../../shared/analyse.ts';
import { analysisRequestSchema } from '../../../shared/schemas/analysis.ts';

const outcomes = ['held', 'held', 'slipped', 'held', 'slipped', 'slipped'] as const;
const configuration = (label: string, inertia: number, half: number) =>
  outcomes.map((outcome, i) => ({
    configuration: label,
    inertia,
    acceleration: half * (0.85 + 0.06 * i),
    outcome,
  }));

it('writes notes and sentences in words a reader knows, not in names of the wire', () => {
  const trials = [...configuration('A', 0.01, 40), ...configuration('B', 0.02, 44)];
  const result = analyse(analysisRequestSchema.parse({ trials }));
  const written = [
    result.sentence,
    ...result.configurations.map(({ sentence }) => sentence),
    ...result.notes,
  ];
  expect(written.length).toBeGreaterThan(3);
  for (const text of written) {
    expect(text).not.toMatch(
      /commonTorque50|mu50|torque50|\bsend\b|undefined|NaN|Infinity|\bnull\b/,
    );
    expect(text).toMatch(/[.)]$/);
  }
});

it('names no culprit where the configurations do not share one curve', () => {
  const trials = [
    ...configuration('A', 0.01, 40),
    ...configuration('A', 0.01, 40),
    ...configuration('B', 0.02, 34),
    ...configuration('B', 0.02, 34),
  ];
  const result = analyse(analysisRequestSchema.parse({ trials }));
  expect(result.verdict).toBe('no common curve');
  expect(result.sentence).toContain('A, B do not share one curve');
});
