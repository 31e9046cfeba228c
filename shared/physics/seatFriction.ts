import type { FrictionKind, InclineReading } from '../schemas/frictionTest.ts';
import {
  combineFriction,
  poolFrictionTests,
  type FrictionSample,
  type FrictionSource,
} from './frictionTest.ts';
import type { LoadedFace } from './seatTorque.ts';

/** What is needed of a stored friction test. */
export type FaceTest = {
  kind: FrictionKind;
  face: string | null;
  readings: readonly InclineReading[];
  readingUncertainty: number;
  excluded?: boolean;
};

/** Friction of a seat: as one sample, and each face's own mean (in the order of the faces). */
export type SeatFriction = { sample: FrictionSample; perFace: number[] };

/**
 * Friction of a seat from the tests of one kind. A face with tests of its own uses those, every
 * other face the tests that name no face; faces that share tests are one source.
 *
 * @returns null if a face that carries torque has no test
 */
export function seatFriction(
  faces: readonly (LoadedFace & { name: string })[],
  tests: readonly FaceTest[],
  kind: FrictionKind,
): SeatFriction | null {
  const common = sourceOf(tests, kind, null);
  const weights = new Map<FrictionSource, number>();
  const perFace: number[] = [];
  for (const { name, normalForce, radius } of faces) {
    const source = sourceOf(tests, kind, name) ?? common;
    if (!source) return null;
    perFace.push(source.mean);
    weights.set(source, (weights.get(source) ?? 0) + normalForce * radius);
  }
  const sources = [...weights]
    .filter(([, weight]) => weight > 0)
    .map(([source, weight]) => ({ ...source, weight }));
  return sources.length === 0 ? null : { sample: combineFriction(sources), perFace };
}

function sourceOf(
  tests: readonly FaceTest[],
  kind: FrictionKind,
  face: string | null,
): FrictionSource | null {
  return poolFrictionTests(tests.filter((test) => test.kind === kind && test.face === face));
}
